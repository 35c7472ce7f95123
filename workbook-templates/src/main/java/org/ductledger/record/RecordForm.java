package org.ductledger.record;

/**
 * How the {@code Ledger} sheet is written: in lines, each with its kind in column A. What reads it back goes by that
 * word alone; headings and notes leave column A empty.
 *
 * <pre>
 * record  key       text
 * input   name      role      cell      unit      kind   value   at the fill   state
 * fixed   name      cells     unit      kind      rows   value
 * call    id        function  revision  unit      kind   rows    value   live cells   filled cells   argument ...
 * value   of        first row value ...
 * </pre>
 *
 * <p>A value is a word, a number with seventeen digits, or {@code fault: kind: reason}. The values of a column stand in
 * {@code value} lines, several to a line, its rows counted from 1; the value of its own line is then empty. Several
 * {@code input} lines of one name are its rows. An argument is {@code name = origin @ cells}, see {@link OriginText}.
 */
final class RecordForm {
    static final String SHEET = "Ledger";
    static final String RECORD = "record";
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

    /** Values in one {@code value} line. */
    static final int VALUES_PER_LINE = 5;

    static final int FIRST_ARGUMENT_COLUMN = 10;

    private RecordForm() {}
}
