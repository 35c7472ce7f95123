package org.ductledger.flow;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/**
 * The U.S. Standard Atmosphere 1976 from sea level to 84 852 m of geopotential altitude, with the standard's own
 * constants. Seven layers, in each of which the molecular-scale temperature is linear in the geopotential altitude.
 */
final class Atmosphere {
    private static final Chapter FAMILY = new Chapter("atmosphere", "U.S. Standard Atmosphere 1976");

    /** Above this geopotential altitude, in m, the composition changes and the standard goes on otherwise. */
    private static final double TOP = 84_852;

    /** r0 of the standard, m. */
    private static final double EARTH_RADIUS = 6_356_766;

    /** R* / M0 of the standard: 8314.32 N m/(kmol K) over 28.9644 kg/kmol. */
    private static final double GAS_CONSTANT = 8314.32 / 28.9644;

    private static final double GAMMA = 1.4;

    /** g0' M0 / R*, K/m, rounded once: 9.80665 x 28.9644 / 8314.32. */
    private static final double GRADIENT = 0.03416319473631037;

    // Table 4 of the standard: base of each layer in m, temperature there in K, lapse rate in K/m.
    private static final double[] BASE = {0, 11_000, 20_000, 32_000, 47_000, 51_000, 71_000};
    private static final double[] BASE_T = {288.15, 216.65, 216.65, 228.65, 270.65, 270.65, 214.65};
    private static final double[] LAPSE = {-0.0065, 0, 0.001, 0.0028, 0, -0.0028, -0.002};

    /** The pressure at the base of each layer in Pa: eq. (33) carried up from 101 325 Pa in 40 digits, rounded once. */
    static final double[] BASE_P = {
        101325,
        22632.06397346293,
        5474.88866967778,
        868.0186847552274,
        110.90630555496588,
        66.93887311868727,
        3.9564204280407287
    };

    private Atmosphere() {}

    private static int layer(double geopotential) {
        int i = BASE.length - 1;
        while (geopotential < BASE[i]) {
            i--;
        }
        return i;
    }

    static double t(double geopotential) {
        int i = layer(geopotential);
        return BASE_T[i] + LAPSE[i] * (geopotential - BASE[i]);
    }

    static double tByGeopotential(double geopotential) {
        return LAPSE[layer(geopotential)];
    }

    static double p(double geopotential) {
        int i = layer(geopotential);
        double rise = (geopotential - BASE[i]) / BASE_T[i];
        double scaleHeights = LAPSE[i] == 0 ? GRADIENT * rise : GRADIENT / LAPSE[i] * StrictMath.log1p(LAPSE[i] * rise);
        return BASE_P[i] * StrictMath.exp(-scaleHeights);
    }

    static double pByGeopotential(double geopotential) {
        return -GRADIENT * p(geopotential) / t(geopotential);
    }

    static double rho(double geopotential) {
        return p(geopotential) / (GAS_CONSTANT * t(geopotential));
    }

    static double rhoByGeopotential(double geopotential) {
        return -rho(geopotential) * (GRADIENT + tByGeopotential(geopotential)) / t(geopotential);
    }

    static double speedOfSound(double geopotential) {
        return Math.sqrt(GAMMA * GAS_CONSTANT * t(geopotential));
    }

    static double speedOfSoundByGeopotential(double geopotential) {
        return 0.5 * speedOfSound(geopotential) * tByGeopotential(geopotential) / t(geopotential);
    }

    static double geopotentialFromGeometric(double geometric) {
        return EARTH_RADIUS * geometric / (EARTH_RADIUS + geometric);
    }

    static double geopotentialByGeometric(double geometric) {
        double nearness = EARTH_RADIUS / (EARTH_RADIUS + geometric);
        return nearness * nearness;
    }

    private static final Source STANDARD =
            new Source("NOAA, NASA and USAF", "U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562)", 1976, "");
    private static final Argument GEOPOTENTIAL = Argument.number(
            "geopotential", "H", "m", Interval.closed(0, TOP), "geopotential altitude above mean sea level");
    private static final Argument GEOMETRIC =
            Argument.number("geometric", "Z", "m", Interval.closed(0, 1e6), "geometric altitude above mean sea level");
    private static final String LAYERS = " Layers from H = 0, 11, 20, 32, 47, 51 and 71 km; lapse rates -6.5, 0, +1.0,"
            + " +2.8, 0, -2.8 and -2.0 K/km.";
    private static final String MOLECULAR_SCALE =
            "T is the molecular-scale temperature, which is the kinetic one up to 80 km and up to 0.04 % above it there.";

    /** The value of the layer, picked by nested IFs. */
    private static String byLayer(double[] values) {
        StringBuilder formula = new StringBuilder();
        for (int i = 0; i < values.length - 1; i++) {
            formula.append("IF({geopotential}<")
                    .append(BASE[i + 1])
                    .append(",")
                    .append(values[i])
                    .append(",");
        }
        return formula.append(values[values.length - 1])
                .append(")".repeat(values.length - 1))
                .toString();
    }

