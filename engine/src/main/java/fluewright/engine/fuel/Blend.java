package fluewright.engine.fuel;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Numbers;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;

/** Blends fuels by volume, mass or energy. Shares of energy are on gross heating values. */
public final class Blend {

    /** What the shares of a blend are counted on. */
    public enum By {
        /** Gas volume at one state, or volume of liquids at about 15 degC. */
        VOLUME,
        /** Mass as fired. */
        MASS,
        /** Gross heating value. */
        ENERGY
    }

    private Blend() {
    }

    /**
     * Returns the blend of fuels.
     *
     * @param shares the share of each fuel [-]; their sum is one within one percent
     * @param by     what the shares are counted on
     * @throws InputException when the shares do not add up, or unlike phases are blended by volume
     */
    public static Fuel of(Map<Fuel, Double> shares, By by) {
        Notes notes = new Notes();
        Map<Fuel, Double> mass = massShares(closed(shares, notes), by);
        mass.keySet().forEach(fuel -> notes.addAll(fuel.notes()));
        Makeup makeup = mass.entrySet().stream().map(e -> e.getKey().makeup().times(e.getValue())).reduce(Makeup::plus).orElseThrow();
        double gross = sum(mass, Fuel::gross);
        Optional<GasComposition> gas = gas(mass);
        String title = shares.entrySet().stream().map(e -> Numbers.rounded(e.getValue() * 100, 4) + " % " + e.getKey().id())
                .collect(Collectors.joining(" + ")) + " by " + by.name().toLowerCase(Locale.ROOT);
        List<String> sources = new ArrayList<>();
        mass.keySet().forEach(fuel -> fuel.sources().stream().filter(s -> !sources.contains(s)).forEach(sources::add));
        return new Fuel("blend", title, phase(mass), makeup, new HeatingValue(gross, "sum of the parts"), gas, density(mass), "",
                notes.list(), sources, "session");
    }

    private static Map<Fuel, Double> closed(Map<Fuel, Double> shares, Notes notes) {
        Map<String, Double> byNumber = new LinkedHashMap<>();
        List<Fuel> fuels = new ArrayList<>(shares.keySet());
        fuels.forEach(fuel -> byNumber.put(byNumber.size() + 1 + " " + fuel.id(), shares.get(fuel)));
        List<Double> closed = new ArrayList<>(Closure.close(byNumber, "blend", "", notes).values());
        Map<Fuel, Double> result = new LinkedHashMap<>();
        for (int i = 0; i < fuels.size(); i++) {
            if (closed.get(i) > 0) {
                result.put(fuels.get(i), closed.get(i));
            }
        }
        return result;
    }

    private static Map<Fuel, Double> massShares(Map<Fuel, Double> shares, By by) {
        Map<Fuel, Double> mass = new LinkedHashMap<>();
        shares.forEach((fuel, share) -> mass.put(fuel, share * massPer(fuel, by, shares.keySet())));
        double total = mass.values().stream().mapToDouble(Double::doubleValue).sum();
        mass.replaceAll((fuel, m) -> m / total);
        return mass;
    }

    private static double massPer(Fuel fuel, By by, Iterable<Fuel> all) {
        return switch (by) {
            case MASS -> 1;
            case ENERGY -> 1 / fuel.gross();
            case VOLUME -> massPerVolume(fuel, all);
        };
    }

    private static double massPerVolume(Fuel fuel, Iterable<Fuel> all) {
        for (Fuel other : all) {
            if (other.phase() != fuel.phase()) {
                throw cannot(fuel, "a " + fuel.phase().label() + " and a " + other.phase().label(), "by: mass or by: energy");
            }
        }
        if (fuel.phase() == Phase.GAS) {
            return fuel.molarMass().getAsDouble();
        }
        return fuel.density().orElseThrow(() -> cannot(fuel, fuel.phase().label() + " without a density", "by: mass or by: energy"));
    }

    private static InputException cannot(Fuel fuel, String found, String expected) {
        return new InputException(EngineMessage.CANNOT_BLEND, Detail.at("blend " + fuel.id()).found(found).expected(expected));
    }

    private static double sum(Map<Fuel, Double> mass, ToDoubleFunction<Fuel> property) {
        return mass.entrySet().stream().mapToDouble(e -> e.getValue() * property.applyAsDouble(e.getKey())).sum();
    }

    private static Phase phase(Map<Fuel, Double> mass) {
        List<Phase> phases = mass.keySet().stream().map(Fuel::phase).distinct().toList();
        return phases.size() == 1 ? phases.get(0) : Phase.MIXED;
    }

    private static Optional<GasComposition> gas(Map<Fuel, Double> mass) {
        if (phase(mass) != Phase.GAS) {
            return Optional.empty();
        }
        double moles = sum(mass, fuel -> 1 / fuel.molarMass().getAsDouble());
        Map<GasComponent, Double> fractions = new LinkedHashMap<>();
        mass.forEach((fuel, share) -> fuel.gas().orElseThrow().fractions().forEach((component, x) ->
                fractions.merge(component, x * share / fuel.molarMass().getAsDouble() / moles, Double::sum)));
        return Optional.of(new GasComposition(fractions));
    }

    /** Volumes of liquids are taken to add up, as is usual for oils. */
    private static OptionalDouble density(Map<Fuel, Double> mass) {
        boolean known = phase(mass) == Phase.LIQUID && mass.keySet().stream().allMatch(fuel -> fuel.density().isPresent());
        return known ? OptionalDouble.of(1 / sum(mass, fuel -> 1 / fuel.density().getAsDouble())) : OptionalDouble.empty();
    }
}
