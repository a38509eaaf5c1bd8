package fluewright.engine.emission;

import fluewright.engine.calculation.Stated;
import fluewright.engine.combustion.Air;
import fluewright.engine.combustion.AirSetting;
import fluewright.engine.combustion.FlueGas;
import fluewright.engine.combustion.Stoichiometry;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.quantity.Value;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/**
 * One run of {@link CorrectEmission}. Inside, NaN stands for a number that the input does not determine: it spreads
 * through the formulas by itself, and the result leaves it out.
 */
final class EmissionConversion {

    /** Below this distance of the O2 from that of air, 0.1 points of reading move the result by 3 % or more [mol/mol]. */
    private static final double NEAR_AIR = 0.033;

    private final CorrectEmission.Input input;
    private final Notes notes;
    private final Pollutant pollutant;
    private final Stated stated;
    private final double ofAir;
    private final FFactors factors;
    private final double moisture;
    private final double oxygen;

    EmissionConversion(CorrectEmission.Input input, Notes notes) {
        this.input = input;
        this.notes = notes;
        this.ofAir = input.airO2();
        Map<Pollutant, Stated> given = given();
        this.pollutant = given.keySet().iterator().next();
        this.stated = given.get(pollutant);
        requireOneDiluent();
        this.factors = factors();
        FlueGas gas = flueGas();
        this.moisture = moisture(gas);
        this.oxygen = oxygen(gas);
        checkOxygen();
    }

    CorrectEmission.Result result() {
        double perHeat = perHeat();
        double measured = measured(perHeat);
        double reference = input.to().orElse(Double.NaN);
        double factor = (ofAir - reference) / (ofAir - oxygen);
        double corrected = Double.isNaN(measured * factor) ? fromHeat(perHeat, reference) : measured * factor;
        double molarMass = pollutant.molarMass();
        double fd = factors == null ? Double.NaN : factors.dry();
        boolean airFree = pollutant == Pollutant.CO;
        return new CorrectEmission.Result(pollutant.label(),
                known(measured), known(stated.basis() == Basis.WET ? stated.value() : measured * (1 - moisture)),
                known(measured * molarMass), known(oxygen), input.to(), ofAir, known(factor), known(corrected),
                known(corrected * molarMass), known(airFree ? measured * ofAir / (ofAir - oxygen) : Double.NaN),
                known(perHeat), known(perHeat), known(fd), Optional.ofNullable(factors).map(FFactors::label), known(moisture));
    }

    private static OptionalDouble known(double number) {
        return Double.isNaN(number) ? OptionalDouble.empty() : OptionalDouble.of(number);
    }

    private Map<Pollutant, Stated> given() {
        Map<Pollutant, Stated> given = new EnumMap<>(Pollutant.class);
        input.nox().ifPresent(s -> given.put(Pollutant.NOX, s));
        input.co().ifPresent(s -> given.put(Pollutant.CO, s));
        input.so2().ifPresent(s -> given.put(Pollutant.SO2, s));
        if (given.size() != 1) {
            throw new InputException(EngineMessage.ONE_OF, Detail.at("correct").found(given.isEmpty() ? "none" : given.keySet().toString())
                    .expected("nox, co or so2"));
        }
        Stated only = given.values().iterator().next();
        if (only.kind() == Kind.TRACE && only.value() > 1) {
            throw new InputException(EngineMessage.IMPOSSIBLE, Detail.at("correct").found(Numbers.percent(only.value())).expected("0 to 1000000 ppm"));
        }
        return given;
    }

    private void requireOneDiluent() {
        long given = Stream.of(input.at(), input.atWet(), input.atCo2(), input.atCo2Wet()).filter(OptionalDouble::isPresent).count();
        boolean needed = stated.kind() != Kind.EMISSION_PER_ENERGY;
        if (given > 1 || needed && given == 0) {
            throw new InputException(EngineMessage.ONE_OF, Detail.at("correct").found(given == 0 ? "none" : given + " of them")
                    .expected("at, atWet, atCo2 or atCo2Wet: what it was measured at").nearest("at: 5.2.pct"));
        }
    }

