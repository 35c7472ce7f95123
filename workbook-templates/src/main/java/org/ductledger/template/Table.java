package org.ductledger.template;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** A table of a template: a sheet of its own, with columns of one length and perhaps a plot. */
public final class Table {
    private final String sheet;
    private final String title;
    private final int rows;
    private final List<TableColumn> columns = new ArrayList<>();
    private @Nullable Plot plot;

    Table(String sheet, String title, int rows) {
        this.sheet = sheet;
        this.title = title;
        this.rows = rows;
    }

    /** One column: words or numbers that the template gives, or the result of a call. */
    sealed interface TableColumn {
        String name();

        String label();
    }

    /** A column of constants. */
    record FixedColumn(String name, String label) implements TableColumn {}

    /** A column of results. */
    record CalledColumn(DraftCall call) implements TableColumn {
        @Override
        public String name() {
            return call.id();
        }

        @Override
        public String label() {
            return call.label();
        }
    }

    /**
     * A plot of two columns of the table along a third.
     *
     * @param jump where both may jump between two rows; {@code null} where they never do
     */
    public record Plot(
            Term along, Term left, Term right, @Nullable Jump jump) {}

    /**
     * A place at which the plotted columns jump, as at a shock: single results, without a value where nothing jumps.
     *
     * @param label what the plot calls it
     */
    public record Jump(String label, Term along, Term leftBefore, Term leftAfter, Term rightBefore, Term rightAfter) {}

    /** Draws a plot above the table. */
    public void plot(Plot drawn) {
        plot = drawn;
    }

    void add(TableColumn column) {
        columns.add(column);
    }

    String sheet() {
        return sheet;
    }

    String title() {
        return title;
    }

    int rows() {
        return rows;
    }

    List<TableColumn> columns() {
        return Collections.unmodifiableList(columns);
    }

    @Nullable
    Plot plot() {
        return plot;
    }
}
