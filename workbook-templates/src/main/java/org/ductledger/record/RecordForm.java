package org.ductledger.record;

/**
 * How the {@code Ledger} sheet is written: in lines, each with its kind in column A. What reads it back goes by that
 * word alone; headings and notes leave column A empty.
 *
 * <pre>
 * A       B         C          D          E     F     G     H      I             J              K
 * record  key       text
 * input   name      cell                  unit  kind  row   value  at the fill   state
 * fixed   name      cells                 unit  kind  rows  value
 * call    id        function   revision   unit  kind  rows  value  live cells    filled cells   arguments
 * value   name, id                              row   value  value         value          value
 * </pre>
 *
 * <p>A value is a word, a number with seventeen digits, or {@code fault: kind: reason}. The values of a column stand in
 * {@code value} lines, several to a line, its rows counted from 1; the value of its own line is then empty. Several
 * {@code input} lines of one name are its rows, a {@code remark} line is an input that no call takes. The arguments of a call stand in one cell,
 * a line each, as {@code name = origin @ cells}, see {@link OriginText}.
 */
final class RecordForm {
    static final String SHEET = "Ledger";
    static final String RECORD = "record";
    static final String INPUT = "input";
    static final String REMARK = "remark";
    static final String FIXED = "fixed";
    static final String CALL = "call";
    static final String VALUE = "value";

    static final String TEMPLATE = "template";
    static final String TEMPLATE_VERSION = "template_version";
    static final String LIBRARY = "library";
    static final String UNITS = "units";
    static final String DIGEST = "digest";

    static final String NUMBER = "number";
    static final String WORD = "word";
    static final String FAULT = "fault: ";
    static final String IS = " = ";
    static final String AT = " @ ";
    static final String NEXT = "\n";

    static final int NAME = 1;
    static final int WHAT = 2;
    static final int REVISION = 3;
    static final int UNIT = 4;
    static final int KIND = 5;
    static final int ROWS = 6;
    static final int VALUES = 7;
    static final int AT_THE_FILL = 8;
    static final int LIVE = 8;
    static final int STATE = 9;
    static final int FILLED = 9;
    static final int ARGUMENTS = 10;

    /** Values in one {@code value} line. */
    static final int VALUES_PER_LINE = 4;

    private RecordForm() {}
}
