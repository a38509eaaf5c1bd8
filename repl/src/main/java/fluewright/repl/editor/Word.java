package fluewright.repl.editor;

import java.util.List;
import org.jline.reader.CompletingParsedLine;

/** The word before the cursor, taken as it stands: nothing in it needs escaping. */
record Word(String line, int cursor, int start) implements CompletingParsedLine {
    @Override
    public String word() {
        return line.substring(start, cursor);
    }

    @Override
    public int wordCursor() {
        return cursor - start;
    }

    @Override
    public int wordIndex() {
        return 0;
    }

    @Override
    public List<String> words() {
        return List.of(word());
    }

    @Override
    public CharSequence escape(CharSequence candidate, boolean complete) {
        return candidate;
    }

    @Override
    public int rawWordCursor() {
        return wordCursor();
    }

    @Override
    public int rawWordLength() {
        return wordCursor();
    }
}
