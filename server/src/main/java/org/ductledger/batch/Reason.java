package org.ductledger.batch;

/**
 * One reason why a document is refused.
 *
 * @param kind one of the fault kinds' labels, or one of the constants here
 * @param pointer the place in the document as a JSON Pointer (RFC 6901); empty for the whole document
 * @param detail what is required and what was given
 */
public record Reason(String kind, String pointer, String detail) {
    /** The document breaks its format's own grammar. */
    public static final String MALFORMED = "malformed";

    public static final String UNKNOWN_MEMBER = "unknown_member";
    public static final String DUPLICATE_MEMBER = "duplicate_member";
    public static final String MISSING_MEMBER = "missing_member";
    /** A value of another JSON type than the place requires; {@code null} is of none. */
    public static final String WRONG_TYPE = "wrong_type";

    public static final String LIMIT_EXCEEDED = "limit_exceeded";
    /** An input of a template that it cannot take. */
    public static final String UNFIT_INPUT = "unfit_input";

    /** A member's name as one step of a JSON Pointer. */
    static String step(String name) {
        return "/" + name.replace("~", "~0").replace("/", "~1");
    }
}
