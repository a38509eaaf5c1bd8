package fluewright.engine.loss;

import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.combustion.Air;
import fluewright.engine.combustion.Firing;
import fluewright.engine.combustion.FlueGas;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.HeatingValue;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.species.Element;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;

/**
 * The calculation {@code losses}: where the heat of the fuel goes, by the heat-loss method.
 *
 * <p>All heats are counted from 25 degC and per kilogram of fuel. Sensible heats are those of the NASA polynomials with
 * all water as vapour; water that the fuel brings or forms takes its heat of vaporization besides. What the combustion
 * air brings above 25 degC is a credit. Losses are shares of the gross heat fired; efficiency is one less the losses plus
 * the credit; the net efficiency is the same useful heat over the net heat fired. Source: loss classes and reference
 * temperature of ASME PTC 4; valid while no water condenses. Worked number: natural gas (CH4 94.9, C2H6 2.5, C3H8 0.25,
 * n-C4H10 0.06, N2 1.6, CO2 0.7 mol %) at 3 % O2 dry, 150 degC, air 20 degC with 0.012 mol/mol water loses 15.24 % gross.
 */
public final class FlueLosses implements Calculation<FlueLosses.Input, FlueLosses.Result> {

    private static final Species WATER = SpeciesTable.get("H2O");
    private static final Species MONOXIDE = SpeciesTable.get("CO");

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("losses", "flue losses and efficiency on gross and net heating value, by the heat-loss method", Input.class, Result.class)
            .source("loss classes and 25 degC reference: ASME PTC 4, energy balance method")
            .source("enthalpies: NASA/TP-2002-211556; heat of vaporization at 25 degC: ISO 6976:2016, 44.013 kJ/mol")
            .example("losses fuel('natural-gas'), o2: 3.pct, stack: 180.degC, air: 20.degC")
            .leadsToSetting();

    /** What is fired, and how the flue gas leaves. */
    public record Input(
            Firing firing,
            @Component(doc = "temperature of the flue gas where it leaves", kind = Kind.TEMPERATURE, possible = "(0 K, inf)",
                    valid = "[200 K, 6000 K]") double stack,
            @Component(doc = "loss by radiation and convection, of the gross heat fired", kind = Kind.SHARE, basis = Basis.GROSS,
                    byDefault = "0 %", possible = "[0 %, 100 %]") double radiation,
            @Component(doc = "other losses that are known, of the gross heat fired", kind = Kind.SHARE, basis = Basis.GROSS,
                    byDefault = "0 %", possible = "[0 %, 100 %]") double other) {
    }

    /** The losses as shares of the gross heat fired, and the efficiencies. */
    public record Result(
            @Component(doc = "excess air over theoretical air", kind = Kind.SHARE) double excessAir,
            @Component(doc = "sensible heat of the dry flue gas above 25 degC", kind = Kind.SHARE, basis = Basis.GROSS) double dryGas,
            @Component(doc = "heat of the water formed from hydrogen, latent and sensible", kind = Kind.SHARE, basis = Basis.GROSS)
            double waterFromHydrogen,
            @Component(doc = "heat of the fuel's moisture, latent and sensible", kind = Kind.SHARE, basis = Basis.GROSS) double fuelMoisture,
            @Component(doc = "sensible heat of the air's water vapour above 25 degC", kind = Kind.SHARE, basis = Basis.GROSS) double airMoisture,
            @Component(doc = "heat not released, left in carbon monoxide", kind = Kind.SHARE, basis = Basis.GROSS) double carbonMonoxide,
            @Component(doc = "heat that the combustion air brings above 25 degC, to be taken off", kind = Kind.SHARE, basis = Basis.GROSS)
            double airCredit,
            @Component(doc = "flue loss: the classes above less the air's credit", kind = Kind.SHARE, basis = Basis.GROSS) double flueLoss,
            @Component(doc = "flue loss of the net heat fired, latent heat left out", kind = Kind.SHARE, basis = Basis.NET) double netFlueLoss,
            @Component(doc = "heat not released, left in unburned carbon", kind = Kind.SHARE, basis = Basis.GROSS) double unburnedCarbon,
            @Component(doc = "radiation and convection, as given", kind = Kind.SHARE, basis = Basis.GROSS) double radiation,
            @Component(doc = "other losses, as given", kind = Kind.SHARE, basis = Basis.GROSS) double other,
            @Component(doc = "efficiency on the gross heating value", kind = Kind.SHARE, basis = Basis.GROSS) double grossEfficiency,
            @Component(doc = "efficiency on the net heating value", kind = Kind.SHARE, basis = Basis.NET) double netEfficiency) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        Firing firing = input.firing();
        FlueGas gas = firing.burn(notes);
        warn(input, gas, notes);
        Fuel fuel = firing.fuel();
        double gross = fuel.gross();
        double vapour = WATER.sensibleHeat(input.stack());
        double water = fuel.makeup().atoms(Element.H) / 2;
        double dryGas = gas.dry().sensibleHeat(input.stack()) / gross;
        double fromHydrogen = water * (vapour + HeatingValue.VAPORIZATION) / gross;
        double fuelMoisture = fuel.makeup().moisture() * (vapour + HeatingValue.VAPORIZATION) / gross;
        double airMoisture = gas.airMoisture() * vapour / gross;
        double monoxide = gas.wet().moles(MONOXIDE) * HeatingValue.CARBON_MONOXIDE / gross;
        double credit = airHeat(gas, firing.air()) / gross;
        double flueLoss = dryGas + fromHydrogen + fuelMoisture + airMoisture + monoxide - credit;
        double unburned = firing.unburned() * HeatingValue.CARBON / gross;
        double efficiency = 1 - flueLoss - unburned - input.radiation() - input.other();
        if (efficiency < 0) {
            notes.warn(EngineMessage.LOSSES_EXCEED_HEAT, Detail.at("losses").found(Numbers.rounded(100 * (1 - efficiency), 5) + " %")
                    .expected("less than 100 % gross"));
        }
        double latent = fuel.makeup().waterFormed() * HeatingValue.VAPORIZATION / gross;
        double grossToNet = gross / fuel.net();
        return new Result(gas.lambda() - 1, dryGas, fromHydrogen, fuelMoisture, airMoisture, monoxide, credit, flueLoss,
                (flueLoss - latent) * grossToNet, unburned, input.radiation(), input.other(), efficiency, efficiency * grossToNet);
    }

    private static double airHeat(FlueGas gas, double temperature) {
        double dry = gas.dryAir() * Air.DRY_MOLE.sensibleHeat(temperature);
        return dry + gas.airMoisture() * WATER.sensibleHeat(temperature);
    }

    private static void warn(Input input, FlueGas gas, Notes notes) {
        double dewPoint = gas.waterDewPoint(input.firing().fluePressure());
        if (input.stack() < dewPoint) {
            notes.warn(EngineMessage.BELOW_DEW_POINT, Detail.at("stack").found(celsius(input.stack())).expected("above " + celsius(dewPoint)));
        }
        if (input.stack() < input.firing().air()) {
            notes.warn(EngineMessage.COLDER_THAN_AIR, Detail.at("stack").found(celsius(input.stack()))
                    .expected("above the air's " + celsius(input.firing().air())));
        }
    }

    private static String celsius(double kelvin) {
        return Numbers.rounded(kelvin - 273.15, 5) + " degC";
    }
}
