package org.ductledger.batch;

import java.nio.charset.StandardCharsets;

/** Texts that are written back to who gave them. */
final class Characters {
    private static final int BRIEF = 40;

    private Characters() {}

    /** The text in quotes, cut where it is long. */
    static String brief(String text) {
        return "'" + (text.length() > BRIEF ? text.substring(0, BRIEF) + "..." : text) + "'";
    }

    /** The text, with a question mark for each half of a surrogate pair that stands alone and is no character. */
    static String whole(String text) {
        for (int i = 0; i < text.length(); i++) {
            if (Character.isSurrogate(text.charAt(i))) {
                return new String(text.getBytes(StandardCharsets.UTF_8), StandardCharsets.UTF_8);
            }
        }
        return text;
    }
}
