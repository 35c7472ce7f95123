package org.ductledger.flow;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.function.BinaryOperator;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;

/**
 * The equations of duct flow as A. H. Shapiro writes them (The Dynamics and Thermodynamics of Compressible Fluid Flow,
 * volume I, 1953, chapters 6 and 7), in more than 40 digits and term by term: nothing of the kernels' rearrangements.
 */
final class DuctEquations {
    /** By the name of the catalogue, a function of M and gamma. */
    static final Map<String, BinaryOperator<Dfp>> FORWARD = forward();

    /** By the name of the inverse, the name of what it inverts. */
    static final Map<String, String> INVERSE = Map.of(
            "mach_from_fanno_fl_over_d", "fanno_fl_over_d",
            "mach_from_fanno_t_over_tstar", "fanno_t_over_tstar",
            "mach_from_fanno_p_over_pstar", "fanno_p_over_pstar",
            "mach_from_rayleigh_t0_over_t0star", "rayleigh_t0_over_t0star",
            "mach_from_rayleigh_t_over_tstar", "rayleigh_t_over_tstar",
            "mach_from_rayleigh_p_over_pstar", "rayleigh_p_over_pstar",
            "mach_from_isothermal_fl_over_d", "isothermal_fl_over_d",
            "mach_from_fanno_p0_over_p0star", "fanno_p0_over_p0star",
            "mach_from_rayleigh_p0_over_p0star", "rayleigh_p0_over_p0star");

    private DuctEquations() {}

    /** The equation of this name, or of what this inverts. */
    static BinaryOperator<Dfp> of(String name) {
        return Objects.requireNonNull(FORWARD.get(INVERSE.getOrDefault(name, name)), name);
    }

    private static Map<String, BinaryOperator<Dfp>> forward() {
        Map<String, BinaryOperator<Dfp>> all = new LinkedHashMap<>();
        all.put("fanno_fl_over_d", DuctEquations::fannoLength);
        all.put("fanno_t_over_tstar", DuctEquations::fannoTemperature);
        all.put("fanno_p_over_pstar", (m, g) -> fannoTemperature(m, g).sqrt().divide(m));
        all.put(
                "fanno_rho_over_rhostar",
                (m, g) -> one(m).divide(m.multiply(fannoTemperature(m, g).sqrt())));
        all.put(
                "fanno_p0_over_p0star",
                (m, g) -> fannoTemperature(m, g).sqrt().divide(m).multiply(stagnationPower(m, g)));
        all.put("rayleigh_p0_over_p0star", (m, g) -> rayleighPressure(m, g).multiply(stagnationPower(m, g)));
        all.put(
                "fanno_v_over_vstar",
                (m, g) -> m.multiply(fannoTemperature(m, g).sqrt()));
        all.put("fanno_impulse_over_impulsestar", (m, g) -> impulse(m, g).divide(impulse(one(m), g)));
        all.put(
                "rayleigh_t0_over_t0star",
                (m, g) -> stagnationTemperature(m, g).divide(stagnationTemperature(one(m), g)));
        all.put("rayleigh_t_over_tstar", (m, g) -> square(rayleighPressure(m, g).multiply(m)));
        all.put("rayleigh_p_over_pstar", DuctEquations::rayleighPressure);
        all.put(
                "rayleigh_v_over_vstar",
                (m, g) -> rayleighPressure(m, g).multiply(m).multiply(m));
        all.put(
                "rayleigh_rho_over_rhostar",
                (m, g) -> one(m).divide(rayleighPressure(m, g).multiply(m).multiply(m)));
        all.put(
                "rayleigh_t02_over_t01_max",
                (m, g) -> stagnationTemperature(one(m), g).divide(stagnationTemperature(m, g)));
        all.put("isothermal_fl_over_d", DuctEquations::isothermalLength);
        all.put("isothermal_p_over_pstar", (m, g) -> one(m).divide(g.sqrt().multiply(m)));
        all.put("isothermal_t0_over_t0star", (m, g) -> sum(m, g).divide(sum(choking(g), g)));
        all.put(
                "isothermal_p0_over_p0star",
                (m, g) -> FortyDigits.pow(sum(m, g).divide(sum(choking(g), g)), g.divide(g.subtract(1)))
                        .divide(g.sqrt().multiply(m)));
        return all;
    }

    private static Dfp one(Dfp x) {
        return x.getOne();
    }

    private static Dfp square(Dfp x) {
        return x.multiply(x);
    }

    private static Dfp choking(Dfp g) {
        return one(g).divide(g.sqrt());
    }

    /** 1 + (gamma-1)/2 M^2. */
    private static Dfp sum(Dfp m, Dfp g) {
        return g.subtract(1).divide(2).multiply(m).multiply(m).add(1);
    }

    /** The stagnation pressure ratio over the static one. */
    private static Dfp stagnationPower(Dfp m, Dfp g) {
        return FortyDigits.pow(sum(m, g).divide(sum(one(m), g)), g.divide(g.subtract(1)));
    }

    private static Dfp fannoLength(Dfp m, Dfp g) {
        Dfp square = square(m);
        Dfp log = FortyDigits.log(g.add(1).multiply(square).divide(sum(m, g).multiply(2)));
        return one(m).subtract(square)
                .divide(g.multiply(square))
                .add(g.add(1).divide(g.multiply(2)).multiply(log));
    }

    private static Dfp fannoTemperature(Dfp m, Dfp g) {
        return sum(one(m), g).divide(sum(m, g));
    }

    /** p A (1 + gamma M^2) over the mass flow and the stagnation sound speed, up to a constant. */
    private static Dfp impulse(Dfp m, Dfp g) {
        return g.multiply(m).multiply(m).add(1).divide(m.multiply(sum(m, g).sqrt()));
    }

    private static Dfp rayleighPressure(Dfp m, Dfp g) {
        return g.add(1).divide(g.multiply(m).multiply(m).add(1));
    }

    /** T0 over the sonic static temperature of the Rayleigh line. */
    private static Dfp stagnationTemperature(Dfp m, Dfp g) {
        return square(rayleighPressure(m, g).multiply(m)).multiply(sum(m, g));
    }

    private static Dfp isothermalLength(Dfp m, Dfp g) {
        Dfp square = g.multiply(m).multiply(m);
        return one(m).subtract(square).divide(square).add(FortyDigits.log(square));
    }

    /** |x f'/f| by a central difference. */
    static double condition(BinaryOperator<Dfp> f, Dfp m, Dfp g) {
        Dfp h = FortyDigits.decimal("1e-14");
        Dfp above = f.apply(m.multiply(h.add(1)), g);
        Dfp below = f.apply(m.multiply(h.negate().add(1)), g);
        return above.subtract(below)
                .divide(h.multiply(2))
                .divide(f.apply(m, g))
                .abs()
                .toDouble();
    }
}
