package org.ductledger.flow;

import static org.ductledger.flow.Arguments.T;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** Named gases as ideal gases of fixed composition: molar mass, gas constant, heat capacity and viscosity. */
final class Gases {
    private static final Chapter FAMILY = new Chapter("gas", "Named gases: constants, heat capacity, viscosity");

    /** The universal gas constant of NASA/TP-2002-211556, J/(mol K). */
    static final double UNIVERSAL = 8.314510;

    private static final int AIR = 0;
    private static final double PASCAL_SECONDS_IN_MICROPOISE = 1e-7;

    private Gases() {}

    static double molarMass(double gas) {
        return GasTable.MOLAR_MASS[(int) gas];
    }

    static double gasConstant(double gas) {
        return UNIVERSAL / molarMass(gas);
    }

    /** cp/R; NaN outside the range of the polynomial. */
    static double cpOverR(double gas, double t) {
        double[] a = GasTable.row(GasTable.HEAT[(int) gas], t);
        double inverse = 1 / t;
        return inverse * (a[3] + inverse * a[2]) + (a[4] + t * (a[5] + t * (a[6] + t * (a[7] + t * a[8]))));
    }

    private static double cpOverRByT(double gas, double t) {
        double[] a = GasTable.row(GasTable.HEAT[(int) gas], t);
        double inverse = 1 / t;
        return -inverse * inverse * (a[3] + 2 * inverse * a[2])
                + (a[5] + t * (2 * a[6] + t * (3 * a[7] + t * 4 * a[8])));
    }

    static double cp(double gas, double t) {
        return gasConstant(gas) * cpOverR(gas, t);
    }

    static double cpByT(double gas, double t) {
        return gasConstant(gas) * cpOverRByT(gas, t);
    }

    static double gamma(double gas, double t) {
        double cp = cpOverR(gas, t);
        return cp / (cp - 1);
    }

    static double gammaByT(double gas, double t) {
        double cv = cpOverR(gas, t) - 1;
        return -cpOverRByT(gas, t) / (cv * cv);
    }

    static double viscosity(double gas, double t) {
        double[] a = GasTable.row(GasTable.VISCOSITY[(int) gas], t);
        if ((int) gas == AIR) {
            return a[2] * t * Math.sqrt(t) / (t + a[3]);
        }
        double log = a[2] * StrictMath.log(t) + (a[3] + a[4] / t) / t + a[5];
        return PASCAL_SECONDS_IN_MICROPOISE * StrictMath.exp(log);
    }

    static double viscosityByT(double gas, double t) {
        double[] a = GasTable.row(GasTable.VISCOSITY[(int) gas], t);
        double slope = (int) gas == AIR ? 1.5 / t - 1 / (t + a[3]) : (a[2] - (a[3] + 2 * a[4] / t) / t) / t;
        return slope * viscosity(gas, t);
    }

    private static double lowest(double[][][] table, double gas) {
        return table[(int) gas][0][0];
    }

    private static double highest(double[][][] table, double gas) {
        double[][] ranges = table[(int) gas];
        return ranges[ranges.length - 1][1];
    }

    private static final Argument GAS =
            Argument.choice("gas", "which gas; air is dry air of fixed composition, steam is H2O", GasTable.NAMES);
    private static final Source NASA_POLYNOMIALS = new Source(
            "B. J. McBride, M. J. Zehe and S. Gordon",
            "NASA/TP-2002-211556: NASA Glenn Coefficients for Calculating Thermodynamic Properties of Individual"
                    + " Species",
            2002,
            "");
    private static final Source NASA_TRANSPORT = new Source(
            "R. A. Svehla",
            "NASA TM-4647: Transport Coefficients for the NASA Lewis Chemical Equilibrium Program",
            1995,
            "");
    private static final Source SUTHERLAND =
            new Source("NOAA, NASA and USAF", "U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562)", 1976, "eq. (51)");
    private static final String CONSTANTS_OF_THE_REPORT =
            "With the report's own R = 8.314510 J/(mol K), so that cp - R = cv; the exact SI value is 5.7e-6 lower. ";
    private static final String IDEAL =
            "Ideal gas of fixed composition, without dissociation or condensation. Air is the report's mixture N2"
                    + " 78.084, O2 20.9476, Ar 0.9365, CO2 0.0319 mole %; steam is H2O.";

    /** Refuses a temperature outside the published ranges of the gas. */
    private static EntryBuilder withinRanges(EntryBuilder entry, double[][][] table, String what) {
        return entry.requiresAtLeast(
                        FaultKind.OUTSIDE_DOMAIN,
                        "t",
                        Kernel.of((gas, t) -> lowest(table, gas)),
                        "the range of " + what)
                .requiresAtMost(
                        FaultKind.OUTSIDE_DOMAIN,
                        "t",
                        Kernel.of((gas, t) -> highest(table, gas)),
                        "the range of " + what);
    }

