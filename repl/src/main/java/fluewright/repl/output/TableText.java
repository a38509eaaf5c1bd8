package fluewright.repl.output;

import java.util.ArrayList;
import java.util.List;

/**
 * Rows of cells as aligned lines: texts to the left, numbers on their decimal point. The last cell of a row may be
 * wrapped to the width.
 */
final class TableText {

    private static final String GAP = "  ";

    private final List<String[]> rows = new ArrayList<>();

    /** Adds a row. */
    void row(String... cells) {
        rows.add(cells);
    }

    /** Returns the lines; columns named by index are aligned on the decimal point. */
    List<String> lines(int... numbers) {
        int columns = rows.stream().mapToInt(row -> row.length).max().orElse(0);
        for (int column : numbers) {
            alignPoints(column);
        }
        int[] widths = new int[columns];
        rows.forEach(row -> widen(widths, row));
        List<String> lines = new ArrayList<>();
        rows.forEach(row -> lines.add(line(row, widths)));
        return lines;
    }

    private static void widen(int[] widths, String[] row) {
        for (int i = 0; i < row.length; i++) {
            widths[i] = Math.max(widths[i], row[i].length());
        }
    }

    private static String line(String[] row, int[] widths) {
        StringBuilder line = new StringBuilder();
        for (int i = 0; i < row.length; i++) {
            line.append(i == 0 ? "" : GAP).append(row[i]).append(" ".repeat(widths[i] - row[i].length()));
        }
        return line.toString().stripTrailing();
    }

    private void alignPoints(int column) {
        int left = 0;
        for (String[] row : rows) {
            if (column < row.length && isNumber(row[column])) {
                left = Math.max(left, point(row[column]));
            }
        }
        for (String[] row : rows) {
            if (column < row.length && isNumber(row[column])) {
                row[column] = " ".repeat(left - point(row[column])) + row[column];
            }
        }
    }

    private static boolean isNumber(String cell) {
        return !cell.isEmpty() && "-0123456789".indexOf(cell.charAt(0)) >= 0;
    }

    private static int point(String cell) {
        int point = cell.indexOf('.');
        int exponent = cell.indexOf('E');
        return point >= 0 ? point : exponent >= 0 ? exponent : cell.length();
    }
}
