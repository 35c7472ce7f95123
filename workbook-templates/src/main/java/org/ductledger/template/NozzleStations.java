package org.ductledger.template;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.template.Table.Jump;
import org.ductledger.template.Table.Plot;

/** The stations of a nozzle: its contour, and the flow along it. */
final class NozzleStations {
    private static final int SEGMENTS = NozzleInputs.POINTS.size() - 1;
    private static final int THROAT = NozzleInputs.POINTS.indexOf("throat");
    private static final int STEPS = 8;

    private final Draft draft;
    private final Table table;

    NozzleStations(Draft draft) {
        this.draft = draft;
        this.table = draft.table("Stations", "Flow along the nozzle", SEGMENTS * STEPS + 1);
    }

    void write() {
        requireOrder();
        Term x = writeContour();
        Term mach = column("station_mach", "Mach number", "M", "nozzle_mach_at", Map.of());
        Term ratio = column("station_p_over_p0", "Pressure over p0", "p/p0", "nozzle_p_over_p0_at", Map.of());
        writeState(mach, ratio);
        Jump shock = new Jump(
                "Shock",
                call("shock_x"),
                call("shock_mach1"),
                call("shock_m2"),
                call("shock_p1_over_p0"),
                call("shock_p2_over_p0"));
        table.plot(new Plot(x, mach, ratio, shock));
    }

    private static Term call(String id) {
        return new Term(new FromCall(id));
    }

    private Term column(String id, String label, String symbol, String function, Map<String, Term> with) {
        return draft.column(table, id, label, symbol, function, with);
    }

    private void requireOrder() {
        for (int i = 0; i < SEGMENTS; i++) {
            draft.requires(
                    "a contour with its " + NozzleInputs.POINTS.get(i) + " ahead of its "
                            + NozzleInputs.POINTS.get(i + 1),
                    draft.input("contour_x", i),
                    draft.input("contour_x", i + 1));
        }
        draft.requires(
                "a contour that narrows from inlet side 1 to inlet side 2",
                draft.input("contour_opening", 1),
                draft.input("contour_opening", 0));
        draft.requires(
                "a contour that widens from exit side 1 to exit side 2",
                draft.input("contour_opening", 2),
                draft.input("contour_opening", 3));
    }

    private Term writeContour() {
        double[] fractions = new double[table.rows()];
        List<String> sides = new ArrayList<>();
        for (int i = 0; i < table.rows(); i++) {
            fractions[i] = (i - segment(i) * STEPS) / (double) STEPS;
            sides.add(i <= THROAT * STEPS ? "converging" : "diverging");
        }
        draft.bind("station_side", draft.column(table, "side", "Side", new Column.Texts(List.copyOf(sides))));
        draft.bind("fraction", draft.column(table, "fraction", "Fraction of the cone", new Column.Numbers(fractions)));
        List<Term> places = new ArrayList<>();
        for (int i = 0; i <= SEGMENTS; i++) {
            places.add(draft.input("contour_x", i));
        }
        Term x = column("station_x", "Place", "x", "contour_x", ends("x1", "x2", places));
        Term opening =
                column("station_opening", "Opening", "o", "contour_opening", ends("opening1", "opening2", openings()));
        Term ratio = column(
                "station_area_ratio",
                "Area over throat area",
                "A/At",
                "contour_area_ratio",
                Map.of("opening", opening));
        draft.bind("area_ratio", ratio);
        column("station_area", "Area", "A", "area_from_area_ratio", Map.of());
        return x;
    }

    private static int segment(int station) {
        return Math.min(station / STEPS, SEGMENTS - 1);
    }

    /** The openings at the points: those between are inputs, the ends and the throat are known. */
    private List<Term> openings() {
        Term end = draft.constant("opening_of_end", 1);
        Term throat = draft.constant("opening_of_throat", 0);
        return List.of(
                end,
                draft.input("contour_opening", 0),
                draft.input("contour_opening", 1),
                throat,
                draft.input("contour_opening", 2),
                draft.input("contour_opening", 3),
                end);
    }

    /** For each station the values at the two points of its cone. */
    private Map<String, Term> ends(String first, String second, List<Term> points) {
        List<Term> firsts = new ArrayList<>();
        List<Term> seconds = new ArrayList<>();
        for (int i = 0; i < table.rows(); i++) {
            firsts.add(points.get(segment(i)));
            seconds.add(points.get(segment(i) + 1));
        }
        return Map.of(first, Draft.each(firsts), second, Draft.each(seconds));
    }

    private void writeState(Term mach, Term ratio) {
        Term p = column("station_pressure", "Pressure", "p", "p_from_p_over_p0", Map.of("p_over_p0", ratio));
        Term tRatio = column("station_t_over_t0", "Temperature over T0", "T/T0", "t_over_t0", Map.of("mach", mach));
        Term t = column("station_temperature", "Temperature", "T", "t_from_t_over_t0", Map.of("t_over_t0", tRatio));
        column("station_density", "Density", "rho", "gas_density", Map.of("p", p, "t", t));
        column("station_speed", "Speed", "V", "flow_speed", Map.of("mach", mach));
    }
}
