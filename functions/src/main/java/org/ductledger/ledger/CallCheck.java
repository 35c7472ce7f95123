package org.ductledger.ledger;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Result;
import org.ductledger.catalogue.Unit;
import org.ductledger.catalogue.UnknownUnitException;
import org.jspecify.annotations.Nullable;

/** Checks one call against its function: what it gives each argument, and in which unit it wants the result. */
final class CallCheck {
    private static final List<String> TEMPERATURES = List.of("K", "delta_K");

    private final Call call;
    private final int place;
    private final FunctionEntry entry;
    private final List<Refusal> refusals;

    /**
     * The check of one call.
     *
     * @param place the call's place in its ledger
     * @param refusals takes what is refused; a method that refuses returns {@code null}
     */
    CallCheck(Call call, int place, FunctionEntry entry, List<Refusal> refusals) {
        this.call = call;
        this.place = place;
        this.entry = entry;
        this.refusals = refusals;
    }

    private Step.@Nullable Input refuse(FaultKind kind, @Nullable String argument, String detail) {
        refusals.add(new Refusal(kind, place, argument, detail));
        return null;
    }

    void refuseUnknownArguments() {
        for (String name : call.arguments().keySet()) {
            if (entry.place(name) < 0) {
                List<String> names =
                        entry.arguments().stream().map(Argument::name).toList();
                refuse(
                        FaultKind.MISSING_ARGUMENT,
                        name,
                        entry.name() + " takes no argument " + name + "; it takes " + String.join(", ", names));
            }
        }
    }

    Step.@Nullable Input missing(Argument argument) {
        String unit = argument.isText() || argument.unit().isOne() ? "" : " (in " + argument.unit() + ")";
        return refuse(
                FaultKind.MISSING_ARGUMENT,
                argument.name(),
                entry.name() + " requires " + argument.name() + unit + ", " + argument.requirement(argument.unit())
                        + ", and it is not given");
    }

    Step.@Nullable Input values(Given.Values given, Argument argument) {
        String name = argument.name();
        boolean text = given.column() instanceof Column.Texts;
        if (argument.isText() != text) {
            String required = argument.isText() ? argument.requirement(Unit.ONE) : "a number";
            String got = text ? "text" : "a number";
            return refuse(FaultKind.NOT_A_NUMBER, name, name + " must be " + required + ", got " + got);
        }
        if (given.column().rows() == 0) {
            return refuse(FaultKind.MISSING_ARGUMENT, name, name + " has no rows; at least one is required");
        }
        if (text && given.unit() != null) {
            return refuse(FaultKind.UNKNOWN_UNIT, name, name + " is a word, which has no unit; got " + given.unit());
        }
        Unit unit = unit(given.unit(), argument.unit(), name, name);
        return unit == null ? null : new Step.Input(argument, given, unit, null);
    }

    Step.@Nullable Input noEarlierCall(String id, Argument argument, boolean laterOne) {
        String refers = argument.name() + " refers to " + id;
        return refuse(
                FaultKind.BAD_REFERENCE,
                argument.name(),
                laterOne
                        ? refers + ", which is not an earlier call: a ledger is evaluated in its order, so that no call"
                                + " can lean on itself or a later one"
                        : refers + ", but no call has that id");
    }

    Step.@Nullable Input reference(Step earlier, Argument argument) {
        Result gives = earlier.entry().result();
        boolean fits =
                gives.choices().equals(argument.choices()) && gives.unit().measuresSameKindAs(argument.unit());
        if (fits) {
            return new Step.Input(argument, null, argument.unit(), earlier);
        }
        return refuse(
                FaultKind.BAD_REFERENCE,
                argument.name(),
                argument.name() + " requires " + value(argument.choices(), argument.unit()) + ", but "
                        + earlier.call().id() + " gives " + value(gives.choices(), gives.unit()));
    }

    private static String value(List<String> choices, Unit unit) {
        return choices.isEmpty()
                ? unit.isOne() ? "a pure number" : "a value in " + unit
                : "one of " + String.join(", ", choices);
    }

    @Nullable
    Unit resultUnit() {
        if (call.unit() != null && entry.result().isText()) {
            refuse(FaultKind.UNKNOWN_UNIT, null, call.id() + " gives a word, which has no unit; got " + call.unit());
            return null;
        }
        return unit(call.unit(), entry.result().unit(), null, "the result");
    }

    private @Nullable Unit unit(@Nullable String symbol, Unit own, @Nullable String argument, String what) {
        if (symbol == null) {
            return own;
        }
        String required = what + (own.isOne() ? " is a pure number" : " requires a unit of the kind of " + own);
        try {
            Unit unit = Unit.named(symbol);
            if (unit.measuresSameKindAs(own)) {
                return unit;
            }
            boolean bothTemperatures = TEMPERATURES.contains(own.coherent().symbol())
                    && TEMPERATURES.contains(unit.coherent().symbol());
            String reason = bothTemperatures ? "; a temperature difference is not a temperature" : "";
            refuse(FaultKind.UNKNOWN_UNIT, argument, required + ", got " + symbol + reason);
        } catch (UnknownUnitException e) {
            refuse(FaultKind.UNKNOWN_UNIT, argument, required + ": " + e.getMessage());
        }
        return null;
    }
}
