package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.fuel.Fuel;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Flue losses from enthalpies: NASA Glenn polynomials, ISO 6976 heating values. */
class FlueLossTest {

    private static final double WATER_OVER_AIR = 18.01528 / 28.9655;
    /** The polynomials meet the enthalpy of formation at 25 degC within 0.001 J/mol; in percent of a heating value. */
    private static final double FIT = 1e-5;

    static Stream<Check> net() {
        return CheckFile.checks("04-siegert-co2max", "flue-gas loss from enthalpies");
    }

    @ParameterizedTest
    @MethodSource("net")
    void net_flue_loss(Check check) {
        Outcome losses = Bench.run("losses", fuel(check), "o2", check.input("O2") + " %", "stack", check.input("tA") + " degC",
                "air", check.input("tL") + " degC");
        check.verify(Bench.in("pct", losses, "netFlueLoss"));
    }

    private static Fuel fuel(Check check) {
        return switch (check.id()) {
            case "SIE-17" -> TestFuels.solid(check.fuel(), 45.6e6);
            case "SIE-18" -> TestFuels.NATURAL_GAS;
            default -> TestFuels.PROPANE;
        };
    }

    /** LOS-07: the oil of the row's handbook, C 84 H 12 N 0.5 O 1.5 S 1.5, moisture 0.5; 10200 kcal/kg; 220 degC, air 27 degC. */
    @Test
    void oil_at_seven_percent_oxygen() {
        Check check = CheckFile.check("09-boiler-losses", "LOS-07");
        Fuel oil = TestFuels.solid("C 84 H 12 N 0.5 O 1.5 S 1.5 moisture 0.5", 10200 * 4186.8);
        Outcome losses = Bench.run("losses", oil, "excessAir", check.input("excess air") + " %", "stack", "220 degC", "air", "27 degC");
        check.verify(Bench.in("pct", losses, "flueLoss"));
    }

    @Test
    void residual_oil_with_humid_air() {
        Check check = CheckFile.check("09-boiler-losses", "LOS-08");
        verifyHumid(check, TestFuels.solid(check.fuel(), 43.0e6), "4 %", "230 degC", "25 degC", 0.01);
    }

    @Test
    void natural_gas_with_humid_air() {
        Check check = CheckFile.check("09-boiler-losses", "LOS-09");
        verifyHumid(check, TestFuels.gas(check.fuel()), "3 %", "150 degC", "20 degC", 0.012);
    }

    private static void verifyHumid(Check check, Fuel fuel, String o2, String stack, String air, double molesOfWater) {
        Outcome losses = Bench.run("losses", fuel, "o2", o2, "stack", stack, "air", air,
                "humidityRatio", molesOfWater * WATER_OVER_AIR + " kg/kg");
        check.verify(Bench.in("pct", losses, "flueLoss"));
    }

    /**
     * By hand: 1 kg of carbon in 10 % ash with 20 % carbon in the residue. Residue = 0.1/(1 - 0.2) = 0.125 kg, of it 0.025 kg
     * carbon; 0.025 x 393.51 / 0.0120107 kJ = 819.1 kJ; of 30 MJ/kg gross that is 2.730 %. (393.51 kJ/mol: CODATA.)
     */
    @Test
    void carbon_in_ash_is_a_loss() {
        Fuel coal = TestFuels.solid("C 75 H 5 O 8 N 1 S 1 ash 10", 30e6);
        Outcome losses = Bench.run("losses", coal, "o2", "4 %", "stack", "150 degC", "carbonInAsh", "20 %");
        assertEquals(2.730, Bench.in("pct", losses, "unburnedCarbon"), 0.001);
    }

    /**
     * By hand: methane at theoretical air less the oxygen of CO, 1 % CO in the dry gas. Dry gas over dry air a: n = a - 1 + CO/2
     * with CO = 0.01 n; at a = 9.5516 (2 / 0.20939): n = 8.5516 / 0.995 = 8.5946, CO = 0.085946 mol, its heat 0.085946 x 282.98
     * = 24.321 kJ; of 890.58 kJ gross that is 2.731 %.
     */
    @Test
    void carbon_monoxide_is_a_loss() {
        Outcome losses = Bench.run("losses", TestFuels.METHANE, "lambda", "1", "co", "1 %", "stack", "150 degC");
        assertEquals(2.731, Bench.in("pct", losses, "carbonMonoxide"), 0.001);
    }

    /**
     * By hand: hydrogen has gross 285.83 and net 285.83 - 44.013 = 241.817 kJ/mol; with the flue gas and the air at 25 degC only
     * the latent heat is lost: 44.013 / 285.83 = 15.398 % gross, nothing net; efficiency 84.602 % gross, 100 % net.
     */
    @Test
    void latent_heat_is_all_that_is_lost_at_25_degC() {
        Outcome losses = Bench.run("losses", TestFuels.HYDROGEN, "excessAir", "30 %", "stack", "25 degC", "air", "25 degC");
        assertEquals(15.398, Bench.in("pct", losses, "flueLoss"), 0.001);
        assertEquals(84.602, Bench.in("pct", losses, "grossEfficiency"), 0.001);
        assertEquals(0, Bench.in("pct", losses, "netFlueLoss"), FIT);
        assertEquals(100, Bench.in("pct", losses, "netEfficiency"), FIT);
    }
}
