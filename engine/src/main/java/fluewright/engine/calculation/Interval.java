package fluewright.engine.calculation;

import fluewright.engine.quantity.ValueText;

/**
 * An interval of values in coherent SI units.
 *
 * @param text         the interval as declared, for people
 * @param low          lower end
 * @param lowIncluded  whether the lower end belongs to it
 * @param high         upper end
 * @param highIncluded whether the upper end belongs to it
 */
public record Interval(String text, double low, boolean lowIncluded, double high, boolean highIncluded) {

    /** Every number. */
    public static final Interval ALL = new Interval("", Double.NEGATIVE_INFINITY, true, Double.POSITIVE_INFINITY, true);

    /** Returns the interval written as {@code "[0 %, 100 %)"}: a bracket includes its end, a parenthesis does not. */
    public static Interval parse(String text) {
        if (text.isEmpty()) {
            return ALL;
        }
        int comma = text.indexOf(',');
        return new Interval(text, end(text.substring(1, comma)), text.startsWith("["),
                end(text.substring(comma + 1, text.length() - 1)), text.endsWith("]"));
    }

    private static double end(String text) {
        return switch (text.strip()) {
            case "inf" -> Double.POSITIVE_INFINITY;
            case "-inf" -> Double.NEGATIVE_INFINITY;
            default -> ValueText.parse(text.strip()).si();
        };
    }

    /** Tells whether a value lies in the interval; NaN never does. */
    public boolean contains(double si) {
        boolean above = lowIncluded ? si >= low : si > low;
        boolean below = highIncluded ? si <= high : si < high;
        return above && below;
    }
}
