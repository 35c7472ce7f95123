package org.ductledger.flow;

import java.util.List;
import java.util.function.Function;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.ductledger.catalogue.CellForm;

/** The cell forms of the named gases: {@link GasTable} written out as nested IFs over {gas} and {t}. */
final class GasCells {
    private static final int HEAT_COEFFICIENTS = 7;
    private static final int VISCOSITY_COEFFICIENTS = 4;

    private GasCells() {}

    static String molarMass() {
        return byGas(IntStream.range(0, GasTable.NAMES.length)
                .mapToObj(i -> Double.toString(GasTable.MOLAR_MASS[i]))
                .toList());
    }

    static CellForm.Builder heat() {
        return coefficients(GasTable.HEAT, HEAT_COEFFICIENTS)
                .helper(
                        "cp_over_r",
                        "IF(AND({t}>={lowest},{t}<={highest}),({a1}/{t}+{a2})/{t}+{a3}"
                                + "+{t}*({a4}+{t}*({a5}+{t}*({a6}+{t}*{a7}))),NA())");
    }

    static CellForm viscosity() {
        return coefficients(GasTable.VISCOSITY, VISCOSITY_COEFFICIENTS)
                .result("IF(AND({t}>={lowest},{t}<={highest}),IF({gas}=\"air\",{a1}*{t}*SQRT({t})/({t}+{a2}),"
                        + "1E-7*EXP({a1}*LN({t})+({a2}+{a3}/{t})/{t}+{a4})),NA())");
    }

    private static CellForm.Builder coefficients(double[][][] table, int count) {
        CellForm.Builder cells = CellForm.steps()
                .helper("lowest", byGas(numbers(table, ranges -> number(ranges[0], 0))))
                .helper("highest", byGas(numbers(table, ranges -> number(ranges[ranges.length - 1], 1))));
        for (int i = 1; i <= count; i++) {
            int place = i + 1;
            cells.helper("a" + i, byGas(numbers(table, ranges -> byRange(ranges, place))));
        }
        return cells;
    }

    private static List<String> numbers(double[][][] table, Function<double[][], String> formula) {
        return Stream.of(table).map(formula).toList();
    }

    /** One formula for each gas. */
    private static String byGas(List<String> formulas) {
        StringBuilder nested = new StringBuilder();
        for (int i = 0; i < formulas.size(); i++) {
            nested.append("IF({gas}=\"").append(GasTable.NAMES[i]).append("\",");
            nested.append(formulas.get(i)).append(",");
        }
        return nested + "NA()" + ")".repeat(formulas.size());
    }

    /** One coefficient for each range of temperature. */
    private static String byRange(double[][] ranges, int place) {
        StringBuilder nested = new StringBuilder();
        int last = ranges.length - 1;
        for (int i = 0; i < last; i++) {
            nested.append("IF({t}<=").append(ranges[i][1]).append(",");
            nested.append(number(ranges[i], place)).append(",");
        }
        return nested + number(ranges[last], place) + ")".repeat(last);
    }

    /** Sutherland's equation has fewer coefficients than the fits. */
    private static String number(double[] range, int place) {
        return Double.toString(place < range.length ? range[place] : 0);
    }
}