    private static final FunctionEntry GAS_CONSTANT_OF = FAMILY.entry("gas_constant_of")
            .title("Specific gas constant of a named gas")
            .formula("R = Ru / M")
            .note(CONSTANTS_OF_THE_REPORT + IDEAL)
            .takes(GAS)
            .gives("R", "J/(kg K)", Interval.above(0))
            .kernel(Gases::gasConstant)
            .sources(NASA_POLYNOMIALS.at("molar masses of the species; R of the report"))
            .example("296.80", "nitrogen")
            .cell(CellForm.steps().helper("molar_mass", GasCells.molarMass()).result("8.31451/{molar_mass}"))
            .build();

    private static final FunctionEntry GAS_MOLAR_MASS = FAMILY.entry("gas_molar_mass")
            .title("Molar mass of a named gas")
            .formula("M, as tabulated")
            .note(IDEAL)
            .takes(GAS)
            .gives("M", "kg/mol", Interval.above(0))
            .kernel(Gases::molarMass)
            .sources(NASA_POLYNOMIALS.at("molar masses of the species"))
            .example("0.0440095", "carbon_dioxide")
            .cell(GasCells.molarMass())
            .build();

    private static final FunctionEntry GAS_GAMMA_AT = withinRanges(
                    FAMILY.entry("gas_gamma_at")
                            .title("Ratio of specific heats of a named gas at a temperature")
                            .formula("gamma = cp / (cp - R)")
                            .note("At the static temperature: gamma of the whole flow is a mean that the engineer"
                                    + " chooses. " + IDEAL)
                            .takes(GAS, T)
                            .gives("gamma", "1", Interval.openClosed(1, 1.667))
                            .kernel(Gases::gamma)
                            .partials(null, Kernel.of(Gases::gammaByT)),
                    GasTable.HEAT,
                    "the polynomials of this gas")
            .sources(NASA_POLYNOMIALS.at("equation for Cp/R and coefficients of the species"))
            .example("1.3361", "air", 1000.0)
            .cell(GasCells.heat().result("{cp_over_r}/({cp_over_r}-1)"))
            .build();

    private static final FunctionEntry GAS_CP_AT = withinRanges(
                    FAMILY.entry("gas_cp_at")
                            .title("Specific heat of a named gas at constant pressure")
                            .formula("cp/R = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4")
                            .note(CONSTANTS_OF_THE_REPORT + IDEAL)
                            .takes(GAS, T)
                            .gives("cp", "J/(kg K)", Interval.above(0))
                            .kernel(Gases::cp)
                            .partials(null, Kernel.of(Gases::cpByT)),
                    GasTable.HEAT,
                    "the polynomials of this gas")
            .sources(NASA_POLYNOMIALS.at("equation for Cp/R and coefficients of the species"))
            .example("1141.02", "air", 1000.0)
            .cell(GasCells.heat().helper("molar_mass", GasCells.molarMass()).result("{cp_over_r}*8.31451/{molar_mass}"))
            .build();

    private static final FunctionEntry GAS_VISCOSITY_AT = withinRanges(
                    FAMILY.entry("gas_viscosity_at")
                            .title("Dynamic viscosity of a named gas at low pressure")
                            .formula("ln(mu/0.1 uPa s) = A ln T + B/T + C/T^2 + D; air: mu = beta T^1.5/(T + S)")
                            .note("Of the dilute gas, without the effect of pressure. Air by Sutherland's equation with"
                                    + " the constants of the U.S. Standard Atmosphere, beta = 1.458e-6 kg/(s m K^0.5)"
                                    + " and S = 110.4 K, taken for 100 to 1900 K (common practice after NACA Report"
                                    + " 1135, from memory). The coefficients of the other gases were read in public"
                                    + " restatements of the report; they agree with reference correlations within 1 %"
                                    + " near 300 K. Carbon monoxide has nitrogen's fit.")
                            .takes(GAS, T)
                            .gives("mu", "Pa.s", Interval.above(0))
                            .kernel(Gases::viscosity)
                            .partials(null, Kernel.of(Gases::viscosityByT)),
                    GasTable.VISCOSITY,
                    "the viscosity fit of this gas")
            .sources(NASA_TRANSPORT.at("viscosity coefficients of the species"), SUTHERLAND)
            .example("1.791E-5", "nitrogen", 300.0)
            .cell(GasCells.viscosity())
            .build();

    static List<FunctionEntry> entries() {
        return List.of(GAS_CONSTANT_OF, GAS_MOLAR_MASS, GAS_GAMMA_AT, GAS_CP_AT, GAS_VISCOSITY_AT);
    }
}
