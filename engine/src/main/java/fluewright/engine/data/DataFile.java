package fluewright.engine.data;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;

/** Reads the engine's own data files: CSV with a header row, and comment lines that begin with {@code #}. */
public final class DataFile {

    private DataFile() {
    }

    /** Returns the rows of a file that stands beside a class. */
    public static List<NamedCsvRecord> read(Class<?> beside, String name) {
        try (InputStream stream = beside.getResourceAsStream(name);
                CsvReader<NamedCsvRecord> reader = CsvReader.builder().commentStrategy(CommentStrategy.SKIP)
                        .ofNamedCsvRecord(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
            return reader.stream().collect(Collectors.toList());
        } catch (IOException e) {
            throw new UncheckedIOException("cannot read the engine's own " + name, e);
        }
    }

    /** Returns a number of a row. */
    public static double number(NamedCsvRecord row, String column) {
        return Double.parseDouble(row.getField(column));
    }
}
