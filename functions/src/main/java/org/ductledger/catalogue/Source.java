package org.ductledger.catalogue;

/** Where a definition comes from: the body or author, the title, the year, and the equation or table in it. */
public record Source(String author, String title, int year, String locator) {
    /** The same work, another place in it. */
    public Source at(String place) {
        return new Source(author, title, year, place);
    }

    @Override
    public String toString() {
        return author + ", " + title + ", " + year + (locator.isEmpty() ? "" : ", " + locator);
    }
}
