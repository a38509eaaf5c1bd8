package fluewright.support;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.util.Arrays;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A published value with the tolerance and the source that its file states.
 *
 * @param id         the row's name
 * @param quantity   what the value is
 * @param inputs     what it was got from
 * @param expected   the value or values
 * @param unit       their unit
 * @param tolerance  how near an independent calculation has to come
 * @param source     where it is published
 * @param provenance whether it was read in a copy, is from memory, or was computed
 */
public record Check(String id, String quantity, String inputs, String expected, String unit, String tolerance, String source,
                    String provenance) {

    private static final String NUMBER = "(-?[0-9]+(?:\\.[0-9]+)?(?:[eE][-+]?[0-9]+)?)";
    private static final Pattern TOLERANCE = Pattern.compile("(abs|rel) " + NUMBER + "(%?)");
    /** The rounding of a double, for values that a rule fixes. */
    private static final double EXACT = 1e-12;

    static Check of(NamedCsvRecord row) {
        return new Check(row.getField("id"), row.getField("quantity"), row.getField("inputs"), row.getField("expected"),
                row.getField("unit"), row.getField("tolerance"), row.getField("source"), row.getField("provenance"));
    }

    /** Returns the number behind a name in the inputs: {@code O2=3 % dry} or {@code excess air 15 %}. */
    public double input(String name) {
        return number(name, inputs);
    }

    /** Tells whether the inputs have a number behind a name. */
    public boolean has(String name) {
        return behind(name, inputs).find();
    }

    /** Returns the first part of the inputs, without its {@code fuel=}. */
    public String fuel() {
        return inputs.split(";")[0].replaceFirst("^(fuel|gas)=", "").strip();
    }

    /** Returns the only number expected. */
    public double value() {
        return Double.parseDouble(expected);
    }

    /** Returns the expected number behind a name: {@code Hi 34.02; Hs 37.78}. */
    public double expected(String name) {
        return number(name, expected);
    }

    /** Returns the expected numbers of a list: {@code 12.1 / 9.9 / 8.4}. */
    public double[] list() {
        return Arrays.stream(expected.split("/")).mapToDouble(Double::parseDouble).toArray();
    }

    /** Asserts that the only expected number is met. */
    public void verify(double actual) {
        verify(value(), actual);
    }

    /** Asserts that one of the expected numbers is met within the row's tolerance. */
    public void verify(double number, double actual) {
        assertEquals(number, actual, allowance(number), this::toString);
    }

    /** Asserts that a number lies in the expected range: {@code 58 to 60} or {@code 1.600..1.836}. */
    public void verifyRange(double actual) {
        double[] ends = Arrays.stream(expected.split(" to |\\.\\.")).mapToDouble(Double::parseDouble).toArray();
        assertTrue(actual >= ends[0] && actual <= ends[1], () -> this + ": " + actual);
    }

    private double allowance(double number) {
        Matcher matcher = TOLERANCE.matcher(tolerance);
        if (!matcher.find()) {
            assertTrue(tolerance.startsWith("exact"), () -> id + " has no tolerance that can be read: " + tolerance);
            return EXACT * Math.abs(number);
        }
        double size = Double.parseDouble(matcher.group(2)) / (matcher.group(3).isEmpty() ? 1 : 100);
        return matcher.group(1).equals("abs") ? size : size * Math.abs(number);
    }

    private static double number(String name, String text) {
        Matcher matcher = behind(name, text);
        assertTrue(matcher.find(), () -> "no " + name + " in: " + text);
        return Double.parseDouble(matcher.group(1));
    }

    private static Matcher behind(String name, String text) {
        return Pattern.compile("(?<![A-Za-z0-9])" + Pattern.quote(name) + "[ =]" + NUMBER).matcher(text);
    }

    @Override
    public String toString() {
        return id + " " + quantity + ", " + inputs + " [" + source + "; " + provenance + "]";
    }
}
