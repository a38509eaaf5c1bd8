package fluewright.engine.fuel;

import fluewright.engine.message.Note;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A fuel: what a kilogram of it as fired is made of, its heating value, and where each number comes from.
 *
 * @param id          the short name it is called by
 * @param title       the name in words
 * @param phase       how it comes to the burner
 * @param makeup      what a kilogram of it as fired is made of
 * @param heat        the heating value and how it is known
 * @param gas         the composition by component, for a gas
 * @param density     the density where known [kg/m3], for a liquid at about 15 degC
 * @param factorClass the fuel's row in Table 19-2 of EPA Method 19, empty where it has none
 * @param notes       what the fuel has to say about its own numbers; every result repeats it
 * @param sources     the sources of its numbers, one a line
 * @param origin      where it was read: a file, or the session
 */
public record Fuel(String id, String title, Phase phase, Makeup makeup, HeatingValue heat, Optional<GasComposition> gas,
                   OptionalDouble density, String factorClass, List<Note> notes, List<String> sources, String origin) {

    /** Copies the lists. */
    public Fuel {
        notes = List.copyOf(notes);
        sources = List.copyOf(sources);
    }

    /** Returns the gross heating value at 25 degC [J/kg as fired]. */
    public double gross() {
        return heat.gross();
    }

    /** Returns the net heating value at 25 degC [J/kg as fired]. */
    public double net() {
        return heat.net(makeup);
    }

    /** Returns the molar mass of a gas [kg/mol], nothing for other fuels. */
    public OptionalDouble molarMass() {
        return gas.isPresent() ? OptionalDouble.of(gas.get().molarMass()) : OptionalDouble.empty();
    }

    @Override
    public String toString() {
        return id;
    }
}
