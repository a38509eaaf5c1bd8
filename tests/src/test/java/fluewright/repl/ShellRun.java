package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Runs the program as a process of its own, without a terminal. */
record ShellRun(int code, String out, String err) {

    /** Runs it in a folder that is its home too, with a text as standard input. */
    static ShellRun of(Path folder, String input, String... arguments) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-Duser.home=" + folder, "-cp", System.getProperty("java.class.path"), "fluewright.repl.Main"));
        command.addAll(List.of(arguments));
        Path in = Files.writeString(folder.resolve("in"), input);
        Path out = folder.resolve("out");
        Path err = folder.resolve("err");
        Process process = new ProcessBuilder(command).directory(folder.toFile()).redirectInput(in.toFile())
            .redirectOutput(out.toFile()).redirectError(err.toFile()).start();
        int code = process.waitFor();
        ShellRun ended = new ShellRun(code, Files.readString(out), Files.readString(err));
        assertFalse((ended.out + ended.err).contains("\u001b"), "no escape codes");
        return ended;
    }
}
