package fluewright.engine.calculation;

import fluewright.engine.message.Notes;

/**
 * A calculation of the catalog: the service interface of plugins. The built-in calculations use nothing else.
 *
 * <p>Implementations are found by {@link java.util.ServiceLoader}; they have a public constructor without arguments, no
 * state, and may be called by several threads.
 *
 * @param <I> the input record
 * @param <R> the result record
 */
public interface Calculation<I extends Record, R extends Record> {

    /** Returns the declaration: name, title, sources, and the two records. */
    Declaration<I, R> declaration();

    /**
     * Calculates.
     *
     * @param input a checked input
     * @param notes takes what the result has to say about itself
     * @throws fluewright.engine.message.InputException when the inputs together are impossible
     */
    R calculate(I input, Notes notes);
}
