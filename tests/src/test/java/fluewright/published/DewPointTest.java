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

/** Water dew points of flue gas. */
class DewPointTest {

    static Stream<Check> dewPoints() {
        return CheckFile.all("07-water-dew-point");
    }

    /** Ranges are common practice (handbook charts, from memory); the other rows are first principles with IAPWS-IF97. */
    @ParameterizedTest
    @MethodSource("dewPoints")
    void dew_point_of_dry_air_and_a_fuel(Check check) {
        boolean altitude = check.inputs().contains("84.0 kPa");
        Outcome outcome = Bench.run("dewPoint", fuel(check.fuel()), "excessAir",
                (check.has("excess air") ? check.input("excess air") : 0) + " %",
                "stackPressure", altitude ? "84.0 kPa" : "101.325 kPa");
        double celsius = Bench.in("degC", outcome, "dewPoint");
        if (check.tolerance().equals("range")) {
            check.verifyRange(celsius);
        } else {
            check.verify(celsius);
        }
    }

    private static Fuel fuel(String name) {
        return switch (name) {
            case "methane / natural gas" -> TestFuels.METHANE;
            case "natural gas" -> TestFuels.NATURAL_GAS;
            case "propane" -> TestFuels.PROPANE;
            case "hydrogen" -> TestFuels.HYDROGEN;
            default -> TestFuels.OIL_2;
        };
    }

    @Test
    void burn_gives_the_same_dew_point() {
        Outcome burn = Bench.run("burn", TestFuels.NATURAL_GAS, "excessAir", "20 %", "stackPressure", "84 kPa");
        Outcome dewPoint = Bench.run("dewPoint", TestFuels.NATURAL_GAS, "excessAir", "20 %", "stackPressure", "84 kPa");
        assertEquals(Bench.si(dewPoint, "dewPoint"), Bench.si(burn, "dewPoint"), 1e-12);
    }

    /** By hand: metal of 60 degC above a dew point of 56.291 degC (check WDP-04, within 0.1 K) leaves 3.709 K. */
    @Test
    void margin_is_the_metal_above_the_dew_point() {
        Outcome outcome = Bench.run("dewPoint", TestFuels.NATURAL_GAS, "excessAir", "15 %", "metal", "60 degC");
        assertEquals(3.709, Bench.in("deltaC", outcome, "margin"), 0.1);
    }
}
