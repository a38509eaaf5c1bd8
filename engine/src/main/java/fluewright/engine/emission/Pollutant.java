package fluewright.engine.emission;

import fluewright.engine.species.SpeciesTable;

/** The pollutants whose amounts are converted. */
public enum Pollutant {
    /** Nitrogen oxides, all counted as NO2, as the rules ask. */
    NOX("NOx", "NO2"),
    /** Carbon monoxide. */
    CO("CO", "CO"),
    /** Sulfur dioxide. */
    SO2("SO2", "SO2");

    private final String label;
    private final String countedAs;

    Pollutant(String label, String countedAs) {
        this.label = label;
        this.countedAs = countedAs;
    }

    /** Returns the name for people, and what it is counted as where that is something else. */
    public String label() {
        return label.equals(countedAs) ? label : label + " as " + countedAs;
    }

    /** Returns the molar mass it is counted with [kg/mol]. */
    public double molarMass() {
        return SpeciesTable.get(countedAs).molarMass();
    }
}
