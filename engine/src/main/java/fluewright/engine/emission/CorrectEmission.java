package fluewright.engine.emission;

import fluewright.engine.calculation.Calculation;
import fluewright.engine.calculation.Component;
import fluewright.engine.calculation.Declaration;
import fluewright.engine.calculation.Stated;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The calculation {@code correct}: an emission at a reference O2, and in the other units.
 *
 * <p>The correction is {@code C_ref = C (a - O2_ref) / (a - O2)} on dry gas, with {@code a} the oxygen of dry air as the
 * rule defines it. Valid for O2 well below {@code a}; close to it the result magnifies every error of the reading.
 */
public final class CorrectEmission implements Calculation<CorrectEmission.Input, CorrectEmission.Result> {

    private static final Declaration<Input, Result> DECLARATION = Declaration
            .of("correct", "an emission at a reference O2, and in ppm, mg/m3, lb/MMBtu and g/GJ", Input.class, Result.class)
            .source("correction to a reference O2: C (a - O2_ref) / (a - O2), dry; a = 20.9 % in 40 CFR 60, 21 % in older EU rules")
            .source("mass per heat: EPA Method 19, 40 CFR 60 Appendix A-7, equations 19-1 to 19-9")
            .source("ppm and mass: ideal gas; NOx counted as NO2, 46.0055 g/mol")
            .example("correct nox: 45.ppm, at: 5.2.pct, to: 3.pct, fuel: 'natural-gas'");

    /** Where the F-factor comes from. */
    public enum FactorFrom {
        /** The table where the fuel has a row, else its analysis. */
        AUTO,
        /** Method 19, Table 19-2. */
        TABLE,
        /** Method 19, equations 19-13 to 19-15. */
        ANALYSIS
    }

    /** The emission, the oxygen it was measured at, and what is needed to convert it. */
    public record Input(
            @Component(doc = "nitrogen oxides, counted as NO2; dry unless the unit is ppmvw", kind = Kind.TRACE,
                    also = {Kind.MASS_PER_GAS, Kind.EMISSION_PER_ENERGY}, possible = "[0, inf)") Optional<Stated> nox,
            @Component(doc = "carbon monoxide; dry unless the unit is ppmvw", kind = Kind.TRACE,
                    also = {Kind.MASS_PER_GAS, Kind.EMISSION_PER_ENERGY}, possible = "[0, inf)") Optional<Stated> co,
            @Component(doc = "sulfur dioxide; dry unless the unit is ppmvw", kind = Kind.TRACE,
                    also = {Kind.MASS_PER_GAS, Kind.EMISSION_PER_ENERGY}, possible = "[0, inf)") Optional<Stated> so2,
            @Component(doc = "O2 that it was measured at, dry", kind = Kind.SHARE, basis = Basis.DRY, possible = "[0 %, 100 %)")
            OptionalDouble at,
            @Component(doc = "O2 that it was measured at, wet", kind = Kind.SHARE, basis = Basis.WET, possible = "[0 %, 100 %)")
            OptionalDouble atWet,
            @Component(doc = "CO2 that it was measured at, dry", kind = Kind.SHARE, basis = Basis.DRY, possible = "(0 %, 100 %]")
            OptionalDouble atCo2,
            @Component(doc = "CO2 that it was measured at, wet", kind = Kind.SHARE, basis = Basis.WET, possible = "(0 %, 100 %]")
            OptionalDouble atCo2Wet,
            @Component(doc = "reference O2, dry", kind = Kind.SHARE, basis = Basis.DRY, possible = "[0 %, 100 %)") OptionalDouble to,
            @Component(doc = "oxygen of dry air as the rule defines it", kind = Kind.SHARE, basis = Basis.DRY, byDefault = "20.9 %",
                    possible = "(0 %, 100 %]", valid = "[20.5 %, 21 %]") double airO2,
            @Component(doc = "water in the flue gas; computed from the fuel and dry air where it is needed and not given",
                    kind = Kind.SHARE, basis = Basis.WET, possible = "[0 %, 100 %)", valid = "[0 %, 40 %]") OptionalDouble moisture,
            @Component(doc = "water in the ambient air by volume: with wet readings and no flue-gas moisture, Eq. 19-2 with Fw "
                    + "(2.7 % may be used anywhere)", kind = Kind.SHARE, basis = Basis.WET, possible = "[0 %, 100 %)", valid = "[0 %, 10 %]")
            OptionalDouble ambientMoisture,
            @Component(doc = "the fuel, for mass per heat") Optional<Fuel> fuel,
            @Component(doc = "where the F-factor comes from", byDefault = "auto") FactorFrom factor,
            @Component(doc = "F-factor Fd of your own, dry flue gas per gross heat", kind = Kind.GAS_PER_ENERGY, possible = "(0, inf)")
            OptionalDouble fd) {
    }

    /** The emission in all units that the input determines. */
    public record Result(
            @Component(doc = "the pollutant and what it is counted as") String pollutant,
            @Component(doc = "concentration as measured", kind = Kind.TRACE, basis = Basis.DRY) OptionalDouble measured,
            @Component(doc = "concentration as measured", kind = Kind.TRACE, basis = Basis.WET) OptionalDouble measuredWet,
            @Component(doc = "mass concentration as measured, at 0 degC and 101.325 kPa", kind = Kind.MASS_PER_GAS, basis = Basis.DRY)
            OptionalDouble measuredMass,
            @Component(doc = "O2 as measured", kind = Kind.SHARE, basis = Basis.DRY) OptionalDouble o2,
            @Component(doc = "reference O2", kind = Kind.SHARE, basis = Basis.DRY) OptionalDouble referenceO2,
            @Component(doc = "oxygen of dry air in the correction", kind = Kind.SHARE, basis = Basis.DRY) double airO2,
            @Component(doc = "factor of the correction, (a - O2_ref) / (a - O2)") OptionalDouble correctionFactor,
            @Component(doc = "concentration at the reference O2", kind = Kind.TRACE, basis = Basis.DRY) OptionalDouble corrected,
            @Component(doc = "mass concentration at the reference O2, at 0 degC and 101.325 kPa", kind = Kind.MASS_PER_GAS,
                    basis = Basis.DRY) OptionalDouble correctedMass,
            @Component(doc = "CO without its excess air, a / (a - O2)", kind = Kind.TRACE, basis = Basis.DRY) OptionalDouble airFree,
            @Component(doc = "mass per gross heat fired", kind = Kind.EMISSION_PER_ENERGY, basis = Basis.GROSS, shown = "lb/MMBtu")
            OptionalDouble perMMBtu,
            @Component(doc = "mass per gross heat fired", kind = Kind.EMISSION_PER_ENERGY, basis = Basis.GROSS, shown = "g/GJ")
            OptionalDouble perGJ,
            @Component(doc = "F-factor Fd, dry flue gas per gross heat at zero excess air", kind = Kind.GAS_PER_ENERGY, basis = Basis.GROSS,
                    shown = "scf68/MMBtu") OptionalDouble fFactor,
            @Component(doc = "which F-factor") Optional<String> fFactorFrom,
            @Component(doc = "water in the flue gas", kind = Kind.SHARE, basis = Basis.WET) OptionalDouble moisture) {
    }

    @Override
    public Declaration<Input, Result> declaration() {
        return DECLARATION;
    }

    @Override
    public Result calculate(Input input, Notes notes) {
        return new EmissionConversion(input, notes).result();
    }
}
