package org.ductledger.catalogue;

import static tech.units.indriya.AbstractUnit.ONE;
import static tech.units.indriya.unit.Units.CUBIC_METRE;
import static tech.units.indriya.unit.Units.GRAM;
import static tech.units.indriya.unit.Units.JOULE;
import static tech.units.indriya.unit.Units.KELVIN;
import static tech.units.indriya.unit.Units.KILOGRAM;
import static tech.units.indriya.unit.Units.METRE;
import static tech.units.indriya.unit.Units.MOLE;
import static tech.units.indriya.unit.Units.NEWTON;
import static tech.units.indriya.unit.Units.PASCAL;
import static tech.units.indriya.unit.Units.SECOND;
import static tech.units.indriya.unit.Units.SQUARE_METRE;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.measure.IncommensurableException;
import tech.units.indriya.function.RationalNumber;

/**
 * The units that can be typed. The factors are exact as NIST SP 811 (2008), appendix B, gives or defines them, built
 * here as rationals; the units library multiplies them out and checks that a unit is of the kind it stands under.
 */
final class UnitTable {
    private static final Map<String, Row> BY_SPELLING = new LinkedHashMap<>();
    private static final List<Row> ALL = new ArrayList<>();

    // NIST SP 811, section B.6 and footnotes: 1 in = 2.54 cm, 1 lb = 0.453 592 37 kg, g_n = 9.806 65 m/s2, all exact.
    private static final javax.measure.Unit<?> INCH = METRE.multiply(ratio(254, 10_000));
    private static final javax.measure.Unit<?> FOOT = METRE.multiply(ratio(3048, 10_000));
    private static final javax.measure.Unit<?> POUND = KILOGRAM.multiply(ratio(45_359_237, 100_000_000));
    private static final javax.measure.Unit<?> STANDARD_GRAVITY =
            METRE.divide(SECOND.pow(2)).multiply(ratio(980_665, 100_000));
    private static final javax.measure.Unit<?> POUND_FORCE = POUND.multiply(STANDARD_GRAVITY);
    private static final javax.measure.Unit<?> SLUG =
            POUND_FORCE.multiply(SECOND.pow(2)).divide(FOOT);
    private static final javax.measure.Unit<?> RANKINE = KELVIN.multiply(ratio(5, 9));
    private static final javax.measure.Unit<?> MINUTE = SECOND.multiply(60);
    private static final javax.measure.Unit<?> HOUR = SECOND.multiply(3600);
    // International Table British thermal unit: 1 Btu/lb = 2326 J/kg exactly.
    private static final javax.measure.Unit<?> BTU_PER_POUND =
            JOULE.divide(KILOGRAM).multiply(2326);
    private static final javax.measure.Unit<?> GAS_CONSTANT = JOULE.divide(KILOGRAM.multiply(KELVIN));
    private static final javax.measure.Unit<?> MASS_FLOW = KILOGRAM.divide(SECOND);
    private static final javax.measure.Unit<?> DENSITY = KILOGRAM.divide(CUBIC_METRE);
    private static final javax.measure.Unit<?> VISCOSITY = PASCAL.multiply(SECOND);
    private static final javax.measure.Unit<?> SPEED = METRE.divide(SECOND);
    private static final javax.measure.Unit<?> MOLAR_MASS = KILOGRAM.divide(MOLE);

