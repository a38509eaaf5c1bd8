package fluewright.engine.calculation;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A named list of numbers of one kind, such as a composition.
 *
 * @param parts the numbers by name, in the coherent SI unit of the component's kind
 */
public record Breakdown(Map<String, Double> parts) {

    /** Copies the parts and keeps their order. */
    public Breakdown {
        parts = Collections.unmodifiableMap(new LinkedHashMap<>(parts));
    }
}
