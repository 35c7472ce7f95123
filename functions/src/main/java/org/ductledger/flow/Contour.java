package org.ductledger.flow;

import static org.ductledger.flow.Arguments.CONVERGING;
import static org.ductledger.flow.Arguments.EXIT_AREA_RATIO;
import static org.ductledger.flow.Arguments.STATION_AREA_RATIO;
import static org.ductledger.flow.Arguments.STATION_SIDE;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/**
 * A nozzle's contour, given by a few points and joined by cones: between two points the diameter is linear in x. The
 * diameter is carried as the <i>opening</i> (D - Dt) / (Dend - Dt), which is 0 at the throat and 1 at the inlet or the
 * exit, so that one contour serves every throat and every area ratio.
 */
final class Contour {
    private static final Chapter FAMILY = new Chapter("contour", "Nozzle contour of cones between points");

    private Contour() {}

    /** A straight line between two values; exact at both ends. */
    static double between(double fraction, double first, double second) {
        return (1 - fraction) * first + fraction * second;
    }

    static double betweenByFraction(double fraction, double first, double second) {
        return second - first;
    }

    static double betweenByFirst(double fraction, double first, double second) {
        return 1 - fraction;
    }

    static double betweenBySecond(double fraction, double first, double second) {
        return fraction;
    }

    private static double end(double side, double inlet, double exit) {
        return side == CONVERGING ? inlet : exit;
    }

    /** The square of 1 + opening (sqrt(end) - 1), multiplied out so that it is exact at both ends and never leaves them. */
    static double areaRatio(double opening, double side, double inlet, double exit) {
        double end = end(side, inlet, exit);
        double rest = 1 - opening;
        double area = rest * rest + 2 * opening * rest * Math.sqrt(end) + opening * opening * end;
        return Math.min(end, Math.max(1, area));
    }

    static double areaRatioByOpening(double opening, double side, double inlet, double exit) {
        double edge = Math.sqrt(end(side, inlet, exit)) - 1;
        return 2 * (1 + opening * edge) * edge;
    }

    private static double areaRatioByEnd(double opening, double end) {
        double diameter = Math.sqrt(end);
        return (1 - opening) * opening / diameter + opening * opening;
    }

    static double areaRatioByInlet(double opening, double side, double inlet, double exit) {
        return side == CONVERGING ? areaRatioByEnd(opening, inlet) : 0;
    }

    static double areaRatioByExit(double opening, double side, double inlet, double exit) {
        return side == CONVERGING ? 0 : areaRatioByEnd(opening, exit);
    }

    /** (sqrt(area) - 1) / (sqrt(end) - 1), free of cancellation near the throat; NaN where area exceeds end. */
    static double openingFromAreaRatio(double area, double end) {
        if (area > end) {
            return Double.NaN;
        }
        return Math.min(1, (area - 1) / (end - 1) * ((Math.sqrt(end) + 1) / (Math.sqrt(area) + 1)));
    }

    static double openingByArea(double area, double end) {
        return (Math.sqrt(end) + 1) / (2 * Math.sqrt(area) * (end - 1));
    }

    static double openingByEnd(double area, double end) {
        return -openingFromAreaRatio(area, end) * (Math.sqrt(end) + 1) / (2 * Math.sqrt(end) * (end - 1));
    }

    /** The share of point 1 .. 4 in the place at this opening: the hat functions of linear interpolation. */
    private static double share(int point, double opening, double opening2, double opening3) {
        double low = opening <= opening2 ? 0 : opening <= opening3 ? opening2 : opening3;
        double high = opening <= opening2 ? opening2 : opening <= opening3 ? opening3 : 1;
        int first = opening <= opening2 ? 1 : opening <= opening3 ? 2 : 3;
        double t = opening == low ? 0 : (opening - low) / (high - low);
        return point == first ? 1 - t : point == first + 1 ? t : 0;
    }

    static double xFromOpening(
            double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        if (opening2 > opening3) {
            return Double.NaN;
        }
        return share(1, opening, opening2, opening3) * x1
                + share(2, opening, opening2, opening3) * x2
                + share(3, opening, opening2, opening3) * x3
                + share(4, opening, opening2, opening3) * x4;
    }

