package org.ductledger.batch;

import com.fasterxml.jackson.core.io.NumberInput;

/** Decimal numbers as people and programs type them, outside JSON. */
final class Decimal {
    private Decimal() {}

    /** Whether a text begins as a number does: a digit, or a sign or point before one. */
    static boolean begins(String text) {
        int i = !text.isEmpty() && (text.charAt(0) == '-' || text.charAt(0) == '+') ? 1 : 0;
        if (i < text.length() && (text.charAt(i) == '.' || text.charAt(i) == ',')) {
            i++;
        }
        return i < text.length() && isDigit(text.charAt(i));
    }

    /** How many characters of the text are one number, at its begin: {@code 3} for {@code 1e5 bar}. */
    static int length(String text, char point) {
        int sign = !text.isEmpty() && (text.charAt(0) == '-' || text.charAt(0) == '+') ? 1 : 0;
        int whole = digits(text, sign);
        int end = whole;
        if (end < text.length() && text.charAt(end) == point) {
            end = digits(text, end + 1);
        }
        if (end - sign - (end > whole ? 1 : 0) == 0) {
            return 0;
        }
        if (end < text.length() && (text.charAt(end) == 'e' || text.charAt(end) == 'E')) {
            int exponent = end + 1;
            if (exponent < text.length() && (text.charAt(exponent) == '-' || text.charAt(exponent) == '+')) {
                exponent++;
            }
            int after = digits(text, exponent);
            end = after > exponent ? after : end;
        }
        return end;
    }

    private static int digits(String text, int from) {
        int i = from;
        while (i < text.length() && isDigit(text.charAt(i))) {
            i++;
        }
        return i;
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    /** The number that a text is, or NaN where it is none or lies beyond a double. */
    static double parse(String text) {
        if (text.isEmpty() || length(text, '.') != text.length()) {
            return Double.NaN;
        }
        double value = NumberInput.parseDouble(text, true);
        return Double.isFinite(value) && (value != 0 || isZero(text)) ? value : Double.NaN;
    }

    /** Whether a number's text has no digit but zeros before its exponent. */
    static boolean isZero(String number) {
        for (int i = 0; i < number.length(); i++) {
            char c = number.charAt(i);
            if (c == 'e' || c == 'E') {
                return true;
            }
            if (c >= '1' && c <= '9') {
                return false;
            }
        }
        return true;
    }
}
