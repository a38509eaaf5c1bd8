package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import fluewright.engine.emission.FFactors;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.Value;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.opentest4j.AssertionFailedError;

/**
 * Published values, all from memory, that are missed by more than their tolerance, and why the engine's number is kept. Each test
 * fails as soon as the published value is met: the row then belongs to the other tests.
 */
class DoubtfulValuesTest {

    /**
     * GAS-02, relative density of G21: EN 437 prints 0.684, 0.35 % above ISO 6976:2016; its mixtures with propane and butane are
     * 0.3 to 0.6 % above, by real-gas factors of its own. By hand from ISO 6976:2016: M = 0.87 x 16.04246 + 0.13 x 44.09562 =
     * 19.68937 g/mol; Z = 1 - (0.87 x 0.04452 + 0.13 x 0.1344)^2 = 0.996841; d = 19.68937/28.96546 x 0.999595/0.996841 = 0.68163.
     */
    @Test
    void relative_density_of_methane_with_propane() {
        Check check = CheckFile.check("10-gas-quality", "GAS-02");
        double actual = Bench.si(Bench.run("properties", TestFuels.gas(check.inputs())), "relativeDensity");
        assertEquals(0.68163, actual, 0.00001);
        assertMissed(check, check.expected("d"), actual);
    }

    /**
     * M19-30, Fc of propane in SI units: the printed 0.321e-7 scm/J is 0.505 % above the US figure of the same table, 1190 scf/MMBtu x
     * 0.0283168 m3/scf / 1055.056e6 J/MMBtu = 3.1939e-8.
     */
    @Test
    void carbon_dioxide_factor_of_propane_in_SI_units() {
        Check check = CheckFile.check("01-method19", "M19-30");
        double actual = Value.ofSi(FFactors.tabulated("propane").orElseThrow().co2(), Units.of("m3at20/J"), Basis.NONE).number();
        assertEquals(3.1939e-8, actual, 1e-12);
        assertMissed(check, check.value(), actual);
    }

    /**
     * SIE-31 to SIE-34, largest CO2 of fuels that the handbook does not write out: a coke-oven gas with much hydrogen, oils, a
     * bituminous coal and an anthracite of usual compositions miss by 0.2 to 1.1 points. SIE-24 and SIE-25 of the same file have
     * 15.383 and 18.527 % for such an oil and coal, from first principles, and are met. What excess air makes of these values is met.
     */
    @ParameterizedTest
    @CsvSource({"SIE-31, coke oven gas, 0.4", "SIE-32, oil, 0.2", "SIE-33, coal, 0.2", "SIE-34, anthracite, 0.2"})
    void largest_carbon_dioxide_of_fuels_that_are_not_written_out(String id, String fuel, double allowed) {
        Check check = CheckFile.check("04-siegert-co2max", id);
        double actual = Bench.percent(Bench.run("burn", fuel(fuel), "lambda", "1"), "dry", "CO2");
        assertThrows(AssertionFailedError.class, () -> assertEquals(check.list()[0], actual, allowed));
        assertEquals(check.list()[0], actual, 1.2, check::toString);
    }

    private static Fuel fuel(String name) {
        return switch (name) {
            case "coke oven gas" -> TestFuels.COKE_OVEN_GAS;
            case "oil" -> TestFuels.OIL_2;
            case "coal" -> TestFuels.BITUMINOUS_COAL;
            default -> TestFuels.ANTHRACITE;
        };
    }

    private static void assertMissed(Check check, double number, double actual) {
        assertThrows(AssertionFailedError.class, () -> check.verify(number, actual), check::toString);
    }
}
