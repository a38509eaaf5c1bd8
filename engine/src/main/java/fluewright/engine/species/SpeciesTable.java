package fluewright.engine.species;

import static fluewright.engine.data.DataFile.number;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.data.DataFile;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The gas species with thermodynamic data, by name; read from {@code species.csv} beside this class. */
public final class SpeciesTable {

    private static final String[] COEFFICIENTS = {"a1", "a2", "a3", "a4", "a5", "a6", "a7", "b1", "b2"};
    private static final Map<String, Species> SPECIES = read();

    private SpeciesTable() {
    }

    /** Returns all species by name, in the order of the file. */
    public static Map<String, Species> all() {
        return SPECIES;
    }

    /** Returns a species that the table is known to hold. */
    public static Species get(String name) {
        Species species = SPECIES.get(name);
        if (species == null) {
            throw new IllegalArgumentException("species.csv has no " + name);
        }
        return species;
    }

    private static Map<String, Species> read() {
        Map<String, Species> table = new LinkedHashMap<>();
        for (NamedCsvRecord row : DataFile.read(SpeciesTable.class, "species.csv")) {
            Species species = new Species(row.getField("species"), row.getField("name"), Element.atoms(row.getField("elements")),
                    number(row, "molar_mass_g_mol") / 1000, number(row, "hf298_J_mol"), range(row, "lo_"), range(row, "hi_"));
            table.put(species.name(), species);
        }
        return Collections.unmodifiableMap(table);
    }

    private static double[] range(NamedCsvRecord row, String prefix) {
        double[] values = new double[COEFFICIENTS.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = number(row, prefix + COEFFICIENTS[i]);
        }
        return values;
    }
}
