package fluewright.engine.species;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** An immutable amount of gas: moles of species. What the moles are counted for (a kilogram of fuel, say) is the owner's to say. */
public final class GasMixture {

    private final Map<Species, Double> moles;
    private final double total;

    private GasMixture(Map<Species, Double> moles) {
        this.moles = Collections.unmodifiableMap(moles);
        double sum = 0;
        for (double n : moles.values()) {
            sum += n;
        }
        this.total = sum;
    }

    /** Returns a mixture of amounts [mol]. */
    public static GasMixture of(Map<Species, Double> moles) {
        return new GasMixture(new LinkedHashMap<>(moles));
    }

    /** Returns the amounts of the species [mol]. */
    public Map<Species, Double> moles() {
        return moles;
    }

    /** Returns the amount of one species [mol], zero when it is not there. */
    public double moles(Species species) {
        return moles.getOrDefault(species, 0.0);
    }

    /** Returns the amount of all species [mol]. */
    public double total() {
        return total;
    }

    /** Returns the mole fraction of one species [mol/mol]. */
    public double fraction(Species species) {
        return moles(species) / total;
    }

    /** Returns the mass [kg]. */
    public double mass() {
        double mass = 0;
        for (Map.Entry<Species, Double> entry : moles.entrySet()) {
            mass += entry.getKey().molarMass() * entry.getValue();
        }
        return mass;
    }

    /** Returns the heat above 298.15 K [J] at a temperature [K] from 200 to 6000, all species as gases. */
    public double sensibleHeat(double t) {
        double heat = 0;
        for (Map.Entry<Species, Double> entry : moles.entrySet()) {
            heat += entry.getValue() * entry.getKey().sensibleHeat(t);
        }
        return heat;
    }

    /** Returns this mixture with one species taken out. */
    public GasMixture without(Species species) {
        Map<Species, Double> rest = new LinkedHashMap<>(moles);
        rest.remove(species);
        return new GasMixture(rest);
    }

    /** Returns a multiple of this mixture. */
    public GasMixture times(double factor) {
        Map<Species, Double> scaled = new LinkedHashMap<>();
        moles.forEach((species, n) -> scaled.put(species, n * factor));
        return new GasMixture(scaled);
    }

    /** Returns the amount of an element's atoms [mol]. */
    public double atoms(Element element) {
        double atoms = 0;
        for (Map.Entry<Species, Double> entry : moles.entrySet()) {
            atoms += entry.getKey().atoms(element) * entry.getValue();
        }
        return atoms;
    }

    /** Returns the mole fractions by species name [mol/mol], those that are zero left out. */
    public Map<String, Double> fractions() {
        Map<String, Double> fractions = new LinkedHashMap<>();
        moles.forEach((species, n) -> {
            if (n > 0) {
                fractions.put(species.name(), n / total);
            }
        });
        return fractions;
    }
}
