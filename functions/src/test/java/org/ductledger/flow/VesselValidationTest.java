package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.ductledger.catalogue.Unit;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Against the blowdown rows of the worked examples (R. T. Balmer, Modern Engineering Thermodynamics, example 16.8; the
 * closed relations of tank discharge), against the balances of mass and energy marched in time (Hipparchus), and
 * against the integral of the textbook form in 40 digits.
 */
class VesselValidationTest {
    private static final double ADIABATIC = 0;
    private static final double ISOTHERMAL = 1;
    private static final PublishedTable TABLE = PublishedTable.read("worked_examples.csv");

    private static Answer answer(Row row) {
        return switch (row.quantity()) {
            case "blowdown time constant, constant-temperature tank [s]" -> Answer.of(balmerTimeConstant(row));
            case "blowdown unchoke time, constant-temperature tank [s]" -> Answer.of(balmerUnchokingTime(row));
            case "choked blowdown time, constant temperature [s]" -> Answer.of(dischargeTime(row, ISOTHERMAL));
            case "choked blowdown time, adiabatic [s]" -> Answer.of(dischargeTime(row, ADIABATIC));
            default -> Answer.none("of another family");
        };
    }

    private static double balmerTimeConstant(Row row) {
        double diameter = Unit.named("in").toCoherent(row.number("D"));
        return Vessel.timeConstant(
                Unit.named("ft3").toCoherent(row.number("V")),
                Math.PI * diameter * diameter / 4,
                Unit.named("degF").toCoherent(row.number("T")),
                row.number("k"),
                Unit.named("ft.lbf/(lbm.R)").toCoherent(row.number("R")));
    }

    private static double balmerUnchokingTime(Row row) {
        double gamma = row.number("k");
        double back = row.number("p_atm") / row.number("p_start");
        double unchoking = back / Math.pow(2 / (gamma + 1), gamma / (gamma - 1));
        return Vessel.timeToPressure(unchoking, back, balmerTimeConstant(row), gamma, ISOTHERMAL);
    }

    private static double dischargeTime(Row row, double process) {
        double gamma = row.number("gamma");
        double timeConstant =
                Vessel.timeConstant(row.number("V"), row.number("A_eff"), row.number("T0"), gamma, row.number("R"));
        return Vessel.timeToPressure(row.number("p2") / row.number("p1"), 0, timeConstant, gamma, process);
    }

    @Test
    void everyBlowdownOfTheWorkedExamplesIsMet() {
        int rows = (int) TABLE.rows().count();
        assertEquals(Map.of("checked", 5, "of another family", rows - 5), TABLE.check(VesselValidationTest::answer));
    }

    /** Without Balmer's rows, which take 32.174 lbm ft/(lbf s2), a digit shorter than the exact factor of the units. */
    @Test
    void theClosedRelationsHoldToTheLastDigits() {
        TABLE.rows()
                .filter(row -> row.quantity().startsWith("choked blowdown time"))
                .forEach(row -> {
                    Dfp exact = FortyDigits.decimal(row.exact());
                    assertTrue(FortyDigits.ulps(answer(row).value(), exact) <= 8, row::toString);
                });
    }

    // A vessel of 0.3 m3 at 800 kPa and 310 K behind an effective area of 40 mm2; R = 290 J/(kg K).
    private static final double VOLUME = 0.3;
    private static final double AREA = 4e-5;
    private static final double P = 8e5;
    private static final double T = 310;
    private static final double R = 290;

    /** The textbook's mass flow from a stagnation state to a back pressure. */
    private static double massFlow(double p0, double t0, double back, double gamma) {
        double critical = Math.pow(2 / (gamma + 1), gamma / (gamma - 1));
        double r = Math.max(critical, Math.min(1, back / p0));
        double fraction = Math.pow(r, 1 / gamma) * Math.sqrt(1 - Math.pow(r, (gamma - 1) / gamma));
        return AREA * p0 / Math.sqrt(R * t0) * Math.sqrt(2 * gamma / (gamma - 1)) * fraction;
    }

    /** Balances of mass and of internal energy; what flows out carries the enthalpy of the vessel's gas. */
    private record Outflow(double back, double gamma, double process) implements OrdinaryDifferentialEquation {
        @Override
        public int getDimension() {
            return 2;
        }

        @Override
        public double[] computeDerivatives(double time, double[] massAndEnergy) {
            double cv = R / (gamma - 1);
            double t = massAndEnergy[1] / (massAndEnergy[0] * cv);
            double flow = massFlow(massAndEnergy[0] * R * t / VOLUME, t, back, gamma);
            return new double[] {-flow, process == ADIABATIC ? -flow * (cv + R) * t : -flow * cv * t};
        }
    }

    /** The same for a supply at the pressure P and the temperature T. */
    private record Inflow(double gamma, double process) implements OrdinaryDifferentialEquation {
        @Override
        public int getDimension() {
            return 2;
        }

        @Override
        public double[] computeDerivatives(double time, double[] massAndEnergy) {
            double cv = R / (gamma - 1);
            double flow = massFlow(P, T, massAndEnergy[1] * (gamma - 1) / VOLUME, gamma);
            return new double[] {flow, process == ADIABATIC ? flow * (cv + R) * T : flow * cv * T};
        }
    }

