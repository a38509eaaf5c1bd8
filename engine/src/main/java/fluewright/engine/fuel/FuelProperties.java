package fluewright.engine.fuel;

import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Numbers;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** The calculation {@code properties}: heating values of a fuel, and of a gas its density and Wobbe index. */
public final class FuelProperties implements Calculation<FuelProperties.Input, FuelProperties.Result> {

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("properties", "heating values of a fuel; of a gas also density and Wobbe index", Input.class, Result.class)
            .source("gases: ISO 6976:2016, real gas at 101.325 kPa")
            .source("liquids and solids: as measured, or Channiwala and Parikh, Fuel 81 (2002)")
            .source("net from gross: 44.013 kJ per mol of water formed, at 25 degC")
            .example("properties fuel('natural-gas'), combustion: 25.degC, metering: 0.degC");

    /** The fuel and its reference temperatures. */
    public record Input(
            @Component(doc = "the fuel") Fuel fuel,
            @Component(doc = "combustion temperature of a gas's heating value by volume: 0, 15, 15.55, 20 or 25 degC",
                    kind = Kind.TEMPERATURE, byDefault = "15 degC") double combustion,
            @Component(doc = "metering temperature of a gas's volume at 101.325 kPa: 0, 15, 15.55 or 20 degC",
                    kind = Kind.TEMPERATURE, byDefault = "15 degC") double metering) {
    }

    /** Heating values at 25 degC by mass and mole; by volume at the input's temperatures. */
    public record Result(
            @Component(doc = "heating value at 25 degC, by mass as fired", kind = Kind.ENERGY_PER_MASS, basis = Basis.GROSS) double gross,
            @Component(doc = "heating value at 25 degC, by mass as fired", kind = Kind.ENERGY_PER_MASS, basis = Basis.NET) double net,
            @Component(doc = "heating value at 25 degC, by mole", kind = Kind.ENERGY_PER_AMOUNT, basis = Basis.GROSS) OptionalDouble molarGross,
            @Component(doc = "heating value at 25 degC, by mole", kind = Kind.ENERGY_PER_AMOUNT, basis = Basis.NET) OptionalDouble molarNet,
            @Component(doc = "heating value by volume of the real gas", kind = Kind.ENERGY_PER_VOLUME, basis = Basis.GROSS)
            OptionalDouble volumeGross,
            @Component(doc = "heating value by volume of the real gas", kind = Kind.ENERGY_PER_VOLUME, basis = Basis.NET)
            OptionalDouble volumeNet,
            @Component(doc = "Wobbe index", kind = Kind.ENERGY_PER_VOLUME, basis = Basis.GROSS) OptionalDouble grossWobbe,
            @Component(doc = "Wobbe index", kind = Kind.ENERGY_PER_VOLUME, basis = Basis.NET) OptionalDouble netWobbe,
            @Component(doc = "density relative to dry air") OptionalDouble relativeDensity,
            @Component(doc = "density; of a gas at the metering temperature and 101.325 kPa", kind = Kind.DENSITY) OptionalDouble density,
            @Component(doc = "molar mass", kind = Kind.MOLAR_MASS) OptionalDouble molarMass,
            @Component(doc = "compression factor at the metering temperature") OptionalDouble compressionFactor,
            @Component(doc = "how the heating value is known") String method) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        Fuel fuel = input.fuel();
        notes.addAll(fuel.notes());
        IsoTemperature combustion = reference("combustion", input.combustion(), true);
        IsoTemperature metering = reference("metering", input.metering(), false);
        OptionalDouble molarMass = fuel.molarMass();
        return new Result(fuel.gross(), fuel.net(), times(molarMass, fuel.gross()), times(molarMass, fuel.net()),
                ofGas(fuel, combustion, metering, GasQuality::gross), ofGas(fuel, combustion, metering, GasQuality::net),
                ofGas(fuel, combustion, metering, GasQuality::grossWobbe), ofGas(fuel, combustion, metering, GasQuality::netWobbe),
                ofGas(fuel, combustion, metering, GasQuality::relativeDensity),
                fuel.gas().isPresent() ? ofGas(fuel, combustion, metering, GasQuality::density) : fuel.density(),
                molarMass, ofGas(fuel, combustion, metering, GasQuality::compressionFactor), fuel.heat().method());
    }

    private static OptionalDouble times(OptionalDouble a, double b) {
        return a.isPresent() ? OptionalDouble.of(a.getAsDouble() * b) : OptionalDouble.empty();
    }

    private static OptionalDouble ofGas(Fuel fuel, IsoTemperature combustion, IsoTemperature metering, ToDoubleFunction<GasQuality> property) {
        return fuel.gas().isPresent()
                ? OptionalDouble.of(property.applyAsDouble(new GasQuality(fuel.gas().get(), combustion, metering))) : OptionalDouble.empty();
    }

    /** 60 degF and the standard's 15.55 degC are the same reference, a rounding apart. */
    private static IsoTemperature reference(String where, double kelvin, boolean combustion) {
        for (IsoTemperature t : IsoTemperature.values()) {
            if (Math.abs(t.kelvin() - kelvin) < 0.02 && (combustion || t != IsoTemperature.T25)) {
                return t;
            }
        }
        throw new InputException(EngineMessage.IMPOSSIBLE, Detail.at("properties " + where)
                .found(Numbers.rounded(kelvin - 273.15, 6) + " degC").expected("0, 15, 15.55 (60 degF), 20" + (combustion ? " or 25 degC" : " degC")));
    }
}
