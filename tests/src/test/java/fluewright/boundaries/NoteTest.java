package fluewright.boundaries;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.Note;
import fluewright.support.Bench;
import fluewright.support.TestFuels;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What results have to say about themselves: inputs that are used, but outside a method's range or apt to mislead. */
class NoteTest {

    @Test
    void the_shares_of_a_lab_sheet_are_scaled_and_it_is_said() {
        assertEquals("100.01 %", note(Bench.run("burn", TestFuels.NATURAL_GAS, "o2", "3 %"), EngineMessage.NORMALISED).detail().found());
        assertFalse(has(Bench.run("burn", TestFuels.METHANE, "o2", "3 %"), EngineMessage.NORMALISED));
    }

    @ParameterizedTest
    @CsvSource({"co, 6 %", "air, 150 K", "pressure, 30 kPa", "humidityRatio, 0.3 kg/kg"})
    void an_input_outside_the_range_of_the_method_is_used_with_a_warning(String argument, String value) {
        Note note = note(Bench.run("burn", TestFuels.METHANE, "o2", "5 %", argument, value), EngineMessage.OUTSIDE_VALID_RANGE);
        assertEquals(argument, note.detail().where());
        assertEquals(Note.Level.WARNING, note.level());
    }

    /** Methane at 15 % excess air has its dew point at about 57 degC. */
    @Test
    void losses_warn_below_the_dew_point_and_below_the_air() {
        Outcome cold = Bench.run("losses", TestFuels.METHANE, "excessAir", "15 %", "stack", "40 degC");
        assertTrue(has(cold, EngineMessage.BELOW_DEW_POINT) && !has(cold, EngineMessage.COLDER_THAN_AIR));
        assertTrue(has(Bench.run("losses", TestFuels.METHANE, "excessAir", "15 %", "stack", "20 degC"), EngineMessage.COLDER_THAN_AIR));
        assertFalse(has(Bench.run("losses", TestFuels.METHANE, "excessAir", "15 %", "stack", "60 degC"), EngineMessage.BELOW_DEW_POINT));
    }

    @Test
    void losses_of_more_than_all_heat_are_warned_of() {
        Outcome all = Bench.run("losses", TestFuels.METHANE, "excessAir", "15 %", "stack", "150 degC", "radiation", "90 %");
        assertTrue(has(all, EngineMessage.LOSSES_EXCEED_HEAT));
        assertFalse(has(Bench.run("losses", TestFuels.METHANE, "excessAir", "15 %", "stack", "150 degC"), EngineMessage.LOSSES_EXCEED_HEAT));
    }

    /** Common practice: a correction from an O2 near that of air is not to be trusted. */
    @Test
    void a_correction_from_near_the_oxygen_of_air_is_warned_of() {
        assertTrue(has(Bench.run("correct", "nox", "5 ppm", "at", "18 %", "to", "3 %"), EngineMessage.ILL_CONDITIONED));
        assertFalse(has(Bench.run("correct", "nox", "5 ppm", "at", "10 %", "to", "3 %"), EngineMessage.ILL_CONDITIONED));
    }

    /** Equation 19-7, both readings wet, takes no moisture; a wet O2 with a fuel takes that of the fuel. */
    @Test
    void computed_moisture_is_named_where_it_was_computed() {
        assertTrue(has(Bench.run("correct", TestFuels.METHANE, "nox", "30 ppmvw", "at", "3 %"), EngineMessage.MOISTURE_COMPUTED));
        assertFalse(has(Bench.run("correct", TestFuels.METHANE, "nox", "30 ppmvw", "atCo2Wet", "9 %"), EngineMessage.MOISTURE_COMPUTED));
        assertFalse(has(Bench.run("correct", TestFuels.METHANE, "nox", "30 ppmvd", "at", "3 %"), EngineMessage.MOISTURE_COMPUTED));
    }

    @Test
    void estimates_say_so() {
        assertTrue(has(Bench.run("properties", TestFuels.BITUMINOUS_COAL), EngineMessage.HEATING_VALUE_ESTIMATED));
        assertFalse(has(Bench.run("properties", TestFuels.OIL_6), EngineMessage.HEATING_VALUE_ESTIMATED));
        assertTrue(has(Bench.run("properties", TestFuels.solid("C 87 H 12.6 S 0.4", 30e6)), EngineMessage.HEATING_VALUE_CONTRADICTS));
        assertTrue(has(Bench.run("properties", FuelBuilder.gas("dme", Map.of("CH3OCH3", 1.0), false).build()),
                EngineMessage.NOT_IN_ISO_6976));
    }

    @Test
    void results_that_lead_to_a_setting_carry_the_caution() {
        assertEquals(Note.Level.CAUTION, note(Bench.run("burn", TestFuels.METHANE, "o2", "3 %"), EngineMessage.SETTING_CAUTION).level());
        assertTrue(has(Bench.run("losses", TestFuels.METHANE, "o2", "3 %", "stack", "150 degC"), EngineMessage.SETTING_CAUTION));
    }

    /** Coal without hydrogen and moisture, but 0.02 %: the little water freezes out before it condenses. */
    @Test
    void a_frost_point_is_called_so() {
        assertTrue(has(Bench.run("dewPoint", TestFuels.solid("C 99.98 H 0.02", 0), "o2", "5 %"), EngineMessage.FROST_POINT));
        assertFalse(has(Bench.run("dewPoint", TestFuels.METHANE, "o2", "5 %"), EngineMessage.FROST_POINT));
    }

    private static boolean has(Outcome outcome, EngineMessage message) {
        return outcome.notes().stream().anyMatch(note -> note.message() == message);
    }

    private static Note note(Outcome outcome, EngineMessage message) {
        return outcome.notes().stream().filter(note -> note.message() == message).findFirst().orElseThrow();
    }
}
