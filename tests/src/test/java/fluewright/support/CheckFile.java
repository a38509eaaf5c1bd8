package fluewright.support;

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
import java.util.stream.Stream;

/** Reads the files in the resource folder {@code checks}: CSV with a header row and comment lines. */
public final class CheckFile {

    private CheckFile() {
    }

    /** Returns the rows of a file, its name without {@code .csv}. */
    public static List<NamedCsvRecord> rows(String file) {
        try (InputStream stream = CheckFile.class.getResourceAsStream("/checks/" + file + ".csv");
                CsvReader<NamedCsvRecord> reader = CsvReader.builder().commentStrategy(CommentStrategy.SKIP)
                        .ofNamedCsvRecord(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
            return reader.stream().collect(Collectors.toList());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Returns the checks of a file whose quantity begins with one of these texts. */
    public static Stream<Check> checks(String file, String... quantities) {
        return rows(file).stream().map(Check::of).filter(check -> Stream.of(quantities).anyMatch(check.quantity()::startsWith));
    }

    /** Returns all checks of a file. */
    public static Stream<Check> all(String file) {
        return rows(file).stream().map(Check::of);
    }

    /** Returns the check of an id. */
    public static Check check(String file, String id) {
        return all(file).filter(check -> check.id().equals(id)).findFirst().orElseThrow();
    }
}
