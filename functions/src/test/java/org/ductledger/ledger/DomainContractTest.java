package org.ductledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.DoubleStream;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Outside the domain of any argument of any entry there is always a fault that names it. */
class DomainContractTest {
    private static final Evaluator EVALUATOR = new Evaluator(StandardCatalogue.get());

    static Collection<FunctionEntry> entries() {
        return StandardCatalogue.get().entries();
    }

    /** The example as a call, one argument replaced. */
    private static Call call(FunctionEntry entry, Argument replaced, Given by) {
        Map<String, Given> arguments = new HashMap<>();
        for (int i = 0; i < entry.arguments().size(); i++) {
            Object given = entry.example().arguments().get(i);
            arguments.put(
                    entry.arguments().get(i).name(),
                    given instanceof Double x ? Given.number(x) : Given.text((String) given));
        }
        arguments.put(replaced.name(), by);
        return Call.of("x", entry.name(), arguments);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void outsideItsDomainAnArgumentIsBlamedInEveryRow(FunctionEntry entry) throws LedgerRefusedException {
        for (Argument argument : entry.arguments()) {
            Given outside = argument.isText()
                    ? Given.texts(List.of(
                            "no_such_word", "", argument.choices().get(0).toUpperCase(Locale.ROOT)))
                    : Given.numbers(outside(argument));
            Outcome outcome = EVALUATOR
                    .evaluate(Ledger.of(call(entry, argument, outside)))
                    .get(0);
            assertEquals(outcome.values().rows(), outcome.faults().size(), entry + ": " + argument.name());
            for (Fault fault : outcome.faults()) {
                assertEquals(argument.name(), fault.argument());
                assertTrue(
                        Set.of(FaultKind.OUTSIDE_DOMAIN, FaultKind.NOT_A_NUMBER).contains(fault.kind()));
            }
        }
    }

    private static double[] outside(Argument argument) {
        return DoubleStream.of(
                        Math.nextDown(argument.interval().least()),
                        Math.nextUp(argument.interval().greatest()),
                        Double.NaN,
                        Double.POSITIVE_INFINITY,
                        Double.NEGATIVE_INFINITY)
                .toArray();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void theExampleRunsAsALedger(FunctionEntry entry) throws LedgerRefusedException {
        Argument first = entry.arguments().get(0);
        Object given = entry.example().arguments().get(0);
        Given same = given instanceof Double x ? Given.number(x) : Given.text((String) given);
        Outcome outcome =
                EVALUATOR.evaluate(Ledger.of(call(entry, first, same))).get(0);
        assertEquals(List.of(), outcome.faults());
    }
}
