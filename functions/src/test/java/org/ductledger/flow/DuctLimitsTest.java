package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What duct flows do at their ends: at rest, at choking, at infinite Mach number, and where there is no flow. */
class DuctLimitsTest {
    private static final double[] GAMMAS = {Math.nextUp(1.0), 1 + 1e-9, 1.05, 1.4, 5 / 3.0, 2, 100};

    private static double call(String name, double... arguments) {
        return entry(name).kernel().at(arguments);
    }

    private static FunctionEntry entry(String name) {
        return StandardCatalogue.get().find(name).orElseThrow();
    }

    private static Fault fault(String name, Object... arguments) throws LedgerRefusedException {
        Map<String, Given> with = new HashMap<>();
        List<Argument> names = entry(name).arguments();
        for (int i = 0; i < arguments.length; i++) {
            with.put(
                    names.get(i).name(),
                    arguments[i] instanceof Double x ? Given.number(x) : Given.text((String) arguments[i]));
        }
        Outcome outcome = new Evaluator(StandardCatalogue.get())
                .evaluate(Ledger.of(Call.of("x", name, with)))
                .get(0);
        return outcome.faults().get(0);
    }

    @Test
    void atTheStarEveryRatioIsOneAndEveryLengthZero() {
        for (double gamma : GAMMAS) {
            double choking = 1 / Math.sqrt(gamma);
            for (FunctionEntry entry : StandardCatalogue.get().entries()) {
                boolean isothermal = entry.name().startsWith("isothermal");
                boolean duct = isothermal || entry.name().matches("(fanno|rayleigh)_.*");
                if (duct && !entry.name().endsWith("mach2")) {
                    double value = entry.kernel().at(isothermal ? choking : 1, gamma);
                    boolean length = entry.name().endsWith("fl_over_d");
                    assertEquals(length ? 0 : 1, value, length ? 1e-31 : 1e-15, () -> entry + " at " + gamma);
                }
            }
        }
    }

    @Test
    void aFlowThatNeedsNoLengthToChokeIsChoked() {
        for (double gamma : GAMMAS) {
            for (double branch = 0; branch < 2; branch++) {
                assertEquals(1, call("mach_from_fanno_fl_over_d", 0, gamma, branch));
                assertEquals(
                        1 / Math.sqrt(gamma), call("mach_from_isothermal_fl_over_d", 0, gamma, branch), Math.ulp(1.0));
                assertEquals(1, call("mach_from_fanno_p0_over_p0star", 1, gamma, branch));
                assertEquals(1, call("mach_from_rayleigh_p0_over_p0star", 1, gamma, branch), 2 * Math.ulp(1.0));
                assertEquals(1, call("mach_from_rayleigh_t0_over_t0star", 1, gamma, branch));
            }
        }
    }

    @Test
    void aDuctOfExactlyTheChokingLengthEndsAtTheStar() {
        for (double mach1 : new double[] {1e-6, 0.05, 0.3, 0.99, 1, 1.01, 3, 50}) {
            for (double gamma : GAMMAS) {
                assertEquals(1, call("fanno_mach2", mach1, call("fanno_fl_over_d", mach1, gamma), gamma));
                double isothermal = call("isothermal_mach2", mach1, call("isothermal_fl_over_d", mach1, gamma), gamma);
                assertEquals(1, isothermal * Math.sqrt(gamma), 4e-16);
                double heated = call("rayleigh_mach2", mach1, call("rayleigh_t02_over_t01_max", mach1, gamma), gamma);
                assertEquals(1, heated, 3e-8 * (1 + gamma));
            }
        }
    }

    @Test
    void withoutDuctOrHeatTheMachNumberStays() {
        for (double mach1 : new double[] {1e-300, 1e-6, 0.3, 1, 1.5, 1e3, 1e300}) {
            for (double gamma : GAMMAS) {
                assertEquals(mach1, call("fanno_mach2", mach1, 0, gamma));
                assertEquals(mach1, call("isothermal_mach2", mach1, 0, gamma));
                assertEquals(mach1, call("rayleigh_mach2", mach1, 1, gamma));
            }
        }
    }

    @Test
    void twoDuctsInLineAreOneDuct() {
        DuctPoints points = new DuctPoints(4);
        for (int i = 0; i < 2000; i++) {
            double gamma = 1.05 + 0.6 * points.random().nextDouble();
            double mach1 = 0.02 + 5 * points.random().nextDouble();
            for (String flow : List.of("fanno", "isothermal")) {
                double length = call(flow + "_fl_over_d", mach1, gamma)
                        * points.random().nextDouble()
                        * 0.9;
                double share = points.random().nextDouble();
                double between = call(flow + "_mach2", mach1, share * length, gamma);
                double behind = call(flow + "_mach2", between, (1 - share) * length, gamma);
                assertEquals(1, behind / call(flow + "_mach2", mach1, length, gamma), 1e-12);
                assertEquals(1, call(flow + "_mach2", between, -share * length, gamma) / mach1, 1e-11);
            }
        }
    }

