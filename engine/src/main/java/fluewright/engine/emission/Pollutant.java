package fluewright.engine.emission;

import fluewright.engine.species.SpeciesTable;

/** The pollutants whose amounts are converted. */
public enum Pollutant {
    /** Nitrogen oxides, all counted as NO2, as the rules ask. */
    NOX("NO2"),
    /** Carbon monoxide. */
    CO("CO"),
    /** Sulfur dioxide. */
    SO2("SO2");

    private final String countedAs;

    Pollutant(String countedAs) {
        this.countedAs = countedAs;
    }

    /** Returns the species it is counted as. */
    public String countedAs() {
        return countedAs;
    }

    /** Returns the molar mass it is counted with [kg/mol]. */
    public double molarMass() {
        return SpeciesTable.get(countedAs).molarMass();
    }
}
