package org.ductledger.flow;

import static org.ductledger.flow.Arguments.CONVERGING;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NozzleTest {
    private static final double DIVERGING = 1;
    private static final double EXIT = 2.5;
    private static final double GAMMA = 1.4;

    private static String regime(double exit, double pb) {
        return StandardCatalogue.get()
                .find("nozzle_regime")
                .orElseThrow()
                .result()
                .choices()
                .get((int) NozzleFlow.regime(exit, pb, GAMMA));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.0001, 1.5, 4, 30})
    void theRegimesFollowEachOtherAsTheBackPressureFalls(double exit) {
        double first = NozzleFlow.firstCritical(exit, GAMMA);
        double second = NozzleFlow.secondCritical(exit, GAMMA);
        double third = NozzleFlow.thirdCritical(exit, GAMMA);
        List<Double> falling = List.of(
                1.0,
                0.5 * (1 + first),
                first,
                0.5 * (first + second),
                second,
                0.5 * (second + third),
                third,
                0.5 * third);
        List<String> regimes = List.of(
                "no_flow",
                "unchoked",
                "first_critical",
                "shock_in_nozzle",
                "shock_at_exit",
                "overexpanded",
                "design",
                "underexpanded");
        IntStream.range(0, regimes.size()).forEach(i -> assertEquals(regimes.get(i), regime(exit, falling.get(i))));
    }

    @ParameterizedTest
    @CsvSource({
        "nozzle_first_critical, unchoked, first_critical, shock_in_nozzle",
        "nozzle_second_critical, shock_in_nozzle, shock_at_exit, overexpanded",
        "nozzle_third_critical, overexpanded, design, underexpanded"
    })
    void aCriticalPointHoldsWithinABillionth(String point, String above, String at, String below) {
        double critical =
                StandardCatalogue.get().find(point).orElseThrow().kernel().at(EXIT, GAMMA);
        assertEquals(above, regime(EXIT, critical * (1 + 1.1e-9)));
        assertEquals(at, regime(EXIT, critical * (1 + 0.9e-9)));
        assertEquals(at, regime(EXIT, critical * (1 - 0.9e-9)));
        assertEquals(below, regime(EXIT, critical * (1 - 1.1e-9)));
    }

    @Test
    void aConvergingNozzleIsUnchokedThenJustChokedThenUnderexpanded() {
        double sonic = Math.pow(2 / (GAMMA + 1), GAMMA / (GAMMA - 1));
        assertEquals("unchoked", regime(1, sonic + 1e-6));
        assertEquals("first_critical", regime(1, sonic));
        assertEquals("underexpanded", regime(1, sonic - 1e-6));
        assertEquals(1, NozzleFlow.exitMach(1, sonic, GAMMA), 1e-9);
        assertEquals(1, NozzleFlow.exitMach(1, 0.1, GAMMA));
        assertEquals(sonic, NozzleFlow.exitPOverP0(1, 0.1, GAMMA), 1e-15);
        assertEquals(1, NozzleFlow.massFlowFraction(1, 0.1, GAMMA));
        assertEquals(sonic * (1 + GAMMA) - 0.1, Thrust.coefficient(1, 0.1, GAMMA), 1e-15);
    }

    /** qm sqrt(R T0)/(p0 At), from the state at a station as a textbook has it. */
    private static double massFlow(double area, double side, double exit, double pb, double gamma) {
        double mach = NozzleFlow.machAt(area, side, exit, pb, gamma);
        double p = NozzleFlow.pOverP0At(area, side, exit, pb, gamma);
        return area * p * mach * Math.sqrt(gamma * (1 + 0.5 * (gamma - 1) * mach * mach));
    }

    @Test
    void everyStationPassesTheSameMass() {
        SplittableRandom random = new SplittableRandom(49);
        for (int i = 0; i < 2000; i++) {
            double gamma = 1.05 + 0.65 * random.nextDouble();
            double exit = 1 + 9 * random.nextDouble();
            double pb = Math.pow(random.nextDouble(), 2) * 0.9999;
            double choked = Math.sqrt(gamma) * Math.pow(2 / (gamma + 1), (gamma + 1) / (2 * (gamma - 1)));
            double expected = choked * NozzleFlow.massFlowFraction(exit, pb, gamma);
            double area = 1 + (exit - 1) * random.nextDouble();
            for (double side : new double[] {CONVERGING, DIVERGING}) {
                assertEquals(expected, massFlow(area, side, exit, pb, gamma), 1e-12 * expected);
                assertEquals(expected, massFlow(1, side, exit, pb, gamma), 1e-12 * expected);
                assertEquals(expected, massFlow(exit, side, exit, pb, gamma), 1e-12 * expected);
            }
        }
    }

    @Test
    void theFlowLeavesAtTheBackPressureWhileItIsSubsonicThere() {
        for (double pb = 0.999; pb > NozzleFlow.secondCritical(EXIT, GAMMA); pb -= 0.01) {
            assertEquals(pb, NozzleFlow.pOverP0At(EXIT, DIVERGING, EXIT, pb, GAMMA), 1e-12);
            assertEquals(
                    NozzleFlow.exitMach(EXIT, pb, GAMMA), NozzleFlow.machAt(EXIT, DIVERGING, EXIT, pb, GAMMA), 1e-12);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.2, 2.5, 12})
    void theExitStateIsContinuousOverTheFirstAndTheSecondCriticalPoint(double exit) {
        double first = NozzleFlow.firstCritical(exit, GAMMA);
        double above = NozzleFlow.exitMach(exit, first * (1 + 2e-9), GAMMA);
        double below = NozzleFlow.exitMach(exit, first * (1 - 2e-9), GAMMA);
        assertEquals(above, below, 1e-6);
        double second = NozzleFlow.secondCritical(exit, GAMMA);
        double inside = NozzleFlow.exitMach(exit, second * (1 + 2e-9), GAMMA);
        assertEquals(inside, NozzleFlow.exitMach(exit, second, GAMMA), 1e-8);
        double full = IsentropicBranches.machFromAreaRatioSupersonic(exit, GAMMA);
        assertEquals(NormalShock.mach2(full, GAMMA), NozzleFlow.exitMach(exit, second, GAMMA), 1e-14);
        assertEquals(NormalShock.p02OverP01(full, GAMMA), NozzleFlow.exitP0OverP0(exit, second, GAMMA), 1e-14);
        assertEquals(full, NozzleFlow.exitMach(exit, second * (1 - 2e-9), GAMMA));
    }

    @Test
    void theShockJoinsItsTwoSides() {
        for (double pb = 0.5; pb < 0.95; pb += 0.05) {
            double place = NozzleFlow.shockAreaRatio(EXIT, pb, GAMMA);
            double mach1 = NozzleFlow.shockMach1(EXIT, pb, GAMMA);
            assertEquals(mach1, NozzleFlow.machAt(place, DIVERGING, EXIT, pb, GAMMA), 1e-9);
            double behind = NozzleFlow.machAt(place * (1 + 2e-9), DIVERGING, EXIT, pb, GAMMA);
            assertEquals(NormalShock.mach2(mach1, GAMMA), behind, 1e-7);
            double ahead = NozzleFlow.pOverP0At(place, DIVERGING, EXIT, pb, GAMMA);
            double jump = NozzleFlow.pOverP0At(place * (1 + 2e-9), DIVERGING, EXIT, pb, GAMMA) / ahead;
            assertEquals(NormalShock.p2OverP1(mach1, GAMMA), jump, 1e-7);
        }
    }

    @Test
    void theShockMovesFromTheThroatToTheExitAsTheBackPressureFalls() {
        double before = 1;
        double first = NozzleFlow.firstCritical(EXIT, GAMMA);
        double second = NozzleFlow.secondCritical(EXIT, GAMMA);
        for (double step = 0.001; step < 1; step += 0.001) {
            double place = NozzleFlow.shockAreaRatio(EXIT, first + step * (second - first), GAMMA);
            assertTrue(place > before);
            before = place;
        }
        assertEquals(EXIT, before, 0.01);
        assertEquals(EXIT, NozzleFlow.shockAreaRatio(EXIT, second, GAMMA));
    }

    @Test
    void belowTheSecondCriticalPointTheWholeNozzleIsAheadOfTheShock() {
        double full = IsentropicBranches.machFromAreaRatioSupersonic(EXIT, GAMMA);
        double second = NozzleFlow.secondCritical(EXIT, GAMMA);
        for (double pb : new double[] {second, 0.3, 0.1, NozzleFlow.thirdCritical(EXIT, GAMMA), 1e-3}) {
            assertEquals(full, NozzleFlow.machAt(EXIT, DIVERGING, EXIT, pb, GAMMA));
        }
    }

    @Test
    void nothingFlowsWithoutAPressureDrop() {
        assertEquals(0, NozzleFlow.exitMach(EXIT, 1, GAMMA));
        assertEquals(0, NozzleFlow.massFlowFraction(EXIT, 1, GAMMA));
        assertEquals(0, NozzleFlow.machAt(1, CONVERGING, EXIT, 1, GAMMA));
        assertEquals(1, NozzleFlow.pOverP0At(1, CONVERGING, EXIT, 1, GAMMA));
        assertEquals(0, Thrust.coefficient(EXIT, 1, GAMMA));
    }
}
