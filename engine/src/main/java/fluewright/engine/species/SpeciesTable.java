package fluewright.engine.species;

import static fluewright.engine.data.DataFile.number;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.data.DataFile;
import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The gas species with thermodynamic data, by name; rows of {@code species.csv} beside this class, each made a species when first asked for. */
public final class SpeciesTable {

    private static final String[] COEFFICIENTS = {"a1", "a2", "a3", "a4", "a5", "a6", "a7", "b1", "b2"};
    private static final Map<String, NamedCsvRecord> ROWS = read();
    private static final Map<String, Species> MADE = new ConcurrentHashMap<>();

    private SpeciesTable() {
    }

    /** Returns the names of all species, in the order of the file. */
    public static Collection<String> names() {
        return ROWS.keySet();
    }

    /** Returns a species that the table is known to hold. */
    public static Species get(String name) {
        return MADE.computeIfAbsent(name, SpeciesTable::make);
    }

    private static Species make(String name) {
        NamedCsvRecord row = ROWS.get(name);
        if (row == null) {
            throw new IllegalArgumentException("species.csv has no " + name);
        }
        return new Species(name, row.getField("name"), Element.atoms(row.getField("elements")),
                number(row, "molar_mass_g_mol") / 1000, number(row, "hf298_J_mol"), range(row, "lo_"), range(row, "hi_"));
    }

    private static Map<String, NamedCsvRecord> read() {
        Map<String, NamedCsvRecord> rows = new LinkedHashMap<>();
        DataFile.read(SpeciesTable.class, "species.csv").forEach(row -> rows.put(row.getField("species"), row));
        return Collections.unmodifiableMap(rows);
    }

    private static double[] range(NamedCsvRecord row, String prefix) {
        double[] values = new double[COEFFICIENTS.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = number(row, prefix + COEFFICIENTS[i]);
        }
        return values;
    }
}
