package fluewright.engine.fuel;

import java.util.Locale;

/** How a fuel comes to the burner. */
public enum Phase {
    /** A gas. */
    GAS,
    /** A liquid. */
    LIQUID,
    /** A solid. */
    SOLID,
    /** Fuels of unlike phases fired together. */
    MIXED;

    /** Returns the word for people. */
    public String label() {
        return name().toLowerCase(Locale.ROOT);
    }
}
