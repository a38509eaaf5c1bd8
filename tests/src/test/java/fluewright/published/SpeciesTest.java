package fluewright.published;

import static fluewright.engine.data.DataFile.number;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.species.Element;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import fluewright.support.CheckFile;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The thermodynamic polynomials against tables that others computed. */
class SpeciesTest {

    static Stream<NamedCsvRecord> janaf() {
        return CheckFile.rows("janaf-cross-check").stream().filter(row -> !row.getField("species").equals("CH4"));
    }

    /** NIST-JANAF, 4th edition: 0.1 kJ/mol; for SO2 the data differ by up to 0.53 kJ/mol (to 2500 K). */
    @ParameterizedTest
    @MethodSource("janaf")
    void enthalpy_agrees_with_JANAF(NamedCsvRecord row) {
        double allowed = row.getField("species").equals("SO2") ? 0.53 : 0.1;
        assertEquals(number(row, "janaf_h_minus_h298_kJ_mol"), sensible(row), allowed, row::toString);
    }

    /** NASA/TP-2002-211556 evaluated by another program, printed to 0.001: catches a wrong coefficient or equation. */
    @ParameterizedTest
    @MethodSource("allJanaf")
    void enthalpy_and_heat_capacity_are_those_of_the_NASA_fit(NamedCsvRecord row) {
        assertEquals(number(row, "nasa9_h_minus_h298_kJ_mol"), sensible(row), 0.00051, row::toString);
        double cp = species(row).heatCapacity(number(row, "T_K"));
        assertEquals(number(row, "nasa9_cp_J_molK"), cp, 0.00051, row::toString);
    }

    static Stream<NamedCsvRecord> allJanaf() {
        return CheckFile.rows("janaf-cross-check").stream();
    }

    static Stream<NamedCsvRecord> known() {
        return CheckFile.rows("species-checks").stream().filter(row -> SpeciesTable.names().contains(row.getField("species")));
    }

    /** CODATA key values (from memory) within 0.005 kJ/mol, to that last digit; heat capacity at 298.15 K within 0.5 % of NIST-JANAF. */
    @ParameterizedTest
    @MethodSource("known")
    void enthalpy_of_formation_and_heat_capacity_at_the_reference(NamedCsvRecord row) {
        Species species = species(row);
        assertEquals(number(row, "hf_codata_kJ"), species.enthalpyOfFormation() / 1000, 0.0055, row::toString);
        double cp = number(row, "cp_janaf");
        assertEquals(cp, species.heatCapacity(Species.T_REF), 0.005 * cp, row::toString);
    }

    @Test
    void enough_species_are_compared_for_that_to_mean_something() {
        assertTrue(known().count() >= 9, () -> "only " + known().count());
    }

    static Stream<Species> all() {
        return SpeciesTable.names().stream().map(SpeciesTable::get);
    }

    /** The definition of the data: H(298.15 K) is the enthalpy of formation; the two ranges meet at 1000 K. */
    @ParameterizedTest
    @MethodSource("all")
    void enthalpy_is_that_of_formation_at_298_K_and_has_no_step_at_1000_K(Species species) {
        assertEquals(species.enthalpyOfFormation(), species.enthalpy(Species.T_REF), 0.01);
        double below = species.enthalpy(Math.nextDown(1000.0));
        assertEquals(below, species.enthalpy(1000), 1e-6 * Math.abs(below) + 0.05);
    }

    /** Molar mass is the sum of the atoms', as ISO 6976:2016 and the NASA data take them. */
    @ParameterizedTest
    @MethodSource("all")
    void molar_mass_is_that_of_the_atoms(Species species) {
        assertEquals(Element.mass(species.atoms()), species.molarMass(), 2e-7 * species.molarMass() + 1e-9);
    }

    private static Species species(NamedCsvRecord row) {
        return SpeciesTable.get(row.getField("species"));
    }

    private static double sensible(NamedCsvRecord row) {
        return species(row).sensibleHeat(number(row, "T_K")) / 1000;
    }
}