    static {
        Kind number = Kind.of("1", ONE);
        number.add("%", ONE.divide(100), "percent");

        Kind pressure = Kind.of("Pa", PASCAL);
        pressure.add("hPa", PASCAL.multiply(100));
        pressure.add("kPa", PASCAL.multiply(1000));
        pressure.add("MPa", PASCAL.multiply(1_000_000));
        pressure.add("mbar", PASCAL.multiply(100));
        pressure.add("bar", PASCAL.multiply(100_000), "bara");
        pressure.add("atm", PASCAL.multiply(101_325));
        pressure.add("Torr", PASCAL.multiply(ratio(101_325, 760)));
        pressure.add("psi", POUND_FORCE.divide(INCH.pow(2)), "psia", "lbf/in2");
        pressure.add("psf", POUND_FORCE.divide(FOOT.pow(2)), "lbf/ft2");

        Kind temperature = Kind.of("K", KELVIN);
        temperature.addShifted("degC", KELVIN, "273.15", "°C");
        temperature.addShifted("degF", RANKINE, "459.67", "°F");
        temperature.add("degR", RANKINE, "R", "°R");

        Kind difference = Kind.of("delta_K", KELVIN);
        difference.add("delta_degC", KELVIN);
        difference.add("delta_degF", RANKINE);
        difference.add("delta_degR", RANKINE, "delta_R");

        Kind length = Kind.of("m", METRE);
        length.add("mm", METRE.divide(1000));
        length.add("cm", METRE.divide(100));
        length.add("km", METRE.multiply(1000));
        length.add("in", INCH);
        length.add("ft", FOOT);

        Kind area = Kind.of("m2", SQUARE_METRE);
        area.add("cm2", METRE.divide(100).pow(2));
        area.add("mm2", METRE.divide(1000).pow(2));
        area.add("in2", INCH.pow(2));
        area.add("ft2", FOOT.pow(2));

        Kind volume = Kind.of("m3", CUBIC_METRE);
        volume.add("L", CUBIC_METRE.divide(1000), "dm3");
        volume.add("cm3", METRE.divide(100).pow(3));
        volume.add("in3", INCH.pow(3));
        volume.add("ft3", FOOT.pow(3));

        Kind mass = Kind.of("kg", KILOGRAM);
        mass.add("g", GRAM);
        mass.add("lbm", POUND, "lb");
        mass.add("slug", SLUG);

        Kind time = Kind.of("s", SECOND);
        time.add("ms", SECOND.divide(1000));
        time.add("min", MINUTE);
        time.add("h", HOUR);

        Kind massFlow = Kind.of("kg/s", MASS_FLOW);
        massFlow.add("g/s", GRAM.divide(SECOND));
        massFlow.add("kg/min", KILOGRAM.divide(MINUTE));
        massFlow.add("kg/h", KILOGRAM.divide(HOUR));
        massFlow.add("lbm/s", POUND.divide(SECOND), "lb/s");
        massFlow.add("lbm/min", POUND.divide(MINUTE), "lb/min");
        massFlow.add("lbm/h", POUND.divide(HOUR), "lb/h");
        massFlow.add("slug/s", SLUG.divide(SECOND));

        Kind speed = Kind.of("m/s", SPEED);
        speed.add("km/h", METRE.multiply(1000).divide(HOUR));
        speed.add("ft/s", FOOT.divide(SECOND));

        Kind density = Kind.of("kg/m3", DENSITY);
        density.add("g/cm3", GRAM.divide(METRE.divide(100).pow(3)));
        density.add("lbm/ft3", POUND.divide(FOOT.pow(3)), "lb/ft3");
        density.add("slug/ft3", SLUG.divide(FOOT.pow(3)));

        Kind force = Kind.of("N", NEWTON);
        force.add("kN", NEWTON.multiply(1000));
        force.add("lbf", POUND_FORCE);

        Kind gasConstant = Kind.of("J/(kg K)", GAS_CONSTANT, "J/kg/K", "J/(kg.K)", "m2/(s2 K)");
        gasConstant.add("kJ/(kg K)", GAS_CONSTANT.multiply(1000), "kJ/kg/K", "kJ/(kg.K)");
        gasConstant.add(
                "ft.lbf/(slug.R)",
                FOOT.multiply(POUND_FORCE).divide(SLUG.multiply(RANKINE)),
                "ft lbf/(slug R)",
                "ft2/(s2 R)");
        gasConstant.add(
                "ft.lbf/(lbm.R)",
                FOOT.multiply(POUND_FORCE).divide(POUND.multiply(RANKINE)),
                "ft lbf/(lbm R)",
                "ft.lbf/(lb.R)");
        gasConstant.add("Btu/(lbm.R)", BTU_PER_POUND.divide(RANKINE), "Btu/(lbm R)", "Btu/(lb.R)");

        Kind viscosity = Kind.of("Pa.s", VISCOSITY, "Pa s", "kg/(m s)", "kg/(m.s)");
        viscosity.add("mPa.s", VISCOSITY.divide(1000), "mPa s", "cP");
        viscosity.add("uPa.s", VISCOSITY.divide(1_000_000), "uPa s");
        viscosity.add("lbm/(ft.s)", POUND.divide(FOOT.multiply(SECOND)), "lb/(ft.s)");

        Kind molarMass = Kind.of("kg/mol", MOLAR_MASS);
        molarMass.add("g/mol", MOLAR_MASS.divide(1000), "kg/kmol");

        // Trade practice: the catalogue takes and gives angles in degrees. pi is no ratio of integers, so that radian
        // stands here with its factor rounded once (57.295 779 513 082 32...).
        put(new Row("deg", "deg", 1, 0), "°");
        put(new Row("rad", "deg", 57.29577951308232, 0));
    }

