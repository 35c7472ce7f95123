package org.ductledger.command;

/** Text for a terminal: headings, and items that are wrapped and indented under them. */
final class Paragraphs {
    private static final int WIDTH = 100;
    private static final String INDENT = "  ";
    private static final String HANGING = "      ";

    private final StringBuilder text = new StringBuilder();

    void line(String line) {
        text.append(line).append('\n');
    }

    void heading(String heading) {
        text.append('\n').append(heading).append('\n');
    }

    /** An item, wrapped between words; a word longer than a line stays whole. */
    void item(String item) {
        StringBuilder line = new StringBuilder(INDENT);
        boolean empty = true;
        for (String word : item.split(" ", -1)) {
            if (!empty && line.length() + 1 + word.length() > WIDTH) {
                line(line.toString());
                line = new StringBuilder(HANGING);
                empty = true;
            }
            line.append(empty ? "" : " ").append(word);
            empty = false;
        }
        line(line.toString());
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
