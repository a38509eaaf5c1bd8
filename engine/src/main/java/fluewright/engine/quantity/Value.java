package fluewright.engine.quantity;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import java.util.Objects;
import javax.measure.Quantity;
import javax.measure.Unit;

/**
 * A number with its unit and basis: the JSR-385 quantity of the project's edges. It keeps the number as it was given;
 * calculations take {@link #si()}. The operator methods have the names that Groovy's operators call.
 *
 * @param <Q> the kind of quantity, where the compiler can know it
 */
public final class Value<Q extends Quantity<Q>> implements Quantity<Q>, Comparable<Value<?>> {

    private final double number;
    private final NamedUnit unit;
    private final Basis basis;

    private Value(double number, NamedUnit unit, Basis basis) {
        this.number = number;
        this.unit = unit;
        this.basis = basis;
    }

    /** Returns a number in a unit, with the basis that the unit states. */
    public static Value<?> of(double number, NamedUnit unit) {
        return of(number, unit, unit.basis());
    }

    /**
     * Returns a number in a unit on a basis.
     *
     * @throws InputException when the number is not finite
     */
    public static Value<?> of(double number, NamedUnit unit, Basis basis) {
        if (!Double.isFinite(number)) {
            throw new InputException(EngineMessage.NOT_A_NUMBER,
                    Detail.at(unit.symbol()).found(number).expected("a finite number"));
        }
        return new Value<>(number, unit, basis);
    }

    /** Returns a number in a unit named by its symbol. */
    public static Value<?> of(double number, String symbol) {
        return of(number, Units.of(symbol));
    }

    /** Returns a value in coherent SI units, expressed in a unit. */
    public static Value<?> ofSi(double si, NamedUnit unit, Basis basis) {
        return of(unit.fromSi(si), unit, basis);
    }

    /** Returns the number in its unit. */
    public double number() {
        return number;
    }

    /** Returns the unit. */
    public NamedUnit named() {
        return unit;
    }

    /** Returns the basis. */
    public Basis basis() {
        return basis;
    }

    /** Returns the value in coherent SI units. */
    public double si() {
        return unit.toSi(number);
    }

    /** Returns this value in another unit, such as {@code to(1 lb/MMBtu)}; the argument's number does not matter. */
    public Value<?> to(Value<?> other) {
        return to(other.unit);
    }

    /** Returns this value in the unit of a symbol. */
    public Value<?> to(String symbol) {
        return to(Units.of(symbol));
    }

    private Value<?> to(NamedUnit target) {
        requireSameDimension("to", target, target.symbol());
        boolean scaleChanges = unit.isTemperatureScale() != target.isTemperatureScale();
        if (scaleChanges || !basis.agreesWith(target.basis())) {
            throw mismatch("to", target.symbol());
        }
        return ofSi(si(), target, basis.or(target.basis()));
    }

    /** Returns the sum; an absolute temperature takes only a difference. */
    public Value<?> plus(Value<?> other) {
        requireComparable("+", other);
        if (unit.isTemperatureScale() && other.unit.isTemperatureScale()) {
            throw mismatch("+", other.toString());
        }
        NamedUnit target = other.unit.isTemperatureScale() ? other.unit : unit;
        return ofSi(si() + other.si(), target, basis.or(other.basis));
    }

    /** Returns the difference; of two absolute temperatures it is a difference of temperatures. */
    public Value<?> minus(Value<?> other) {
        requireComparable("-", other);
        double difference = si() - other.si();
        if (unit.isTemperatureScale() && other.unit.isTemperatureScale()) {
            return ofSi(difference, Units.of(unit.symbol().endsWith("F") ? "deltaF" : "deltaC"), Basis.NONE);
        }
        if (other.unit.isTemperatureScale()) {
            throw mismatch("-", other.toString());
        }
        return ofSi(difference, unit, basis.or(other.basis));
    }

    /** Returns a multiple. */
    @Override
    public Value<Q> multiply(Number times) {
        requireNoScale("*");
        return same(number * times.doubleValue());
    }

    /** Returns the product of two values. */
    public Value<?> multiply(Value<?> other) {
        requireNoScale("*");
        other.requireNoScale("*");
        return of(number * other.number, unit.times(other.unit));
    }

    /** Returns a part. */
    public Value<Q> div(Number parts) {
        return multiply(1 / parts.doubleValue());
    }

