package org.ductledger.catalogue;

import java.util.Locale;

/** The kinds of fault: a small closed set that every face of the program shares. */
public enum FaultKind {
    /** An argument lies outside its admissible values, or the result beyond the range of a double. */
    OUTSIDE_DOMAIN,
    /** The arguments are admissible one by one, but no flow has them together: a detached shock, a choked duct. */
    NO_SOLUTION,
    /** An iteration ended before it reached its accuracy. */
    NOT_CONVERGED,
    MISSING_ARGUMENT,
    UNKNOWN_FUNCTION,
    UNKNOWN_UNIT,
    /** A reference to no call, to a later one, to one of another kind or length, or to a row without a value. */
    BAD_REFERENCE,
    NOT_A_NUMBER;

    /** The kind as the faces write it: {@code outside_domain}. */
    public String label() {
        return name().toLowerCase(Locale.ROOT);
    }
}
