package fluewright.engine.calculation;

import fluewright.engine.quantity.UnitSystem;
import java.util.Optional;

/** How the values of a caller are read where a declaration alone does not say it. */
public interface Reading {

    /** Returns the unit system in which bare numbers are read; nothing when they are refused. */
    Optional<UnitSystem> bareNumbers();

    /** Returns the object of a type that a text names, such as the fuel of an id; nothing when the type has no names. */
    Optional<Object> read(Class<?> type, String text);
}
