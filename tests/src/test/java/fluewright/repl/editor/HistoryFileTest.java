package fluewright.repl.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.jline.reader.LineReader;
import org.jline.reader.LineReaderBuilder;
import org.jline.terminal.Terminal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class HistoryFileTest {
    @TempDir Path home;
    private final List<String> warnings = new ArrayList<>();

    private HistoryFile open(Path file) throws IOException {
        try (Terminal terminal = Terminals.ofStreams(java.io.InputStream.nullInputStream(),
                java.io.OutputStream.nullOutputStream())) {
            HistoryFile history = new HistoryFile(file, warnings::add);
            LineReader reader = LineReaderBuilder.builder().terminal(terminal).history(history).build();
            history.attach(reader);
            return history;
        }
    }

    @Test
    void keepsEveryInputAtOnceForItsOwnerOnly() throws IOException {
        Path file = home.resolve("kept/history");
        open(file).add(Instant.now(), "a = '\\n'\nb");
        HistoryFile again = open(file);
        assertEquals("a = '\\n'\nb", again.get(again.last()));
        assertEquals("rw-------", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
        assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(file.getParent())));
        assertEquals(List.of(), warnings);
    }

    @Test
    void warnsOnceWhenTheFileCannotBeKept() throws IOException {
        Path inTheWay = Files.createFile(home.resolve("plain"));
        HistoryFile history = open(inTheWay.resolve("history"));
        history.add(Instant.now(), "1");
        history.add(Instant.now(), "2");
        assertEquals(2, history.size());
        assertEquals(1, warnings.size());
    }
}
