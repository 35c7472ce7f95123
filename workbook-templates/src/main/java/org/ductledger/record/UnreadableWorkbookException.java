package org.ductledger.record;

/** A file that is no workbook of ours, or whose record is damaged; names the place, what is required and what was found. */
public final class UnreadableWorkbookException extends Exception {
    private static final long serialVersionUID = 1L;

    private final String place;
    private final String required;
    private final String given;

    public UnreadableWorkbookException(String place, String required, String given) {
        super(place + " must be " + required + ", got " + given);
        this.place = place;
        this.required = required;
        this.given = given;
    }

    /** The file as a whole, a sheet, or a cell as in {@code Ledger!C7}. */
    public String place() {
        return place;
    }

    public String required() {
        return required;
    }

    public String given() {
        return given;
    }
}
