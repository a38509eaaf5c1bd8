package fluewright.fuels;

import java.util.List;

/** The keys of the fuel file format; the editor schema {@code fuel.schema.json} has the same. */
final class FuelKeys {

    static final String ID = "id";
    static final String TITLE = "title";
    static final String PHASE = "phase";
    static final String COMPOSITION = "composition";
    static final String HEAT = "gross-heating-value";
    static final String DENSITY = "density";
    static final String METHOD_19 = "method-19";
    static final String BASIS = "basis";
    static final String SOURCE = "source";
    static final String SHARES = "shares";
    static final String VALUE = "value";

    /** The keys of a file. */
    static final List<String> OF_FILE = List.of(ID, TITLE, PHASE, COMPOSITION, HEAT, DENSITY, METHOD_19);
    /** The keys of a composition. */
    static final List<String> OF_COMPOSITION = List.of(BASIS, SOURCE, SHARES);
    /** The keys of a heating value or density. */
    static final List<String> OF_NUMBER = List.of(VALUE, SOURCE);

    private FuelKeys() {
    }
}