    private static CellForm.Builder layerCells() {
        return CellForm.steps()
                .helper("base", byLayer(BASE))
                .helper("base_t", byLayer(BASE_T))
                .helper("lapse", byLayer(LAPSE));
    }

    private static CellForm.Builder temperatureCells() {
        return layerCells().helper("t", "{base_t}+{lapse}*({geopotential}-{base})");
    }

    private static CellForm.Builder pressureCells() {
        return temperatureCells()
                .helper("base_p", byLayer(BASE_P))
                .helper(
                        "p",
                        "{base_p}*IF({lapse}=0,EXP(-0.03416319473631037*({geopotential}-{base})/{base_t}),"
                                + "({t}/{base_t})^(-0.03416319473631037/IF({lapse}=0,1,{lapse})))");
    }

    private static final FunctionEntry ATMOSPHERE_T = FAMILY.entry("atmosphere_t")
            .title("Temperature of the standard atmosphere")
            .formula("T = Tb + L (H - Hb)")
            .note(MOLECULAR_SCALE + LAYERS)
            .takes(GEOPOTENTIAL)
            .gives("T", "K", Interval.closed(186.946, 288.15))
            .kernel(Atmosphere::t)
            .partials(Kernel.of(Atmosphere::tByGeopotential))
            .sources(STANDARD.at("eq. (23) and table 4"))
            .example("223.150", 10_000.0)
            .cell(layerCells().result("{base_t}+{lapse}*({geopotential}-{base})"))
            .build();

    private static final FunctionEntry ATMOSPHERE_P = FAMILY.entry("atmosphere_p")
            .title("Pressure of the standard atmosphere")
            .formula("p = pb (Tb/T)^(g0 M0/(R* L)), or pb exp(-g0 M0 (H - Hb)/(R* Tb)) where L = 0")
            .note("101 325 Pa at sea level; g0 = 9.80665 m/s2, M0 = 28.9644 kg/kmol, R* = 8314.32 J/(kmol K)." + LAYERS)
            .takes(GEOPOTENTIAL)
            .gives("p", "Pa", Interval.closed(0.37338, 101_325))
            .kernel(Atmosphere::p)
            .partials(Kernel.of(Atmosphere::pByGeopotential))
            .sources(STANDARD.at("eqs. (33a) and (33b)"))
            .example("26436.3", 10_000.0)
            .cell(pressureCells().result("{p}"))
            .build();

    private static final FunctionEntry ATMOSPHERE_RHO = FAMILY.entry("atmosphere_rho")
            .title("Density of the standard atmosphere")
            .formula("rho = p M0/(R* T)")
            .note("The air of the standard: R*/M0 = 287.0529 J/(kg K).")
            .takes(GEOPOTENTIAL)
            .gives("rho", "kg/m3", Interval.closed(6.957e-6, 1.22501))
            .kernel(Atmosphere::rho)
            .partials(Kernel.of(Atmosphere::rhoByGeopotential))
            .sources(STANDARD.at("eq. (42)"))
            .example("0.41271", 10_000.0)
            .cell(pressureCells().result("{p}*28.9644/(8314.32*{t})"))
            .build();

    private static final FunctionEntry ATMOSPHERE_SPEED_OF_SOUND = FAMILY.entry("atmosphere_speed_of_sound")
            .title("Speed of sound in the standard atmosphere")
            .formula("a = sqrt(gamma R* T/M0), gamma = 1.4")
            .takes(GEOPOTENTIAL)
            .gives("a", "m/s", Interval.closed(274.09, 340.2942))
            .kernel(Atmosphere::speedOfSound)
            .partials(Kernel.of(Atmosphere::speedOfSoundByGeopotential))
            .sources(STANDARD.at("eq. (50)"))
            .example("299.463", 10_000.0)
            .cell(temperatureCells().result("SQRT(1.4*8314.32/28.9644*{t})"))
            .build();

    private static final FunctionEntry GEOPOTENTIAL_FROM_GEOMETRIC = FAMILY.entry("geopotential_from_geometric")
            .title("Geopotential altitude from the geometric one")
            .formula("H = r0 Z/(r0 + Z), r0 = 6 356 766 m")
            .note("The other functions of the family take H. Their upper end, H = 84 852 m, is Z = 86.0 km.")
            .takes(GEOMETRIC)
            .gives("H", "m", Interval.closedOpen(0, EARTH_RADIUS))
            .kernel(Atmosphere::geopotentialFromGeometric)
            .partials(Kernel.of(Atmosphere::geopotentialByGeometric))
            .sources(STANDARD.at("eq. (18)"))
            .example("29859", 30_000.0)
            .cell("6356766*{geometric}/(6356766+{geometric})")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                ATMOSPHERE_T, ATMOSPHERE_P, ATMOSPHERE_RHO, ATMOSPHERE_SPEED_OF_SOUND, GEOPOTENTIAL_FROM_GEOMETRIC);
    }
}
