package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.fuel.Blend;
import fluewright.engine.fuel.Fuel;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Heating values by volume, relative density and Wobbe index of gases: ISO 6976:2016. */
class GasQualityTest {

    static Stream<Check> testGases() {
        return CheckFile.checks("10-gas-quality", "net/gross");
    }

    /** EN 437 test gases at 15/15 degC (from memory), within the tolerance of each row. */
    @ParameterizedTest
    @MethodSource("testGases")
    void test_gases_have_the_values_of_EN_437(Check check) {
        Outcome quality = Bench.run("properties", TestFuels.gas(check.inputs()));
        check.verify(check.expected("Hi"), Bench.in("MJ/m3", quality, "volumeNet"));
        check.verify(check.expected("Hs"), Bench.in("MJ/m3", quality, "volumeGross"));
        if (!check.id().equals("GAS-02")) { // see DoubtfulValuesTest
            check.verify(check.expected("d"), Bench.si(quality, "relativeDensity"));
        }
        check.verify(check.expected("Wi"), Bench.in("MJ/m3", quality, "netWobbe"));
        check.verify(check.expected("Ws"), Bench.in("MJ/m3", quality, "grossWobbe"));
    }

    static Stream<Check> hydrogen() {
        return CheckFile.checks("10-gas-quality", "hydrogen in natural gas");
    }

    /** ISO 6976:2016 data, change in percent by hydrogen in natural gas. */
    @ParameterizedTest
    @MethodSource("hydrogen")
    void hydrogen_lowers_heating_value_and_Wobbe_index(Check check) {
        double share = Double.parseDouble(check.inputs().substring(0, check.inputs().indexOf(' '))) / 100;
        Outcome blend = Bench.run("properties", blend(share));
        Outcome gas = Bench.run("properties", TestFuels.NATURAL_GAS);
        check.verify(check.list()[0], change(blend, gas, "volumeGross"));
        check.verify(check.list()[1], change(blend, gas, "grossWobbe"));
    }

    private static Fuel blend(double hydrogen) {
        return Blend.of(Map.of(TestFuels.HYDROGEN, hydrogen, TestFuels.NATURAL_GAS, 1 - hydrogen), Blend.By.VOLUME);
    }

    private static double change(Outcome changed, Outcome from, String component) {
        return 100 * (Bench.si(changed, component) / Bench.si(from, component) - 1);
    }

    /**
     * Methane at 0/0 and 25/0 degC, by hand from the figures of ISO 6976:2016: s = 0.04886, Z = 1 - 0.04886^2 = 0.997613;
     * V = Z R T / p = 0.997613 x 8.3144621 x 273.15 / 101325 = 0.0223603 m3/mol; 892.92 kJ/mol / V = 39.933 MJ/m3 and
     * 890.58 kJ/mol / V = 39.829 MJ/m3; density 16.04246 g/mol / V = 0.71745 kg/m3.
     */
    @Test
    void methane_at_other_reference_temperatures() {
        Outcome at0 = Bench.run("properties", TestFuels.METHANE, "combustion", "0 degC", "metering", "0 degC");
        assertEquals(0.997613, Bench.si(at0, "compressionFactor"), 1e-6);
        assertEquals(39.933, Bench.in("MJ/m3", at0, "volumeGross"), 0.001);
        assertEquals(0.71745, Bench.in("kg/m3", at0, "density"), 0.00002);
        Outcome at25 = Bench.run("properties", TestFuels.METHANE, "combustion", "25 degC", "metering", "0 degC");
        assertEquals(39.829, Bench.in("MJ/m3", at25, "volumeGross"), 0.001);
    }
}
