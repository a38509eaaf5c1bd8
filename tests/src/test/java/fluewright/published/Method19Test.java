package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.emission.FFactors;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.Value;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** EPA Method 19, 40 CFR 60 Appendix A-7: table, constants and equations. */
class Method19Test {

    static Stream<Check> table() {
        return CheckFile.all("01-method19").filter(check -> check.quantity().matches("F[dwc] factor( SI)?") && !check.id().equals("M19-30"));
    }

    /** Table 19-2 and 40 CFR 75 Appendix F, table 1: US figures to the digit, SI figures within the row's tolerance. */
    @ParameterizedTest
    @MethodSource("table")
    void factors_are_those_of_the_table(Check check) {
        FFactors factors = FFactors.tabulated(check.fuel().replaceFirst(" \\(.*", "")).orElseThrow();
        String unit = check.quantity().endsWith("SI") ? "m3at20/J" : "scf68/MMBtu";
        check.verify(in(unit, factor(factors, check.quantity())));
    }

    private static double factor(FFactors factors, String quantity) {
        return switch (quantity.charAt(1)) {
            case 'd' -> factors.dry();
            case 'w' -> factors.wet().orElseThrow();
            default -> factors.co2();
        };
    }

    private static double in(String unit, double si) {
        return Value.ofSi(si, Units.of(unit), Basis.NONE).number();
    }

    static Stream<Check> coefficients() {
        return CheckFile.checks("01-method19", "coefficient");
    }

    /** Equations 19-13 to 19-15 of fuels that are half one element and half carbon give each coefficient by itself. */
    @ParameterizedTest
    @MethodSource("coefficients")
    void equations_have_the_constants_of_the_method(Check check) {
        String name = check.quantity().split(" ")[1];
        double coefficient = switch (name) {
            case "Kc" -> per("C 100", 'd') / 100;
            case "Kcc" -> per("C 100", 'c') / 100;
            case "Khd" -> besideCarbon("H", 'd');
            case "Khw" -> besideCarbon("H", 'w');
            case "Ks" -> besideCarbon("S", 'd');
            case "Kn" -> besideCarbon("N", 'd');
            case "Ko" -> -besideCarbon("O", 'd');
            case "Kw" -> besideCarbon("moisture", 'w');
            default -> fail(check.toString());
        };
        assertEquals(check.value(), coefficient, 1e-9, check::toString);
    }

    private static double besideCarbon(String element, char factor) {
        return (per("C 50 " + element + " 50", factor) - per("C 100", factor) / 2) / 50;
    }

    /** The sum that the method multiplies with 1e6 / GCV: with a GCV of 1e6 Btu/lb the factor itself [scf/lb]. */
    private static double per(String analysis, char factor) {
        double gross = 1e6 * Units.of("Btu").toSi(1) / Units.of("lb").toSi(1);
        return in("scf68/MMBtu", factor(FFactors.computed(TestFuels.solid(analysis, gross)), "F" + factor));
    }

    static Stream<Check> constants() {
        return CheckFile.checks("01-method19", "ppm to", "lb/scf to", "standard conditions", "molar volume");
    }

    /** Table 19-1 and the standard conditions of 40 CFR 60.2. */
    @ParameterizedTest
    @MethodSource("constants")
    void conversions_are_those_of_the_method(Check check) {
        switch (check.id()) {
            case "M19-60" -> check.verify(massPerPpm("nox", "lb/scf68"));
            case "M19-61" -> check.verify(massPerPpm("so2", "lb/scf68"));
            case "M19-62" -> check.verify(massPerPpm("nox", "ng/m3at20"));
            case "M19-63" -> check.verify(Value.of(1, "lb/scf68").to("ng/m3at20").number());
            case "M19-64" -> check.verify(check.list()[0], kelvinOfStandardCubicFoot(1000 * check.list()[1]) - 273.15);
            case "M19-65" -> check.verify(Value.of(1, "lbmol").to("scf68").number());
            default -> fail(check.toString());
        }
    }

    private static double massPerPpm(String pollutant, String unit) {
        return Bench.in(unit, Bench.run("correct", pollutant, "1 ppm", "at", "3 %"), "measuredMass");
    }

    /** The ideal gas law turned round: p V / (n R), R of CODATA 2018. */
    private static double kelvinOfStandardCubicFoot(double pascal) {
        return pascal * Units.of("ft3").toSi(1) / (Units.of("scf68").toSi(1) * 8.314462618);
    }

    static Stream<Check> equations() {
        return CheckFile.checks("01-method19", "emission rate, Eq. 19-");
    }

