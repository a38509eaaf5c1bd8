package fluewright.engine.quantity;

import javax.measure.Dimension;
import javax.measure.Quantity;
import javax.measure.Unit;
import javax.measure.UnitConverter;

/**
 * A unit with the symbol that people type: a JSR-385 unit, its scale (absolute or difference), and the basis where the
 * unit itself states one.
 */
public final class NamedUnit {

    private final String symbol;
    private final Unit<?> unit;
    private final Quantity.Scale scale;
    private final Basis basis;
    private final double factor;
    private final double offset;
    private final Dimension dimension;

    NamedUnit(String symbol, Unit<?> unit, Quantity.Scale scale, Basis basis) {
        this.symbol = symbol;
        this.unit = unit;
        this.scale = scale;
        this.basis = basis;
        this.dimension = unit.getDimension();
        UnitConverter toSystem = toSystem(unit);
        this.offset = toSystem.convert(0.0);
        this.factor = offset == 0 ? toSystem.convert(1.0) : (toSystem.convert(1000.0) - offset) / 1000;
    }

    private static <Q extends Quantity<Q>> UnitConverter toSystem(Unit<Q> unit) {
        return unit.getConverterTo(unit.getSystemUnit());
    }

    /** Returns the symbol, as typed and printed. */
    public String symbol() {
        return symbol;
    }

    /** Returns the symbol as printed beside a number: a percent sign for pct, nothing for a pure number. */
    public String label() {
        return switch (symbol) {
            case "pct" -> "%";
            case "1" -> "";
            case "ppmvd", "ppmvw" -> "ppm";
            default -> symbol;
        };
    }

    /** Returns the JSR-385 unit. */
    public Unit<?> unit() {
        return unit;
    }

    /** Returns the basis that the unit itself states. */
    public Basis basis() {
        return basis;
    }

    /** Tells whether numbers in this unit are differences of temperatures. */
    public boolean isDifference() {
        return scale == Quantity.Scale.RELATIVE;
    }

    /** Tells whether this is an absolute temperature scale, on which sums and multiples have no meaning. */
    public boolean isTemperatureScale() {
        return !isDifference() && hasDimensionOf(Units.of("K"));
    }

    /** Tells whether both units measure the same dimension. */
    public boolean hasDimensionOf(NamedUnit other) {
        return this == other || dimension.equals(other.dimension);
    }

    /** Returns the number in coherent SI units. */
    public double toSi(double number) {
        return number * factor + offset;
    }

    /** Returns the number in this unit of a value in coherent SI units. */
    public double fromSi(double si) {
        return (si - offset) / factor;
    }

    NamedUnit times(NamedUnit other) {
        return new NamedUnit(joined(other, "*"), unit.multiply(other.unit), Quantity.Scale.ABSOLUTE, Basis.NONE);
    }

    NamedUnit per(NamedUnit other) {
        return new NamedUnit(joined(other, "/"), unit.divide(other.unit), Quantity.Scale.ABSOLUTE, Basis.NONE);
    }

    private String joined(NamedUnit other, String operator) {
        boolean compound = operator.equals("/") && other.symbol.matches(".*[*/].*");
        return symbol + operator + (compound ? "(" + other.symbol + ")" : other.symbol);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof NamedUnit that && symbol.equals(that.symbol);
    }

    @Override
    public int hashCode() {
        return symbol.hashCode();
    }

    @Override
    public String toString() {
        return symbol;
    }
}
