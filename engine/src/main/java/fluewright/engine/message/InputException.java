package fluewright.engine.message;

import java.util.ArrayList;
import java.util.List;

/** An input that cannot be used: a message constant and the circumstances, kept as values. */
public final class InputException extends IllegalArgumentException {

    private final transient Message reason;
    private final transient Detail detail;

    /** Makes the exception of a reason and its circumstances. */
    public InputException(Message reason, Detail detail) {
        super(String.join("; ", lines(reason, detail)));
        this.reason = reason;
        this.detail = detail;
    }

    /** Makes the exception with the failure below it, such as a file that could not be read. */
    public InputException(Message reason, Detail detail, Throwable cause) {
        this(reason, detail);
        initCause(cause);
    }

    /** Returns the message constant. */
    public Message reason() {
        return reason;
    }

    /** Returns the circumstances. */
    public Detail detail() {
        return detail;
    }

    /** Returns the error for people: the sentence, then at most four lines of circumstances. */
    public List<String> lines() {
        return lines(reason, detail);
    }

    private static List<String> lines(Message reason, Detail detail) {
        List<String> lines = new ArrayList<>(5);
        lines.add(reason.sentence());
        lines.addAll(detail.lines());
        return lines;
    }
}
