package fluewright.engine.quantity;

import java.util.Locale;

/** What a number refers to where the same unit can mean two things. */
public enum Basis {
    /** Nothing to tell apart. */
    NONE,
    /** Of gas with its water vapour taken out. */
    DRY,
    /** Of gas as it flows, water vapour included. */
    WET,
    /** On the gross (higher) heating value. */
    GROSS,
    /** On the net (lower) heating value. */
    NET;

    /** Returns the word printed beside a number, empty for {@link #NONE}. */
    public String label() {
        return this == NONE ? "" : name().toLowerCase(Locale.ROOT);
    }

    /** Tells whether numbers of this and the other basis may be compared or added. */
    public boolean agreesWith(Basis other) {
        return this == NONE || other == NONE || this == other;
    }

    /** Returns the more telling of two bases that agree. */
    public Basis or(Basis other) {
        return this == NONE ? other : this;
    }
}
