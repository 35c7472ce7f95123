package org.ductledger.numeric;

import java.util.Arrays;

/**
 * A {@link StagnationPower} over columns, block by block. The operations and their order are those of one value; a
 * block with a row beyond their range is computed value by value.
 */
public final class PowerColumn {
    private static final int BLOCK = 256;

    /** Fewer rows than this are computed one by one. */
    private static final int LEAST_ROWS = 12;

    private static final long MOST_MACH = Double.doubleToRawLongBits(StagnationSum.MOST_MACH);
    private static final long LEAST_GAMMA = Double.doubleToRawLongBits(GammaTerms.LEAST_GAMMA);

    private final StagnationPower power;

    public PowerColumn(StagnationPower power) {
        this.power = power;
    }

    /**
     * Fills {@code result[from..to)}.
     *
     * @param arguments the Mach numbers and the gammas; a column of one value holds for all rows
     */
    public void apply(double[][] arguments, int from, int to, double[] result) {
        double[] machs = arguments[0];
        double[] gammas = arguments[1];
        if (to - from >= LEAST_ROWS) {
            new Block(power, Math.min(to - from, BLOCK)).run(machs, gammas, from, to, result);
            return;
        }
        for (int i = from; i < to; i++) {
            result[i] = power.at(machs[machs.length == 1 ? 0 : i], gammas[gammas.length == 1 ? 0 : i]);
        }
    }

    /** The scratch arrays of a run, and the order of the steps. */
    private static final class Block {
        private final StagnationPower power;
        private final double[] mach;
        private final double[] gamma;
        private final double[] h;
        private final double[] w0;
        private final double[] w1;
        private final double[] sonic;
        private final double[] sonicRest;
        private final double[] sonicInverse;
        private final double[] head;
        private final double[] tail;
        private final double[] scale;
        private final double[] k;
        private final double[] tableTail;
        private final double[] s;
        private final double[] z;

        Block(StagnationPower power, int size) {
            this.power = power;
            mach = new double[size];
            gamma = new double[size];
            h = new double[size];
            w0 = new double[size];
            w1 = new double[size];
            sonic = new double[size];
            sonicRest = new double[size];
            sonicInverse = new double[size];
            head = new double[size];
            tail = new double[size];
            scale = new double[size];
            k = new double[size];
            tableTail = new double[size];
            s = new double[size];
            z = new double[size];
        }

        void run(double[] machs, double[] gammas, int from, int to, double[] result) {
            boolean oneGamma = gammas.length == 1;
            Arrays.fill(mach, machs[0]);
            Arrays.fill(gamma, gammas[0]);
            gammaTerms(mach.length);
            for (int start = from; start < to; start += mach.length) {
                int n = Math.min(mach.length, to - start);
                if (machs.length != 1) {
                    System.arraycopy(machs, start, mach, 0, n);
                }
                if (!oneGamma) {
                    System.arraycopy(gammas, start, gamma, 0, n);
                    gammaTerms(n);
                }
                fill(n, oneGamma, start, result);
            }
        }

        private void gammaTerms(int n) {
            Loops.exponents(gamma, h, w0, w1, power.a(), power.b(), n);
            if (power.overSonic()) {
                Loops.sonicTerms(h, sonic, sonicRest, sonicInverse, n);
            }
        }

        private void fill(int n, boolean oneGamma, int start, double[] result) {
            if (isPlain(oneGamma ? 1 : n, n)) {
                base(n);
                logarithm(n);
                exponential(n);
                Loops.scale(s, k, result, start, n);
                return;
            }
            for (int i = 0; i < n; i++) {
                result[start + i] = power.at(mach[i], gamma[i]);
            }
        }

        /** Asks the order of the bits, which is that of positive doubles, of the whole block without a branch. */
        private boolean isPlain(int gammas, int machs) {
            long outside = 0;
            for (int i = 0; i < machs; i++) {
                outside |= MOST_MACH - Double.doubleToRawLongBits(mach[i]);
            }
            for (int i = 0; i < gammas; i++) {
                outside |= Double.doubleToRawLongBits(gamma[i]) - LEAST_GAMMA;
            }
            return outside >= 0;
        }

        private void base(int n) {
            Loops.leading(mach, h, s, z, n);
            Loops.sum(s, z, head, tail, n);
            if (power.overSonic()) {
                Loops.overSonic(head, tail, sonic, sonicRest, sonicInverse, n);
            }
        }

        private void logarithm(int n) {
            Loops.gather(head, scale, k, tableTail, n);
            Loops.reduce(head, tail, scale, n);
            Loops.logarithmHead(head, tail, k, tableTail, s, z, n);
            Loops.logarithmTail(tail, z, n);
        }

        private void exponential(int n) {
            Loops.fraction(w0, w1, s, tail, z, k, n);
            Loops.exponentialTail(z, scale, n);
            Loops.mantissa(z, scale, s, n);
            switch (power.ending()) {
                case NOTHING -> {}
                case OVER_MACH -> Loops.overMach(s, mach, n);
                case MACH_ROOT_GAMMA -> Loops.machRootGamma(s, mach, gamma, n);
                case HALF_GAMMA_MACH_SQUARE -> Loops.halfGammaMachSquare(s, mach, gamma, n);
            }
        }
    }
}
