package fluewright.properties;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.combustion.Air;
import fluewright.engine.combustion.FlueGas;
import fluewright.engine.combustion.Stoichiometry;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.Makeup;
import fluewright.engine.species.Element;
import fluewright.engine.species.SpeciesTable;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;

/** Nothing is lost or made: the atoms of fuel and air are those of flue gas and unburned carbon. */
@Domain(RandomFuels.class)
@Domain(DomainContext.Global.class)
class ElementBalancePropertiesTest {

    private static final double RELATIVE = 1e-12;

    @Property
    void atoms_of_fuel_and_air_are_those_of_the_flue_gas(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1, max = 10) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.2) double water, @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.05) double co,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.3) double unburnedShare) {
        double burnable = Math.min(fuel.makeup().atoms(Element.C), fuel.makeup().oxygenDemand());
        double unburned = unburnedShare * burnable * Element.C.molarMass();
        Stoichiometry s = new Stoichiometry(fuel.makeup(), unburned);
        double dryAir = lambda * s.theoreticalAir();
        FlueGas gas = s.flueGas(dryAir, new Air(water), co);
        for (Element element : List.of(Element.C, Element.H, Element.O, Element.N, Element.S, Element.AR, Element.HE, Element.NE)) {
            double in = atoms(fuel.makeup(), element) + Air.DRY_MOLE.atoms(element) * dryAir + atomsOfWater(element) * water * dryAir;
            double out = gas.wet().atoms(element) + (element == Element.C ? unburned / Element.C.molarMass() : 0);
            assertEquals(in, out, RELATIVE * in, element::name);
        }
    }

    /** Mass in is mass out: the fuel but its ash, the air with its water; molar masses are rounded to 0.01 mg/mol in the data. */
    @Property
    void mass_of_fuel_and_air_is_that_of_the_flue_gas(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1, max = 10) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.2) double water) {
        Stoichiometry s = new Stoichiometry(fuel.makeup(), 0);
        FlueGas gas = s.flueGas(lambda * s.theoreticalAir(), new Air(water), 0);
        double in = 1 - fuel.makeup().ash() + gas.dryAir() * Air.MOLAR_MASS * (1 + gas.air().humidityRatio());
        assertEquals(in, gas.wet().mass(), 1e-6 * in);
    }

    @Property
    void fractions_add_up_to_one(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1, max = 10) double lambda) {
        Stoichiometry s = new Stoichiometry(fuel.makeup(), 0);
        FlueGas gas = s.flueGas(lambda * s.theoreticalAir(), Air.DRY, 0);
        assertEquals(1, gas.wet().fractions().values().stream().mapToDouble(Double::doubleValue).sum(), RELATIVE);
        assertEquals(1, gas.dry().fractions().values().stream().mapToDouble(Double::doubleValue).sum(), RELATIVE);
        fuel.gas().ifPresent(g -> assertEquals(1, g.fractions().values().stream().mapToDouble(Double::doubleValue).sum(), RELATIVE));
        assertTrue(gas.wet().fractions().values().stream().allMatch(x -> x > 0));
    }

    private static double atoms(Makeup makeup, Element element) {
        return makeup.atoms(element) + makeup.moisture() * atomsOfWater(element);
    }

    private static double atomsOfWater(Element element) {
        return SpeciesTable.get("H2O").atoms(element);
    }
}
