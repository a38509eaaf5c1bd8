package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.species.WaterSaturation;
import fluewright.support.CheckFile;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The saturation line of water. */
class WaterSaturationTest {

    /** IAPWS R7-97(2012), table 35: verification values of region 4, pressure (found). */
    @ParameterizedTest
    @CsvSource({"300, 3.53658941e-3", "500, 2.63889776", "600, 12.3443146"})
    void pressure_over_liquid_meets_the_verification_values_of_IF97(double t, double megapascal) {
        assertEquals(megapascal, WaterSaturation.pressure(t) / 1e6, 0.5e-8 * megapascal);
    }

    /** IAPWS R7-97(2012), table 36: verification values of region 4, temperature (from memory). */
    @ParameterizedTest
    @CsvSource({"0.1, 372.755919", "1, 453.035632", "10, 584.149488"})
    void temperature_meets_the_verification_values_of_IF97(double megapascal, double t) {
        assertEquals(t, WaterSaturation.temperature(megapascal * 1e6), 0.5e-6);
    }

    /** IAPWS R14-08(2011): verification value of the sublimation pressure (found). */
    @Test
    void pressure_over_ice_meets_the_verification_value_of_R14() {
        assertEquals(8.94735, WaterSaturation.pressure(230), 0.5e-5);
    }

    static Stream<NamedCsvRecord> table() {
        return CheckFile.rows("water-saturation").stream();
    }

    /** IAPWS-IF97 over liquid and R14-08 over ice; 0.001 %, or half a unit of the last digit printed where that is more. */
    @ParameterizedTest
    @MethodSource("table")
    void pressure_meets_the_table(NamedCsvRecord row) {
        String printed = row.getField("p_sat_Pa");
        double expected = Double.parseDouble(printed);
        int decimals = printed.contains(".") ? printed.length() - printed.indexOf('.') - 1 : 0;
        double allowed = Math.max(1e-5 * expected, 0.5 * Math.pow(10, -decimals));
        assertEquals(expected, WaterSaturation.pressure(Double.parseDouble(row.getField("T_K"))), allowed, row::toString);
    }

    /** The equations of temperature are those of pressure turned round: IF97 equation 31 is exact, the ice line is iterated. */
    @ParameterizedTest
    @MethodSource("table")
    void temperature_turns_pressure_round(NamedCsvRecord row) {
        double t = Double.parseDouble(row.getField("T_K"));
        assertEquals(t, WaterSaturation.temperature(WaterSaturation.pressure(t)), 1e-7);
    }

    /** The two lines meet at the triple point, 273.16 K and 611.657 Pa (IAPWS R14-08). */
    @Test
    void the_lines_meet_at_the_triple_point() {
        assertEquals(611.657, WaterSaturation.pressure(273.16), 0.01);
        assertEquals(WaterSaturation.pressure(273.16), WaterSaturation.pressure(Math.nextDown(273.16)), 0.01);
    }

    @Test
    void the_line_ends_at_the_critical_point_and_deep_in_the_ice() {
        assertTrue(Double.isNaN(WaterSaturation.pressure(647.1)));
        assertTrue(Double.isNaN(WaterSaturation.pressure(49)));
        assertTrue(Double.isNaN(WaterSaturation.temperature(22.1e6)));
        assertTrue(Double.isNaN(WaterSaturation.temperature(0)));
    }
}
