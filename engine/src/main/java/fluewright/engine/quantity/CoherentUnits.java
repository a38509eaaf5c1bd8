package fluewright.engine.quantity;

import javax.measure.Unit;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.unit.Units;

/** The coherent SI units that the rows of {@code units.csv} are made of. */
final class CoherentUnits {

    private CoherentUnits() {
    }

    static Unit<?> of(String name) {
        return switch (name) {
            case "1" -> AbstractUnit.ONE;
            case "K" -> Units.KELVIN;
            case "Pa" -> Units.PASCAL;
            case "J" -> Units.JOULE;
            case "W" -> Units.WATT;
            case "kg" -> Units.KILOGRAM;
            case "mol" -> Units.MOLE;
            case "m" -> Units.METRE;
            case "m2" -> Units.SQUARE_METRE;
            case "m3" -> Units.CUBIC_METRE;
            case "s" -> Units.SECOND;
            default -> throw new IllegalStateException("units.csv names the unknown coherent unit " + name);
        };
    }
}
