package fluewright.repl;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.FilterOutputStream;
import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.function.IntSupplier;

/**
 * Where results and messages go.
 *
 * @param interactive whether a person types at a prompt
 * @param colour      whether escape codes for colour are welcome on {@code out}
 * @param width       the columns that a line may have
 */
public record Output(PrintStream out, PrintStream err, boolean interactive, boolean colour, IntSupplier width) {
    /** An output whose lines may be as long as they like. */
    Output(PrintStream out, PrintStream err, boolean interactive, boolean colour) {
        this(out, err, interactive, colour, () -> Integer.MAX_VALUE);
    }

    /** This output with lines no longer than a width. */
    Output within(IntSupplier columns) {
        return new Output(out, err, interactive, colour, columns);
    }

    /** The process's own streams; {@code System.out} is replaced, so that scripts get the same treatment. */
    static Output ofProcess(boolean terminal, boolean interactive) {
        PrintStream out = new PrintStream(
            new BufferedOutputStream(new Pipe(new FileOutputStream(FileDescriptor.out))), true, StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        System.setOut(out);
        System.setErr(err);
        return new Output(out, err, interactive, terminal && wantsColour());
    }

    static boolean wantsColour() {
        String refused = System.getenv("NO_COLOR");
        return (refused == null || refused.isEmpty()) && !isDumb();
    }

    static boolean isDumb() {
        String type = System.getenv("TERM");
        return type == null || type.isEmpty() || type.startsWith("dumb");
    }

    /** Ends the process at the first write that fails: nobody reads any more, or there is no room. */
    private static final class Pipe extends FilterOutputStream {
        Pipe(OutputStream target) {
            super(target);
        }

        @Override
        public void write(int value) {
            write(new byte[] {(byte) value}, 0, 1);
        }

        @Override
        public void write(byte[] bytes, int from, int length) {
            try {
                out.write(bytes, from, length);
            } catch (IOException failure) {
                end(failure);
            }
        }

        private static void end(IOException failure) {
            String why = String.valueOf(failure.getMessage());
            if (why.contains("roken pipe")) {
                Runtime.getRuntime().halt(0);
            }
            System.err.println("fluewright: cannot write the results: " + why);
            Runtime.getRuntime().halt(1);
        }
    }
}
