package org.ductledger.catalogue;

import java.util.List;
import java.util.Map;
import java.util.Random;

/** Draws admissible arguments for any entry, the same ones in every run. */
final class Draws {
    /** What a quantity commonly measures, by its coherent unit: the decades between which it is drawn. */
    private static final Map<String, double[]> DECADES = Map.of(
            "Pa", new double[] {3, 7.5},
            "K", new double[] {2, 3.3},
            "m", new double[] {-3, 1},
            "m2", new double[] {-6, 0},
            "m/s", new double[] {0, 3.5},
            "kg/s", new double[] {-4, 2},
            "J/(kg K)", new double[] {2, 3.6},
            "deg", new double[] {-1, 1.9});

    private static final double[] OF_NUMBERS = {-3, 1};
    private static final Interval ORDINARY_GAMMA = Interval.closed(1.02, 1.7);

    private final FunctionEntry entry;
    private final Random random;

    Draws(FunctionEntry entry) {
        this.entry = entry;
        // unlike the newer generators, this one is specified to the bit
        random = new Random(entry.name().hashCode());
    }

    /** The example's arguments as a kernel takes them. */
    static double[] example(FunctionEntry entry) {
        List<Argument> arguments = entry.arguments();
        double[] row = new double[arguments.size()];
        for (int i = 0; i < row.length; i++) {
            Object given = entry.example().arguments().get(i);
            row[i] = given instanceof Double x ? x : arguments.get(i).choices().indexOf(given);
        }
        return row;
    }

    /** Arguments of a size met in practice: half of them about the example, half over a few decades. */
    double[] ordinary() {
        double[] row = wide();
        if (random.nextBoolean()) {
            double[] example = example(entry);
            for (int i = 0; i < row.length; i++) {
                Argument argument = entry.arguments().get(i);
                double near = example[i] * (0.8 + 0.4 * random.nextDouble());
                row[i] = argument.isText() ? row[i] : clamp(near, argument.interval());
            }
        }
        return row;
    }

    /** Arguments of a size met in practice, each over a few decades; the example has no part in them. */
    double[] wide() {
        double[] row = new double[entry.arguments().size()];
        for (int i = 0; i < row.length; i++) {
            Argument argument = entry.arguments().get(i);
            row[i] = argument.isText()
                    ? random.nextInt(argument.choices().size())
                    : clamp(ordinary(argument), argument.interval());
        }
        return row;
    }

    private double ordinary(Argument argument) {
        Interval range = argument.name().startsWith("gamma") ? ORDINARY_GAMMA : argument.interval();
        boolean low = Double.isFinite(range.lower());
        if (low && range.upper() - range.lower() <= 1000) {
            return range.lower() + random.nextDouble() * (range.upper() - range.lower());
        }
        double[] decades = DECADES.getOrDefault(argument.unit().symbol(), OF_NUMBERS);
        double size = StrictMath.pow(10, decades[0] + random.nextDouble() * (decades[1] - decades[0]));
        return low ? Math.max(0, range.lower()) + size : random.nextBoolean() ? size : -size;
    }

    /** Arguments from anywhere in their intervals, ends and the last doubles before them included. */
    double[] extreme() {
        double[] row = wide();
        for (int i = 0; i < row.length; i++) {
            Argument argument = entry.arguments().get(i);
            if (!argument.isText() && random.nextBoolean()) {
                row[i] = clamp(extreme(argument.interval()), argument.interval());
            }
        }
        return row;
    }

    private double extreme(Interval interval) {
        double size = Math.scalb(1 + random.nextDouble(), random.nextInt(2098) - 1074);
        return switch (random.nextInt(7)) {
            case 0 -> interval.least();
            case 1 -> interval.greatest();
            case 2 -> Math.nextUp(interval.least());
            case 3 -> Math.nextDown(interval.greatest());
            case 4 -> interval.lower() + Math.scalb(1 + random.nextDouble(), random.nextInt(68) - 60);
            case 5 -> interval.upper() - Math.scalb(1 + random.nextDouble(), random.nextInt(68) - 60);
            default -> random.nextBoolean() ? size : -size;
        };
    }

    private static double clamp(double x, Interval interval) {
        return Math.min(interval.greatest(), Math.max(interval.least(), x));
    }
}
