package fluewright.engine.message;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;

/** Finds the valid name that somebody most likely meant. */
public final class NearestName {

    private NearestName() {
    }

    /**
     * Returns the valid name nearest to the given one by edit distance, case ignored, or an empty text when none is
     * near (more than a third of the letters would have to change, and neither contains the other).
     */
    public static String of(String given, Collection<String> valid) {
        return valid.stream()
                .filter(name -> isNear(given, name))
                .min(Comparator.comparingInt((String name) -> distance(fold(given), fold(name))).thenComparing(name -> name))
                .orElse("");
    }

    private static boolean isNear(String given, String name) {
        String a = fold(given);
        String b = fold(name);
        boolean contained = Math.min(a.length(), b.length()) >= 3 && (a.contains(b) || b.contains(a));
        return contained || distance(a, b) <= Math.max(1, Math.max(a.length(), b.length()) / 3);
    }

    private static String fold(String name) {
        return name.toLowerCase(Locale.ROOT);
    }

    /** The optimal string alignment distance: insertions, deletions, changes and swaps of neighbours. */
    private static int distance(String a, String b) {
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                d[i][j] = i == 0 || j == 0 ? i + j : cheapest(a, b, d, i, j);
            }
        }
        return d[a.length()][b.length()];
    }

    private static int cheapest(String a, String b, int[][] d, int i, int j) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        int best = Math.min(Math.min(d[i - 1][j], d[i][j - 1]) + 1, d[i - 1][j - 1] + change);
        boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(best, d[i - 2][j - 2] + 1) : best;
    }
}
