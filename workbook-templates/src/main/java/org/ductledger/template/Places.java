package org.ductledger.template;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Where everything of a workbook stands: the sheets say it as they are written, the record asks for it. */
final class Places {
    private final Map<String, List<String>> shown = new HashMap<>();
    private final Map<String, String> filled = new HashMap<>();
    private final Map<String, List<String>> coherent = new HashMap<>();
    private final Map<String, Map<Integer, String>> arguments = new HashMap<>();

    /** The cells, or the one range, that show a quantity or a live result in its unit. */
    void show(String name, List<String> cells) {
        shown.put(name, cells);
    }

    List<String> shown(String name) {
        return shown.getOrDefault(name, List.of());
    }

    /** The cell or range of a call's filled value. */
    void fill(String call, String cells) {
        filled.put(call, cells);
    }

    String filled(String call) {
        return filled.getOrDefault(call, "");
    }

    /** The cells, one a row, that hold a single quantity or result in its coherent unit, as live formulas take it. */
    void hold(String name, List<String> cells) {
        coherent.put(name, cells);
    }

    List<String> held(String name) {
        return coherent.getOrDefault(name, List.of());
    }

    /** The range that holds an argument of a call in a table. */
    void argument(String call, int place, String range) {
        arguments.computeIfAbsent(call, key -> new HashMap<>()).put(place, range);
    }

    /** The range that holds an argument of a call in a table; empty where there is none of its own. */
    String argument(String call, int place) {
        return arguments.getOrDefault(call, Map.of()).getOrDefault(place, "");
    }
}
