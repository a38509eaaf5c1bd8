package fluewright.example;

import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.combustion.Firing;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Kind;

/**
 * An example of a plugin: the natural draft of a stack, {@code g h (rho_air - rho_gas)}, friction left out. Two records
 * and one method; DEVELOPERS.md says how to make a jar of it.
 */
public final class StackDraft implements Calculation<StackDraft.Input, StackDraft.Result> {

    private static final double GRAVITY = 9.80665;
    private static final double R = 8.314462618;
    private static final double MOLAR_MASS_OF_AIR = 28.96546e-3;

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("stackDraft", "natural draft of a stack, friction left out", Input.class, Result.class)
            .source("hydrostatics and the ideal gas law; dry ambient air of CIPM-2007")
            .example("stackDraft 'natural-gas', o2: 3.pct, gas: 180.degC, height: 30.m, outside: 5.degC");

    /** What is fired, and the stack. */
    public record Input(
            Firing firing,
            @Component(doc = "mean temperature of the gas in the stack", kind = Kind.TEMPERATURE, possible = "(0 K, inf)",
                    valid = "[273 K, 1500 K]") double gas,
            @Component(doc = "height of the stack above the inlet", kind = Kind.LENGTH, possible = "(0 m, inf)") double height,
            @Component(doc = "temperature of the outside air", kind = Kind.TEMPERATURE, byDefault = "15 degC",
                    possible = "(0 K, inf)") double outside) {
    }

    /** The draft. */
    public record Result(
            @Component(doc = "natural draft at the foot of the stack", kind = Kind.PRESSURE_DIFFERENCE) double draft,
            @Component(doc = "density of the flue gas in the stack", kind = Kind.DENSITY) double gasDensity) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        var flueGas = input.firing().burn(notes).wet();
        double pressure = input.firing().fluePressure();
        double gasDensity = density(pressure, flueGas.mass() / flueGas.total(), input.gas());
        double airDensity = density(pressure, MOLAR_MASS_OF_AIR, input.outside());
        return new Result(GRAVITY * input.height() * (airDensity - gasDensity), gasDensity);
    }

    private static double density(double pressure, double molarMass, double temperature) {
        return pressure * molarMass / (R * temperature);
    }
}
