package fluewright.properties;

import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Provide;
import net.jqwik.api.domains.DomainContextBase;

/** Random fuels: gas blends that always have something to burn, and ultimate analyses on any basis. */
public class RandomFuels extends DomainContextBase {

    private static final List<String> GASES = List.of("CH4", "C2H6", "C3H8", "n-C4H10", "i-C4H10", "C2H4", "H2", "CO", "CO2", "N2",
            "O2", "H2O", "H2S", "NH3", "Ar", "He", "Ne", "COS", "CH3OH", "C6H6", "C2H5OH");

    /** Fuels of all phases. */
    @Provide
    Arbitrary<Fuel> fuels() {
        return Arbitraries.oneOf(gases(), solids());
    }

    /** Gases of at least 20 % hydrogen, carbon monoxide or hydrocarbons, and at most 5 % oxygen. */
    static Arbitrary<Fuel> gases() {
        Arbitrary<List<Double>> weights = Arbitraries.doubles().between(0, 1).ofScale(6).list().ofSize(GASES.size());
        Arbitrary<String> main = Arbitraries.of("CH4", "C3H8", "H2", "CO");
        Arbitrary<Double> share = Arbitraries.doubles().between(0.2, 1).ofScale(6);
        Arbitrary<List<Boolean>> present = Arbitraries.of(true, false, false).list().ofSize(GASES.size());
        return Combinators.combine(weights, present, main, share).as(RandomFuels::gas);
    }

    private static Fuel gas(List<Double> weights, List<Boolean> present, String main, double share) {
        Map<String, Double> parts = new LinkedHashMap<>();
        for (int i = 0; i < GASES.size(); i++) {
            if (present.get(i) && weights.get(i) > 0) {
                parts.put(GASES.get(i), weights.get(i));
            }
        }
        double sum = parts.values().stream().mapToDouble(Double::doubleValue).sum();
        Map<String, Double> shares = new LinkedHashMap<>();
        parts.forEach((name, part) -> shares.put(name, Math.min(part / sum * (1 - share), name.equals("O2") ? 0.05 : 1)));
        double rest = 1 - shares.values().stream().mapToDouble(Double::doubleValue).sum();
        shares.merge(main, rest, Double::sum);
        return FuelBuilder.gas("random gas", shares, false).build();
    }

    /** Liquids and solids with more carbon than oxygen. */
    static Arbitrary<Fuel> solids() {
        Arbitrary<List<Double>> weights = Arbitraries.doubles().between(0.001, 1).ofScale(6).list().ofSize(7);
        return Combinators.combine(weights, Arbitraries.of(AnalysisBasis.class), Arbitraries.of(Phase.LIQUID, Phase.SOLID))
                .as(RandomFuels::solid);
    }

    private static Fuel solid(List<Double> weights, AnalysisBasis basis, Phase phase) {
        double[] most = {1, 0.2, 0.4, 0.05, 0.08, 0.3, 0.3};
        List<Double> parts = new ArrayList<>();
        for (int i = 0; i < most.length; i++) {
            parts.add(i == 0 ? 0.5 + weights.get(0) / 2 : most[i] * weights.get(i));
        }
        Map<String, Double> shares = new LinkedHashMap<>();
        double sum = sumOnBasis(parts, basis);
        for (int i = 0; i < most.length; i++) {
            shares.put(UltimateAnalysis.NAMES.get(i), parts.get(i) / (isOutside(i, basis) ? 1 : sum));
        }
        return FuelBuilder.ultimate("random " + phase.label(), phase, new UltimateAnalysis(shares, basis)).build();
    }

    private static double sumOnBasis(List<Double> parts, AnalysisBasis basis) {
        double sum = 0;
        for (int i = 0; i < parts.size(); i++) {
            sum += isOutside(i, basis) ? 0 : parts.get(i);
        }
        return sum;
    }

    /** Ash is the sixth share, moisture the seventh. */
    private static boolean isOutside(int index, AnalysisBasis basis) {
        return index == 6 && basis != AnalysisBasis.AS_RECEIVED || index == 5 && basis == AnalysisBasis.DRY_ASH_FREE;
    }
}
