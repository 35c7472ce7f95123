package org.ductledger.catalogue;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Guesses what a mistyped name may have meant. */
public final class Spelling {
    private static final int LONGEST_COMPARED = 60;

    private Spelling() {}

    /**
     * The names within about a third of the given letters, the nearest first, at most so many; the case of letters
     * counts last.
     */
    public static List<String> near(String given, Collection<String> names, int most) {
        if (given.length() > LONGEST_COMPARED) {
            return List.of();
        }
        int allowed = (given.length() + 1) / 3;
        String plain = given.toLowerCase(Locale.ROOT);
        record Near(String name, int distance, int exact) {}
        return names.stream()
                .map(name -> new Near(name, distance(plain, name.toLowerCase(Locale.ROOT)), distance(given, name)))
                .filter(near -> near.distance <= allowed)
                .sorted(Comparator.comparingInt(Near::distance).thenComparingInt(Near::exact))
                .limit(most)
                .map(Near::name)
                .toList();
    }

    /** The edit distance of Levenshtein. */
    private static int distance(String a, String b) {
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int above = row[j];
                int change = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(change, 1 + Math.min(above, row[j - 1]));
                diagonal = above;
            }
        }
        return row[b.length()];
    }
}
