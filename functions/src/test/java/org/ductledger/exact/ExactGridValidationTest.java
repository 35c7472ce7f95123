package org.ductledger.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.ductledger.exact.ExactGrid.Comparison;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Functions of the catalogue against exact values, near-sonic, tiny, huge and limiting arguments included. Source: the
 * definition in the last column of each file, evaluated for exact doubles to 25 digits and more outside this program.
 */
class ExactGridValidationTest {
    /** An error is allowed this many times what the last place of the input and of the result are worth. */
    private static final double MOST = 4;

    private static final double MOST_RMS = 1;

    /** A row for each file; a new one is covered by a row here. */
    // spotless:off
    static Stream<ExactGrid> grids() {
        return Stream.of(
                ExactGrid.of("t_over_t0.csv", "t_over_t0", "mach"),
                ExactGrid.of("p_over_p0.csv", "p_over_p0", "mach"),
                ExactGrid.of("rho_over_rho0.csv", "rho_over_rho0", "mach"),
                ExactGrid.of("v_over_astar.csv", "v_over_astar", "mach"),
                ExactGrid.of("area_ratio.csv", "area_ratio", "mach"),
                ExactGrid.of("q_over_p0.csv", "q_over_p0", "mach"),
                ExactGrid.of("p0_over_p_minus_1.csv", "impact_pressure_over_p", "mach"),
                ExactGrid.of("mass_flow_parameter.csv", "mass_flow_number", "mach"),
                ExactGrid.of("mach_angle_rad.csv", "mach_angle", "mach").givingRadians(),
                ExactGrid.of("inv_mach_from_t_over_t0.csv", "mach_from_t_over_t0", "t_over_t0"),
                ExactGrid.of("inv_mach_from_p_over_p0.csv", "mach_from_p_over_p0", "p_over_p0"),
                ExactGrid.of("inv_mach_from_rho_over_rho0.csv", "mach_from_rho_over_rho0", "rho_over_rho0"),
                ExactGrid.of("inv_mach_from_v_over_astar.csv", "mach_from_v_over_astar", "v_over_astar"),
                ExactGrid.of("inv_mach_from_area_ratio_subsonic.csv", "mach_from_area_ratio", "area_ratio")
                        .with("branch", "subsonic"),
                ExactGrid.of("inv_mach_from_area_ratio_supersonic.csv", "mach_from_area_ratio", "area_ratio")
                        .with("branch", "supersonic"),
                ExactGrid.of("inv_mach_from_mass_flow_parameter_subsonic.csv", "mach_from_mass_flow_number", "mass_flow_number")
                        .with("branch", "subsonic"),
                ExactGrid.of("inv_mach_from_mass_flow_parameter_supersonic.csv", "mach_from_mass_flow_number", "mass_flow_number")
                        .with("branch", "supersonic"),
                ExactGrid.of("prandtl_meyer_rad.csv", "prandtl_meyer_angle", "mach").givingRadians(),
                ExactGrid.of("inv_mach_from_prandtl_meyer_rad.csv", "mach_from_prandtl_meyer_angle", "prandtl_meyer_angle")
                        .takingRadians(),
                ExactGrid.of("oblique_theta_from_beta_rad.csv", "oblique_deflection", "shock_angle", "mach1")
                        .takingRadians()
                        .givingRadians(),
                ExactGrid.of("oblique_beta_weak_rad.csv", "oblique_shock_angle", "deflection", "mach1")
                        .takingRadians()
                        .givingRadians()
                        .with("branch", "weak"),
                ExactGrid.of("oblique_beta_strong_rad.csv", "oblique_shock_angle", "deflection", "mach1")
                        .takingRadians()
                        .givingRadians()
                        .with("branch", "strong"),
                ExactGrid.of("oblique_theta_max_rad.csv", "oblique_deflection_max", "mach1").givingRadians(),
                ExactGrid.of("oblique_beta_at_theta_max_rad.csv", "oblique_angle_at_deflection_max", "mach1").givingRadians(),
                ExactGrid.of("oblique_beta_sonic_rad.csv", "oblique_angle_at_sonic", "mach1").givingRadians(),
                ExactGrid.of("oblique_m2_weak.csv", "oblique_mach2", "deflection", "mach1")
                        .takingRadians()
                        .with("branch", "weak")
                        .through("oblique_shock_angle", "shock_angle"),
                ExactGrid.of("oblique_m2_strong.csv", "oblique_mach2", "deflection", "mach1")
                        .takingRadians()
                        .with("branch", "strong")
                        .through("oblique_shock_angle", "shock_angle"),
                ExactGrid.of("oblique_p2_p1_weak.csv", "oblique_p2_over_p1", "deflection", "mach1")
                        .takingRadians()
                        .with("branch", "weak")
                        .through("oblique_shock_angle", "shock_angle"),
                ExactGrid.of("normal_shock_m2.csv", "shock_mach2", "mach1"),
                ExactGrid.of("normal_shock_p2_p1.csv", "shock_p2_over_p1", "mach1"),
                ExactGrid.of("normal_shock_t2_t1.csv", "shock_t2_over_t1", "mach1"),
                ExactGrid.of("normal_shock_rho2_rho1.csv", "shock_rho2_over_rho1", "mach1"),
                ExactGrid.of("normal_shock_p02_p01.csv", "shock_p02_over_p01", "mach1"),
                ExactGrid.of("normal_shock_p02_p1.csv", "shock_p02_over_p1", "mach1"),
                ExactGrid.of("inv_normal_shock_m1_from_m2.csv", "mach1_from_shock_mach2", "mach2"),
                ExactGrid.of("inv_normal_shock_m1_from_p2_p1.csv", "mach1_from_shock_p2_over_p1", "p2_over_p1"),
                ExactGrid.of("inv_normal_shock_m1_from_t2_t1.csv", "mach1_from_shock_t2_over_t1", "t2_over_t1"),
                ExactGrid.of("inv_normal_shock_m1_from_rho2_rho1.csv", "mach1_from_shock_rho2_over_rho1", "rho2_over_rho1"),
                ExactGrid.of("inv_normal_shock_m1_from_p02_p01.csv", "mach1_from_shock_p02_over_p01", "p02_over_p01"),
                ExactGrid.of("inv_normal_shock_m1_from_p02_p1.csv", "mach1_from_shock_p02_over_p1", "p02_over_p1"),
                ExactGrid.of("fanno_4fL_D.csv", "fanno_fl_over_d", "mach"),
                ExactGrid.of("fanno_t_tstar.csv", "fanno_t_over_tstar", "mach"),
                ExactGrid.of("fanno_p_pstar.csv", "fanno_p_over_pstar", "mach"),
                ExactGrid.of("fanno_rho_rhostar.csv", "fanno_rho_over_rhostar", "mach"),
                ExactGrid.of("fanno_p0_p0star.csv", "fanno_p0_over_p0star", "mach"),
                ExactGrid.of("inv_fanno_mach_from_4fL_D_subsonic.csv", "mach_from_fanno_fl_over_d", "fl_over_d")
                        .with("branch", "subsonic"),
                ExactGrid.of("inv_fanno_mach_from_4fL_D_supersonic.csv", "mach_from_fanno_fl_over_d", "fl_over_d")
                        .with("branch", "supersonic"),
                ExactGrid.of("rayleigh_t0_t0star.csv", "rayleigh_t0_over_t0star", "mach"),
                ExactGrid.of("rayleigh_t_tstar.csv", "rayleigh_t_over_tstar", "mach"),
                ExactGrid.of("rayleigh_p_pstar.csv", "rayleigh_p_over_pstar", "mach"),
                ExactGrid.of("rayleigh_rho_rhostar.csv", "rayleigh_rho_over_rhostar", "mach"),
                ExactGrid.of("rayleigh_p0_p0star.csv", "rayleigh_p0_over_p0star", "mach"),
                ExactGrid.of("inv_rayleigh_mach_from_t0_t0star_subsonic.csv", "mach_from_rayleigh_t0_over_t0star", "t0_over_t0star")
                        .with("branch", "subsonic"),
                ExactGrid.of("inv_rayleigh_mach_from_t0_t0star_supersonic.csv", "mach_from_rayleigh_t0_over_t0star", "t0_over_t0star")
                        .with("branch", "supersonic"),
                ExactGrid.of("inv_rayleigh_mach_from_p_pstar.csv", "mach_from_rayleigh_p_over_pstar", "p_over_pstar"),
                ExactGrid.of("isothermal_4fL_D.csv", "isothermal_fl_over_d", "mach"),
                ExactGrid.of("isothermal_p_pstar.csv", "isothermal_p_over_pstar", "mach"),
                ExactGrid.of("isothermal_t0_t0star.csv", "isothermal_t0_over_t0star", "mach"),
                ExactGrid.of("isothermal_p0_p0star.csv", "isothermal_p0_over_p0star", "mach"),
                ExactGrid.of("inv_isothermal_mach_from_4fL_D_low.csv", "mach_from_isothermal_fl_over_d", "fl_over_d")
                        .with("branch", "below"),
                ExactGrid.of("inv_isothermal_mach_from_4fL_D_high.csv", "mach_from_isothermal_fl_over_d", "fl_over_d")
                        .with("branch", "above"));
    }
    // spotless:on

