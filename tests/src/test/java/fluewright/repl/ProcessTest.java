package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own. */
class ProcessTest {
    @TempDir Path folder;

    private ShellRun run(String input, String... arguments) throws IOException, InterruptedException {
        return ShellRun.of(folder, input, arguments);
    }

    @Test
    void evaluatesAnExpression() throws Exception {
        assertEquals(new ShellRun(0, "2\n", ""), run("", "-e", "1 + 1"));
    }

    @Test
    void evaluatesAFileWithArguments() throws Exception {
        Path script = Files.writeString(folder.resolve("mix.groovy"), "mix = args[0]\nmix * 2\n");
        assertEquals(new ShellRun(0, "abab\n", ""), run("", script.toString(), "ab"));
    }

    @Test
    void evaluatesStandardInput() throws Exception {
        assertEquals(new ShellRun(0, "3\nµ\n", ""), run("x = 3\nx\n'µ'\n"));
    }

    @Test
    void failsWithOneForAnEvaluationAndTwoForArguments() throws Exception {
        assertEquals(1, run("1\nnowhere\n").code());
        assertEquals(2, run("", "--versoin").code());
        ShellRun missing = run("", "missing.groovy");
        assertEquals(2, missing.code());
        assertEquals("fluewright: cannot read missing.groovy: no such file\n", missing.err());
    }

    @Test
    void tellsItsVersion() throws Exception {
        ShellRun version = run("", "--version");
        assertEquals(0, version.code());
        assertTrue(version.out().matches("fluewright \\d+\\.\\d+\\.\\d+\\n"), version.out());
    }
}