    /** Returns the quotient of two values; a plain number in the unit {@code 1} when both measure the same. */
    public Value<?> div(Value<?> other) {
        requireNoScale("/");
        other.requireNoScale("/");
        boolean ratio = unit.hasDimensionOf(other.unit) && !unit.symbol().equals("1") && !unit.equals(other.unit);
        return ratio ? of(si() / other.si(), Units.of("1")) : of(number / other.number, unit.per(other.unit));
    }

    /** Returns the value with its sign turned; in Groovy {@code -5.degC} is the negative of {@code 5.degC}. */
    public Value<Q> negative() {
        return same(-number);
    }

    @Override
    public int compareTo(Value<?> other) {
        requireComparable("compared with", other);
        return Double.compare(si(), other.si());
    }

    private void requireComparable(String operation, Value<?> other) {
        requireSameDimension(operation, other.unit, other.toString());
        if (!basis.agreesWith(other.basis)) {
            throw mismatch(operation, other.toString());
        }
    }

    private void requireSameDimension(String operation, NamedUnit other, String shown) {
        if (!unit.hasDimensionOf(other)) {
            throw mismatch(operation, shown);
        }
    }

    private void requireNoScale(String operation) {
        if (unit.isTemperatureScale()) {
            throw mismatch(operation, "an absolute temperature");
        }
    }

    private InputException mismatch(String operation, String other) {
        return new InputException(EngineMessage.UNITS_DO_NOT_FIT, Detail.at(this + " " + operation + " " + other)
                .expected("the same quantity on the same basis; absolute temperatures and differences (deltaC, deltaF) kept apart"));
    }

    private Value<Q> same(double changed) {
        of(changed, unit);
        return new Value<>(changed, unit, basis);
    }

    // The rest of the JSR-385 interface, in terms of the above.

    @Override
    public Quantity<Q> add(Quantity<Q> addend) {
        return cast(plus(from(addend)));
    }

    @Override
    public Quantity<Q> subtract(Quantity<Q> subtrahend) {
        return cast(minus(from(subtrahend)));
    }

    @Override
    public Quantity<?> divide(Quantity<?> divisor) {
        return div(from(divisor));
    }

    @Override
    public Quantity<Q> divide(Number divisor) {
        return div(divisor);
    }

    @Override
    public Quantity<?> multiply(Quantity<?> multiplicand) {
        return multiply(from(multiplicand));
    }

    @Override
    public Quantity<?> inverse() {
        return of(1, Units.of("1")).div(this);
    }

    @Override
    public Quantity<Q> negate() {
        return negative();
    }

    @Override
    public Quantity<Q> to(Unit<Q> target) {
        return cast(ofSi(si(), anonymous(target, getScale()), basis));
    }

    @Override
    public <T extends Quantity<T>> Quantity<T> asType(Class<T> type) {
        unit.unit().asType(type);
        return cast(this);
    }

    @Override
    public Number getValue() {
        return number;
    }

    @Override
    @SuppressWarnings("unchecked")
    public Unit<Q> getUnit() {
        return (Unit<Q>) unit.unit();
    }

    @Override
    public Scale getScale() {
        return unit.isDifference() ? Scale.RELATIVE : Scale.ABSOLUTE;
    }

    @Override
    public boolean isEquivalentTo(Quantity<Q> that) {
        return si() == from(that).si();
    }

    private static Value<?> from(Quantity<?> quantity) {
        if (quantity instanceof Value<?> value) {
            return value;
        }
        return of(quantity.getValue().doubleValue(), anonymous(quantity.getUnit(), quantity.getScale()));
    }

    private static NamedUnit anonymous(Unit<?> unit, Scale scale) {
        return NamedUnit.of(unit, scale);
    }

    @SuppressWarnings("unchecked")
    private static <T extends Quantity<T>> Quantity<T> cast(Value<?> value) {
        return (Quantity<T>) value;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Value<?> that && basis == that.basis && unit.hasDimensionOf(that.unit)
                && unit.isDifference() == that.unit.isDifference() && si() == that.si();
    }

    @Override
    public int hashCode() {
        return Objects.hash(basis, si());
    }

    /** Returns the number with all its digits, its unit and its basis. */
    @Override
    public String toString() {
        String text = Numbers.exact(number) + (unit.label().isEmpty() ? "" : " " + unit.label());
        return basis == Basis.NONE ? text : text + " " + basis.label();
    }
}
