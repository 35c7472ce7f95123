package org.ductledger.sheet;

/** How many lines a wrapped text takes: heights are set here, since a headless machine cannot measure letters. */
final class Lines {
    /** Widths count digits of the body's letters, of which Arial's average letter takes less. */
    private static final double LETTERS_PER_WIDTH = 1.15;

    /** What the indents of a cell take, in widths. */
    private static final int INDENT = 2;

    private Lines() {}

    /**
     * The lines of a text.
     *
     * @param width of the column, in digits of the body's letters
     * @param points the size of the text's letters
     */
    static int needed(String text, int width, int points) {
        double letters = (width - INDENT) * LETTERS_PER_WIDTH * Look.Font.PLAIN.points / points;
        int lines = 0;
        for (String paragraph : text.split("\n", -1)) {
            lines += paragraphLines(paragraph, Math.max(1, (int) letters));
        }
        return lines;
    }

    private static int paragraphLines(String paragraph, int width) {
        int lines = 1;
        int used = 0;
        for (String word : paragraph.split(" ", -1)) {
            int needed = used == 0 ? word.length() : used + 1 + word.length();
            if (needed > width && used > 0) {
                lines++;
                needed = word.length();
            }
            lines += (needed - 1) / width;
            used = needed > width ? needed % width : needed;
        }
        return lines;
    }
}
