package fluewright.boundaries;

import static fluewright.support.Bench.refused;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.Blend;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.quantity.Value;
import fluewright.engine.quantity.ValueText;
import fluewright.support.Bench;
import fluewright.support.TestFuels;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Bad inputs: the message constant, what was found, and the way out; never the sentence. */
class RefusalTest {

    private static final Fuel GAS = TestFuels.NATURAL_GAS;

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void a_number_has_to_be_finite(double number) {
        Detail detail = refused(EngineMessage.NOT_A_NUMBER, () -> Value.of(number, "pct")).detail();
        assertEquals(String.valueOf(number), detail.found());
        assertEquals("pct", detail.where());
    }

    @ParameterizedTest
    @CsvSource({"o2, -1 %", "o2, 100 %", "o2, 250 %", "co2, 0 %", "o2Wet, -0.1 %", "co, -5 ppm", "co, 2000000 ppm", "excessAir, -100 %",
        "lambda, 0", "lambda, -1", "humidity, 101 %", "humidity, -1 %", "pressure, 0 kPa", "pressure, -5 kPa", "air, 0 K", "air, -300 degC",
        "humidityRatio, -0.1 kg/kg", "carbonInAsh, 100 %"})
    void an_impossible_number_is_refused(String argument, String value) {
        Detail detail = refused(EngineMessage.IMPOSSIBLE, () -> Bench.run("burn", GAS, argument, value)).detail();
        assertEquals("burn " + argument, detail.where());
        assertEquals(ValueText.parse(value).toString(), detail.found());
        assertTrue(!detail.expected().isEmpty());
    }

    @ParameterizedTest
    @CsvSource({"o2, 3 kPa", "o2, 3 degC", "air, 20 %", "stack, 5 kg", "pressure, 1 MJ/kg", "humidityRatio, 3 K"})
    void a_unit_of_another_kind_is_refused(String argument, String value) {
        Detail detail = refused(EngineMessage.WRONG_UNIT, () -> Bench.run("losses", GAS, argument, value)).detail();
        assertEquals("losses " + argument, detail.where());
        assertEquals(ValueText.parse(value).toString(), detail.found());
    }

