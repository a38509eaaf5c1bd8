package fluewright.engine.quantity;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;

/** Reads a number with a unit from text, such as {@code 45.4 MJ/kg}, {@code 3 %} or {@code 1.2}. */
public final class ValueText {

    private ValueText() {
    }

    /**
     * Returns the value of a text; without a unit it is a pure number.
     *
     * @throws InputException when the text is no finite number, or the unit is unknown
     */
    public static Value<?> parse(String text) {
        String trimmed = text.strip();
        int end = 0;
        while (end < trimmed.length() && "+-0123456789.eE".indexOf(trimmed.charAt(end)) >= 0) {
            end++;
        }
        String unit = trimmed.substring(end).strip();
        return Value.of(number(trimmed.substring(0, end), text), unit.isEmpty() ? Units.of("1") : unit(unit, text));
    }

    private static double number(String digits, String text) {
        try {
            return Double.parseDouble(digits);
        } catch (NumberFormatException e) {
            throw new InputException(EngineMessage.NOT_A_VALUE,
                    Detail.NONE.found(text).expected("a number and a unit, such as 45.4 MJ/kg or 3 %"), e);
        }
    }

    private static NamedUnit unit(String symbol, String text) {
        return Units.find(symbol).orElseThrow(() -> new InputException(EngineMessage.UNKNOWN_UNIT,
                Detail.NONE.found(text).expected("a unit such as %, degC, kPa, MJ/kg")
                        .nearest(NearestName.of(symbol, Units.docs().keySet()))));
    }
}
