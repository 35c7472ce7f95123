package org.ductledger.sheet;

import org.apache.poi.ss.usermodel.ConditionalFormattingRule;
import org.apache.poi.ss.usermodel.FontFormatting;
import org.apache.poi.ss.usermodel.PatternFormatting;
import org.apache.poi.ss.usermodel.SheetConditionalFormatting;
import org.apache.poi.ss.util.CellRangeAddress;

/** Colours that come and go with what a cell says; the words are in the cell, the colour only draws the eye. */
public final class Alerts {
    private Alerts() {}

    /** Marks the cells of a range that say none of these words. */
    public static void unless(Grid grid, CellRangeAddress range, String... words) {
        String first = new CellRangeAddress(
                        range.getFirstRow(), range.getFirstRow(), range.getFirstColumn(), range.getFirstColumn())
                .formatAsString();
        StringBuilder condition = new StringBuilder("AND(" + first + "<>\"\"");
        for (String word : words) {
            condition.append(',').append(first).append("<>").append(Literals.text(word));
        }
        ConditionalFormattingRule rule = rules(grid)
                .createConditionalFormattingRule(condition.append(')').toString());
        PatternFormatting fill = rule.createPatternFormatting();
        fill.setFillPattern(PatternFormatting.SOLID_FOREGROUND);
        fill.setFillBackgroundColor(Palette.BLUSH.color());
        FontFormatting letters = rule.createFontFormatting();
        letters.setFontStyle(false, true);
        letters.setFontColor(Palette.BRICK.color());
        rules(grid).addConditionalFormatting(new CellRangeAddress[] {range}, rule);
    }

    /** Lets the error values of a range step back: they belong to branches that a case does not take. */
    public static void quietErrors(Grid grid, CellRangeAddress range) {
        String first = new CellRangeAddress(
                        range.getFirstRow(), range.getFirstRow(), range.getFirstColumn(), range.getFirstColumn())
                .formatAsString();
        ConditionalFormattingRule rule = rules(grid).createConditionalFormattingRule("ISERROR(" + first + ")");
        rule.createFontFormatting().setFontColor(Palette.RULE.color());
        rules(grid).addConditionalFormatting(new CellRangeAddress[] {range}, rule);
    }

    private static SheetConditionalFormatting rules(Grid grid) {
        return grid.poi().getSheetConditionalFormatting();
    }
}
