package org.ductledger.flow;

import static org.ductledger.flow.Arguments.CONVERGING;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.junit.jupiter.api.Test;

/**
 * Against textbook examples of nozzles (Anderson; White; Cengel and Cimbala; Crowe, Elger and Roberson; Massey; Balmer;
 * Sutton and Biblarz) and against values computed to 50 digits from the published equations. The columns {@code source}
 * and {@code provenance} of the table say which values were read and which are from memory.
 */
class NozzleValidationTest {
    /** A back pressure below every design. */
    private static final double VACUUM = 1e-9;

    /** Of the nozzle in Massey's example 11.5, designed for helium (gamma 5/3) at M = 1.8. */
    private static final double HELIUM_NOZZLE = Isentropic.areaRatio(1.8, 5.0 / 3);

    private static double gamma(Row row) {
        return row.number(row.inputs().contains("gamma=") ? "gamma" : "k");
    }

    private static double exit(Row row) {
        return row.inputs().contains("eps=") ? row.number("eps") : row.number("Ae/At");
    }

    private static double exitOfDiameters(Row row) {
        double ratio = row.number("De") / row.number("Dt");
        return ratio * ratio;
    }

    /** What a quantity is called before its unit or a remark. */
    private static String name(Row row) {
        return row.quantity().replaceAll(" [\\[(].*", "");
    }

    private static Answer answer(Row row) {
        return switch (name(row)) {
            case "unchoked CD nozzle exit Mach", "unchoked CD nozzle throat Mach" -> unchoked(row);
            case "converging nozzle mass flow" -> Answer.of(massFlow(row));
            case "first critical pe/p0", "first critical pb/p0" ->
                Answer.of(NozzleFlow.firstCritical(exit(row), gamma(row)));
            case "first critical p0/pe" -> Answer.of(1 / NozzleFlow.firstCritical(exit(row), gamma(row)));
            case "second critical pb/p0" -> Answer.of(NozzleFlow.secondCritical(exit(row), gamma(row)));
            case "third critical pb/p0" -> Answer.of(NozzleFlow.thirdCritical(exit(row), gamma(row)));
            case "nozzle exit pressure" ->
                Answer.of(row.number("p0") * NozzleFlow.thirdCritical(exit(row), gamma(row)));
            default -> row.quantity().contains("thrust coefficient") ? thrust(row) : shock(row);
        };
    }

    private static Answer unchoked(Row row) {
        double pb = row.number("pe") / row.number("p0");
        return Answer.of(
                row.quantity().contains("throat")
                        ? NozzleFlow.machAt(1, CONVERGING, exit(row), pb, gamma(row))
                        : NozzleFlow.exitMach(exit(row), pb, gamma(row)));
    }

    private static double massFlow(Row row) {
        double area = 0.25 * Math.PI * row.number("d") * row.number("d");
        double rootOfHeat = Math.sqrt(row.number("R") * row.number("Tt"));
        double choked = Isentropic.chokedMassFlowNumber(gamma(row)) * row.number("pt") * 1000 * area / rootOfHeat;
        return choked * NozzleFlow.massFlowFraction(1, row.number("pb") / row.number("pt"), gamma(row));
    }

    private static Answer shock(Row row) {
        return switch (name(row)) {
            case "shock location A_s/A_t from pb/p0" ->
                Answer.of(NozzleFlow.shockAreaRatio(exit(row), row.number("pb/p0"), gamma(row)));
            case "shock Mach from pb/p0" ->
                Answer.of(NozzleFlow.shockMach1(exit(row), row.number("pb/p0"), gamma(row)));
            case "nozzle shock p02/p01" -> Answer.of(NozzleFlow.exitP0OverP0(exit(row), backPressure(row), gamma(row)));
            case "nozzle with shock exit pressure" -> Answer.of(row.number("p0") * backPressure(row));
            case "static pressure behind exit-plane shock" ->
                Answer.of(1000 * row.number("p0") * NozzleFlow.secondCritical(exitOfDiameters(row), gamma(row)));
            case "exit shock p2" ->
                Answer.of(row.number("p0")
                        * NozzleFlow.secondCritical(Isentropic.areaRatio(row.number("Me"), gamma(row)), gamma(row)));
            case "exit shock T2" ->
                Answer.of(row.number("T0")
                        * Isentropic.tOverT0(NormalShock.mach2(row.number("Me"), gamma(row)), gamma(row)));
            default -> expansion(row);
        };
    }

    private static Answer expansion(Row row) {
        return switch (name(row)) {
            case "nozzle exit Mach" ->
                Answer.of(NozzleFlow.exitMach(
                        row.inputs().contains("De=") ? exitOfDiameters(row) : exit(row), VACUUM, gamma(row)));
            case "nozzle design exit pressure" ->
                Answer.of(row.number("p0") * NozzleFlow.thirdCritical(row.number("Ae") / row.number("At"), gamma(row)));
            case "nozzle exit area" -> Answer.of(row.number("At") * Isentropic.areaRatio(row.number("Me"), gamma(row)));
            case "rocket nozzle exit area" ->
                Answer.of(row.number("A*") * areaRatio(row.number("pe") / row.number("p0"), gamma(row)));
            case "nozzle area ratio A2/At" -> Answer.of(areaRatio(row.number("p2=p3") / row.number("p1"), gamma(row)));
            case "ideal nozzle exhaust velocity" -> {
                double mach = Isentropic.machFromPOverP0(row.number("p2=p3") / row.number("p1"), gamma(row));
                yield Answer.of(FlowRates.flowSpeed(mach, row.number("T1"), gamma(row), row.number("R")));
            }
            case "A/A* squared for helium" -> Answer.of(HELIUM_NOZZLE * HELIUM_NOZZLE);
            case "air Mach at same area ratio" -> Answer.of(NozzleFlow.exitMach(HELIUM_NOZZLE, VACUUM, 1.4));
            default -> Answer.none("of another family");
        };
    }

    private static double areaRatio(double p, double gamma) {
        return Isentropic.areaRatio(Isentropic.machFromPOverP0(p, gamma), gamma);
    }

    private static Answer thrust(Row row) {
        double gamma = gamma(row);
        if (row.quantity().contains("limit")) {
            return Answer.of(Thrust.vacuumCoefficient(1e30, gamma));
        }
        return Answer.of(
                row.quantity().contains("vacuum")
                        ? Thrust.vacuumCoefficient(exit(row), gamma)
                        : Thrust.coefficient(exit(row), NozzleFlow.thirdCritical(exit(row), gamma), gamma));
    }

    /** The back pressure that holds the shock where the example has it, by bisection on the catalogue's function. */
    private static double backPressure(Row row) {
        double exit = exit(row);
        double gamma = gamma(row);
        double low = NozzleFlow.secondCritical(exit, gamma);
        double high = NozzleFlow.firstCritical(exit, gamma) * (1 - 1e-8);
        for (int i = 0; i < 100; i++) {
            double middle = 0.5 * (low + high);
            if (NozzleFlow.shockAreaRatio(exit, middle, gamma) > row.number("shock at A/At")) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    @Test
    void textbookExamplesAreMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        assertEquals(Map.of("checked", 41, "of another family", 76), table.check(NozzleValidationTest::answer));
    }
}
