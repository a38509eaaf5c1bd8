package fluewright.engine.fuel;

import java.util.Optional;
import java.util.Set;

/**
 * A place that fuels come from: the service interface of fuel plugins. Sources are asked from the highest
 * {@link #rank()} down, so that a user's file hides a built-in fuel of the same id.
 */
public interface FuelSource {

    /** Returns the place for people: a folder, or the name of a collection. */
    String place();

    /** Returns the rank: built-in 0, site folder 10, user folder 20. */
    int rank();

    /** Returns the ids it holds. */
    Set<String> ids();

    /** Tells whether it holds an id, without reading the fuel. */
    default boolean has(String id) {
        return ids().contains(id);
    }

    /**
     * Returns the fuel of an id, or nothing when this source has none.
     *
     * @throws fluewright.engine.message.InputException when the source has it but cannot read it
     */
    Optional<Fuel> load(String id);
}
