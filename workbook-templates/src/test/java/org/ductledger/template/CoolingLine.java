package org.ductledger.template;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Interval;
import org.ductledger.ledger.Column;
import org.ductledger.template.Table.Plot;

/** A small template for tests: the machinery must carry any template, not only the first one. */
final class CoolingLine implements Template {
    @Override
    public String name() {
        return "cooling_line";
    }

    @Override
    public String title() {
        return "Cooling line";
    }

    @Override
    public String purpose() {
        return "Temperatures along a line.";
    }

    @Override
    public int version() {
        return 2;
    }

    @Override
    public List<String> limits() {
        return List.of("None.");
    }

    @Override
    public List<String> cautions() {
        return List.of("Cold surfaces.");
    }

    @Override
    public List<TemplateInput> inputs() {
        return List.of(
                TemplateInput.number("gamma", "Gamma", "g", Interval.openClosed(1, 3), "ratio", 1.4, "1"),
                TemplateInput.number("t0", "Supply", "T0", Interval.above(0), "stagnation", 300, "K"),
                TemplateInput.number("mach", "Mach", "M", Interval.atLeast(0), "at the end", 2, "1")
                        .oneOf("end"),
                TemplateInput.number("t_ratio", "Ratio", "T/T0", Interval.openClosed(0, 1), "at the end", 0.5, "1")
                        .oneOf("end"),
                TemplateInput.choice("side", "Side", "", "which", "converging", "diverging"),
                TemplateInput.column(
                        "point", "Point", "x", Interval.anyNumber(), "places", List.of("first", "last"), "mm", 0, 100),
                TemplateInput.remark("project", "Project", "name", "Test"));
    }

    @Override
    public void write(Draft draft) {
        draft.bind("gamma", draft.input("gamma"));
        draft.bind("t0", draft.input("t0"));
        draft.requires("the first point ahead of the last", draft.input("point", 0), draft.input("point", 1));
        draft.section("End");
        Term ratio = draft.has("mach")
                ? draft.result("end_ratio", "Ratio", "T/T0", "t_over_t0", Map.of("mach", draft.input("mach")))
                : draft.input("t_ratio");
        draft.headline(draft.result("end_t", "Temperature", "T", "t_from_t_over_t0", Map.of("t_over_t0", ratio)));
        draft.result(
                "end_mach",
                "Mach number",
                "M",
                "mach_from_area_ratio",
                Map.of("area_ratio", draft.constant("ratio", 2), "branch", draft.word("fast", "supersonic")));
        draft.result(
                "end_area",
                "Area ratio",
                "A/At",
                "contour_area_ratio",
                Map.of(
                        "opening", draft.constant("half", 0.5),
                        "station_side", draft.input("side"),
                        "inlet_area_ratio", draft.constant("inlet", 3),
                        "exit_area_ratio", draft.constant("exit", 5)));
        Table table = draft.table("Line", "Along the line", 3);
        draft.bind("fraction", draft.column(table, "fraction", "Fraction", new Column.Numbers(0, 0.5, 1)));
        Term first = Draft.each(List.of(draft.input("point", 0), draft.input("point", 0), draft.input("point", 0)));
        Term last = Draft.each(List.of(draft.input("point", 1), draft.input("point", 1), draft.input("point", 1)));
        Term x = draft.column(table, "line_x", "Place", "x", "contour_x", Map.of("x1", first, "x2", last));
        Term mach = draft.column(table, "machs", "Mach", new Column.Numbers(0, 1, 2));
        Term t = draft.column(table, "line_ratio", "Ratio", "T/T0", "t_over_t0", Map.of("mach", mach));
        Term all = draft.column(table, "line_t", "Temperature", "T", "t_from_t_over_t0", Map.of("t_over_t0", t));
        table.plot(new Plot(x, all, t, null));
    }
}
