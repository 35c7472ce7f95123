package org.ductledger.sheet;

/** How many lines a wrapped text takes: heights are set here, since a headless machine cannot measure letters. */
final class Lines {
    /** Arial is narrower than the digits that column widths count, but words break early: near enough alike. */
    private static final double CHARACTERS_PER_WIDTH = 1.05;

    private Lines() {}

    static int needed(String text, int width) {
        int lines = 0;
        for (String paragraph : text.split("\n", -1)) {
            lines += paragraphLines(paragraph, Math.max(1, (int) (width * CHARACTERS_PER_WIDTH)));
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
