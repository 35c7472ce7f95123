package org.ductledger.ledger;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.Family;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** A made-up catalogue whose kernels are quick to see through, and short ways to evaluate against it. */
final class Bench {
    private static final Family FAMILY = new Family("bench", "Made up for tests");
    private static final Source SOURCE = new Source("A. Body", "A Standard", 2001, "");
    private static final Argument LENGTH = Argument.number("length", "l", "m", Interval.atLeast(0), "a length");
    private static final Argument OTHER = LENGTH.named("other", "o", "another length");
    private static final Argument AREA = Argument.number("area", "A", "m2", Interval.above(0), "an area");
    private static final Argument SIDE = Argument.choice("side", "which side", "left", "right");
    private static final Argument HAND = Argument.choice("hand", "which hand", "port", "starboard");
    private static final Argument TEMPERATURE =
            Argument.number("t", "T", "K", Interval.above(0), "an absolute temperature");

    /** length * other, negative on the left; asks for {@code other <= length}. */
    private static final FunctionEntry SIGNED_AREA = new EntryBuilder(FAMILY, "signed_area")
            .title("A signed area")
            .formula("A = +-l o")
            .takes(LENGTH, OTHER, SIDE)
            .gives("A", "m2", Interval.anyNumber())
            .kernel((length, other, side) -> other > length ? Double.NaN : (side == 0 ? -length : length) * other)
            .requiresAtMost(FaultKind.NO_SOLUTION, "other", Kernel.of((l, o, s) -> l), "the length")
            .sources(SOURCE)
            .example("-6", 3.0, 2.0, "left")
            .cell("{length}*{other}")
            .build();

    private static final FunctionEntry EDGE_OF = new EntryBuilder(FAMILY, "edge_of")
            .title("The edge of a square")
            .formula("l = sqrt(A)")
            .takes(AREA)
            .gives("l", "m", Interval.above(0))
            .kernel(area -> inDomain(area, Math.sqrt(area)))
            .sources(SOURCE)
            .example("2", 4.0)
            .cell("SQRT({area})")
            .build();

    private static final FunctionEntry SIDE_OF = new EntryBuilder(FAMILY, "side_of")
            .title("The side on which a length ends")
            .formula("right from 1 m on")
            .takes(LENGTH)
            .givesOneOf("side", "left", "right")
            .kernel(length -> length < 1 ? 0 : 1)
            .sources(SOURCE)
            .example("right", 2.0)
            .cell("IF({length}<1,\"left\",\"right\")")
            .build();

    private static final FunctionEntry HAND_OF = new EntryBuilder(FAMILY, "hand_of")
            .title("A hand by a word of its own")
            .formula("1 to port, 2 to starboard")
            .takes(HAND)
            .gives("n", "1", Interval.closed(1, 2))
            .kernel(hand -> 1 + hand)
            .sources(SOURCE)
            .example("1", "port")
            .cell("IF({hand}=\"port\",1,2)")
            .build();

    private static final FunctionEntry WARMER = new EntryBuilder(FAMILY, "warmer_by_half")
            .title("A temperature half as high again")
            .formula("1.5 T")
            .takes(TEMPERATURE)
            .gives("T", "K", Interval.above(0))
            .kernel(t -> 1.5 * t)
            .sources(SOURCE)
            .example("450", 300.0)
            .cell("1.5*{t}")
            .build();

    private static final FunctionEntry LOST = new EntryBuilder(FAMILY, "lost_iteration")
            .title("An iteration that is lost below 1 m and overflows above 2 m")
            .formula("l")
            .takes(LENGTH)
            .gives("l", "m", Interval.atLeast(0))
            .kernel(length -> length < 1 ? Double.NaN : length > 2 ? 1 / 0.0 : length)
            .sources(SOURCE)
            .example("1.5", 1.5)
            .cell("{length}")
            .build();

    static final Evaluator EVALUATOR =
            new Evaluator(new Catalogue("0.0.1", List.of(SIGNED_AREA, EDGE_OF, SIDE_OF, HAND_OF, WARMER, LOST)));

    private Bench() {}

    private static double inDomain(double area, double result) {
        if (!(area > 0)) {
            throw new AssertionError("a kernel was asked outside its domain: " + area);
        }
        return result;
    }

    static Given ref(String id) {
        return new Reference(id);
    }

    static Outcome evaluate(Call... calls) throws LedgerRefusedException {
        List<Outcome> outcomes = EVALUATOR.evaluate(Ledger.of(calls));
        return outcomes.get(outcomes.size() - 1);
    }

    static Call edge(String id, Given area) {
        return Call.of(id, "edge_of", Map.of("area", area));
    }

    static Call signed(String id, Given length, Given other, Given side) {
        return Call.of(id, "signed_area", Map.of("length", length, "other", other, "side", side));
    }

    static Call inUnit(Call call, String unit) {
        return new Call(call.id(), call.function(), call.arguments(), unit);
    }

    /** The rows of a result, rounded off to what a reader compares. */
    static List<Double> values(Outcome outcome) {
        return Arrays.stream(outcome.numbers()).boxed().toList();
    }
}
