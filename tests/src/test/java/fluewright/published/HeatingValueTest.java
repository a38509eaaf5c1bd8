package fluewright.published;

import static fluewright.engine.data.DataFile.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.GasComponent;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.IsoTemperature;
import fluewright.engine.species.Element;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import fluewright.support.Bench;
import fluewright.support.Check;
import fluewright.support.CheckFile;
import fluewright.support.TestFuels;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Heating values of gas components, gases, liquids and solids. */
class HeatingValueTest {

    /** NASA Glenn and ISO 6976:2016 agree within this, but for the components below [kJ/mol]. */
    private static final double AGREEMENT = 0.06 + 1e-9;
    /** Where the two sources differ by more: the deviations stated with the data [kJ/mol at 25 degC]. */
    private static final Map<String, Double> DEVIATIONS = Map.of("hydrogen cyanide", -1.99, "1,3-butadiene", 0.76,
            "carbon disulfide", -0.66, "carbonyl sulfide", 0.39, "cyclohexane", -0.22, "toluene", 0.17, "methanol", 0.14);

    static Stream<NamedCsvRecord> components() {
        return CheckFile.rows("heating-values-iso6976").stream();
    }

    static Stream<NamedCsvRecord> crossChecked() {
        return components().filter(row -> !row.getField("gross_nasa9_25C_kJ_mol").isEmpty());
    }

    /** ISO 6976:2016, table of gross molar heating values (figures). */
    @ParameterizedTest
    @MethodSource("components")
    void components_have_the_values_of_ISO_6976(NamedCsvRecord row) {
        GasComponent component = component(row);
        List<String> columns = List.of("0", "15", "15.55", "20", "25");
        for (IsoTemperature t : IsoTemperature.values()) {
            double expected = number(row, "gross_2016_" + columns.get(t.ordinal()) + "C_kJ_mol");
            assertEquals(expected, component.gross(t) / 1000, 1e-9, row::toString);
        }
        assertEquals(number(row, "molar_mass_2016_g_mol"), component.molarMass() * 1000, 1e-9, row::toString);
    }

    /** ISO 6976:2016 against NASA Glenn enthalpies of formation, an independent source, at 0, 15 and 25 degC. */
    @ParameterizedTest
    @MethodSource("crossChecked")
    void components_agree_with_NASA_enthalpies(NamedCsvRecord row) {
        GasComponent component = component(row);
        double deviation = DEVIATIONS.getOrDefault(component.title(), 0.0);
        Map.of("25", IsoTemperature.T25, "15", IsoTemperature.T15, "0", IsoTemperature.T0).forEach((celsius, t) ->
                assertEquals(number(row, "gross_nasa9_" + celsius + "C_kJ_mol") - deviation, component.gross(t) / 1000, AGREEMENT,
                        row::toString));
    }

    static Stream<NamedCsvRecord> species() {
        return crossChecked().filter(row -> SpeciesTable.names().contains(component(row).symbol()));
    }

    /** The same from the engine's own species: heat of reaction at 298.15 K, liquid water at -285.830 kJ/mol (CODATA). */
    @ParameterizedTest
    @MethodSource("species")
    void components_agree_with_the_species_table(NamedCsvRecord row) {
        Species species = SpeciesTable.get(component(row).symbol());
        assertEquals(number(row, "gross_nasa9_25C_kJ_mol"), heatOfReaction(species) / 1000, 0.0015, row::toString);
    }

    private static double heatOfReaction(Species fuel) {
        return fuel.enthalpyOfFormation()
                - fuel.atoms(Element.C) * SpeciesTable.get("CO2").enthalpyOfFormation()
                - fuel.atoms(Element.S) * SpeciesTable.get("SO2").enthalpyOfFormation()
                + fuel.atoms(Element.H) / 2 * 285830;
    }

    /** ISO 6976:2016: net is gross less 44.013 kJ per mole of water formed, at 25 degC. */
    @ParameterizedTest
    @MethodSource("burnable")
    void net_heating_value_is_that_of_ISO_6976(NamedCsvRecord row) {
        Fuel fuel = FuelBuilder.gas("pure", Map.of(component(row).symbol(), 1.0), false).build();
        double net = Bench.in("kJ/mol", Bench.run("properties", fuel), "molarNet");
        assertEquals(number(row, "net_2016_25C_kJ_mol"), net, 0.0051, row::toString);
    }

    /** Without water, whose gross value is its heat of vaporization, and the inert gases. */
    static Stream<NamedCsvRecord> burnable() {
        return components().filter(row -> number(row, "gross_2016_25C_kJ_mol") > 50);
    }

    static Stream<Check> estimates() {
        return CheckFile.all("13-fuel-properties");
    }

    /** Channiwala and Parikh, Fuel 81 (2002); the third number of each row. */
    @ParameterizedTest
    @MethodSource("estimates")
    void estimate_is_that_of_Channiwala_and_Parikh(Check check) {
        Fuel fuel = TestFuels.solid(check.inputs(), 0);
        check.verify(check.list()[2], Bench.in("MJ/kg", Bench.run("properties", fuel), "gross"));
    }

    @Test
    void enough_components_are_compared_for_that_to_mean_something() {
        assertTrue(components().count() >= 55 && crossChecked().count() >= 45 && species().count() >= 40 && burnable().count() >= 50);
    }

    private static GasComponent component(NamedCsvRecord row) {
        return GasComponents.of(row.getField("component"));
    }
}