    /** A temperature and a difference of temperatures are kept apart, both ways. */
    @Test
    void a_difference_is_no_temperature() {
        assertEquals("180 deltaC", refused(EngineMessage.WRONG_UNIT, () -> Bench.run("losses", GAS,
                "stack", "180 deltaC")).detail().found());
        Value<?> hot = Value.of(180, "degC");
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> hot.plus(hot));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> Value.of(10, "deltaC").minus(hot));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> hot.multiply(2));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> hot.to("deltaC"));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> hot.plus(Value.of(1, "kPa")));
        assertEquals(10, hot.minus(Value.of(170, "degC")).to("deltaC").number(), 1e-9);
    }

    @Test
    void wet_is_not_dry() {
        Detail detail = refused(EngineMessage.WRONG_BASIS, () -> Bench.run("burn", GAS, "o2", "3 %", "co", "50 ppmvw")).detail();
        assertEquals("burn co", detail.where());
        assertEquals(Value.of(50, "ppmvw").toString(), detail.found());
        Value<?> dry = (Value<?>) Bench.run("burn", GAS, "o2", "3 %").get("o2");
        refused(EngineMessage.WRONG_BASIS, () -> Bench.run("burn", GAS, "o2Wet", dry));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> Value.of(50, "ppmvw").plus(Value.of(50, "ppmvd")));
        refused(EngineMessage.UNITS_DO_NOT_FIT, () -> Value.of(50, "ppmvw").to("ppmvd"));
    }

    @Test
    void a_bare_number_is_refused_and_the_unit_shown() {
        Detail detail = refused(EngineMessage.UNIT_MISSING, () -> Bench.run("losses", GAS, "o2", "3 %", "stack", 180)).detail();
        assertEquals("losses stack", detail.where());
        assertEquals("180", detail.found());
        assertTrue(detail.nearest().contains("180.degC"), detail::nearest);
        Bench.run("burn", GAS, "lambda", 1.2);
    }

    @ParameterizedTest
    @CsvSource({"o3, o2", "exessAir, excessAir", "stak, stack", "humidty, humidity", "carbonInAhs, carbonInAsh"})
    void an_unknown_argument_is_answered_with_the_nearest(String typed, String meant) {
        Detail detail = refused(EngineMessage.UNKNOWN_ARGUMENT, () -> Bench.run("losses", GAS, typed, "3 %")).detail();
        assertEquals(typed, detail.found());
        assertEquals(meant, detail.nearest());
    }

    @Test
    void unknown_names_are_answered_with_the_nearest() {
        assertEquals("losses", refused(EngineMessage.UNKNOWN_CALCULATION, () -> Bench.run("loses", GAS)).detail().nearest());
        assertEquals("dewPoint", refused(EngineMessage.UNKNOWN_COMPONENT,
                () -> Bench.run("burn", GAS, "o2", "3 %").get("dewpoint")).detail().nearest());
        assertEquals("degC", refused(EngineMessage.UNKNOWN_UNIT, () -> Value.of(1, "degc")).detail().nearest());
        assertEquals("3 pcts", refused(EngineMessage.UNKNOWN_UNIT, () -> ValueText.parse("3 pcts")).detail().found());
        assertEquals("CH4", refused(EngineMessage.UNKNOWN_FUEL_COMPONENT,
                () -> FuelBuilder.gas("lab", Map.of("CH44", 1.0), false)).detail().nearest());
        assertEquals("moisture", refused(EngineMessage.UNKNOWN_FUEL_COMPONENT,
                () -> new UltimateAnalysis(Map.of("moistur", 0.1), AnalysisBasis.DRY)).detail().nearest());
        assertEquals("table", refused(EngineMessage.WRONG_TYPE,
                () -> Bench.run("correct", GAS, "nox", "30 ppm", "at", "3 %", "factor", "tabel")).detail().nearest());
    }

    @Test
    void what_is_needed_is_asked_for() {
        assertEquals("none", refused(EngineMessage.ONE_OF, () -> Bench.run("burn", GAS)).detail().found());
        refused(EngineMessage.ARGUMENT_MISSING, () -> Bench.run("burn", "o2", "3 %"));
        assertEquals("no stack", refused(EngineMessage.ARGUMENT_MISSING, () -> Bench.run("losses", GAS, "o2", "3 %")).detail().found());
        refused(EngineMessage.ONE_OF, () -> Bench.run("correct", "at", "3 %"));
        refused(EngineMessage.ONE_OF, () -> Bench.run("correct", "nox", "30 ppm"));
        refused(EngineMessage.NEEDS_ALSO, () -> Bench.run("correct", "nox", "30 ppmvw", "at", "3 %"));
        refused(EngineMessage.NEEDS_ALSO, () -> Bench.run("correct", "nox", "0.04 lb/MMBtu", "to", "3 %"));
        refused(EngineMessage.NEEDS_ALSO, () -> Bench.run("burn", GAS, "o2", "3 %", "ambient", "20 degC"));
        refused(EngineMessage.NO_F_FACTOR, () -> Bench.run("correct", GAS, "nox", "30 ppm", "at", "3 %", "factor", "table"));
    }

    @Test
    void what_excludes_one_another_is_refused() {
        assertEquals("lambda and o2", refused(EngineMessage.ONE_OF, () -> Bench.run("burn", GAS, "o2", "3 %",
                "lambda", "1.1")).detail().found());
        refused(EngineMessage.ONE_OF, () -> Bench.run("correct", "nox", "30 ppm", "co", "30 ppm", "at", "3 %"));
        refused(EngineMessage.ONE_OF, () -> Bench.run("correct", "nox", "30 ppm", "at", "3 %", "atWet", "3 %"));
        refused(EngineMessage.NOT_BOTH, () -> Bench.run("burn", GAS, "o2", "3 %", "humidity", "60 %", "humidityRatio", "0.01 kg/kg"));
        refused(EngineMessage.NOT_BOTH, () -> Bench.run("burn", TestFuels.BITUMINOUS_COAL, "o2", "3 %", "carbonInAsh", "5 %",
                "unburnedCarbon", "1 %"));
    }

    @Test
    void unnamed_values_have_to_have_a_place() {
        Fuel other = TestFuels.PROPANE;
        Detail detail = refused(EngineMessage.TOO_MANY_VALUES, () -> Bench.runOn("burn", List.of(GAS, other), "o2", "3 %")).detail();
        assertEquals(other.toString(), detail.found());
        refused(EngineMessage.WRONG_TYPE, () -> Bench.runOn("burn", List.of(3.5), "o2", "3 %"));
        refused(EngineMessage.WRONG_TYPE, () -> Bench.run("burn", GAS, "o2", List.of(3)));
        refused(EngineMessage.NOT_A_VALUE, () -> Bench.run("burn", GAS, "o2", "three"));
    }

    @ParameterizedTest
    @CsvSource({"o2, 20.939 %", "o2, 25 %", "o2Wet, 21 %"})
    void a_flue_gas_has_less_oxygen_than_air(String argument, String value) {
        assertEquals(argument, refused(EngineMessage.OXYGEN_OF_AIR, () -> Bench.run("burn", GAS, argument, value)).detail().where());
    }

    @ParameterizedTest
    @CsvSource({"at, 20.9 %, 3 %", "at, 3 %, 21 %", "at, 22 %, 3 %"})
    void a_correction_has_less_oxygen_than_air(String argument, String measured, String reference) {
        refused(EngineMessage.OXYGEN_OF_AIR, () -> Bench.run("correct", "nox", "30 ppm", argument, measured, "to", reference));
    }

    /** The largest CO2 of methane is 11.74 % with the air of CIPM-2007, that of hydrogen the air's own; air alone has 0.04 %. */
    @Test
    void carbon_dioxide_is_at_most_its_maximum() {
        assertEquals("12 %", refused(EngineMessage.CO2_ABOVE_MAXIMUM, () -> Bench.run("burn", TestFuels.METHANE,
                "co2", "12 %")).detail().found());
        Bench.run("burn", TestFuels.METHANE, "co2", "11.7 %");
        refused(EngineMessage.CO2_ABOVE_MAXIMUM, () -> Bench.run("burn", TestFuels.HYDROGEN, "co2", "5 %"));
        refused(EngineMessage.READING_CONTRADICTS, () -> Bench.run("burn", TestFuels.METHANE, "co2", "0.01 %"));
        assertEquals("19 %", refused(EngineMessage.CO2_ABOVE_MAXIMUM, () -> Bench.run("correct", TestFuels.METHANE, "nox", "30 ppm",
                "atCo2", "19 %")).detail().found());
    }

    @ParameterizedTest
    @CsvSource({"lambda, 0.98", "excessAir, -5 %"})
    void less_air_than_theoretical_is_refused_without_the_carbon_monoxide_it_leaves(String argument, String value) {
        refused(EngineMessage.TOO_LITTLE_AIR, () -> Bench.run("burn", GAS, argument, value));
        Bench.run("burn", GAS, argument, value, "co", "2.5 %");
    }

    /** Hydrogen gives no CO; methane at 3 % O2 has too little carbon for 15 %; neither is a lack of air. */
    @ParameterizedTest
    @CsvSource({"H2 100, 100 ppm", "H2 100, 1000 ppm", "CH4 100, 15 %"})
    void there_is_no_more_carbon_monoxide_than_the_fuel_has_carbon_for(String fuel, String co) {
        Detail detail = refused(EngineMessage.READING_CONTRADICTS, () -> Bench.run("burn", TestFuels.gas(fuel), "o2", "3 %",
                "co", co)).detail();
        assertEquals("co", detail.where());
    }

    @Test
    void a_fuel_has_to_close_and_to_burn() {
        assertEquals("97 %", refused(EngineMessage.NOT_CLOSED,
                () -> FuelBuilder.gas("lab", Map.of("CH4", 0.97), false)).detail().found());
        refused(EngineMessage.NOT_CLOSED, () -> FuelBuilder.ultimate("coal", Phase.SOLID,
                new UltimateAnalysis(Map.of("C", 0.9), AnalysisBasis.DRY)));
        refused(EngineMessage.IMPOSSIBLE, () -> FuelBuilder.gas("lab", Map.of("CH4", 1.1, "N2", -0.1), false));
        refused(EngineMessage.IMPOSSIBLE, () -> FuelBuilder.gas("lab", Map.of("CH4", Double.NaN), false));
        refused(EngineMessage.NOTHING_TO_BURN, () -> FuelBuilder.gas("lab", Map.of("N2", 0.5, "CO2", 0.5), false).build());
        refused(EngineMessage.NOTHING_TO_BURN, () -> TestFuels.solid("ash 100", 0));
        refused(EngineMessage.ONLY_FOR_GASES, () -> FuelBuilder.ultimate("coal", Phase.SOLID,
                new UltimateAnalysis(Map.of("C", 1.0), AnalysisBasis.DRY)).measuredPerMole(4e5));
        refused(EngineMessage.IMPOSSIBLE, () -> TestFuels.solid("C 80 H 20", 1e6));
        refused(EngineMessage.NOT_CLOSED, () -> Blend.of(Map.of(GAS, 0.5, TestFuels.PROPANE, 0.4), Blend.By.MASS));
        refused(EngineMessage.CANNOT_BLEND, () -> Blend.of(Map.of(GAS, 0.5, TestFuels.OIL_2, 0.5), Blend.By.VOLUME));
    }

    @Test
    void other_impossible_states_are_refused() {
        refused(EngineMessage.MORE_CARBON_THAN_FUEL, () -> Bench.run("burn", TestFuels.BITUMINOUS_COAL, "o2", "3 %",
                "unburnedCarbon", "75 %"));
        Fuel carbonOfItsOxide = TestFuels.gas("CO 20, CO2 80");
        refused(EngineMessage.MORE_CARBON_THAN_FUEL, () -> Bench.run("burn", carbonOfItsOxide, "lambda", "1.2", "unburnedCarbon", "15 %"));
        refused(EngineMessage.IMPOSSIBLE, () -> Bench.run("burn", GAS, "o2", "3 %", "humidity", "100 %", "ambient", "120 degC"));
        refused(EngineMessage.IMPOSSIBLE, () -> Bench.run("dewPoint", TestFuels.solid("C 100", 0), "o2", "3 %"));
        refused(EngineMessage.IMPOSSIBLE, () -> Bench.run("properties", GAS, "combustion", "17 degC"));
        refused(EngineMessage.IMPOSSIBLE, () -> Bench.run("properties", GAS, "metering", "25 degC"));
    }
}