    /** Equations 19-1 to 19-8, each chosen by which readings are wet and which diluent is given. */
    @ParameterizedTest
    @MethodSource("equations")
    void emission_rates(Check check) {
        Outcome outcome = Bench.run("correct", TestFuels.ofClass(check.fuel()), arguments(check).toArray());
        check.verify(Bench.in("lb/MMBtu", outcome, "perMMBtu"));
    }

    private static List<Object> arguments(Check check) {
        List<Object> arguments = new ArrayList<>();
        String pollutant = check.has("NOx") ? "NOx" : "SO2";
        boolean wetPollutant = check.inputs().contains("ppmvw");
        arguments.addAll(List.of(pollutant.toLowerCase(Locale.ROOT), check.input(pollutant) + (wetPollutant ? " ppmvw" : " ppmvd")));
        String wet = check.inputs().contains("% wet") ? "Wet" : "";
        arguments.addAll(check.has("O2") ? List.of("at" + wet, check.input("O2") + " %") : List.of("atCo2" + wet,
                check.input("CO2") + " %"));
        if (check.has("Bws")) {
            arguments.addAll(List.of("moisture", 100 * check.input("Bws") + " %"));
        }
        if (check.has("Bwa")) {
            arguments.addAll(List.of("ambientMoisture", 100 * check.input("Bwa") + " %"));
        }
        return arguments;
    }

    /**
     * Equation 19-9 by hand (from memory; no row has it), a dry emission and a wet CO2: NOx 200 ppmvd, CO2 12 % wet, moisture 8 %,
     * Fc 1800: 200 x 1.194e-7 x (1 - 0.08) x 1800 x 100 / 12 = 0.32954 lb/MMBtu.
     */
    @Test
    void emission_rate_of_a_dry_emission_and_a_wet_carbon_dioxide() {
        Outcome outcome = Bench.run("correct", TestFuels.ofClass("bituminous coal"), "nox", "200 ppmvd", "atCo2Wet", "12 %",
                "moisture", "8 %");
        assertEquals(0.32954, Bench.in("lb/MMBtu", outcome, "perMMBtu"), 0.0001);
    }

    static Stream<Check> analyses() {
        return CheckFile.checks("01-method19", "Fd from", "Fw from", "Fc from");
    }

    /** Equations 19-13 to 19-15 of ultimate analyses. */
    @ParameterizedTest
    @MethodSource("analyses")
    void factors_of_analyses(Check check) {
        double gross = Value.of(check.input("GCV"), "Btu/lb").si();
        FFactors factors = FFactors.computed(TestFuels.solid(check.inputs(), gross));
        check.verify(in("scf68/MMBtu", factor(factors, check.quantity())));
    }

    static Stream<Check> fo() {
        return CheckFile.checks("01-method19", "Fo = 0.209 Fd/Fc");
    }

    /** Method 3B: Fo = 0.209 Fd/Fc; one row is for anthracite and lignite together and prints the factors of anthracite. */
    @ParameterizedTest
    @MethodSource("fo")
    void fo_of_the_table(Check check) {
        FFactors factors = FFactors.tabulated(switch (check.fuel()) {
            case "distillate oil" -> "oil";
            case "anthracite and lignite" -> "anthracite coal";
            default -> check.fuel();
        }).orElseThrow();
        check.verify(0.209 * factors.dry() / factors.co2());
    }

    static Stream<Check> foRanges() {
        return CheckFile.checks("01-method19", "expected range of Fo");
    }

    /** Method 3B: (20.9 - O2) / CO2 of a reading has to lie in the fuel's range; here of flue gas that the engine computes. */
    @ParameterizedTest
    @MethodSource("foRanges")
    void fo_of_a_computed_reading_lies_in_the_range_of_the_fuel(Check check) {
        Outcome burn = Bench.run("burn", switch (check.fuel()) {
            case "natural gas" -> TestFuels.NATURAL_GAS;
            case "propane" -> TestFuels.PROPANE;
            case "distillate oil" -> TestFuels.OIL_2;
            case "bituminous coal" -> TestFuels.BITUMINOUS_COAL;
            case "anthracite and lignite" -> TestFuels.ANTHRACITE;
            default -> throw new AssertionError(check);
        }, "o2", "3 %");
        check.verifyRange((20.9 - 3) / Bench.percent(burn, "dry", "CO2"));
    }

    /** Every row of the file belongs to one of the tests above, but for one in DoubtfulValuesTest. */
    @Test
    void no_row_is_left_out() {
        long tested = Stream.of(table(), coefficients(), constants(), equations(), analyses(), fo(),
                foRanges()).mapToLong(Stream::count).sum();
        assertEquals(CheckFile.all("01-method19").count() - 1, tested);
    }
}
