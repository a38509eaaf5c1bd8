package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class OptionsTest {
    @Test
    void knowsEveryTask() throws Options.Unusable {
        assertEquals(Options.Task.SHELL, Options.parse().task());
        assertEquals(Options.Task.VERSION, Options.parse("--version").task());
        assertEquals(Options.Task.HELP, Options.parse("--help").task());
        assertEquals(Options.Task.STANDARD_INPUT, Options.parse("-").task());
        assertEquals("1 + 1", Options.parse("-e", "1 + 1").expression());
    }

    @Test
    void leavesWhatFollowsTheFileToTheScript() throws Options.Unusable {
        Options options = Options.parse("--json", "--plugins", "more", "a.groovy", "--version", "x");
        assertEquals(Options.Task.FILE, options.task());
        assertEquals(List.of("--version", "x"), options.arguments());
        assertEquals(Path.of("more"), options.plugins());
        assertTrue(options.json());
    }

    @Test
    void namesTheNearestOption() {
        var wrong = assertThrows(Options.Unusable.class, () -> Options.parse("--jsn"));
        assertEquals("unknown option --jsn; did you mean --json?", wrong.getMessage());
        assertThrows(Options.Unusable.class, () -> Options.parse("-e"));
    }
}
