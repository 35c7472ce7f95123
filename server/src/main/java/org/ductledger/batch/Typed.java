package org.ductledger.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.jspecify.annotations.Nullable;

/** Arguments as they are typed, in a command or in a spreadsheet's cell: {@code 1.4}, {@code 7 bar}, {@code subsonic}. */
public final class Typed {
    /** A number as it stands in a text, and what stands after it. */
    private record Head(double value, String rest) {}

    private Typed() {}

    /**
     * One value, with a unit after it or none. The decimal sign is a point or a comma, as the spreadsheet's language
     * has it; there is no sign between thousands.
     *
     * @throws DocumentRefusedException if it is empty, or a number beyond a double
     */
    public static Given.Values cell(String argument, String text) throws DocumentRefusedException {
        String given = given(argument, text);
        if (!Decimal.begins(given)) {
            return words(true, given);
        }
        char sign = given.indexOf(',') >= 0 && !hasPointBefore(given, given.indexOf(',')) ? ',' : '.';
        Head head = head(argument, given, sign);
        return numbers(true, unit(head.rest()), head.value());
    }

    private static boolean hasPointBefore(String text, int comma) {
        int point = text.indexOf('.');
        return point >= 0 && point < comma;
    }

    /**
     * One value, or several between commas, with a unit after the last: {@code 7}, {@code 7bar}, {@code "1,2,3 bar"},
     * {@code weak,strong}. The decimal sign is a point.
     *
     * @throws DocumentRefusedException if a part is empty, or a number beyond a double
     */
    public static Given.Values list(String argument, String text) throws DocumentRefusedException {
        String given = given(argument, text);
        String[] parts = given.split(",", -1);
        boolean one = parts.length == 1;
        if (!Decimal.begins(given)) {
            List<String> words = new ArrayList<>();
            for (String part : parts) {
                words.add(given(argument, part));
            }
            return words(one, words.toArray(String[]::new));
        }
        double[] values = new double[parts.length];
        String unit = "";
        for (int i = 0; i < parts.length; i++) {
            Head head = head(argument, given(argument, parts[i]), '.');
            values[i] = head.value();
            unit = head.rest();
            if (i < parts.length - 1 && !unit.isEmpty()) {
                throw refused(argument + " takes numbers between commas and one unit after the last, got '" + parts[i]
                        + "' among them");
            }
        }
        return numbers(one, unit(unit), values);
    }

    private static String given(String argument, String text) throws DocumentRefusedException {
        String given = text.strip();
        if (given.isEmpty()) {
            throw new DocumentRefusedException(
                    new Reason(FaultKind.MISSING_ARGUMENT.label(), "", argument + " is given without a value"));
        }
        return given;
    }

    private static Head head(String argument, String text, char sign) throws DocumentRefusedException {
        int length = Decimal.length(text, sign);
        double value = Decimal.parse(text.substring(0, length).replace(sign, '.'));
        if (Double.isNaN(value)) {
            throw refused(argument + " must be a number within the range of a double (about 4.9e-324 to 1.8e308), got "
                    + Characters.brief(text));
        }
        return new Head(value, text.substring(length).strip());
    }

    private static DocumentRefusedException refused(String detail) {
        return new DocumentRefusedException(new Reason(FaultKind.NOT_A_NUMBER.label(), "", detail));
    }

    private static @Nullable String unit(String rest) {
        return rest.isEmpty() ? null : rest;
    }

    private static Given.Values words(boolean one, String... words) {
        return new Given.Values(new Column.Texts(Arrays.asList(words)), one, null);
    }

    private static Given.Values numbers(boolean one, @Nullable String unit, double... values) {
        return new Given.Values(new Column.Numbers(values), one, unit);
    }
}
