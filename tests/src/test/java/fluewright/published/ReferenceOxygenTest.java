package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import fluewright.engine.calculation.Outcome;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Correction to a reference O2, ppm and mass, wet and dry, CO free of its excess air. */
class ReferenceOxygenTest {

    static Stream<Check> all() {
        return CheckFile.all("03-reference-o2-units");
    }

    @ParameterizedTest
    @MethodSource("all")
    void emissions_in_other_terms(Check check) {
        switch (check.quantity().replaceFirst(",.*| per ppm at.*", "")) {
            case "concentration at reference O2" -> check.verify(check.has("C") ? correctedPpm(check) : correctedMass(check));
            case "difference between the two rules" -> check.verify(differenceOfRules(check));
            case "wet to dry concentration" -> check.verify(dryOfWet(check));
            case "mg/m3" -> check.verify(massPerPpm(check));
            case "NOx" -> check.verify(Bench.in("mg/Nm3", Bench.run("correct", "nox", "60 ppmvd", "at", "3 %", "to", "3 %"),
                    "correctedMass"));
            case "CO air-free" -> check.verify(Bench.in("ppm", correct("co", check.input("CO") + " ppm", check.input("O2"), 0,
                    "20.9 %"), "airFree"));
            case "NOx mg/kWh (net)" -> check.verify(milligramPerKilowattHour());
            default -> fail(check.toString());
        }
    }

    private static Outcome correct(String pollutant, String emission, double measuredAt, double reference, String air) {
        return Bench.run("correct", pollutant, emission, "at", measuredAt + " %", "to", reference + " %", "airO2", air);
    }

    private static double correctedMass(Check check) {
        return Bench.in("mg/Nm3", correct("nox", check.input("E_M") + " mg/Nm3", check.input("O2 measured"),
                check.input("O2 reference"), "21 %"),
                "correctedMass");
    }

    private static double correctedPpm(Check check) {
        return Bench.in("ppm", correct("nox", check.input("C") + " ppmvd", check.input("O2 measured"), check.input("O2 reference"),
                "20.9 %"),
                "corrected");
    }

    private static double differenceOfRules(Check check) {
        double us = Bench.si(correct("nox", check.input("C") + " ppm", check.input("O2 measured"), check.input("reference"), "20.9 %"),
                "corrected");
        double eu = Bench.si(correct("nox", check.input("C") + " ppm", check.input("O2 measured"), check.input("reference"), "21 %"),
                "corrected");
        return 100 * (us / eu - 1);
    }

    private static double dryOfWet(Check check) {
        Outcome outcome = Bench.run("correct", "nox", check.input("C wet") + " ppmvw", "moisture", 100 * check.input("moisture") + " %",
                "at", "3 %");
        return Bench.in("ppm", outcome, "measured");
    }

    /** At 0 degC in the unit mg/Nm3; at 25 degC with the rule's own molar volume, 24.45 L/mol. */
    private static double massPerPpm(Check check) {
        Outcome outcome = Bench.run("correct", check.fuel().contains("CO") ? "co" : "nox", "1 ppm", "at", "3 %");
        return check.quantity().contains("25 degC")
                ? Bench.in("mg/mol", outcome, "measuredMass") / 24.45e-3 : Bench.in("mg/Nm3", outcome, "measuredMass");
    }

    /** NOx of methane at 3 % O2 by the 21 % rule, with the dry stoichiometric flue gas as the F-factor, on the net heat. */
    private static double milligramPerKilowattHour() {
        double fd = Bench.in("Nm3/GJ", Bench.run("burn", TestFuels.METHANE, "lambda", "1"), "dryVolumePerHeat");
        Outcome outcome = Bench.run("correct", "nox", "1 ppm", "at", "3 %", "airO2", "21 %", "fd", fd + " Nm3/GJ");
        double grossToNet = TestFuels.METHANE.gross() / TestFuels.METHANE.net();
        return Bench.in("mg/kWh", outcome, "perGJ") * grossToNet;
    }

    /** By hand, the 21 % rule (EU; common practice): CO 100 mg/m3 at 6 % to 3 %: 100 (21 - 3)/(21 - 6) = 120 mg/m3. */
    @Test
    void carbon_monoxide_by_the_21_rule() {
        assertEquals(120, Bench.in("mg/Nm3", correct("co", "100 mg/Nm3", 6, 3, "21 %"), "correctedMass"), 1e-9);
    }

    /**
     * By hand: the oxygen of the air that a rule sets holds for the mass per heat too: 30 ppm NOx at 3 %, Fd 8710 scf/MMBtu, 21 %:
     * 30 x 1.19393e-7 x 8710 x 21/(21 - 3) = 0.036397 lb/MMBtu (46.0055 / 385.33e6 = 1.19393e-7 lb/scf; by 20.9 % it is 0.036426).
     */
    @Test
    void mass_per_heat_by_the_21_rule() {
        Outcome outcome = Bench.run("correct", "nox", "30 ppm", "at", "3 %", "airO2", "21 %", "fd", "8710 scf68/MMBtu");
        assertEquals(0.036397, Bench.in("lb/MMBtu", outcome, "perMMBtu"), 0.000003);
    }

    /**
     * By hand: 90 ppm in wet gas with 10 % water are 90 / (1 - 0.1) = 100 ppm dry; the wet O2 of 4.5 % is 5 % dry; to 3 % by the
     * 20.9 % rule: 100 (20.9 - 3)/(20.9 - 5) = 112.58 ppm.
     */
    @Test
    void wet_readings_of_a_probe_in_the_duct() {
        Outcome outcome = Bench.run("correct", "nox", "90 ppmvw", "atWet", "4.5 %", "moisture", "10 %", "to", "3 %");
        assertEquals(100, Bench.in("ppm", outcome, "measured"), 1e-9);
        assertEquals(90, Bench.in("ppm", outcome, "measuredWet"), 1e-9);
        assertEquals(5, Bench.in("pct", outcome, "o2"), 1e-9);
        assertEquals(112.58, Bench.in("ppm", outcome, "corrected"), 0.005);
    }

    /** By hand: with a wet reading and no moisture, the fuel's own: methane at 3 % O2 dry with dry air, the wet O2 of check EXA-04. */
    @ParameterizedTest
    @CsvSource({"methane, 2.499, 3", "propane, 4.3888, 5"})
    void moisture_comes_from_the_fuel(String fuel, double wet, double dry) {
        Outcome outcome = Bench.run("correct", fuel.equals("methane") ? TestFuels.METHANE : TestFuels.PROPANE, "nox", "50 ppmvd",
                "atWet", wet + " %");
        assertEquals(dry, Bench.in("pct", outcome, "o2"), 0.002 * dry);
    }
}
