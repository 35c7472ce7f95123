package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.junit.jupiter.api.Test;

class VesselTest {
    private static final double ADIABATIC = 0;
    private static final double ISOTHERMAL = 1;

    @Test
    void timeAndPressureInvertEachOther() {
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 50_000; i++) {
            double gamma = 1 + Math.pow(10, -6 + 6.4 * random.nextDouble());
            double pb = random.nextInt(4) == 0 ? 1 - Math.pow(10, -8 * random.nextDouble()) : random.nextDouble();
            double p = Math.min(1, pb + (1 - pb) * Math.pow(10, -6 * random.nextDouble()));
            double process = random.nextInt(2);
            double time = Vessel.timeToPressure(p, pb, 7, gamma, process);
            double back = Vessel.pOverPi(time, pb, 7, gamma, process);
            String at = "p " + p + " pb " + pb + " gamma " + gamma + " process " + process;
            double moved = 4 * Math.ulp(time) * -VesselSlopes.pByTime(time, pb, 7, gamma, process);
            assertEquals(p, back, 8 * Math.ulp(p) + moved, at);
        }
    }

    @Test
    void theVesselComesToRestAtTheBackPressureAndStaysThere() {
        for (double process : new double[] {ADIABATIC, ISOTHERMAL}) {
            double end = Vessel.timeToPressure(0.3, 0.3, 10, 1.4, process);
            assertTrue(end > 0 && end < 100);
            for (double time : new double[] {end, 1.001 * end, 1e6, 1e300}) {
                assertEquals(0.3, Vessel.pOverPi(time, 0.3, 10, 1.4, process), 1e-15);
            }
            assertEquals(0, VesselSlopes.pByTime(1.001 * end, 0.3, 10, 1.4, process), Double.MIN_VALUE);
            assertEquals(1, VesselSlopes.pByPb(1.001 * end, 0.3, 10, 1.4, process), 1e-14);
        }
    }

    @Test
    void thePressureFallsWithoutAStepWhereTheThroatUnchokes() {
        for (double process : new double[] {ADIABATIC, ISOTHERMAL}) {
            double unchoking = VesselFlow.unchokingTime(0.25, 1.4, process);
            double before = Vessel.pOverPi(Math.nextDown(unchoking), 0.25, 1, 1.4, process);
            double after = Vessel.pOverPi(unchoking, 0.25, 1, 1.4, process);
            assertEquals(before, after, 4 * Math.ulp(after));
            assertEquals(0.25 / 0.528281787717174, after, 4 * Math.ulp(after));
        }
    }

    @Test
    void intoAVacuumTheFlowStaysChoked() {
        assertEquals(Math.exp(-3), Vessel.pOverPi(3, 0, 1, 1.4, ISOTHERMAL), 1e-16);
        assertEquals(Math.pow(1.6, -7), Vessel.pOverPi(3, 0, 1, 1.4, ADIABATIC), 4e-17);
        assertEquals(Math.pow(1.6, -2), Vessel.tOverTi(3, 0, 1, 1.4, ADIABATIC), 4e-16);
        assertEquals(0, Vessel.pOverPi(1e308, 0, 1e-3, 1.4, ISOTHERMAL));
    }

    @Test
    void anAdiabaticVesselEmptiesFasterInPressureAndSlowerInMass() {
        for (double time = 0.1; time < 2; time += 0.1) {
            assertTrue(Vessel.pOverPi(time, 0.1, 1, 1.4, ADIABATIC) < Vessel.pOverPi(time, 0.1, 1, 1.4, ISOTHERMAL));
            assertTrue(
                    Vessel.massOverMi(time, 0.1, 1, 1.4, ADIABATIC) > Vessel.massOverMi(time, 0.1, 1, 1.4, ISOTHERMAL));
        }
    }

    @Test
    void fillingTwiceTakesTheSumOfBothTimes() {
        SplittableRandom random = new SplittableRandom(12);
        for (int i = 0; i < 10_000; i++) {
            double first = random.nextDouble();
            double last = first + (1 - first) * random.nextDouble();
            double between = first + (last - first) * random.nextDouble();
            double whole = Vessel.fillTime(last, first, 3, 1.3, ISOTHERMAL);
            double parts = Vessel.fillTime(last, between, 3, 1.3, ISOTHERMAL)
                    + Vessel.fillTime(between, first, 3, 1.3, ISOTHERMAL);
            assertEquals(whole, parts, 1e-14);
            assertEquals(whole / 1.3, Vessel.fillTime(last, first, 3, 1.3, ADIABATIC), 1e-14);
        }
    }

    @Test
    void aPressureBelowTheBackPressureIsRefusedInWords() throws LedgerRefusedException {
        Call call = Call.of(
                "t",
                "vessel_time_to_pressure",
                Map.of(
                        "p_over_pi", Given.number(0.2),
                        "pb_over_pi", Given.number(0.3),
                        "time_constant", Given.number(10),
                        "gamma", Given.number(1.4),
                        "process", Given.text("adiabatic")));
        Fault fault = new Evaluator(StandardCatalogue.get())
                .evaluate(Ledger.of(call))
                .get(0)
                .faults()
                .get(0);
        assertEquals(FaultKind.NO_SOLUTION, fault.kind());
        assertTrue(fault.detail().startsWith("p_over_pi must be at least 0.3 (the back pressure"), fault.detail());
    }
}
