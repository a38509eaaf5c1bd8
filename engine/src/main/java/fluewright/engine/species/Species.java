package fluewright.engine.species;

import java.util.Map;

/**
 * A gas species with its thermodynamic polynomial.
 *
 * <p>Source: NASA/TP-2002-211556, nine-coefficient form (equations stand in {@code species.csv}); R is the value of the
 * fit, 8.314510 J/(mol K). Valid range: 200 to 6000 K. Worked number: CO2 at
 * 1000 K lies 33.400 kJ/mol above 298.15 K (NIST-JANAF, 4th edition: 33.397); most species agree with JANAF within
 * 0.1 kJ/mol to 2500 K.
 */
public final class Species {

    /** Gas constant of the NASA Glenn fits [J/(mol K)]. */
    public static final double R = 8.314510;
    /** Reference temperature of the data and of heating values [K]. */
    public static final double T_REF = 298.15;
    /** Lowest temperature of the polynomials [K]. */
    public static final double T_LOW = 200;
    /** Highest temperature of the polynomials [K]. */
    public static final double T_HIGH = 6000;

    private static final double T_MID = 1000;

    private final String name;
    private final String title;
    private final Map<Element, Double> atoms;
    private final double molarMass;
    private final double formation;
    private final double[] low;
    private final double[] high;
    private final double reference;

    Species(String name, String title, Map<Element, Double> atoms, double molarMass, double formation, double[] low, double[] high) {
        this.name = name;
        this.title = title;
        this.atoms = atoms;
        this.molarMass = molarMass;
        this.formation = formation;
        this.low = low;
        this.high = high;
        this.reference = enthalpy(T_REF);
    }

    /** Returns the name, such as {@code CO2} or {@code n-C4H10}. */
    public String name() {
        return name;
    }

    /** Returns the name in words. */
    public String title() {
        return title;
    }

    /** Returns the atoms of one molecule. */
    public Map<Element, Double> atoms() {
        return atoms;
    }

    /** Returns the atoms of one element in a molecule. */
    public double atoms(Element element) {
        return atoms.getOrDefault(element, 0.0);
    }

    /** Returns the molar mass [kg/mol]. */
    public double molarMass() {
        return molarMass;
    }

    /** Returns the enthalpy of formation at 298.15 K [J/mol]. */
    public double enthalpyOfFormation() {
        return formation;
    }

    /** Returns the molar enthalpy, that of formation included [J/mol], at a temperature [K] from 200 to 6000. */
    public double enthalpy(double t) {
        double[] a = t < T_MID ? low : high;
        double polynomial = a[2] + t * (a[3] / 2 + t * (a[4] / 3 + t * (a[5] / 4 + t * a[6] / 5)));
        return R * (t * polynomial - a[0] / t + a[1] * Math.log(t) + a[7]);
    }

    /** Returns the molar heat capacity at constant pressure [J/(mol K)] at a temperature [K] from 200 to 6000. */
    public double heatCapacity(double t) {
        double[] a = t < T_MID ? low : high;
        return R * (a[2] + t * (a[3] + t * (a[4] + t * (a[5] + t * a[6]))) + (a[0] / t + a[1]) / t);
    }

    /** Returns the enthalpy above that at 298.15 K [J/mol], at a temperature [K] from 200 to 6000. */
    public double sensibleHeat(double t) {
        return enthalpy(t) - reference;
    }

    @Override
    public String toString() {
        return name;
    }
}
