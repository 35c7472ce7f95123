package org.ductledger.numeric;

/** What a power of the stagnation ratio is multiplied with. */
public enum Ending {
    NOTHING(0) {
        @Override
        double of(double power, double mach, double gamma) {
            return power;
        }
    },
    /** Over M: the form of A/A*. */
    OVER_MACH(-1) {
        @Override
        double of(double power, double mach, double gamma) {
            return overMach(power, mach);
        }
    },
    /** Times M sqrt(gamma): the form of a mass flow. */
    MACH_ROOT_GAMMA(1) {
        @Override
        double of(double power, double mach, double gamma) {
            return machRootGamma(power, mach, gamma);
        }
    },
    /** Times gamma/2 M^2: the form of a dynamic pressure. */
    HALF_GAMMA_MACH_SQUARE(2) {
        @Override
        double of(double power, double mach, double gamma) {
            return halfGammaMachSquare(power, mach, gamma);
        }
    };

    /** The power in which the Mach number stands in it. */
    final int machExponent;

    Ending(int machExponent) {
        this.machExponent = machExponent;
    }

    abstract double of(double power, double mach, double gamma);

    static double overMach(double power, double mach) {
        return power / mach;
    }

    static double machRootGamma(double power, double mach, double gamma) {
        return power * (Math.sqrt(gamma) * mach);
    }

    static double halfGammaMachSquare(double power, double mach, double gamma) {
        return power * (0.5 * gamma * mach * mach);
    }
}
