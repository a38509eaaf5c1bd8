package fluewright.repl.function;

import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.Value;

/** Gives Groovy's numbers units ({@code 3.pct}, {@code 180.degC}) and lets them multiply and divide by quantities. */
public final class NumberUnits {

    private NumberUnits() {
    }

    /**
     * Returns the number in the unit of a symbol.
     *
     * @throws fluewright.engine.message.InputException when there is no such unit
     */
    public static Object propertyMissing(Number self, String symbol) {
        return Value.of(self.doubleValue(), Units.of(symbol));
    }

    /** Returns a multiple of a quantity. */
    public static Object multiply(Number self, Value<?> quantity) {
        return quantity.multiply(self);
    }

    /** Returns the number over a quantity. */
    public static Object div(Number self, Value<?> quantity) {
        return Value.of(self.doubleValue(), Units.of("1")).div(quantity);
    }
}
