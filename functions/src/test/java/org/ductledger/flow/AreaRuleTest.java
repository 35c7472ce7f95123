package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.ductledger.catalogue.FunctionEntry;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AreaRuleTest {
    private static double of(String name, double... row) {
        FunctionEntry entry = StandardCatalogue.get().find(name).orElseThrow();
        return entry.kernel().at(row);
    }

    private static String role(double mach, double areaChange) {
        FunctionEntry entry = StandardCatalogue.get().find("passage_role").orElseThrow();
        return entry.result().choices().get((int) entry.kernel().at(mach, areaChange));
    }

    /** Common practice: the signs that every text on nozzles tabulates; +1 grows, -1 falls along the flow. */
    @ParameterizedTest
    @CsvSource({
        // M,  dA, dV, dp, drho, dT, dM, role
        "0.5, -1,  1, -1, -1, -1,  1, nozzle",
        "0.5,  1, -1,  1,  1,  1, -1, diffuser",
        "2.0, -1, -1,  1,  1,  1, -1, diffuser",
        "2.0,  1,  1, -1, -1, -1,  1, nozzle"
    })
    void signsAreThoseOfCommonPractice(
            double mach, double da, double dv, double dp, double drho, double dt, double dmach, String role) {
        assertEquals(dv, Math.signum(da * of("dv_over_da", mach)));
        assertEquals(dp, Math.signum(da * of("dp_over_da", mach, 1.4)));
        assertEquals(drho, Math.signum(da * of("drho_over_da", mach)));
        assertEquals(dt, Math.signum(da * of("dt_over_da", mach, 1.4)));
        assertEquals(dmach, Math.signum(da * of("dmach_over_da", mach, 1.4)));
        assertEquals(role, role(mach, 0.01 * da));
    }

    /** Both states from the isentropic relations at areas 1e-5 to either side; the slopes are of logarithms. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.3, 0.7, 0.95, 1.05, 1.4, 2, 5, 20})
    void slopesAreThoseOfTheIsentropicRelations(double mach) {
        for (double gamma : new double[] {1.1, 1.4, 5.0 / 3}) {
            double area = Isentropic.areaRatio(mach, gamma);
            double before = at(mach, area * (1 - 1e-5), gamma);
            double after = at(mach, area * (1 + 1e-5), gamma);
            double tolerance = 3e-4 / Math.abs(mach - 1) * 1e-2;
            assertEquals(
                    slope(Isentropic.vOverAstar(before, gamma), Isentropic.vOverAstar(after, gamma)),
                    of("dv_over_da", mach),
                    tolerance * (1 + Math.abs(of("dv_over_da", mach))));
            assertEquals(
                    slope(Isentropic.pOverP0(before, gamma), Isentropic.pOverP0(after, gamma)),
                    of("dp_over_da", mach, gamma),
                    tolerance * (1 + Math.abs(of("dp_over_da", mach, gamma))));
            assertEquals(
                    slope(Isentropic.rhoOverRho0(before, gamma), Isentropic.rhoOverRho0(after, gamma)),
                    of("drho_over_da", mach),
                    tolerance * (1 + Math.abs(of("drho_over_da", mach))));
            assertEquals(
                    slope(Isentropic.tOverT0(before, gamma), Isentropic.tOverT0(after, gamma)),
                    of("dt_over_da", mach, gamma),
                    tolerance * (1 + Math.abs(of("dt_over_da", mach, gamma))));
            assertEquals(
                    slope(before, after),
                    of("dmach_over_da", mach, gamma),
                    tolerance * (1 + Math.abs(of("dmach_over_da", mach, gamma))));
        }
    }

    private static double at(double mach, double area, double gamma) {
        return mach < 1
                ? IsentropicBranches.machFromAreaRatioSubsonic(area, gamma)
                : IsentropicBranches.machFromAreaRatioSupersonic(area, gamma);
    }

    private static double slope(double before, double after) {
        return Math.log(after / before) / Math.log((1 + 1e-5) / (1 - 1e-5));
    }

    @Test
    void incompressibleFlowKeepsSpeedTimesArea() {
        assertEquals(-1, of("dv_over_da", 0));
        assertEquals(-1, of("dmach_over_da", 0, 1.4));
        assertEquals(0, of("dp_over_da", 0, 1.4));
        assertEquals(0, of("drho_over_da", 0));
    }

    @Test
    void hypersonicFlowKeepsItsSpeed() {
        assertEquals(0, of("dv_over_da", 1e200));
        assertEquals(-1, of("drho_over_da", 1e200));
        assertEquals(-0.4, of("dt_over_da", 1e200, 1.4), 1e-15);
        assertEquals(0.2, of("dmach_over_da", 1e200, 1.4), 1e-15);
    }

    @Test
    void slopesHaveNoBoundAtTheThroat() {
        FunctionEntry entry = StandardCatalogue.get().find("dp_over_da").orElseThrow();
        assertTrue(Double.isInfinite(entry.kernel().at(1, 1.4)));
        assertEquals(1, entry.conditions().size());
        assertTrue(entry.conditions().get(0).holds().test(new double[] {Math.nextUp(1.0), 1.4}));
        assertTrue(!entry.conditions().get(0).holds().test(new double[] {1, 1.4}));
    }

    @Test
    void atTheThroatAndInAStraightPipeThereIsNoRoleToPlay() {
        assertEquals("sonic", role(1, 0.1));
        assertEquals("constant_area", role(1, 0));
        assertEquals("constant_area", role(0.3, 0));
        assertEquals("diffuser", role(0, 1));
    }
}
