package fluewright.engine.fuel;

import fluewright.engine.species.Element;
import java.util.Collections;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The composition of a fuel gas.
 *
 * @param fractions mole fractions of the components [mol/mol]; their sum is one
 */
public record GasComposition(Map<GasComponent, Double> fractions) {

    /** Copies the fractions and leaves out those that are zero. */
    public GasComposition {
        Map<GasComponent, Double> present = new LinkedHashMap<>();
        fractions.forEach((component, x) -> {
            if (x > 0) {
                present.put(component, x);
            }
        });
        fractions = Collections.unmodifiableMap(present);
    }

    /** Returns the molar mass [kg/mol]. */
    public double molarMass() {
        double mass = 0;
        for (Map.Entry<GasComponent, Double> entry : fractions.entrySet()) {
            mass += entry.getValue() * entry.getKey().molarMass();
        }
        return mass;
    }

    /** Returns the gross molar heating value [J/mol], {@code sum x_i H_i}: ISO 6976:2016, equation 1. */
    public double gross(IsoTemperature combustion) {
        double gross = 0;
        for (Map.Entry<GasComponent, Double> entry : fractions.entrySet()) {
            gross += entry.getValue() * entry.getKey().gross(combustion);
        }
        return gross;
    }

    /** Returns what a kilogram of the gas is made of; its water vapour counts as moisture. */
    public Makeup makeup() {
        Map<Element, Double> atoms = new EnumMap<>(Element.class);
        double moisture = 0;
        double perKilogram = 1 / molarMass();
        for (Map.Entry<GasComponent, Double> entry : fractions.entrySet()) {
            double n = entry.getValue() * perKilogram;
            if (entry.getKey().symbol().equals("H2O")) {
                moisture += n;
            } else {
                entry.getKey().atoms().forEach((element, count) -> atoms.merge(element, count * n, Double::sum));
            }
        }
        return new Makeup(atoms, moisture, 0);
    }

    /** Tells whether every component's figures are of ISO 6976. */
    public boolean inIso6976() {
        return fractions.keySet().stream().allMatch(GasComponent::inIso6976);
    }
}
