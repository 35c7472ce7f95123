package org.ductledger.template;

import static org.ductledger.template.TemplateInput.column;
import static org.ductledger.template.TemplateInput.number;
import static org.ductledger.template.TemplateInput.remark;

import java.util.List;
import org.ductledger.catalogue.Interval;

/** What the sizing of a nozzle asks for; the defaults are those of an invented rig. */
final class NozzleInputs {
    /** The points of the contour; the throat is the fourth. */
    static final List<String> POINTS =
            List.of("inlet", "inlet side 1", "inlet side 2", "throat", "exit side 1", "exit side 2", "exit");

    private static final List<String> POINTS_BETWEEN =
            List.of("inlet side 1", "inlet side 2", "exit side 1", "exit side 2");
    private static final Interval POSITIVE = Interval.above(0);
    private static final Interval GAMMA = Interval.closed(1.05, 1.7);

    private NozzleInputs() {}

    // spotless:off
    static List<TemplateInput> all() {
        return List.of(
                number("gamma", "Ratio of specific heats", "gamma", GAMMA, "cp/cv, constant", 1.4, "1"),
                number("gas_constant", "Specific gas constant", "R", POSITIVE, "Ru over the molar mass", 296.8, "J/(kg K)"),
                number("p0", "Supply pressure", "p0", POSITIVE, "stagnation pressure, absolute", 700, "kPa"),
                number("t0", "Supply temperature", "T0", POSITIVE, "stagnation temperature", 300, "K"),
                number("pb", "Back pressure", "pb", POSITIVE, "of the receiver, absolute", 380, "kPa"),
                number("mass_flow", "Mass flow", "m", POSITIVE, "with a sonic throat", 2, "kg/s").oneOf("size"),
                number("throat_diameter", "Throat diameter", "Dt", POSITIVE, "of the round throat", 40, "mm").oneOf("size"),
                number("exit_mach", "Design exit Mach number", "Me", Interval.openClosed(1, 20),
                        "when the nozzle runs full", 2.5, "1").oneOf("exit"),
                number("exit_pressure", "Design exit pressure", "pe", POSITIVE,
                        "when the nozzle runs full, absolute", 40, "kPa").oneOf("exit"),
                number("inlet_area_ratio", "Inlet over throat area", "Ai/At", Interval.openClosed(1, 1000),
                        "of the round inlet", 4, "1"),
                column("contour_x", "Contour place", "x", Interval.anyNumber(),
                        "along the axis, each point further on than the one before",
                        POINTS, "mm", -80, -50, -20, 0, 35, 75, 130),
                column("contour_opening", "Contour opening", "o", Interval.open(0, 1),
                        "(D - Dt)/(Dend - Dt): 0 at the throat, 1 at the inlet and the exit",
                        POINTS_BETWEEN, "1", 0.55, 0.12, 0.35, 0.75),
                remark("project", "Project", "what the calculation belongs to",
                        "Nitrogen blowdown stand 2, Skarrow Bay yard"),
                remark("calculation_number", "Calculation no.", "the number in the register", "SB2-NZ-014"),
                remark("revision", "Revision", "of this calculation", "A"),
                remark("prepared_by", "Prepared by, date", "who wrote it", ""),
                remark("checked_by", "Checked by, date", "who checked it", ""),
                remark("approved_by", "Approved by, date", "who releases it", ""));
    }
    // spotless:on
}
