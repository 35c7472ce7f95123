package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** The values of one quantity, row by row: numbers, or words. */
public sealed interface Column {
    int rows();

    /** Numbers; NaN marks a row without a value in a result. The array is shared, not copied: it is not to be written. */
    final class Numbers implements Column {
        private final double[] values;

        public Numbers(double... values) {
            this.values = values;
        }

        public double[] values() {
            return values;
        }

        @Override
        public int rows() {
            return values.length;
        }
    }

    /** Words; {@code null} marks a row without a value in a result. */
    final class Texts implements Column {
        private final List<@Nullable String> values;

        public Texts(List<@Nullable String> values) {
            this.values = Collections.unmodifiableList(new ArrayList<>(values));
        }

        public List<@Nullable String> values() {
            return values;
        }

        @Override
        public int rows() {
            return values.size();
        }
    }
}
