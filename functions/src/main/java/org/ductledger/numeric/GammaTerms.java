package org.ductledger.numeric;

/** What the powers need of gamma: h = (gamma-1)/2, 1 + h, and an exponent a + b/(gamma-1) as a head of 26 bits and a tail. */
final class GammaTerms {
    /** Below this gamma the exponent is too steep for the quick power. */
    static final double LEAST_GAMMA = 1 + 0x1p-10;

    private GammaTerms() {}

    /** (gamma-1)/2, exact. */
    static double half(double gamma) {
        return 0.5 * (gamma - 1);
    }

    /** The head of the exponent; inverse is 1/(gamma-1), rounded. */
    static double exponentHead(double inverse, double a, double b) {
        return Split.head(a + b * Split.head(inverse, Split.DROP_27), Split.DROP_27);
    }

    /** The tail of the exponent. */
    static double exponentTail(double gamma, double inverse, double a, double b, double head) {
        double d = gamma - 1;
        double dHead = Split.head(d, Split.DROP_27);
        double w = Split.head(inverse, Split.DROP_27);
        double rest = ((1 - w * dHead) - w * (d - dHead)) * inverse;
        return ((a - head) + b * w) + b * rest;
    }

    /** The leading bits of the sonic value of 1 + h M^2, which is 1 + h. */
    static double sonic(double h) {
        return Split.head(1 + h, Split.DROP_30);
    }

    /** What they leave of it. */
    static double sonicRest(double h, double sonic) {
        double sum = 1 + h;
        double ofH = sum - 1;
        return (sum - sonic) + ((1 - (sum - ofH)) + (h - ofH));
    }
}
