package fluewright.engine.dewpoint;

import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.combustion.Firing;
import fluewright.engine.combustion.FlueGas;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.species.WaterSaturation;
import java.util.OptionalDouble;

/** The calculation {@code dewPoint}: the temperature at which the water of a flue gas begins to condense. */
public final class WaterDewPoint implements Calculation<WaterDewPoint.Input, WaterDewPoint.Result> {

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("dewPoint", "water dew point of the flue gas at the pressure of the stack", Input.class, Result.class)
            .source("IAPWS-IF97 region 4, equation 31: T = Tsat(x_H2O p), 273.16 to 647.096 K")
            .source("below 273.16 K, over ice: IAPWS R14-08(2011), equation 6")
            .example("dewPoint fuel('natural-gas'), excessAir: 20.pct, stackPressure: 84.kPa");

    /** What is fired, and the coldest metal it meets. */
    public record Input(
            Firing firing,
            @Component(doc = "coldest metal that the flue gas touches", kind = Kind.TEMPERATURE, possible = "(0 K, inf)")
            OptionalDouble metal) {
    }

    /** The dew point. */
    public record Result(
            @Component(doc = "water dew point", kind = Kind.TEMPERATURE) double dewPoint,
            @Component(doc = "water in the flue gas", kind = Kind.SHARE, basis = Basis.WET) double water,
            @Component(doc = "partial pressure of the water", kind = Kind.PRESSURE) double waterPressure,
            @Component(doc = "by how much the coldest metal is above the dew point", kind = Kind.TEMPERATURE_DIFFERENCE)
            OptionalDouble margin) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        FlueGas gas = input.firing().burn(notes);
        double waterPressure = gas.moisture() * input.firing().fluePressure();
        double dewPoint = WaterSaturation.temperature(waterPressure);
        if (Double.isNaN(dewPoint)) {
            throw new InputException(EngineMessage.IMPOSSIBLE, Detail.at("dewPoint").found(waterPressure + " Pa of water")
                    .expected("flue gas with water, below the critical pressure of 22.064 MPa"));
        }
        if (dewPoint < WaterSaturation.TRIPLE_POINT) {
            notes.remark(EngineMessage.FROST_POINT, Detail.at("dewPoint"));
        }
        OptionalDouble margin = input.metal().isPresent()
                ? OptionalDouble.of(input.metal().getAsDouble() - dewPoint) : OptionalDouble.empty();
        return new Result(dewPoint, gas.moisture(), waterPressure, margin);
    }
}
