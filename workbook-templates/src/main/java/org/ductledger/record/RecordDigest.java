package org.ductledger.record;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import org.ductledger.ledger.Column;

/** The digest of a record: SHA-256 over a canonical text of all it says, so that no line changes unnoticed. */
public final class RecordDigest {
    private RecordDigest() {}

    /** The digest that the record ought to carry, as 64 hexadecimal digits. */
    public static String of(LedgerRecord record) {
        try {
            byte[] text = canonicalText(record).getBytes(StandardCharsets.UTF_8);
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(text));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    /** Whether the record's own digest is the one it ought to carry. */
    public static boolean holds(LedgerRecord record) {
        return of(record).equals(record.digest());
    }

    /** All that a record says but its digest, a line for each statement. */
    static String canonicalText(LedgerRecord record) {
        StringBuilder text = new StringBuilder();
        line(text, "record", record.template(), record.templateVersion(), record.library(), record.units());
        for (RecordedQuantity quantity : record.quantities()) {
            line(text, "quantity", quantity.name(), quantity.role(), quantity.unit(), quantity.cells());
            values(text, quantity.values());
        }
        for (RecordedCall call : record.calls()) {
            line(text, "call", call.id(), call.function(), call.revision(), call.unit());
            line(text, "cells", call.liveCells(), call.filledCells());
            call.arguments().forEach(a -> line(text, "argument", a.name(), OriginText.of(a.origin()), a.cells()));
            values(text, call.values());
            call.faults().forEach(fault -> line(text, "fault", fault.row(), fault.kind(), fault.detail()));
        }
        return text.toString();
    }

    private static void values(StringBuilder text, Column column) {
        if (column instanceof Column.Texts texts) {
            texts.values().forEach(word -> line(text, "word", word == null ? "" : word));
            return;
        }
        for (double x : ((Column.Numbers) column).values()) {
            line(text, "number", Double.isNaN(x) ? "" : Digits.of(x));
        }
    }

    /** Each part by its length and itself, so that no two records have one text. */
    private static void line(StringBuilder text, Object... parts) {
        for (Object part : List.of(parts)) {
            String written = part.toString();
            text.append(written.length()).append(':').append(written).append(' ');
        }
        text.append('\n');
    }
}
