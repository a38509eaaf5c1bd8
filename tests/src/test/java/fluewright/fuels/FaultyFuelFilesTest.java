package fluewright.fuels;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.message.InputException;
import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** Every faulty file is named by its fault; its first line says which error is expected, and where. */
class FaultyFuelFilesTest {

    @TestFactory
    Stream<DynamicTest> everyFaultyFileIsRefusedAtItsFault() throws IOException, URISyntaxException {
        Path folder = Path.of(FaultyFuelFilesTest.class.getResource("/fuels/faulty").toURI());
        return Files.list(folder).sorted().map(file -> DynamicTest.dynamicTest(file.getFileName().toString(), () -> check(file)));
    }

    private static void check(Path file) throws IOException {
        String expected = Files.readString(file).lines().findFirst().orElseThrow().replace("# expected: ", "");
        InputException error = assertThrows(InputException.class, () -> FuelFile.read(file));
        String where = error.detail().where();
        assertTrue(where.startsWith(file + ", line "), where);
        assertEquals(expected, error.reason().name() + where.substring(file.toString().length()).replaceFirst(":.*", ""));
        assertTrue(!error.detail().found().isEmpty() && !error.detail().expected().isEmpty(), error.getMessage());
    }
}
