package fluewright.engine.combustion;

import fluewright.engine.calculation.Component;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.Makeup;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.species.Element;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/** What is fired and with how much air: the inputs that all calculations of the flue gas share. */
public record Firing(
        @Component(doc = "the fuel") Fuel fuel,
        @Component(doc = "excess air over theoretical air", kind = Kind.SHARE, possible = "(-100 %, inf)") OptionalDouble excessAir,
        @Component(doc = "ratio of the air to theoretical air", possible = "(0, inf)") OptionalDouble lambda,
        @Component(doc = "O2 in the flue gas, dry: the reading of an analyzer that dries its sample", kind = Kind.SHARE,
                basis = Basis.DRY, possible = "[0 %, 100 %)") OptionalDouble o2,
        @Component(doc = "O2 in the flue gas, wet: the reading of a probe in the duct", kind = Kind.SHARE, basis = Basis.WET,
                possible = "[0 %, 100 %)") OptionalDouble o2Wet,
        @Component(doc = "CO2 in the flue gas, dry, on the side of excess air", kind = Kind.SHARE, basis = Basis.DRY,
                possible = "(0 %, 100 %)") OptionalDouble co2,
        @Component(doc = "CO in the flue gas, dry", kind = Kind.TRACE, basis = Basis.DRY, byDefault = "0 ppm",
                possible = "[0 %, 100 %)", valid = "[0 %, 5 %]") double co,
        @Component(doc = "temperature of the combustion air", kind = Kind.TEMPERATURE, byDefault = "25 degC",
                possible = "(0 K, inf)", valid = "[200 K, 6000 K]") double air,
        @Component(doc = "relative humidity of the ambient air (dry air without it)", kind = Kind.SHARE,
                possible = "[0 %, 100 %]") OptionalDouble humidity,
        @Component(doc = "temperature of the ambient air that the relative humidity belongs to; that of the combustion air "
                + "without it", kind = Kind.TEMPERATURE, possible = "(0 K, inf)", valid = "[50 K, 373.15 K]") OptionalDouble ambient,
        @Component(doc = "water per dry air by mass, in place of a relative humidity", kind = Kind.MASS_RATIO,
                possible = "[0, inf)", valid = "[0, 0.2]") OptionalDouble humidityRatio,
        @Component(doc = "absolute pressure of the ambient air", kind = Kind.PRESSURE, byDefault = "101.325 kPa",
                possible = "(0 kPa, inf)", valid = "[50 kPa, 120 kPa]") double pressure,
        @Component(doc = "absolute pressure of the flue gas; that of the ambient air without it", kind = Kind.PRESSURE,
                possible = "(0 kPa, inf)") OptionalDouble stackPressure,
        @Component(doc = "carbon in the dry residue, by mass", kind = Kind.SHARE, possible = "[0 %, 100 %)") OptionalDouble carbonInAsh,
        @Component(doc = "carbon left unburned per fuel, by mass, in place of carbonInAsh", kind = Kind.SHARE,
                possible = "[0 %, 100 %)") OptionalDouble unburnedCarbon) {

    /**
     * Returns the flue gas.
     *
     * @param notes takes the fuel's own notes
     * @throws InputException when the inputs together are impossible
     */
    public FlueGas burn(Notes notes) {
        notes.addAll(fuel.notes());
        Stoichiometry s = stoichiometry();
        Air humid = humidAir();
        AirSetting setting = setting();
        requireBelowAir(setting, humid);
        double dryAir = setting.dryAir(s, humid, co);
        if (!(dryAir > 0 && Double.isFinite(dryAir))) {
            throw contradiction(s);
        }
        FlueGas gas = s.flueGas(dryAir, humid, co);
        requireComplete(gas, s);
        return gas;
    }

    /** Returns the element balance of the fuel, unburned carbon taken out. */
    public Stoichiometry stoichiometry() {
        return new Stoichiometry(fuel.makeup(), unburned());
    }

    /** Returns the pressure of the flue gas [Pa]. */
    public double fluePressure() {
        return stackPressure.orElse(pressure);
    }

    /** Returns the carbon that leaves unburned [kg/kg fuel]. */
    public double unburned() {
        if (carbonInAsh.isPresent() && unburnedCarbon.isPresent()) {
            throw new InputException(EngineMessage.NOT_BOTH, Detail.NONE.found("carbonInAsh and unburnedCarbon").expected("one of them"));
        }
        Makeup makeup = fuel.makeup();
        double share = carbonInAsh.orElse(0);
        double carbon = unburnedCarbon.orElse(makeup.ash() * share / (1 - share));
        double burnable = Math.min(makeup.atoms(Element.C), makeup.oxygenDemand()) * Element.C.molarMass();
        if (carbon >= burnable && carbon > 0) {
            throw new InputException(EngineMessage.MORE_CARBON_THAN_FUEL, Detail.at("unburned carbon").found(Numbers.percent(carbon))
                    .expected("less than the fuel's " + Numbers.percent(burnable)));
        }
        return carbon;
    }

    private Air humidAir() {
        if (humidity.isPresent() && humidityRatio.isPresent()) {
            throw new InputException(EngineMessage.NOT_BOTH, Detail.NONE.found("humidity and humidityRatio").expected("one of them"));
        }
        if (ambient.isPresent() && humidity.isEmpty()) {
            throw new InputException(EngineMessage.NEEDS_ALSO, Detail.at("ambient").found("no humidity").expected("humidity: 60.pct"));
        }
        if (humidity.isEmpty()) {
            return Air.ofHumidityRatio(humidityRatio.orElse(0));
        }
        Air humid = Air.humid(ambient.orElse(air), pressure, humidity.getAsDouble());
        if (!(humid.waterRatio() >= 0 && Double.isFinite(humid.waterRatio()))) {
            throw new InputException(EngineMessage.IMPOSSIBLE, Detail.at("humidity").found(Numbers.percent(humidity.getAsDouble()) + " at "
                    + Numbers.rounded(ambient.orElse(air) - 273.15, 6) + " degC").expected("air below the boiling point of water")
                    .nearest("give the temperature the humidity was measured at: ambient: 20.degC"));
        }
        return humid;
    }

    private AirSetting setting() {
        Map<String, AirSetting> given = new LinkedHashMap<>();
        excessAir.ifPresent(e -> given.put("excessAir", new AirSetting.Lambda(1 + e)));
        lambda.ifPresent(l -> given.put("lambda", new AirSetting.Lambda(l)));
        o2.ifPresent(y -> given.put("o2", new AirSetting.OxygenDry(y)));
        o2Wet.ifPresent(y -> given.put("o2Wet", new AirSetting.OxygenWet(y)));
        co2.ifPresent(y -> given.put("co2", new AirSetting.CarbonDioxideDry(y)));
        if (given.size() != 1) {
            throw new InputException(EngineMessage.ONE_OF, Detail.at("air").found(given.isEmpty() ? "none" : String.join(" and ", given.keySet()))
                    .expected("excessAir, lambda, o2, o2Wet or co2"));
        }
        return given.values().iterator().next();
    }

    private static void requireBelowAir(AirSetting setting, Air humid) {
        if (setting instanceof AirSetting.OxygenDry dry) {
            requireBelowAir("o2", dry.fraction(), Air.O2, "dry");
        } else if (setting instanceof AirSetting.OxygenWet wet) {
            requireBelowAir("o2Wet", wet.fraction(), Air.O2 / (1 + humid.waterRatio()), "this");
        }
    }

    private static void requireBelowAir(String where, double found, double ofAir, String which) {
        if (!(found < ofAir)) {
            throw new InputException(EngineMessage.OXYGEN_OF_AIR, Detail.at(where).found(Numbers.percent(found))
                    .expected("below the " + Numbers.percent(ofAir) + " of " + which + " air")
                    .nearest("check the sample line for a leak and the cell's calibration"));
        }
    }

    private InputException contradiction(Stoichiometry s) {
        String found = co2.isPresent() ? "CO2 " + Numbers.percent(co2.getAsDouble()) : "O2 and CO";
        String expected = s.carbon() > 0 ? "CO2 up to " + Numbers.percent(s.co2Maximum()) + " dry" : "a fuel with carbon; this one gives no CO2";
        return new InputException(EngineMessage.READING_CONTRADICTS, Detail.at(fuel.id()).found(found).expected(expected));
    }

    private void requireComplete(FlueGas gas, Stoichiometry s) {
        double dry = gas.dry().total();
        if (co * dry > s.carbon()) {
            throw new InputException(EngineMessage.READING_CONTRADICTS, Detail.at("co").found("CO " + Numbers.percent(co))
                    .expected("CO up to " + Numbers.percent(s.carbon() / dry) + " dry, all carbon of " + fuel.id()));
        }
        boolean enoughOxygen = gas.wet().moles().values().stream().allMatch(n -> n >= 0);
        if (!enoughOxygen && co2.isPresent()) {
            throw new InputException(EngineMessage.CO2_ABOVE_MAXIMUM, Detail.at("co2").found(Numbers.percent(co2.getAsDouble()))
                    .expected("up to " + Numbers.percent(s.co2Maximum()) + " dry for " + fuel.id()));
        }
        if (!enoughOxygen) {
            throw new InputException(EngineMessage.TOO_LITTLE_AIR, Detail.at("air").found("lambda " + Numbers.rounded(gas.lambda(), 5)
                    + ", CO " + Numbers.percent(co)).expected("lambda 1 or more, or as much CO as the missing oxygen leaves"));
        }
    }
}
