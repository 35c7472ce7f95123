package org.ductledger.catalogue;

/** A unit's symbol that is not known, or not to be had, with the reason. */
public final class UnknownUnitException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    UnknownUnitException(String message) {
        super(message);
    }
}
