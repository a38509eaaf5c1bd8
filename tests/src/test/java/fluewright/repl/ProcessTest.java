package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own. */
class ProcessTest {
    @TempDir Path folder;

    private record Ended(int code, String out, String err) {
    }

    private Ended run(String input, String... arguments) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-cp", System.getProperty("java.class.path"), "fluewright.repl.Main"));
        command.addAll(List.of(arguments));
        Path in = Files.writeString(folder.resolve("in"), input);
        Path out = folder.resolve("out");
        Path err = folder.resolve("err");
        Process process = new ProcessBuilder(command).redirectInput(in.toFile()).redirectOutput(out.toFile())
            .redirectError(err.toFile()).start();
        int code = process.waitFor();
        Ended ended = new Ended(code, Files.readString(out), Files.readString(err));
        assertFalse((ended.out + ended.err).contains("\u001b"), "no escape codes");
        return ended;
    }

    @Test
    void evaluatesAnExpression() throws Exception {
        assertEquals(new Ended(0, "2\n", ""), run("", "-e", "1 + 1"));
    }

    @Test
    void evaluatesAFileWithArguments() throws Exception {
        Path script = Files.writeString(folder.resolve("mix.groovy"), "mix = args[0]\nmix * 2\n");
        assertEquals(new Ended(0, "abab\n", ""), run("", script.toString(), "ab"));
    }

    @Test
    void evaluatesStandardInput() throws Exception {
        assertEquals(new Ended(0, "3\nµ\n", ""), run("x = 3\nx\n'µ'\n"));
    }

    @Test
    void failsWithOneForAnEvaluationAndTwoForArguments() throws Exception {
        assertEquals(1, run("1\nnowhere\n").code);
        assertEquals(2, run("", "--versoin").code);
        Ended missing = run("", "missing.groovy");
        assertEquals(2, missing.code);
        assertEquals("fluewright: cannot read missing.groovy: no such file\n", missing.err);
    }

    @Test
    void tellsItsVersion() throws Exception {
        Ended version = run("", "--version");
        assertEquals(0, version.code);
        assertTrue(version.out.matches("fluewright \\d+\\.\\d+\\.\\d+\\n"), version.out);
    }
}
