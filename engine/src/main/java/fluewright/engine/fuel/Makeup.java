package fluewright.engine.fuel;

import fluewright.engine.species.Element;
import fluewright.engine.species.SpeciesTable;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;

/**
 * What a kilogram of fuel as fired is made of.
 *
 * @param atoms    amounts of the elements, those of the moisture left out [mol/kg]
 * @param moisture amount of water that the fuel brings along as such [mol/kg]
 * @param ash      mass of mineral matter [kg/kg]
 */
public record Makeup(Map<Element, Double> atoms, double moisture, double ash) {

    /** Molar mass of water [kg/mol]. */
    static final double WATER = SpeciesTable.get("H2O").molarMass();

    /** Copies the amounts. */
    public Makeup {
        atoms = Collections.unmodifiableMap(new EnumMap<>(atoms));
    }

    /** Returns the amount of an element's atoms [mol/kg]. */
    public double atoms(Element element) {
        return atoms.getOrDefault(element, 0.0);
    }

    /** Returns the mass fraction of an element as fired [kg/kg], that in the moisture left out. */
    public double massFraction(Element element) {
        return atoms(element) * element.molarMass();
    }

    /** Returns the mass fraction of moisture as fired [kg/kg]. */
    public double moistureMass() {
        return moisture * WATER;
    }

    /** Returns the water that leaves with the flue gas when all hydrogen burns, the moisture included [mol/kg]. */
    public double waterFormed() {
        return atoms(Element.H) / 2 + moisture;
    }

    /** Returns the oxygen needed for complete combustion, {@code C + H/4 + S - O/2} [mol/kg]. */
    public double oxygenDemand() {
        return atoms(Element.C) + atoms(Element.H) / 4 + atoms(Element.S) - atoms(Element.O) / 2;
    }

    /** Returns the makeup of a kilogram that holds this much [kg/kg] of this fuel, for sums of several. */
    Makeup times(double share) {
        Map<Element, Double> scaled = new EnumMap<>(Element.class);
        atoms.forEach((element, n) -> scaled.put(element, n * share));
        return new Makeup(scaled, moisture * share, ash * share);
    }

    /** Returns the sum of two parts of a kilogram. */
    Makeup plus(Makeup other) {
        Map<Element, Double> sum = new EnumMap<>(Element.class);
        sum.putAll(atoms);
        other.atoms.forEach((element, n) -> sum.merge(element, n, Double::sum));
        return new Makeup(sum, moisture + other.moisture, ash + other.ash);
    }
}
