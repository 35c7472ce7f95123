package org.ductledger.audit;

import java.util.Locale;

/**
 * One difference that an audit found.
 *
 * @param sheet the sheet's name; empty where the file as a whole is meant
 * @param cell the cell on it, as in {@code D6}; empty where no single one is meant
 * @param quantity the input or the call that stands there
 * @param recorded what the record, or today's library, says
 * @param found what the workbook holds
 * @param detail one sentence
 */
public record Finding(
        Kind kind, String sheet, String cell, String quantity, String recorded, String found, String detail) {
    /** The kinds of difference. */
    public enum Kind {
        /** An input cell holds another value than at the fill. */
        INPUT_CHANGED,
        /** A filled cell holds another value than the record says it was given. */
        FILLED_VALUE_CHANGED,
        /** Today's library gives another value than the record holds. */
        RESULT_CHANGED,
        /** Today's library has another revision of a function. */
        REVISION_CHANGED,
        /** Today's library cannot evaluate a recorded call. */
        CALL_REFUSED,
        /** A live cell holds no formula any more. */
        FORMULA_REMOVED,
        /** A live formula reads otherwise than the template writes it. */
        FORMULA_CHANGED,
        /** A live formula, recalculated, gives another value than the library for the inputs as they stand. */
        LIVE_VALUE_DIFFERS,
        /** A live formula could not be recalculated here. */
        LIVE_NOT_RECALCULATED,
        /** The record's digest is not the digest of what the record says. */
        DIGEST_DIFFERS;

        /** The kind as the faces write it: {@code input_changed}. */
        public String label() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** Where it is, as in {@code Inputs!D6}. */
    public String place() {
        return cell.isEmpty() ? sheet : sheet + "!" + cell;
    }
}
