package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.spi.ToolProvider;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A plugin made as DEVELOPERS.md says, from the example's source, and used by the program. */
class PluginTest {
    private static final Path SOURCE = Path.of("src", "test", "java", "fluewright", "example", "StackDraft.java");
    private static final String CALL = "stackDraft 'natural-gas', o2: 3.pct, gas: 180.degC, height: 30.m, outside: 5.degC";
    @TempDir Path folder;
    private Path plugins;

    @BeforeEach
    void makeFolder() throws IOException {
        plugins = Files.createDirectories(folder.resolve("plugins"));
    }

    private void makeJar(Path source, String service, String file) throws IOException {
        Path classes = Files.createDirectories(folder.resolve(file));
        assertEquals(0, tool("javac", "-cp", System.getProperty("java.class.path"), "-d", classes.toString(), source.toString()));
        Path services = Files.createDirectories(classes.resolve("META-INF").resolve("services"));
        Files.writeString(services.resolve("fluewright.engine.calculation.Calculation"), service + "\n");
        assertEquals(0, tool("jar", "--create", "--file", plugins.resolve(file + ".jar").toString(), "-C", classes.toString(), "."));
    }

    private static int tool(String name, String... arguments) {
        return ToolProvider.findFirst(name).orElseThrow().run(System.out, System.err, arguments);
    }

    /** By hand: air 1.2691, gas of 27.74 g/mol at 453.15 K 0.746 kg/m3, so 9.80665 x 30 x 0.523 = 154 Pa. */
    @Test
    void aPluginAddsAFunctionWithItsHelp() throws Exception {
        makeJar(SOURCE, "fluewright.example.StackDraft", "draft");
        ShellRun run = ShellRun.of(folder, "(" + CALL.replaceFirst(" ", "(") + ")).draft.number()\nhelp 'stackDraft'\nhelp",
            "--plugins", plugins.toString());
        assertEquals("", run.err());
        assertEquals(154, Double.parseDouble(run.out().lines().findFirst().orElseThrow()), 2);
        assertTrue(run.out().contains("natural draft at the foot of the stack [Pa]"), run.out());
        assertTrue(run.out().contains("  stackDraft   natural draft of a stack"), run.out());
    }

    @Test
    void aPluginWithoutItsClassIsToldByName() throws Exception {
        makeJar(SOURCE, "fluewright.example.Missing", "faulty");
        ShellRun run = ShellRun.of(folder, CALL, "--plugins", plugins.toString());
        assertEquals(1, run.code());
        assertTrue(run.err().contains("fluewright.example.Missing"), run.err());
    }

    @Test
    void aPluginOfATakenNameIsRefusedWithBothClasses() throws Exception {
        Path taken = Files.writeString(Files.createDirectories(folder.resolve("source")).resolve("OtherBurn.java"),
            Files.readString(SOURCE).replace("StackDraft", "OtherBurn").replace("\"stackDraft\"", "\"burn\""));
        makeJar(taken, "fluewright.example.OtherBurn", "taken");
        ShellRun run = ShellRun.of(folder, "1 + 1; burn 'methane', lambda: 1.1", "--plugins", plugins.toString());
        assertEquals(1, run.code());
        assertTrue(run.err().contains("fluewright.example.OtherBurn") && run.err().contains("fluewright.engine.combustion.Burn"), run.err());
    }

    @Test
    void aFolderThatIsNotThereCannotBeUsed() throws Exception {
        ShellRun run = ShellRun.of(folder, "1", "--plugins", "nowhere");
        assertEquals(2, run.code());
        assertEquals("fluewright: option --plugins needs a folder; there is none at nowhere\n", run.err());
    }
}
