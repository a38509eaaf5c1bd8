package fluewright.engine.message;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Collects what a calculation has to say about its result. Not safe for use by several threads. */
public final class Notes {

    private final Map<String, Note> notes = new LinkedHashMap<>();

    /** Adds a remark: how a number came about. */
    public void remark(Message message, Detail detail) {
        add(new Note(Note.Level.REMARK, message, detail));
    }

    /** Adds a warning: used, but outside a method's range or apt to mislead. */
    public void warn(Message message, Detail detail) {
        add(new Note(Note.Level.WARNING, message, detail));
    }

    /** Adds a caution: a danger to people or plant. */
    public void caution(Message message, Detail detail) {
        add(new Note(Note.Level.CAUTION, message, detail));
    }

    /** Adds notes that something used here carries already. */
    public void addAll(List<Note> others) {
        others.forEach(this::add);
    }

    /** Returns the notes in the order they were added, each once. */
    public List<Note> list() {
        return new ArrayList<>(notes.values());
    }

    private void add(Note note) {
        notes.putIfAbsent(note.text(), note);
    }
}
