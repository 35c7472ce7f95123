package org.ductledger.template;

import java.util.List;

/** A converging-diverging nozzle: its size for a duty, and what it does at the given back pressure. */
final class NozzleSizing implements Template {
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
        return NozzleInputs.all();
    }

    @Override
    public void write(Draft draft) {
        new NozzleCalculation(draft).write();
        new NozzleStations(draft).write();
    }
}
