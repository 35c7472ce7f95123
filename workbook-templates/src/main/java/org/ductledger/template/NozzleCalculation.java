package org.ductledger.template;

import java.util.List;
import java.util.Map;

/** The ledger of a nozzle's sizing: its single results, in the order of a hand calculation. */
final class NozzleCalculation {
    private static final Map<String, Term> AS_BOUND = Map.of();

    private final Draft draft;

    NozzleCalculation(Draft draft) {
        this.draft = draft;
    }

    void write() {
        for (String input : List.of("gamma", "gas_constant", "p0", "t0", "pb", "inlet_area_ratio")) {
            draft.bind(input, draft.input(input));
        }
        draft.requires("a back pressure below the supply pressure", draft.input("pb"), draft.input("p0"));
        writeThroat();
        Term exitMach = writeExitMach();
        writeGeometry(exitMach);
        writeDesignExit(exitMach);
        writeCriticalPressures();
        writeRunning();
        writeShockStrength();
        writeShockPlace();
        writeThrust();
    }

    private Term result(String id, String label, String symbol, String function, Map<String, Term> with) {
        return draft.result(id, label, symbol, function, with);
    }

    private Term pressure(String id, String label, String symbol, Term ratio) {
        return result(id, label, symbol, "p_from_p_over_p0", Map.of("p_over_p0", ratio));
    }

    private Term temperature(String id, String symbol, Term mach) {
        Term ratio =
                result(id + "_t_over_t0", "Temperature over T0", symbol + "/T0", "t_over_t0", Map.of("mach", mach));
        return result(id + "_temperature", "Temperature", symbol, "t_from_t_over_t0", Map.of("t_over_t0", ratio));
    }

    private void writeThroat() {
        draft.section("Throat, when sonic");
        Term sonic = draft.constant("sonic_mach", 1);
        Term ratio = result("throat_p_over_p0", "Pressure over p0", "pt/p0", "p_over_p0", Map.of("mach", sonic));
        Term p = pressure("throat_pressure", "Pressure", "pt", ratio);
        Term t = temperature("throat", "Tt", sonic);
        result("throat_density", "Density", "rhot", "gas_density", Map.of("p", p, "t", t));
        result("throat_speed", "Speed", "Vt", "flow_speed", Map.of("mach", sonic));
        if (draft.has("exit_pressure")) {
            draft.requires(
                    "a design exit pressure below the pressure in the sonic throat", draft.input("exit_pressure"), p);
        }
        writeThroatArea();
        Term choked = result(
                "choked_flow",
                "Mass flow, choked",
                "m*",
                "choked_mass_flow",
                Map.of("area", draft.bound("throat_area")));
        draft.bind("choked_mass_flow", choked);
        draft.headline(choked);
        result("c_star", "Characteristic velocity", "c*", "characteristic_velocity", AS_BOUND);
    }

    private void writeThroatArea() {
        if (draft.has("throat_diameter")) {
            Map<String, Term> diameter = Map.of("diameter", draft.input("throat_diameter"));
            draft.bind("throat_area", result("throat_area", "Area", "At", "area_from_diameter", diameter));
            return;
        }
        Map<String, Term> massFlow = Map.of("mass_flow", draft.input("mass_flow"));
        Term area = result("throat_area", "Area for the mass flow", "At", "throat_area_from_mass_flow", massFlow);
        draft.bind("throat_area", area);
        draft.headline(result("throat_diameter", "Throat diameter", "Dt", "diameter_from_area", Map.of("area", area)));
    }

    /** The design exit Mach number: given, or from the exit pressure. */
    private Term writeExitMach() {
        draft.section("Inlet and exit");
        if (draft.has("exit_mach")) {
            return draft.input("exit_mach");
        }
        Term ratio = result(
                "exit_p_over_p0",
                "Exit pressure over p0",
                "pe/p0",
                "p_over_p0_from_p",
                Map.of("p", draft.input("exit_pressure")));
        Term mach =
                result("exit_mach", "Design exit Mach number", "Me", "mach_from_p_over_p0", Map.of("p_over_p0", ratio));
        draft.headline(mach);
        return mach;
    }

    private void writeGeometry(Term exitMach) {
        Term ratio =
                result("exit_area_ratio", "Exit over throat area", "Ae/At", "area_ratio", Map.of("mach", exitMach));
        draft.bind("exit_area_ratio", ratio);
        Term exit = result("exit_area", "Exit area", "Ae", "area_from_area_ratio", Map.of("area_ratio", ratio));
        draft.headline(result("exit_diameter", "Exit diameter", "De", "diameter_from_area", Map.of("area", exit)));
        Term inlet = result(
                "inlet_area",
                "Inlet area",
                "Ai",
                "area_from_area_ratio",
                Map.of("area_ratio", draft.input("inlet_area_ratio")));
        result("inlet_diameter", "Inlet diameter", "Di", "diameter_from_area", Map.of("area", inlet));
    }

    private void writeDesignExit(Term mach) {
        draft.section("Exit, when the nozzle runs full");
        Term ratio = result("design_p_over_p0", "Pressure over p0", "pe/p0", "p_over_p0", Map.of("mach", mach));
        Term p = pressure("design_pressure", "Pressure", "pe", ratio);
        Term t = temperature("design", "Te", mach);
        result("design_density", "Density", "rhoe", "gas_density", Map.of("p", p, "t", t));
        result("design_speed", "Speed", "Ve", "flow_speed", Map.of("mach", mach));
    }

