package fluewright.engine.calculation;

import fluewright.engine.message.NearestName;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import java.util.ArrayList;
import java.util.List;

/**
 * What a calculation says of itself.
 *
 * @param <I> the input record
 * @param <R> the result record
 */
public final class Declaration<I extends Record, R extends Record> {

    private final String name;
    private final String title;
    private final Class<I> inputType;
    private final Class<R> resultType;
    private final List<String> sources = new ArrayList<>();
    private String example = "";
    private boolean setting;
    private RecordShape<I> input;
    private RecordShape<R> result;

    private Declaration(String name, String title, Class<I> inputType, Class<R> resultType) {
        this.name = name;
        this.title = title;
        this.inputType = inputType;
        this.resultType = resultType;
    }

    /**
     * Begins a declaration.
     *
     * @param name       the name it is called by: a Groovy identifier
     * @param title      one line saying what it does
     * @param inputType  the input record, its components annotated with {@link Component}
     * @param resultType the result record, likewise
     */
    public static <I extends Record, R extends Record> Declaration<I, R> of(String name, String title, Class<I> inputType,
                                                                            Class<R> resultType) {
        return new Declaration<>(name, title, inputType, resultType);
    }

    /** Adds a source: the standard or publication, to the clause or equation. */
    public Declaration<I, R> source(String text) {
        sources.add(text);
        return this;
    }

    /** Sets a call that works as it stands. */
    public Declaration<I, R> example(String call) {
        this.example = call;
        return this;
    }

    /** Says that people set burners by the result, so that it carries the usual caution. */
    public Declaration<I, R> leadsToSetting() {
        this.setting = true;
        return this;
    }

    /** Returns the name it is called by. */
    public String name() {
        return name;
    }

    /** Returns the line saying what it does. */
    public String title() {
        return title;
    }

    /** Returns the sources. */
    public List<String> sources() {
        return List.copyOf(sources);
    }

    /** Returns a call that works as it stands, or an empty text. */
    public String example() {
        return example;
    }

    /** Tells whether people set burners by the result. */
    public boolean isSetting() {
        return setting;
    }

    /** Returns the shape of the input record; read when first asked for. */
    public synchronized RecordShape<I> input() {
        if (input == null) {
            input = RecordShape.of(inputType);
        }
        return input;
    }

    /** Returns the shape of the result record; read when first asked for. */
    public synchronized RecordShape<R> result() {
        if (result == null) {
            result = RecordShape.of(resultType);
        }
        return result;
    }

    /**
     * Returns the argument of a name.
     *
     * @throws InputException when there is none
     */
    public Term argument(String argument) {
        return input().find(argument).orElseThrow(() -> new InputException(EngineMessage.UNKNOWN_ARGUMENT,
                Detail.at(name).found(argument).expected("one of " + String.join(", ", input().names()))
                        .nearest(NearestName.of(argument, input().names()))));
    }
}
