package undermask.input;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** Finds the known name that somebody may have meant. */
final class NearestName {
    private static final int SHORTEST_PART = 3;

    private NearestName() {}

    /**
     * The known name with the fewest slips of the pen to a written one: letters left out, added, replaced, or swapped
     * with their neighbour; upper and lower case count as the same. Of equals, the one that begins alike longest. Where
     * none is near, the first that holds all that was written.
     *
     * @return empty when even the nearest name differs in more than a third of the letters and none holds what was
     *     written
     */
    static Optional<String> of(String written, Collection<String> known) {
        String folded = written.toLowerCase(Locale.ROOT);
        return known.stream()
                .min(Comparator.comparingInt((String name) -> slips(folded, name.toLowerCase(Locale.ROOT)))
                        .thenComparingInt(name -> -sharedStart(folded, name.toLowerCase(Locale.ROOT)))
                        .thenComparing(Comparator.naturalOrder()))
                .filter(name -> slips(folded, name.toLowerCase(Locale.ROOT)) <= Math.max(1, name.length() / 3))
                .or(() -> known.stream()
                        .filter(name -> folded.length() >= SHORTEST_PART
                                && name.toLowerCase(Locale.ROOT).contains(folded))
                        .min(Comparator.naturalOrder()));
    }

    /**
     * The end of a message about an unknown name: {@code ; nearest: …} when one is near, and what is known.
     *
     * @param known what is known, in words
     */
    static String hint(String written, Collection<String> names, String known) {
        return of(written, names).map(name -> "; nearest: " + name).orElse("") + "; " + known;
    }

    private static int sharedStart(String a, String b) {
        int length = 0;
        while (length < Math.min(a.length(), b.length()) && a.charAt(length) == b.charAt(length)) {
            length++;
        }
        return length;
    }

    /** Distance of two words in single slips (Damerau 1964, Levenshtein 1966; neighbours are swapped at most once). */
    private static int slips(String a, String b) {
        int[] beforeLast = new int[b.length() + 1];
        int[] last = new int[b.length() + 1];
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] spare = beforeLast;
            beforeLast = last;
            last = row;
            row = spare;
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replaced = last[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, Math.min(last[j], row[j - 1]) + 1);
                boolean swapped =
                        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
                if (swapped) {
                    row[j] = Math.min(row[j], beforeLast[j - 2] + 1);
                }
            }
        }
        return row[b.length()];
    }
}
