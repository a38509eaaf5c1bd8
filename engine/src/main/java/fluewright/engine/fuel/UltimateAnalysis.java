package fluewright.engine.fuel;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.message.Notes;
import fluewright.engine.species.Element;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The ultimate analysis of a liquid or solid fuel: mass shares of C, H, O, N, S, ash and moisture. Hydrogen and oxygen
 * of the moisture are not counted under H and O.
 *
 * @param shares mass shares by name [kg/kg], on the basis
 * @param basis  what they are counted on
 */
public record UltimateAnalysis(Map<String, Double> shares, AnalysisBasis basis) {

    /** The names that shares may have. */
    public static final List<String> NAMES = List.of("C", "H", "O", "N", "S", "ash", "moisture");

    private static final String ASH = "ash";
    private static final String MOISTURE = "moisture";

    /**
     * Checks the names.
     *
     * @throws InputException when one is unknown
     */
    public UltimateAnalysis {
        shares = Map.copyOf(shares);
        for (String name : shares.keySet()) {
            if (!NAMES.contains(name)) {
                throw new InputException(EngineMessage.UNKNOWN_FUEL_COMPONENT, Detail.at("analysis").found(name)
                        .expected("one of " + String.join(", ", NAMES)).nearest(NearestName.of(name, NAMES)));
            }
        }
    }

    /** Returns what a number on this basis has to be multiplied with to be as received [-]. */
    public double toAsReceived() {
        double dry = 1 - share(MOISTURE);
        return switch (basis) {
            case AS_RECEIVED -> 1;
            case DRY -> dry;
            case DRY_ASH_FREE -> dry * (1 - share(ASH));
        };
    }

    /**
     * Returns what a kilogram as received is made of.
     *
     * @throws InputException when the shares do not add up
     */
    public Makeup makeup(Notes notes) {
        Map<String, Double> closed = closed(notes);
        double factor = toAsReceived();
        Map<Element, Double> atoms = new EnumMap<>(Element.class);
        for (Element element : List.of(Element.C, Element.H, Element.O, Element.N, Element.S)) {
            atoms.put(element, closed.getOrDefault(element.name(), 0.0) * factor / element.molarMass());
        }
        double moisture = basis == AnalysisBasis.AS_RECEIVED ? closed.getOrDefault(MOISTURE, 0.0) : share(MOISTURE);
        double ash = basis == AnalysisBasis.DRY_ASH_FREE ? share(ASH) * (1 - moisture) : closed.getOrDefault(ASH, 0.0) * factor;
        return new Makeup(atoms, moisture / Makeup.WATER, ash);
    }

    private Map<String, Double> closed(Notes notes) {
        Map<String, Double> part = new LinkedHashMap<>(shares);
        if (basis != AnalysisBasis.AS_RECEIVED) {
            part.remove(MOISTURE);
        }
        if (basis == AnalysisBasis.DRY_ASH_FREE) {
            part.remove(ASH);
        }
        Closure.requireShare("analysis", MOISTURE, share(MOISTURE));
        Closure.requireShare("analysis", ASH, share(ASH));
        String hint = shares.containsKey("O") ? "" : "; give O by difference";
        return Closure.close(part, "analysis, " + basis.label(), hint, notes);
    }

    private double share(String name) {
        return shares.getOrDefault(name, 0.0);
    }
}
