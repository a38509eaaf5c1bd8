package fluewright.repl.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PipedInputStream;
import java.io.PipedOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import org.jline.terminal.Terminal;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EditorTest {
    private static final int PATIENCE_SECONDS = 20;
    @TempDir Path home;
    private final PipedOutputStream keys = new PipedOutputStream();
    private final ByteArrayOutputStream screen = new ByteArrayOutputStream();
    private Terminal terminal;
    private Editor editor;

    @BeforeEach
    void open() throws IOException {
        terminal = Terminals.ofStreams(new PipedInputStream(keys), screen);
        editor = new Editor(terminal, SampleVocabulary::new, home.resolve("history"), true, warning -> { });
    }

    @AfterEach
    void close() throws IOException {
        terminal.close();
    }

    private String typed(String text) throws Exception {
        CompletableFuture<String> input = CompletableFuture.supplyAsync(editor::read);
        await(editor::isReading);
        keys.write(text.getBytes(StandardCharsets.UTF_8));
        keys.flush();
        return input.get(PATIENCE_SECONDS, TimeUnit.SECONDS);
    }

    private static void await(BooleanSupplier condition) throws InterruptedException {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        while (!condition.getAsBoolean() && System.nanoTime() < end) {
            Thread.sleep(5);
        }
    }

    @Test
    void readsLinesThatBelongTogether() throws Exception {
        assertEquals("1 + 1", typed("1 + 1\r"));
        assertEquals("(1 +\n2)", typed("(1 +\r2)\r"));
        assertTrue(screen.toString(StandardCharsets.UTF_8).contains(Editor.PROMPT));
        assertTrue(screen.toString(StandardCharsets.UTF_8).contains(Editor.CONTINUATION));
    }

    @Test
    void completesWithTab() throws Exception {
        assertEquals("burn 'natural gas'", typed("bu\t'na\t'\r"));
        assertEquals("burn ng, air: 3", typed("burn ng, a\t3\r"));
    }

    @Test
    void controlCClearsAndControlDLeaves() throws Exception {
        assertEquals("", typed("(1 + \u0003"));
        assertNull(typed("\u0004"));
    }
}
