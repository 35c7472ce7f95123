package org.ductledger.template;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Collectors;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Source;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.PageSetup;

/** The sheet {@code Sources}: the functions of the workbook, their revisions, formulas and sources. */
final class SourcesSheet {
    static final String NAME = "Sources";

    private static final int LAST = 4;

    private SourcesSheet() {}

    static void write(Layout layout, Grid grid) {
        grid.widths(36, 9, 40, 56, 64);
        grid.text(0, 0, Look.TITLE, "Sources");
        grid.height(0, 24);
        grid.across(
                1,
                0,
                LAST,
                Look.NOTE,
                "The functions that this workbook calls, from the library "
                        + layout.draft().catalogue().version() + ", and where each comes from.");
        grid.heads(3, 0, Look.COLUMN_HEAD, "Function", "Revision", "What it gives", "Formula", "Sources");
        int row = 4;
        for (FunctionEntry entry : functions(layout).values()) {
            write(grid, row++, entry);
        }
        PageSetup.repeat(grid, 3, 3);
        grid.poi().createFreezePane(0, 4);
        layout.page().apply(grid, true, "$A$1:$E$" + row);
    }

    private static Map<String, FunctionEntry> functions(Layout layout) {
        Map<String, FunctionEntry> functions = new LinkedHashMap<>();
        layout.draft()
                .calls()
                .values()
                .forEach(call -> functions.putIfAbsent(call.entry().name(), call.entry()));
        return functions;
    }

    private static void write(Grid grid, int row, FunctionEntry entry) {
        String what = entry.title() + (entry.note().isEmpty() ? "" : ". " + entry.note());
        String sources = entry.sources().stream().map(Source::toString).collect(Collectors.joining("\n"));
        String[] texts = {entry.name(), Integer.toString(entry.revision()), what, entry.formula(), sources};
        for (int i = 0; i < texts.length; i++) {
            grid.text(row, i, Look.TEXT, texts[i]);
        }
    }
}