    private FFactors factors() {
        if (input.fd().isPresent()) {
            return new FFactors(input.fd().getAsDouble(), OptionalDouble.empty(), Double.NaN, "as given");
        }
        if (input.fuel().isEmpty()) {
            if (stated.kind() == Kind.EMISSION_PER_ENERGY) {
                throw new InputException(EngineMessage.NEEDS_ALSO, Detail.at("correct").found("mass per heat without a fuel")
                        .expected("fuel: 'natural-gas', or fd: 8710.scf68/MMBtu"));
            }
            return null;
        }
        return factors(input.fuel().get());
    }

    private FFactors factors(Fuel fuel) {
        Optional<FFactors> table = FFactors.tabulated(fuel.factorClass());
        return switch (input.factor()) {
            case AUTO -> table.orElseGet(() -> FFactors.computed(fuel));
            case ANALYSIS -> FFactors.computed(fuel);
            case TABLE -> table.orElseThrow(() -> new InputException(EngineMessage.NO_F_FACTOR,
                    Detail.at(fuel.id()).found("factor: 'table'").expected("a fuel with a row in Table 19-2: "
                            + String.join(", ", FFactors.rows())).nearest("factor: 'analysis'")));
        };
    }

    /** The flue gas that the fuel gives with dry air at the reading; null where it is not needed or not to be had. */
    private FlueGas flueGas() {
        boolean wetReading = input.atWet().isPresent() || input.atCo2Wet().isPresent() || stated.basis() == Basis.WET;
        boolean needsMoisture = wetReading && input.moisture().isEmpty() && input.ambientMoisture().isEmpty();
        boolean needsOxygen = input.atCo2().isPresent();
        if (input.fuel().isEmpty() || !(needsMoisture || needsOxygen)) {
            return null;
        }
        FlueGas gas = solve(new Stoichiometry(input.fuel().get().makeup(), 0));
        if (needsMoisture && gas != null) {
            notes.remark(EngineMessage.MOISTURE_COMPUTED, Detail.at(input.fuel().get().id()));
        }
        return gas;
    }

    private FlueGas solve(Stoichiometry s) {
        AirSetting setting = input.at().isPresent() ? new AirSetting.OxygenDry(input.at().getAsDouble())
                : input.atWet().isPresent() ? new AirSetting.OxygenWet(input.atWet().getAsDouble())
                : input.atCo2().isPresent() ? new AirSetting.CarbonDioxideDry(input.atCo2().getAsDouble()) : null;
        if (input.atCo2().orElse(0) > s.co2Maximum()) {
            throw new InputException(EngineMessage.CO2_ABOVE_MAXIMUM, Detail.at("correct atCo2").found(Numbers.percent(input.atCo2().getAsDouble()))
                    .expected("up to " + Numbers.percent(s.co2Maximum()) + " dry for " + input.fuel().get().id()));
        }
        double dryAir = setting == null ? Double.NaN : setting.dryAir(s, Air.DRY, 0);
        return dryAir >= s.theoreticalAir() * (1 - 1e-9) && Double.isFinite(dryAir) ? s.flueGas(dryAir, Air.DRY, 0) : null;
    }

    private double moisture(FlueGas gas) {
        return input.moisture().orElse(gas == null ? Double.NaN : gas.moisture());
    }

    private double oxygen(FlueGas gas) {
        if (input.at().isPresent()) {
            return input.at().getAsDouble();
        }
        if (input.atWet().isPresent()) {
            double dry = input.atWet().getAsDouble() / (1 - moisture);
            requireMoisture(dry, input.ambientMoisture().isPresent() && stated.basis() == Basis.WET, "atWet");
            return dry;
        }
        return gas == null || input.atCo2().isEmpty() ? Double.NaN : gas.oxygenDry();
    }

    private void requireMoisture(double number, boolean otherWay, String what) {
        if (Double.isNaN(number) && !otherWay) {
            String fuel = input.fuel().isEmpty() && input.atCo2Wet().isEmpty() ? ", or a fuel to compute it from" : "";
            throw new InputException(EngineMessage.NEEDS_ALSO, Detail.at("correct " + what).found("a wet reading")
                    .expected("moisture: 16.pct" + fuel));
        }
    }

