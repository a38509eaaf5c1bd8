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
    private final Unit<?> coherent;
    private final double factor;
    private final double offset;
    private final Quantity.Scale scale;
    private final Basis basis;
    private final Dimension dimension;

    /**
     * Makes a unit of {@code SI value = (number + offset) * factor}.
     *
     * @param coherent the coherent SI unit
     */
    NamedUnit(String symbol, Unit<?> coherent, double factor, double offset, Quantity.Scale scale, Basis basis) {
        this.symbol = symbol;
        this.coherent = coherent;
        this.factor = factor;
        this.offset = offset;
        this.scale = scale;
        this.basis = basis;
        this.dimension = coherent.getDimension();
    }

    /** Returns the unit of a JSR-385 unit from elsewhere. */
    static NamedUnit of(Unit<?> unit, Quantity.Scale scale) {
        UnitConverter toSystem = toSystem(unit);
        double zero = toSystem.convert(0.0);
        double slope = zero == 0 ? toSystem.convert(1.0) : (toSystem.convert(1000.0) - zero) / 1000;
        return new NamedUnit(unit.toString(), unit.getSystemUnit(), slope, zero / slope, scale, Basis.NONE);
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

    /** Returns the JSR-385 unit; made when asked for, since the library's factors take long to load. */
    public Unit<?> unit() {
        Unit<?> scaled = factor == 1 ? coherent : coherent.multiply(factor);
        return offset == 0 ? scaled : scaled.shift(offset);
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
        return (number + offset) * factor;
    }

    /** Returns the number in this unit of a value in coherent SI units. */
    public double fromSi(double si) {
        return si / factor - offset;
    }

    NamedUnit times(NamedUnit other) {
        return new NamedUnit(joined(other, "*"), coherent.multiply(other.coherent), factor * other.factor, 0,
                Quantity.Scale.ABSOLUTE, Basis.NONE);
    }

    NamedUnit per(NamedUnit other) {
        return new NamedUnit(joined(other, "/"), coherent.divide(other.coherent), factor / other.factor, 0,
                Quantity.Scale.ABSOLUTE, Basis.NONE);
    }

    private String joined(NamedUnit other, String operator) {
        boolean compound = operator.equals("/") && (other.symbol.indexOf('/') >= 0 || other.symbol.indexOf('*') >= 0);
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