    private static double[] march(OrdinaryDifferentialEquation balances, double pressure, double time, double gamma) {
        double[] start = {pressure * VOLUME / (R * T), pressure * VOLUME / (gamma - 1)};
        return new DormandPrince853Integrator(1e-12, time, 1e-12, 1e-12)
                .integrate(balances, new ODEState(0, start), time)
                .getPrimaryState();
    }

    @ParameterizedTest
    @CsvSource({
        "0, 1.4, 3",
        "0.1, 1.4, 1.5",
        "0.1, 1.4, 2.2",
        "0.4, 1.4, 0.7",
        "0.7, 1.4, 0.3",
        "0.2, 1.15, 1.5",
        "0.2, 1.6666666666666667, 1.2",
        "0.6, 1.3, 0.5",
        "0.95, 1.4, 0.08",
        "0.3, 2.5, 0.6"
    })
    void theBlowdownIsThatOfTheBalances(double back, double gamma, double timeConstants) {
        double timeConstant = Vessel.timeConstant(VOLUME, AREA, T, gamma, R);
        double time = timeConstants * timeConstant;
        for (double process : new double[] {ADIABATIC, ISOTHERMAL}) {
            double[] state = march(new Outflow(back * P, gamma, process), P, time, gamma);
            double mass = state[0] / (P * VOLUME / (R * T));
            double pressure = state[1] / (P * VOLUME / (gamma - 1));
            assertEquals(pressure, Vessel.pOverPi(time, back, timeConstant, gamma, process), 1e-9 * pressure);
            assertEquals(mass, Vessel.massOverMi(time, back, timeConstant, gamma, process), 1e-9 * mass);
            assertEquals(pressure / mass, Vessel.tOverTi(time, back, timeConstant, gamma, process), 1e-9);
            assertEquals(time, Vessel.timeToPressure(pressure, back, timeConstant, gamma, process), 1e-7 * time);
        }
    }

    @ParameterizedTest
    @CsvSource({"0, 1.4, 0.3", "0.01, 1.4, 0.6", "0.2, 1.15, 0.5", "0.6, 1.6666666666666667, 0.15", "0.1, 1.3, 0.4"})
    void theFillingIsThatOfTheBalances(double first, double gamma, double timeConstants) {
        double timeConstant = Vessel.timeConstant(VOLUME, AREA, T, gamma, R);
        double time = timeConstants * timeConstant;
        for (double process : new double[] {ADIABATIC, ISOTHERMAL}) {
            double[] state = march(new Inflow(gamma, process), first * P, time, gamma);
            double pressure = state[1] / (P * VOLUME / (gamma - 1));
            assertEquals(time, Vessel.fillTime(pressure, first, timeConstant, gamma, process), 1e-8 * time);
        }
    }

    /** The unchoked time as the textbook has it: the integral over the pressure, here with p = pb + (1 - pb) u^2. */
    @ParameterizedTest
    @CsvSource({
        "0.6, 0.6, 1.4",
        "0.6, 0.7, 1.4",
        "0.6, 0.99, 1.4",
        "0.9, 0.9, 1.0001",
        "0.9, 0.95, 1.6666666666666667",
        "0.999, 0.9995, 1.3",
        "0.7, 0.7, 3",
        "0.8, 0.8, 20",
        "0.75, 0.9, 100"
    })
    void theUnchokedTimeHoldsInFortyDigits(double back, double p, double gamma) {
        for (double process : new double[] {ADIABATIC, ISOTHERMAL}) {
            Dfp exact = unchokedTime(back, p, gamma, process);
            double got = Vessel.timeToPressure(p, back, 1, gamma, process);
            double condition = 1 + p * -VesselSlopes.timeByP(p, back, 1, gamma, process) / got;
            assertTrue(p == back || FortyDigits.ulps(got, exact) <= 8 * condition, () -> got + " for " + exact);
            assertEquals(exact.toDouble(), got, 4e-15 * got * (p == back ? 1 : condition));
        }
    }

    private static Dfp unchokedTime(double back, double p, double gamma, double process) {
        Dfp g = FortyDigits.of(gamma);
        Dfp pb = FortyDigits.of(back);
        Dfp room = g.getOne().subtract(pb);
        Dfp e = g.subtract(1).divide(g);
        Dfp power = g.add(1).divide(g.subtract(1).multiply(2));
        Dfp choked = g.sqrt().multiply(FortyDigits.pow(g.add(1).divide(2), power.negate()));
        Dfp scale = g.multiply(2).divide(g.subtract(1)).sqrt();
        Dfp from = FortyDigits.of(p).subtract(pb).divide(room).sqrt();
        return FortyDigits.integral(
                u -> {
                    Dfp x = pb.add(room.multiply(u).multiply(u));
                    Dfp r = pb.divide(x);
                    Dfp drop = g.getOne().subtract(FortyDigits.pow(r, e)).sqrt();
                    Dfp flow =
                            scale.multiply(FortyDigits.pow(r, g.reciprocal())).multiply(drop);
                    Dfp rate = flow.multiply(x);
                    if (process == ADIABATIC) {
                        rate = rate.multiply(g).multiply(FortyDigits.pow(x, e.divide(2)));
                    }
                    return choked.multiply(room).multiply(2).multiply(u).divide(rate);
                },
                from,
                g.getOne());
    }
}