    static double xByOpening(
            double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        return opening <= opening2
                ? (x2 - x1) / opening2
                : opening <= opening3 ? (x3 - x2) / (opening3 - opening2) : (x4 - x3) / (1 - opening3);
    }

    static double xByX1(double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        return share(1, opening, opening2, opening3);
    }

    static double xByX2(double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        return share(2, opening, opening2, opening3);
    }

    static double xByX3(double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        return share(3, opening, opening2, opening3);
    }

    static double xByX4(double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        return share(4, opening, opening2, opening3);
    }

    static double xByOpening2(
            double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        double slope = xByOpening(opening, x1, x2, x3, x4, opening2, opening3);
        return -slope * share(2, opening, opening2, opening3);
    }

    static double xByOpening3(
            double opening, double x1, double x2, double x3, double x4, double opening2, double opening3) {
        double slope = xByOpening(opening, x1, x2, x3, x4, opening2, opening3);
        return -slope * share(3, opening, opening2, opening3);
    }

    private static final Interval UNIT_INTERVAL = Interval.closed(0, 1);
    private static final Source CONES = Sources.SUTTON_BIBLARZ.at("section 3.4, Nozzle Configurations");
    private static final String PRACTICE = "Walls of cones between a few points are common practice. ";

    private static final Argument FRACTION =
            Argument.number("fraction", "f", "1", UNIT_INTERVAL, "share of the way from the first point to the second");
    private static final Argument OPENING = Argument.number(
            "opening", "o", "1", UNIT_INTERVAL, "(D - Dt)/(Dend - Dt): 0 at the throat, 1 at the inlet or exit");
    private static final Argument INLET_AREA_RATIO =
            EXIT_AREA_RATIO.named("inlet_area_ratio", "Ai/At", "inlet area over the throat area");
    private static final Argument END_AREA_RATIO = Argument.number(
            "end_area_ratio", "Aend/At", "1", Interval.above(1), "inlet or exit area over the throat area");

    private static Argument x(int point, String where) {
        return Argument.number("x" + point, "x" + point, "m", Interval.anyNumber(), "place of " + where);
    }

    private static Argument opening(int point, String where) {
        return OPENING.named("opening" + point, "o" + point, "opening at " + where);
    }

    private static final FunctionEntry CONTOUR_X = FAMILY.entry("contour_x")
            .title("Place of a station between two points of the contour")
            .formula("x = x1 + f (x2 - x1)")
            .note("The throat is wherever x says; upstream of it x may be negative.")
            .takes(FRACTION, x(1, "the first point"), x(2, "the second point"))
            .gives("x", "m", Interval.anyNumber())
            .kernel(Contour::between)
            .partials(
                    Kernel.of(Contour::betweenByFraction),
                    Kernel.of(Contour::betweenByFirst),
                    Kernel.of(Contour::betweenBySecond))
            .sources(CONES)
            .example("0.055", 0.25, 0.04, 0.1)
            .cell("(1-{fraction})*{x1}+{fraction}*{x2}")
            .build();

    private static final FunctionEntry CONTOUR_OPENING = FAMILY.entry("contour_opening")
            .title("Opening of a station between two points of the contour")
            .formula("o = o1 + f (o2 - o1),  o = (D - Dt)/(Dend - Dt)")
            .note(PRACTICE + "The diameter, and with it the opening, is linear in x on each.")
            .takes(FRACTION, opening(1, "the first point"), opening(2, "the second point"))
            .gives("o", "1", UNIT_INTERVAL)
            .kernel(Contour::between)
            .partials(
                    Kernel.of(Contour::betweenByFraction),
                    Kernel.of(Contour::betweenByFirst),
                    Kernel.of(Contour::betweenBySecond))
            .sources(CONES)
            .example("0.425", 0.25, 0.3, 0.8)
            .cell("(1-{fraction})*{opening1}+{fraction}*{opening2}")
            .build();

