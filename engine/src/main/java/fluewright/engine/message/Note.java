package fluewright.engine.message;

/**
 * Something a result has to say about itself.
 *
 * @param level   how much it matters
 * @param message the message constant
 * @param detail  the circumstances
 */
public record Note(Level level, Message message, Detail detail) {

    /** How much a note matters. */
    public enum Level {
        /** A statement of how a number came about. */
        REMARK,
        /** An input outside a method's valid range, or a result that may mislead. */
        WARNING,
        /** A danger to people or plant. */
        CAUTION
    }

    /** Returns the note as one line. */
    public String text() {
        StringBuilder text = new StringBuilder(message.sentence());
        append(text, ": ", detail.where());
        append(text, " = ", detail.found());
        append(text, "; ", detail.expected());
        append(text, "; ", detail.nearest());
        return text.toString();
    }

    private static void append(StringBuilder text, String before, String part) {
        if (!part.isEmpty()) {
            text.append(before).append(part);
        }
    }
}
