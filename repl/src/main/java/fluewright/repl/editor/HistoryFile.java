package fluewright.repl.editor;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermission;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import org.jline.reader.LineReader;
import org.jline.reader.impl.history.DefaultHistory;

/**
 * The inputs of earlier sessions, one line each, in a file that only its owner can read. Every
 * input is written as it is accepted, so that a killed shell loses none.
 */
final class HistoryFile extends DefaultHistory {
    private static final int KEPT = 2000;
    private static final Set<PosixFilePermission> OWNER_FILE = PosixFilePermissions.fromString("rw-------");
    private static final Set<PosixFilePermission> OWNER_FOLDER = PosixFilePermissions.fromString("rwx------");

    private final Path file;
    private final Consumer<String> warning;
    private boolean broken;

    /** @param warning told at most once, when the file can't be used */
    HistoryFile(Path file, Consumer<String> warning) {
        this.file = file;
        this.warning = warning;
    }

    /** Called by the line editor when it starts. */
    @Override
    public void attach(LineReader reader) {
        super.attach(reader);
        if (size() == 0) {
            guarded(this::readFile);
        }
    }

    private void readFile() throws IOException {
        prepare();
        List<String> lines = new String(Files.readAllBytes(file), StandardCharsets.UTF_8).lines().toList();
        List<String> recent = lines.subList(Math.max(0, lines.size() - KEPT), lines.size());
        recent.forEach(line -> internalAdd(Instant.EPOCH, decoded(line)));
        resetIndex();
        if (lines.size() > 2 * KEPT) {
            replace(recent);
        }
    }

    private void prepare() throws IOException {
        Path folder = file.getParent();
        if (!Files.isDirectory(folder)) {
            Files.createDirectories(folder, onlyFor(OWNER_FOLDER));
        }
        if (!Files.exists(file)) {
            Files.createFile(file, onlyFor(OWNER_FILE));
        } else if (!OWNER_FILE.equals(Files.getPosixFilePermissions(file))) {
            Files.setPosixFilePermissions(file, OWNER_FILE);
        }
    }

    private static FileAttribute<?> onlyFor(Set<PosixFilePermission> permissions) {
        return PosixFilePermissions.asFileAttribute(permissions);
    }

    private void replace(List<String> lines) throws IOException {
        Path fresh = Files.createTempFile(file.getParent(), "history", null, onlyFor(OWNER_FILE));
        Files.write(fresh, lines);
        Files.move(fresh, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    }

    @Override
    public void add(Instant time, String line) {
        String input = line.strip();
        boolean repeated = size() > 0 && get(last()).equals(input);
        if (!input.isEmpty() && !repeated) {
            internalAdd(time, input);
            guarded(() -> Files.write(file, (encoded(input) + "\n").getBytes(StandardCharsets.UTF_8),
                StandardOpenOption.APPEND));
        }
    }

    /** Nothing is left to save at the end. */
    @Override
    public void save() {
    }

    private static String encoded(String input) {
        return input.replace("\\", "\\\\").replace("\n", "\\n");
    }

    private static String decoded(String line) {
        StringBuilder input = new StringBuilder(line.length());
        for (int at = 0; at < line.length(); at++) {
            char c = line.charAt(at);
            boolean escaped = c == '\\' && at + 1 < line.length();
            input.append(!escaped ? c : line.charAt(++at) == 'n' ? '\n' : line.charAt(at));
        }
        return input.toString();
    }

    private interface FileWork {
        void run() throws IOException;
    }

    private void guarded(FileWork work) {
        if (broken) {
            return;
        }
        try {
            work.run();
        } catch (IOException | UnsupportedOperationException | SecurityException failure) {
            broken = true;
            warning.accept("the history is not kept: " + failure);
        }
    }
}
