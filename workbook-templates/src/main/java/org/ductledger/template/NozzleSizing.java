package org.ductledger.template;

import java.util.List;
import org.ductledger.catalogue.Interval;

/** A converging-diverging nozzle: its size for a duty, and what it does at the given back pressure. */
final class NozzleSizing implements Template {
    private static final Interval POSITIVE = Interval.above(0);

    @Override
    public String name() {
        return "nozzle_sizing";
    }

    @Override
    public String title() {
        return "Sizing of a converging-diverging nozzle";
    }

    @Override
    public String purpose() {
        return "Sizes the throat and the exit of a converging-diverging nozzle for a supply state, a mass flow (or a"
                + " throat) and a design exit Mach number (or exit pressure); finds the three critical back pressures,"
                + " the regime, the shock where one stands and the thrust at the given back pressure; and follows the"
                + " flow along the contour.";
    }

    @Override
    public int version() {
        return 1;
    }

    @Override
    public List<String> limits() {
        return List.of(
                "Perfect gas: constant gamma and gas constant, from the supply to the exit.",
                "One-dimensional, steady, adiabatic flow without friction; a shock in the nozzle is normal and thin.",
                "Separation of an overexpanded jet ahead of the exit and boundary layers are not modelled: an actual"
                        + " shock stands further upstream and smears.",
                "No discharge, divergence or velocity coefficient is applied: multiply by those of the hardware.",
                "The gas must stay a gas: condensation at low exit temperatures is not looked at.");
    }

    @Override
    public List<String> cautions() {
        return List.of(
                "Pressurised gas stores energy that a failed part sets free at once: design, test and relieve every"
                        + " part by the pressure code in force at the site.",
                "Thrust loads the stand and its piping, and a broken or unanchored line whips: anchor for the full"
                        + " thrust, with the dynamic load of a sudden start.",
                "Gas other than air displaces oxygen in enclosed or low-lying places: ventilate and monitor.",
                "The jet is loud enough to harm hearing at a distance, and throws what lies in its way: keep clear and"
                        + " protect.",
                "This workbook is a calculation, not an approval: local codes, and the judgement of a licensed"
                        + " practitioner, go before it.");
    }

    @Override
    public List<TemplateInput> inputs() {
        return List.of(
                TemplateInput.number(
                        "gamma",
                        "Ratio of specific heats",
                        "gamma",
                        Interval.closed(1.05, 1.7),
                        "cp/cv of the gas, constant",
                        1.4,
                        "1"),
                TemplateInput.number(
                        "gas_constant",
                        "Specific gas constant",
                        "R",
                        POSITIVE,
                        "universal gas constant over the molar mass",
                        296.8,
                        "J/(kg K)"),
                TemplateInput.number(
                        "p0", "Supply pressure", "p0", POSITIVE, "stagnation pressure, absolute", 700, "kPa"),
                TemplateInput.number("t0", "Supply temperature", "T0", POSITIVE, "stagnation temperature", 300, "K"),
                TemplateInput.number(
                        "pb",
                        "Back pressure",
                        "pb",
                        POSITIVE,
                        "static pressure into which the nozzle discharges, absolute",
                        380,
                        "kPa"),
                TemplateInput.number(
                                "mass_flow", "Mass flow", "m", POSITIVE, "mass flow of the choked nozzle", 2, "kg/s")
                        .oneOf("size"),
                TemplateInput.number(
                                "throat_diameter",
                                "Throat diameter",
                                "Dt",
                                POSITIVE,
                                "diameter of the round throat",
                                40,
                                "mm")
                        .oneOf("size"),
                TemplateInput.number(
                                "exit_mach",
                                "Design exit Mach number",
                                "Me",
                                Interval.openClosed(1, 20),
                                "Mach number at the exit when the nozzle runs full",
                                2.5,
                                "1")
                        .oneOf("exit"),
                TemplateInput.number(
                                "exit_pressure",
                                "Design exit pressure",
                                "pe",
                                POSITIVE,
                                "static pressure at the exit when the nozzle runs full, absolute",
                                40,
                                "kPa")
                        .oneOf("exit"),
                TemplateInput.number(
                        "inlet_area_ratio",
                        "Inlet over throat area",
                        "Ai/At",
                        Interval.openClosed(1, 1000),
                        "area of the inlet over the area of the throat",
                        4,
                        "1"),
                TemplateInput.column(
                        "contour_x",
                        "Contour point, place",
                        "x",
                        Interval.anyNumber(),
                        "inlet, two between, throat at 0, two between, exit; each further on than the one before",
                        "mm",
                        -80,
                        -50,
                        -20,
                        0,
                        35,
                        75,
                        130),
                TemplateInput.column(
                        "contour_opening",
                        "Contour point, opening",
                        "h",
                        Interval.open(0, 1),
                        "(D - Dt) over that of the nearer end, at the two points between inlet and throat and the two"
                                + " between throat and exit",
                        "1",
                        0.55,
                        0.12,
                        0.35,
                        0.75),
                TemplateInput.remark(
                        "project",
                        "Project",
                        "what the calculation belongs to",
                        "Nitrogen blowdown stand 2, Skarrow Bay yard"),
                TemplateInput.remark(
                        "calculation_number", "Calculation no.", "the number in your register", "SB2-NZ-014"),
                TemplateInput.remark("revision", "Revision", "of this calculation", "A"),
                TemplateInput.remark("prepared_by", "Prepared by", "name and date", ""),
                TemplateInput.remark("checked_by", "Checked by", "name and date", ""),
                TemplateInput.remark("approved_by", "Approved by", "name and date", ""));
    }
}
