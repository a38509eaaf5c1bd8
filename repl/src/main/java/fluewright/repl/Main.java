package fluewright.repl;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;

/** The command {@code fluewright}. */
public final class Main {
    static final int FAILED = 1;
    static final int UNUSABLE = 2;

    private Main() {
    }

    public static void main(String[] arguments) {
        int code = run(arguments);
        System.out.flush();
        System.exit(code);
    }

    private static int run(String... arguments) {
        try {
            return run(Options.parse(arguments));
        } catch (Options.Unusable unusable) {
            System.err.println("fluewright: " + unusable.getMessage());
            return UNUSABLE;
        }
    }

    private static int run(Options options) {
        if (options.plugins() != null && !Files.isDirectory(options.plugins())) {
            System.err.println("fluewright: option --plugins needs a folder; there is none at " + options.plugins());
            return UNUSABLE;
        }
        boolean terminal = isTerminal();
        boolean interactive = terminal && options.task() == Options.Task.SHELL;
        Output output = Output.ofProcess(terminal, interactive);
        return switch (options.task()) {
            case VERSION -> print(output, "fluewright " + version() + "\n");
            case HELP -> print(output, Options.HELP);
            case SHELL -> interactive ? new Interactive(options, output).run() : new Batch(options, output).run();
            default -> new Batch(options, output).run();
        };
    }

    /** The launcher knows; asking Java takes a while. */
    private static boolean isTerminal() {
        String told = System.getProperty("fluewright.terminal");
        return told == null ? System.console() != null : Boolean.parseBoolean(told);
    }

    private static int print(Output output, String text) {
        output.out().print(text);
        return 0;
    }

    /** The version that Maven gave this build. */
    static String version() {
        String told = System.getProperty("fluewright.version");
        return told == null || told.isEmpty() ? storedVersion() : told;
    }

    private static String storedVersion() {
        try (InputStream in = Main.class.getResourceAsStream("version.txt")) {
            return in == null ? "unknown" : new String(in.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException unreadable) {
            return "unknown";
        }
    }
}
