package fluewright.engine.species;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;

/**
 * The chemical elements of fuels, air and flue gas, with their molar masses [kg/mol]: those of ISO 6976:2016 and of the
 * NASA Glenn data, so that masses and thermodynamic data agree.
 */
public enum Element {
    /** Hydrogen. */
    H(1.00794e-3),
    /** Carbon. */
    C(12.0107e-3),
    /** Nitrogen. */
    N(14.0067e-3),
    /** Oxygen. */
    O(15.9994e-3),
    /** Sulfur. */
    S(32.065e-3),
    /** Argon. */
    AR(39.948e-3),
    /** Helium. */
    HE(4.002602e-3),
    /** Neon. */
    NE(20.1797e-3),
    /** Chlorine. */
    CL(35.453e-3),
    /** Fluorine. */
    F(18.9984032e-3);

    private final double molarMass;

    Element(double molarMass) {
        this.molarMass = molarMass;
    }

    /** Returns the molar mass [kg/mol]. */
    public double molarMass() {
        return molarMass;
    }

    /** Returns the atoms of a formula written as in the data files, such as {@code C:1;H:4}. */
    public static Map<Element, Double> atoms(String formula) {
        Map<Element, Double> atoms = new EnumMap<>(Element.class);
        for (String part : formula.split(";")) {
            int colon = part.indexOf(':');
            atoms.merge(valueOf(part.substring(0, colon).toUpperCase(Locale.ROOT)), Double.valueOf(part.substring(colon + 1)), Double::sum);
        }
        return Collections.unmodifiableMap(atoms);
    }

    /** Returns the mass of an amount of atoms [kg], the amounts in mol. */
    public static double mass(Map<Element, Double> atoms) {
        double mass = 0;
        for (Map.Entry<Element, Double> entry : atoms.entrySet()) {
            mass += entry.getKey().molarMass * entry.getValue();
        }
        return mass;
    }
}