    @ParameterizedTest(name = "{0}")
    @MethodSource("grids")
    void staysWithinTheConditionOfTheFunction(ExactGrid grid) {
        List<Comparison> all = grid.compare();
        assertTrue(all.size() > 100, () -> grid + " has " + all.size() + " rows");
        Comparison worst = all.stream()
                .max(Comparator.comparingDouble(Comparison::relativeToCondition))
                .orElseThrow();
        double rms = rootMeanSquare(all);
        System.out.printf(
                Locale.ROOT,
                "%s: max %.2f, rms %.2f x (1 + condition) ulp; the most at %s%n",
                grid,
                worst.relativeToCondition(),
                rms,
                worst.row());
        assertTrue(worst.relativeToCondition() <= MOST, () -> grid + ": " + worst);
        assertTrue(rms <= MOST_RMS, () -> grid + ": rms " + rms);
    }

    private static double rootMeanSquare(List<Comparison> all) {
        double sum = 0;
        for (Comparison comparison : all) {
            sum += comparison.relativeToCondition() * comparison.relativeToCondition();
        }
        return Math.sqrt(sum / all.size());
    }

    @Test
    void everyFileHasARow() throws IOException, URISyntaxException {
        Path one = Path.of(Objects.requireNonNull(ExactGrid.class.getResource("/exact/area_ratio.csv"))
                .toURI());
        Set<String> files = new TreeSet<>();
        try (Stream<Path> found = Files.list(Objects.requireNonNull(one.getParent()))) {
            found.map(file -> String.valueOf(file.getFileName()))
                    .filter(name -> name.endsWith(".csv"))
                    .forEach(files::add);
        }
        Set<String> rows = new TreeSet<>();
        grids().map(ExactGrid::file).forEach(rows::add);
        assertEquals(files, rows);
    }
}