    private UnitTable() {}

    /** A line of the table: {@code coherent = (x + offset) * scale}. */
    record Row(String symbol, String coherent, double scale, double offset) {}

    /** A kind of quantity under its coherent unit, and the units that measure it. */
    private record Kind(String coherent, javax.measure.Unit<?> definition) {
        static Kind of(String coherent, javax.measure.Unit<?> definition, String... spellings) {
            put(new Row(coherent, coherent, 1, 0), spellings);
            return new Kind(coherent, definition);
        }

        void add(String symbol, javax.measure.Unit<?> unit, String... spellings) {
            put(new Row(symbol, coherent, factor(unit), 0), spellings);
        }

        void addShifted(String symbol, javax.measure.Unit<?> step, String zero, String... spellings) {
            put(new Row(symbol, coherent, factor(step), Double.parseDouble(zero)), spellings);
        }

        private double factor(javax.measure.Unit<?> unit) {
            try {
                return nearest(unit.getConverterToAny(definition).convert(1));
            } catch (IncommensurableException e) {
                throw new IllegalStateException(unit + " does not measure what " + coherent + " does", e);
            }
        }
    }

    private static RationalNumber ratio(long numerator, long denominator) {
        return RationalNumber.of(numerator, denominator);
    }

    /** The double nearest to an exact factor. */
    private static double nearest(Number exact) {
        if (exact instanceof RationalNumber q) {
            return new BigDecimal(q.getDividend())
                    .divide(new BigDecimal(q.getDivisor()), MathContext.DECIMAL128)
                    .doubleValue();
        }
        return new BigDecimal(exact.toString()).doubleValue();
    }

    private static void put(Row unit, String... spellings) {
        ALL.add(unit);
        BY_SPELLING.put(unit.symbol(), unit);
        for (String spelling : spellings) {
            BY_SPELLING.put(spelling, unit);
        }
    }

    static List<Row> all() {
        return List.copyOf(ALL);
    }

    /**
     * The line of a unit.
     *
     * @throws UnknownUnitException if there is none, naming the reason or what is near
     */
    static Row find(String symbol) {
        Row unit = BY_SPELLING.get(symbol);
        if (unit == null) {
            throw new UnknownUnitException(refusal(symbol));
        }
        return unit;
    }

    private static String refusal(String symbol) {
        String absolute = absoluteOfGauge(symbol);
        if (!absolute.isEmpty()) {
            return symbol + " is a gauge unit: the pressures here are absolute; add the barometric pressure of the site"
                    + " and give the sum in " + absolute;
        }
        List<String> near = Spelling.near(symbol, BY_SPELLING.keySet(), 3);
        return "the unit '" + (symbol.length() > 40 ? symbol.substring(0, 40) + "..." : symbol) + "' is not known"
                + (near.isEmpty() ? "" : "; near it: " + String.join(", ", near));
    }

    /** The absolute unit that a gauge spelling (psig, bar(g), kPa gauge) leans on, or an empty text. */
    private static String absoluteOfGauge(String symbol) {
        String plain = symbol.strip().toLowerCase(Locale.ROOT).replaceAll("[\\s_]*(\\(g\\)|gauge|g)$", "");
        if (plain.length() == symbol.strip().length()) {
            return "";
        }
        return BY_SPELLING.values().stream()
                .filter(unit -> unit.coherent().equals("Pa"))
                .map(Row::symbol)
                .filter(known -> known.toLowerCase(Locale.ROOT).equals(plain))
                .findFirst()
                .orElse("");
    }
}
