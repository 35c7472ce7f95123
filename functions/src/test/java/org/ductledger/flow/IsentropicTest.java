package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What the isentropic functions do at the ends of their ranges. */
class IsentropicTest {
    private static double of(String name, double... row) {
        return StandardCatalogue.get()
                .find(name)
                .map(FunctionEntry::kernel)
                .orElseThrow()
                .at(row);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1 + 0x1p-52, 1.0001, 1.1, 1.4, 5.0 / 3, 100})
    void restIsTheStagnationState(double gamma) {
        for (String ratio : List.of("t_over_t0", "p_over_p0", "rho_over_rho0", "a_over_a0")) {
            assertEquals(1, of(ratio, 0, gamma), ratio);
            assertEquals(0, of("mach_from_" + ratio, 1, gamma), ratio);
        }
        for (String number : List.of(
                "v_over_astar",
                "v_over_vmax",
                "q_over_p0",
                "q_over_p",
                "impact_pressure_over_p",
                "mass_flow_number",
                "mass_flow_number_static")) {
            assertEquals(0, of(number, 0, gamma), number);
        }
        for (String number : List.of("v_over_astar", "v_over_vmax", "q_over_p", "impact_pressure_over_p")) {
            assertEquals(0, of("mach_from_" + number, 0, gamma), number);
        }
        assertEquals(0, of("mach_from_mass_flow_number", 0, gamma, 0));
        assertEquals(0, of("mach_from_q_over_p0", 0, gamma, 0));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1 + 0x1p-52, 1.0001, 1.05, 1.1, 1.2, 1.3, 1.4, 5.0 / 3, 2, 7, 100})
    void theThroatIsTheSonicStateExactly(double gamma) {
        for (String ratio : List.of(
                "t_over_tstar",
                "p_over_pstar",
                "rho_over_rhostar",
                "v_over_astar",
                "area_ratio",
                "impulse_over_impulsestar")) {
            assertEquals(1, of(ratio, 1, gamma), ratio);
        }
        assertEquals(of("choked_mass_flow_number", gamma), of("mass_flow_number", 1, gamma));
        for (double branch = 0; branch <= 1; branch++) {
            assertEquals(1, of("mach_from_area_ratio", 1, gamma, branch));
            assertEquals(1, of("mach_from_impulse_over_impulsestar", 1, gamma, branch));
            assertEquals(1, of("mach_from_mass_flow_number", of("choked_mass_flow_number", gamma), gamma, branch));
        }
    }

    @Test
    void dynamicPressureIsGreatestAtRootTwo() {
        for (double gamma : new double[] {1.01, 1.4, 5.0 / 3, 10}) {
            double most = of("q_over_p0", Math.sqrt(2), gamma);
            assertTrue(most >= of("q_over_p0", 1.41, gamma) && most >= of("q_over_p0", 1.42, gamma));
            assertEquals(Math.sqrt(2), of("mach_from_q_over_p0", most, gamma, 0), 3e-8);
            assertEquals(Math.sqrt(2), of("mach_from_q_over_p0", most, gamma, 1), 3e-8);
        }
    }

    @Test
    void machAngleFallsFromARightAngleToNothing() {
        assertEquals(90, of("mach_angle", 1));
        assertEquals(30, of("mach_angle", 2), 1e-14);
        assertEquals(Math.toDegrees(1 / Double.MAX_VALUE), of("mach_angle", Double.MAX_VALUE), 1e-321);
        assertEquals(1, of("mach_from_mach_angle", 90));
        assertEquals(2, of("mach_from_mach_angle", 30), 1e-15);
        assertTrue(of("mach_angle", Math.nextUp(1.0)) < 90);
    }

    @Test
    void hypersonicLimitsAreKept() {
        double most = Math.sqrt(2.4 / 0.4);
        assertEquals(most, of("v_over_astar", 1e300, 1.4), 1e-15 * most);
        assertEquals(1, of("v_over_vmax", 1e300, 1.4));
        assertEquals(1.4 / Math.sqrt(0.96), of("impulse_over_impulsestar", 1e300, 1.4), 1e-15);
        assertEquals(0, of("p_over_p0", 1e300, 1.4));
        assertEquals(Double.POSITIVE_INFINITY, of("area_ratio", 1e300, 1.4));
        assertEquals(1 / (0.2 * 1e155) / 1e155, of("t_over_t0", 1e155, 1.4), 1e-322);
    }

    @Test
    void neighboursOfTheThroatAreToldApart() {
        double subsonic = of("mach_from_area_ratio", Math.nextUp(1.0), 1.4, 0);
        double supersonic = of("mach_from_area_ratio", Math.nextUp(1.0), 1.4, 1);
        assertEquals(1 - Math.sqrt(1.2 * 0x1p-52), subsonic, 1e-15);
        assertEquals(1 + Math.sqrt(1.2 * 0x1p-52), supersonic, 1e-15);
    }

    @Test
    void inversesReachTheEndsOfTheRange() {
        assertEquals(0.57870370370370370 / 1e300, of("mach_from_area_ratio", 1e300, 1.4, 0), 1e-314);
        assertEquals(1, of("area_ratio", of("mach_from_area_ratio", 1e300, 1.4, 1), 1.4) / 1e300, 1e-11);
        assertEquals(1e-200 / Math.sqrt(1.4), of("mach_from_mass_flow_number", 1e-200, 1.4, 0), 1e-215);
        assertEquals(Double.POSITIVE_INFINITY, of("mach_from_area_ratio", 1e10, 100, 1));
        assertEquals(1e160, of("mach_from_t_over_t0", of("t_over_t0", 1e160, 1.0000001), 1.0000001), 1e155);
    }

    private static Fault fault(String function, Given value, String argument, String branch)
            throws LedgerRefusedException {
        Call call = Call.of(
                "x", function, Map.of(argument, value, "gamma", Given.number(1.4), "branch", Given.text(branch)));
        return new Evaluator(StandardCatalogue.get())
                .evaluate(Ledger.of(call))
                .get(0)
                .faults()
                .get(0);
    }

    @Test
    void refusalsSayWhatIsRequiredAtThisGamma() throws LedgerRefusedException {
        assertEquals(
                "mass_flow_number must be at most 0.684731456377 (that of choked flow), got 0.7",
                fault("mach_from_mass_flow_number", Given.number(0.7), "mass_flow_number", "subsonic")
                        .detail());
        assertEquals(
                "q_over_p0 must be at most 0.431201150372 (its value at M = sqrt(2)), got 0.5",
                fault("mach_from_q_over_p0", Given.number(0.5), "q_over_p0", "above")
                        .detail());
        assertEquals(
                "impulse_over_impulsestar must be less than 1.42886901662 (that of expansion into vacuum) on the"
                        + " supersonic branch, got 1.5",
                fault("mach_from_impulse_over_impulsestar", Given.number(1.5), "impulse_over_impulsestar", "supersonic")
                        .detail());
        assertEquals(
                "area_ratio must be at least 1, got 0.99",
                fault("mach_from_area_ratio", Given.number(0.99), "area_ratio", "subsonic")
                        .detail());
    }
}
