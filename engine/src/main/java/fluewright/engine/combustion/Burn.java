package fluewright.engine.combustion;

import fluewright.engine.calculation.Breakdown;
import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.species.GasMixture;
import fluewright.engine.species.WaterSaturation;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import java.util.OptionalDouble;

/** The calculation {@code burn}: air and flue gas of a fuel. */
public final class Burn implements Calculation<Burn.Input, Burn.Result> {

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("burn", "air and flue gas of a fuel: amounts, composition wet and dry, water dew point", Input.class, Result.class)
            .source("element balance, first principles; theoretical air of the carbon that burns, ASME PTC 4")
            .source("dry air: CIPM-2007, Picard et al., Metrologia 45 (2008)")
            .source("water dew point: IAPWS-IF97 region 4, equation 31; frost point: IAPWS R14-08(2011), equation 6")
            .example("burn fuel('natural-gas'), o2: 3.pct, humidity: 60.pct")
            .leadsToSetting();

    /** What is fired. */
    public record Input(Firing firing) {
    }

    /** Air and flue gas. */
    public record Result(
            @Component(doc = "ratio of the air to theoretical air") double lambda,
            @Component(doc = "excess air over theoretical air", kind = Kind.SHARE) double excessAir,
            @Component(doc = "theoretical dry air per fuel, by mass", kind = Kind.MASS_RATIO) double theoreticalAir,
            @Component(doc = "dry air supplied per fuel, by mass", kind = Kind.MASS_RATIO) double dryAir,
            @Component(doc = "air supplied with its water vapour per fuel, by mass", kind = Kind.MASS_RATIO) double humidAir,
            @Component(doc = "theoretical dry air per fuel", kind = Kind.GAS_PER_MASS) double theoreticalAirVolume,
            @Component(doc = "dry air supplied per fuel", kind = Kind.GAS_PER_MASS) double dryAirVolume,
            @Component(doc = "theoretical dry air per fuel gas, by volume", kind = Kind.VOLUME_RATIO) OptionalDouble theoreticalAirPerGas,
            @Component(doc = "dry air supplied per fuel gas, by volume", kind = Kind.VOLUME_RATIO) OptionalDouble dryAirPerGas,
            @Component(doc = "dry air supplied per heat fired", kind = Kind.MASS_PER_ENERGY, basis = Basis.GROSS, shown = "kg/GJ")
            double airPerGJ,
            @Component(doc = "dry air supplied per heat fired", kind = Kind.MASS_PER_ENERGY, basis = Basis.GROSS, shown = "lb/MMBtu")
            double airPerMMBtu,
            @Component(doc = "dry air supplied per heat fired", kind = Kind.GAS_PER_ENERGY, basis = Basis.GROSS) double airVolumePerHeat,
            @Component(doc = "flue gas per fuel, by mass", kind = Kind.MASS_RATIO, basis = Basis.WET) double flueMass,
            @Component(doc = "flue gas per fuel", kind = Kind.GAS_PER_MASS, basis = Basis.WET) double wetVolume,
            @Component(doc = "flue gas per fuel", kind = Kind.GAS_PER_MASS, basis = Basis.DRY) double dryVolume,
            @Component(doc = "wet flue gas per fuel gas, by volume", kind = Kind.VOLUME_RATIO, basis = Basis.WET) OptionalDouble wetPerGas,
            @Component(doc = "dry flue gas per fuel gas, by volume", kind = Kind.VOLUME_RATIO, basis = Basis.DRY) OptionalDouble dryPerGas,
            @Component(doc = "wet flue gas per gross heat fired", kind = Kind.GAS_PER_ENERGY, basis = Basis.WET) double wetVolumePerHeat,
            @Component(doc = "dry flue gas per gross heat fired", kind = Kind.GAS_PER_ENERGY, basis = Basis.DRY) double dryVolumePerHeat,
            @Component(doc = "molar mass of the flue gas", kind = Kind.MOLAR_MASS, basis = Basis.WET) double molarMass,
            @Component(doc = "O2 in the dry flue gas", kind = Kind.SHARE, basis = Basis.DRY) double o2,
            @Component(doc = "largest possible CO2, that at theoretical air", kind = Kind.SHARE, basis = Basis.DRY) double co2Max,
            @Component(doc = "composition as it flows", kind = Kind.SHARE, basis = Basis.WET) Breakdown wet,
            @Component(doc = "composition without its water", kind = Kind.SHARE, basis = Basis.DRY) Breakdown dry,
            @Component(doc = "water per dry air of the combustion air, by mass", kind = Kind.MASS_RATIO) double humidityRatio,
            @Component(doc = "water dew point at the pressure of the flue gas", kind = Kind.TEMPERATURE) OptionalDouble dewPoint) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        Firing firing = input.firing();
        FlueGas gas = firing.burn(notes);
        Stoichiometry s = firing.stoichiometry();
        GasMixture dry = gas.dry();
        double gross = firing.fuel().gross();
        OptionalDouble molarMass = firing.fuel().molarMass();
        double air = gas.dryAir() * Air.MOLAR_MASS;
        return new Result(gas.lambda(), gas.lambda() - 1,
                s.theoreticalAir() * Air.MOLAR_MASS, air, air * (1 + gas.air().humidityRatio()),
                s.theoreticalAir(), gas.dryAir(), per(molarMass, s.theoreticalAir()), per(molarMass, gas.dryAir()),
                air / gross, air / gross, gas.dryAir() / gross,
                gas.wet().mass(), gas.wet().total(), dry.total(), per(molarMass, gas.wet().total()), per(molarMass, dry.total()),
                gas.wet().total() / gross, dry.total() / gross, gas.wet().mass() / gas.wet().total(),
                gas.oxygenDry(), s.co2Maximum(), new Breakdown(gas.wet().fractions()), new Breakdown(dry.fractions()),
                gas.air().humidityRatio(), dewPoint(gas, firing.fluePressure(), notes));
    }

    private static OptionalDouble per(OptionalDouble molarMass, double molesPerKilogram) {
        return molarMass.isPresent() ? OptionalDouble.of(molesPerKilogram * molarMass.getAsDouble()) : OptionalDouble.empty();
    }

    private static OptionalDouble dewPoint(FlueGas gas, double pressure, Notes notes) {
        double dewPoint = gas.waterDewPoint(pressure);
        if (dewPoint < WaterSaturation.TRIPLE_POINT) {
            notes.remark(EngineMessage.FROST_POINT, Detail.at("dewPoint"));
        }
        return Double.isNaN(dewPoint) ? OptionalDouble.empty() : OptionalDouble.of(dewPoint);
    }
}
