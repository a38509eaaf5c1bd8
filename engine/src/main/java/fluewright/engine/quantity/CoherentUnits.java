package fluewright.engine.quantity;

import javax.measure.Unit;
import javax.measure.quantity.AmountOfSubstance;
import javax.measure.quantity.Length;
import javax.measure.quantity.Mass;
import javax.measure.quantity.Temperature;
import javax.measure.quantity.Time;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.unit.BaseUnit;
import tech.units.indriya.unit.UnitDimension;

/**
 * The coherent SI units that the rows of {@code units.csv} are made of. They are made of the library's base units, for
 * its table of all SI units takes longer to set up than the shell has to start.
 */
final class CoherentUnits {

    private static final Unit<Length> METRE = new BaseUnit<>("m", "metre", UnitDimension.LENGTH);
    private static final Unit<Mass> KILOGRAM = new BaseUnit<>("kg", "kilogram", UnitDimension.MASS);
    private static final Unit<Time> SECOND = new BaseUnit<>("s", "second", UnitDimension.TIME);
    private static final Unit<Temperature> KELVIN = new BaseUnit<>("K", "kelvin", UnitDimension.TEMPERATURE);
    private static final Unit<AmountOfSubstance> MOLE = new BaseUnit<>("mol", "mole", UnitDimension.AMOUNT_OF_SUBSTANCE);

    private CoherentUnits() {
    }

    static Unit<?> of(String name) {
        return switch (name) {
            case "1" -> AbstractUnit.ONE;
            case "K" -> KELVIN;
            case "Pa" -> KILOGRAM.divide(METRE).divide(SECOND.pow(2));
            case "J" -> KILOGRAM.multiply(METRE.pow(2)).divide(SECOND.pow(2));
            case "W" -> KILOGRAM.multiply(METRE.pow(2)).divide(SECOND.pow(3));
            case "kg" -> KILOGRAM;
            case "mol" -> MOLE;
            case "m" -> METRE;
            case "m2" -> METRE.pow(2);
            case "m3" -> METRE.pow(3);
            case "s" -> SECOND;
            default -> throw new IllegalStateException("units.csv names the unknown coherent unit " + name);
        };
    }
}
