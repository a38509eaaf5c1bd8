package fluewright.repl.language;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;

/** Finds what the user may have meant by a name that does not exist. */
public final class Nearest {
    private static final int LIMIT = 3;

    private Nearest() {
    }

    /** At most three of the names, the nearest first; empty when none is near. */
    public static List<String> of(String wanted, Collection<String> names) {
        int allowed = Math.max(1, wanted.length() / 3);
        return names.stream().distinct()
            .filter(name -> distance(wanted, name) <= allowed)
            .sorted(Comparator.<String>comparingInt(name -> distance(wanted, name))
                .thenComparing(Comparator.naturalOrder()))
            .limit(LIMIT).toList();
    }

    /** Edit steps between two names, upper and lower case alike; a swap of neighbours is one step. */
    static int distance(String first, String second) {
        String a = first.toLowerCase();
        String b = second.toLowerCase();
        int[][] steps = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                steps[i][j] = i == 0 || j == 0 ? i + j : cheapest(steps, a, b, i, j);
            }
        }
        return steps[a.length()][b.length()];
    }

    private static int cheapest(int[][] steps, String a, String b, int i, int j) {
        boolean same = a.charAt(i - 1) == b.charAt(j - 1);
        int best = Math.min(steps[i - 1][j - 1] + (same ? 0 : 1),
            1 + Math.min(steps[i - 1][j], steps[i][j - 1]));
        boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(best, steps[i - 2][j - 2] + 1) : best;
    }
}