    private static final FunctionEntry CONTOUR_AREA_RATIO = FAMILY.entry("contour_area_ratio")
            .title("Area over throat area at a station of the contour")
            .formula("A/At = (1 + o (sqrt(Aend/At) - 1))^2,  o = (D - Dt)/(Dend - Dt)")
            .note("The end is the inlet on the converging side and the exit on the diverging side. Circular sections.")
            .takes(OPENING, STATION_SIDE, INLET_AREA_RATIO, EXIT_AREA_RATIO)
            .gives("A/At", "1", Interval.atLeast(1))
            .kernel(Contour::areaRatio)
            .partials(
                    Kernel.of(Contour::areaRatioByOpening),
                    null,
                    Kernel.of(Contour::areaRatioByInlet),
                    Kernel.of(Contour::areaRatioByExit))
            .sources(CONES)
            .example("2.25", 0.5, "diverging", 3.0, 4.0)
            .cell(areaRatioCell())
            .build();

    private static CellForm areaRatioCell() {
        return CellForm.steps()
                .helper("end", "IF({station_side}=\"converging\",{inlet_area_ratio},{exit_area_ratio})")
                .result("MIN({end},MAX(1,(1-{opening})^2+2*{opening}*(1-{opening})*SQRT({end})+{opening}^2*{end}))");
    }

    private static final FunctionEntry CONTOUR_OPENING_FROM_AREA_RATIO = FAMILY.entry("contour_opening_from_area_ratio")
            .title("Opening of the contour where it has a given area")
            .formula("o = (sqrt(A/At) - 1)/(sqrt(Aend/At) - 1)")
            .takes(STATION_AREA_RATIO, END_AREA_RATIO)
            .gives("o", "1", UNIT_INTERVAL)
            .kernel(Contour::openingFromAreaRatio)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION, "area_ratio", Kernel.of((area, end) -> end), "the area ratio of that end")
            .partials(Kernel.of(Contour::openingByArea), Kernel.of(Contour::openingByEnd))
            .sources(CONES)
            .example("0.5", 2.25, 4.0)
            .cell("IF({area_ratio}<={end_area_ratio},"
                    + "MIN(1,({area_ratio}-1)/({end_area_ratio}-1)*(SQRT({end_area_ratio})+1)/(SQRT({area_ratio})+1)),"
                    + "NA())")
            .build();

    private static final FunctionEntry CONTOUR_X_FROM_OPENING = FAMILY.entry("contour_x_from_opening")
            .title("Place at which one side of the contour has a given opening")
            .formula("x = xa + (xb - xa)(o - oa)/(ob - oa) on the cone with oa <= o <= ob,  o1 = 0,  o4 = 1")
            .note("One side, from the throat (point 1) over points 2 and 3 to the inlet or exit (point 4). Where the"
                    + " contour is a cylinder, the place nearest to the throat.")
            .takes(
                    OPENING,
                    x(1, "the throat"),
                    x(2, "point 2"),
                    x(3, "point 3"),
                    x(4, "the inlet or exit"),
                    opening(2, "point 2"),
                    opening(3, "point 3"))
            .gives("x", "m", Interval.anyNumber())
            .kernel(Contour::xFromOpening)
            .requiresAtLeast(
                    FaultKind.NO_SOLUTION,
                    "opening3",
                    Kernel.of((opening, x1, x2, x3, x4, opening2, opening3) -> opening2),
                    "opening2: from the throat on the contour must not narrow")
            .partials(
                    Kernel.of(Contour::xByOpening),
                    Kernel.of(Contour::xByX1),
                    Kernel.of(Contour::xByX2),
                    Kernel.of(Contour::xByX3),
                    Kernel.of(Contour::xByX4),
                    Kernel.of(Contour::xByOpening2),
                    Kernel.of(Contour::xByOpening3))
            .sources(CONES)
            .example("0.07", 0.5, 0.0, 0.03, 0.11, 0.2, 0.25, 0.75)
            .cell("IF({opening2}>{opening3},NA(),IF({opening}<={opening2},"
                    + "IF({opening2}=0,{x1},{x1}+({x2}-{x1})*{opening}/{opening2}),IF({opening}<={opening3},"
                    + "{x2}+({x3}-{x2})*({opening}-{opening2})/({opening3}-{opening2}),"
                    + "{x3}+({x4}-{x3})*({opening}-{opening3})/(1-{opening3}))))")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                CONTOUR_X,
                CONTOUR_OPENING,
                CONTOUR_AREA_RATIO,
                CONTOUR_OPENING_FROM_AREA_RATIO,
                CONTOUR_X_FROM_OPENING);
    }
}
