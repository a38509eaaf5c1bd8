package fluewright.repl.language;

import java.util.List;

/** A failure that brings its own text for the user. */
public interface Explained {
    List<String> lines();
}