    private void writeCriticalPressures() {
        draft.section("Critical back pressures");
        critical("first", "First: just choked, subsonic to the exit", "pb1");
        critical("second", "Second: normal shock in the exit plane", "pb2");
        critical("third", "Third: full expansion, no wave at the exit", "pb3");
    }

    private void critical(String which, String label, String symbol) {
        Term ratio =
                result(which + "_critical_ratio", label, symbol + "/p0", "nozzle_" + which + "_critical", AS_BOUND);
        pressure(which + "_critical_pressure", label, symbol, ratio);
    }

    private void writeRunning() {
        draft.section("At the given back pressure");
        Term back = result("back_pressure_ratio", "Back pressure over p0", "pb/p0", "pb_over_p0_from_pb", AS_BOUND);
        draft.bind("pb_over_p0", back);
        draft.headline(result("regime", "Regime", "", "nozzle_regime", AS_BOUND));
        Term fraction =
                result("mass_flow_fraction", "Mass flow over choked", "m/m*", "nozzle_mass_flow_fraction", AS_BOUND);
        draft.headline(result(
                "actual_mass_flow",
                "Mass flow",
                "m",
                "mass_flow_from_fraction",
                Map.of("mass_flow_fraction", fraction)));
        Term mach = result("actual_exit_mach", "Exit Mach number", "Me", "nozzle_exit_mach", AS_BOUND);
        Term ratio =
                result("actual_exit_p_over_p0", "Exit pressure over p0", "pe/p0", "nozzle_exit_p_over_p0", AS_BOUND);
        Term p = pressure("actual_exit_pressure", "Exit pressure", "pe", ratio);
        Term t = temperature("actual_exit", "Te", mach);
        result("actual_exit_density", "Exit density", "rhoe", "gas_density", Map.of("p", p, "t", t));
        result("actual_exit_speed", "Exit speed", "Ve", "flow_speed", Map.of("mach", mach));
        result(
                "actual_exit_p0_over_p0",
                "Exit stagnation pressure over p0",
                "p0e/p0",
                "nozzle_exit_p0_over_p0",
                AS_BOUND);
    }

    private void writeShockStrength() {
        draft.section("Shock, where one stands");
        Term mach1 = result("shock_mach1", "Mach number ahead", "M1", "nozzle_shock_mach1", AS_BOUND);
        Term mach2 = result("shock_m2", "Mach number behind", "M2", "shock_mach2", Map.of("mach1", mach1));
        Term ahead = result("shock_p1_over_p0", "Pressure ahead over p0", "p1/p0", "p_over_p0", Map.of("mach", mach1));
        pressure("shock_p1", "Pressure ahead", "p1", ahead);
        Term loss = result(
                "shock_p02_ratio",
                "Stagnation pressure behind over ahead",
                "p02/p01",
                "shock_p02_over_p01",
                Map.of("mach1", mach1));
        Term p02 = pressure("shock_p02", "Stagnation pressure behind", "p02", loss);
        Term behind = result(
                "shock_p2_over_p02", "Pressure over stagnation, behind", "p2/p02", "p_over_p0", Map.of("mach", mach2));
        Term p2 =
                result("shock_p2", "Pressure behind", "p2", "p_from_p_over_p0", Map.of("p_over_p0", behind, "p0", p02));
        result("shock_p2_over_p0", "Pressure behind over p0", "p2/p0", "p_over_p0_from_p", Map.of("p", p2));
    }

    private void writeShockPlace() {
        Term ratio = result("shock_area_ratio", "Area over throat area", "As/At", "nozzle_shock_area_ratio", AS_BOUND);
        Term opening = result(
                "shock_opening",
                "Opening there",
                "o",
                "contour_opening_from_area_ratio",
                Map.of("area_ratio", ratio, "end_area_ratio", draft.bound("exit_area_ratio")));
        Term x = result(
                "shock_x",
                "Shock, place along the axis",
                "xs",
                "contour_x_from_opening",
                Map.of(
                        "opening", opening,
                        "x1", draft.input("contour_x", 3),
                        "x2", draft.input("contour_x", 4),
                        "x3", draft.input("contour_x", 5),
                        "x4", draft.input("contour_x", 6),
                        "opening2", draft.input("contour_opening", 2),
                        "opening3", draft.input("contour_opening", 3)));
        draft.headline(x);
    }

    private void writeThrust() {
        draft.section("Thrust");
        Term coefficient =
                result("thrust_coefficient", "Thrust coefficient", "CF", "nozzle_thrust_coefficient", AS_BOUND);
        draft.headline(result(
                "thrust", "Thrust", "F", "thrust_from_thrust_coefficient", Map.of("thrust_coefficient", coefficient)));
        Term vacuum = result(
                "vacuum_coefficient",
                "Thrust coefficient into vacuum",
                "CFv",
                "nozzle_vacuum_thrust_coefficient",
                AS_BOUND);
        result(
                "vacuum_thrust",
                "Thrust into vacuum",
                "Fv",
                "thrust_from_thrust_coefficient",
                Map.of("thrust_coefficient", vacuum));
    }
}
