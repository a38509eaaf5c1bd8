package fluewright.engine.message;

/**
 * A kind of thing the project has to tell its user: an error or a note. Every module keeps its own as one enum, so
 * that tests compare the constant and texts can improve freely.
 */
public interface Message {

    /** Returns the constant's name, for programs and tests. */
    String name();

    /** Returns the sentence for people; the circumstances stand beside it in a {@link Detail}. */
    String sentence();
}