    private void checkOxygen() {
        requireBelowAir("at", oxygen);
        requireBelowAir("to", input.to().orElse(0));
        requireBelowAir("atWet", input.atWet().orElse(0));
        if (ofAir - oxygen < NEAR_AIR) {
            notes.warn(EngineMessage.ILL_CONDITIONED, Detail.at("O2").found(Numbers.percent(oxygen) + " dry")
                    .expected("0.1 points of O2 move the result by " + Numbers.rounded(0.1 / (ofAir - oxygen), 2) + " %"));
        }
    }

    private void requireBelowAir(String where, double found) {
        if (found >= ofAir) {
            throw new InputException(EngineMessage.OXYGEN_OF_AIR, Detail.at("correct " + where).found(Numbers.percent(found))
                    .expected("below the " + Numbers.percent(ofAir) + " of dry air: there would be no flue gas to correct for")
                    .nearest("check the sample line for a leak and the cell's calibration"));
        }
    }

    /** The emission in dry gas as measured [mol/mol]. */
    private double measured(double perHeat) {
        return switch (stated.kind()) {
            case TRACE -> stated.basis() == Basis.WET ? fromWet() : stated.value();
            case MASS_PER_GAS -> stated.value() / pollutant.molarMass();
            default -> fromHeat(perHeat, oxygen);
        };
    }

    private double fromWet() {
        double dry = stated.value() / (1 - moisture);
        boolean bothWet = input.atCo2Wet().isPresent() || input.atWet().isPresent() && input.ambientMoisture().isPresent();
        requireMoisture(dry, bothWet, pollutant.name().toLowerCase(Locale.ROOT));
        return dry;
    }

    /** The concentration in dry gas at an O2 that belongs to a mass per heat: equation 19-1 turned round [mol/mol]. */
    private double fromHeat(double perHeat, double atOxygen) {
        return factors == null ? Double.NaN : perHeat / (pollutant.molarMass() * factors.dry()) * (ofAir - atOxygen) / ofAir;
    }

    /** The mass per gross heat [kg/J], by the equation of Method 19 that fits the readings. */
    private double perHeat() {
        if (stated.kind() == Kind.EMISSION_PER_ENERGY) {
            return stated.value();
        }
        if (factors == null) {
            return Double.NaN;
        }
        if (input.atCo2().isPresent() || input.atCo2Wet().isPresent()) {
            return perHeatByCo2();
        }
        return input.ambientMoisture().isPresent() && stated.basis() == Basis.WET && input.atWet().isPresent() && Double.isNaN(moisture)
                ? perHeatWet() : measured(Double.NaN) * pollutant.molarMass() * factors.dry() * ofAir / (ofAir - oxygen);
    }

    /** Equations 19-6 to 19-9; with both readings wet the moisture falls out. */
    private double perHeatByCo2() {
        boolean wetCo2 = input.atCo2Wet().isPresent();
        double co2 = wetCo2 ? input.atCo2Wet().getAsDouble() : input.atCo2().getAsDouble();
        boolean bothWet = wetCo2 && stated.basis() == Basis.WET;
        double concentration = bothWet ? stated.value() : measured(Double.NaN);
        double diluent = wetCo2 && !bothWet ? co2 / (1 - moisture) : co2;
        requireMoisture(diluent, false, "atCo2Wet");
        return concentration * pollutant.molarMass() * factors.co2() / diluent;
    }

    /** Equation 19-2, with the moisture of the ambient air in place of that of the flue gas. */
    private double perHeatWet() {
        double wet = factors.wet().orElseThrow(() -> new InputException(EngineMessage.NO_F_FACTOR,
                Detail.at(factors.label()).found("no Fw").expected("moisture: of the flue gas, in place of ambientMoisture")));
        double airWet = ofAir * (1 - input.ambientMoisture().getAsDouble());
        requireBelowAirWet(airWet);
        return stated.value() * pollutant.molarMass() * wet * ofAir / (airWet - input.atWet().getAsDouble());
    }

    private void requireBelowAirWet(double airWet) {
        if (input.atWet().getAsDouble() >= airWet) {
            throw new InputException(EngineMessage.OXYGEN_OF_AIR, Detail.at("correct atWet").found(Numbers.percent(input.atWet().getAsDouble()))
                    .expected("below the " + Numbers.percent(airWet) + " of this air"));
        }
    }
}