    /** Shapiro's limits for infinite Mach number. */
    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.4, 5 / 3.0})
    void hypersonicFlowsComeToTheirLimits(double gamma) {
        double length = (gamma + 1) / (2 * gamma) * StrictMath.log((gamma + 1) / (gamma - 1)) - 1 / gamma;
        assertEquals(length, call("fanno_fl_over_d", 1e9, gamma), 1e-15);
        assertEquals(length, call("fanno_fl_over_d", 1e300, gamma), 1e-15);
        assertEquals(Math.sqrt((gamma + 1) / (gamma - 1)), call("fanno_v_over_vstar", 1e300, gamma), 1e-14);
        assertEquals(1 - 1 / (gamma * gamma), call("rayleigh_t0_over_t0star", 1e300, gamma), 1e-15);
        assertEquals((gamma + 1) / gamma, call("rayleigh_v_over_vstar", 1e300, gamma), 1e-15);
        assertEquals(2 * StrictMath.log(1e300) + StrictMath.log(gamma) - 1, call("isothermal_fl_over_d", 1e300, gamma));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.4, 5 / 3.0})
    void slowFlowsComeToTheirValuesAtRest(double gamma) {
        assertEquals((gamma + 1) / 2, call("fanno_t_over_tstar", 0, gamma), 1e-15);
        assertEquals(1 + gamma, call("rayleigh_p_over_pstar", 0, gamma));
        assertEquals(2 * gamma / (3 * gamma - 1), call("isothermal_t0_over_t0star", 0, gamma), 1e-15);
        assertEquals(0, call("rayleigh_t0_over_t0star", 0, gamma));
        double atRest = (1 + gamma) * StrictMath.pow(2 / (gamma + 1), gamma / (gamma - 1));
        assertEquals(atRest, call("rayleigh_p0_over_p0star", 0, gamma), 4e-15);
        for (double mach = 1e-3; mach > 1e-150; mach *= 1e-7) {
            double long1 = 1 / gamma / mach / mach;
            assertEquals(1, call("fanno_fl_over_d", mach, gamma) / long1, 1e-4);
            assertEquals(1, call("mach_from_fanno_fl_over_d", long1, gamma, 0) / mach, 1e-4);
            assertEquals(1, call("mach_from_isothermal_fl_over_d", long1, gamma, 0) / mach, 1e-4);
        }
    }

    /** As gamma goes to 1 the Fanno flow becomes the isothermal one. */
    @Test
    void atGammaOneFannoFlowIsIsothermal() {
        double gamma = Math.nextUp(1.0);
        for (double mach = 0.01; mach < 20; mach *= 1.3) {
            assertEquals(1, call("fanno_fl_over_d", mach, gamma) / call("isothermal_fl_over_d", mach, gamma), 1e-13);
            assertEquals(
                    1, call("fanno_p_over_pstar", mach, gamma) / call("isothermal_p_over_pstar", mach, gamma), 1e-13);
        }
    }

    @Test
    void aTooLongDuctIsToldHowLongItMayBe() throws LedgerRefusedException {
        Fault tooLong = fault("fanno_mach2", 0.3, 6.0, 1.4);
        assertEquals(FaultKind.NO_SOLUTION, tooLong.kind());
        assertEquals("fl_over_d", tooLong.argument());
        assertTrue(tooLong.detail().contains("must be at most 5.299253"), tooLong.detail());
        assertTrue(tooLong.detail().contains("chokes") && tooLong.detail().endsWith("got 6"), tooLong.detail());

        Fault isothermal = fault("isothermal_mach2", 0.3, 5.0, 1.4);
        assertTrue(isothermal.detail().contains("must be at most 4.865"), isothermal.detail());

        Fault supersonic = fault("mach_from_fanno_fl_over_d", 0.83, 1.4, "supersonic");
        assertEquals(FaultKind.NO_SOLUTION, supersonic.kind());
        assertTrue(supersonic.detail().contains("must be less than 0.821508116"), supersonic.detail());

        Fault upstream = fault("fanno_mach2", 3.0, -0.4, 1.4);
        assertTrue(upstream.detail().contains("must be greater than -0.2993487"), upstream.detail());
    }

    @Test
    void tooMuchHeatIsToldWhatChokes() throws LedgerRefusedException {
        Fault hot = fault("rayleigh_mach2", 0.3, 3.0, 1.4);
        assertEquals(FaultKind.NO_SOLUTION, hot.kind());
        assertTrue(hot.detail().contains("must be at most 2.88300"), hot.detail());

        Fault cold = fault("rayleigh_mach2", 3.0, 0.7, 1.4);
        assertTrue(cold.detail().contains("must be greater than 0.748947"), cold.detail());

        Fault below = fault("mach_from_rayleigh_t0_over_t0star", 0.48, 1.4, "supersonic");
        assertTrue(below.detail().contains("must be greater than 0.4897959"), below.detail());

        Fault high = fault("mach_from_rayleigh_t_over_tstar", 1.03, 1.4, "below");
        assertTrue(high.detail().contains("must be at most 1.0285714"), high.detail());

        Fault atRest = fault("mach_from_rayleigh_p0_over_p0star", 1.3, 1.4, "subsonic");
        assertTrue(atRest.detail().contains("must be at most 1.267876"), atRest.detail());
    }

    @Test
    void lookedBackFromChokingThereAreTwoFlows() throws LedgerRefusedException {
        Fault fanno = fault("fanno_mach2", 1.0, -0.1, 1.4);
        assertEquals(FaultKind.OUTSIDE_DOMAIN, fanno.kind());
        assertEquals("mach1", fanno.argument());
        assertTrue(fanno.detail().contains("takes the branch"), fanno.detail());
        assertEquals("mach1", fault("isothermal_mach2", 0.5, -0.1, 4.0).argument());
        assertEquals("mach1", fault("rayleigh_mach2", 1.0, 0.9, 1.4).argument());
    }
}
