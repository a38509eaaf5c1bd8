package fluewright.repl.function;

import fluewright.engine.fuel.Blend;
import fluewright.engine.fuel.Fuel;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** {@code blend 'natural-gas': 80.pct, hydrogen: 20.pct, by: volume}: a blend of fuels. */
final class BlendFunction implements ShellFunction {

    private final Workbench workbench;

    BlendFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "blend";
    }

    @Override
    public String title() {
        return "a blend of fuels by volume, mass or energy";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of(ArgumentDoc.choice("by", "what the shares are counted on; energy is on gross heating values", "volume",
                NamedValues.words(Blend.By.class)));
    }

    @Override
    public List<String> examples() {
        return List.of("blend 'natural-gas': 80.pct, hydrogen: 20.pct, by: volume");
    }

    @Override
    public List<String> remarks() {
        return List.of("All other names are fuels with their shares: an id, or a variable that holds a fuel. By volume goes for",
                "gases, and for liquids with known densities; unlike phases are blended by mass or energy.");
    }

    @Override
    public Map<String, String> openNames() {
        Map<String, String> names = new LinkedHashMap<>();
        workbench.fuelIds().forEach(id -> names.put(id.contains("-") ? "'" + id + "'" : id, "fuel"));
        return names;
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.atMost(name(), unnamed, 0);
        NamedValues values = new NamedValues(name(), workbench, named);
        Blend.By by = values.choice("by", Blend.By.VOLUME);
        Map<Fuel, Double> shares = new LinkedHashMap<>();
        values.shares().forEach((name, share) -> shares.merge(name instanceof Fuel fuel ? fuel : workbench.fuel(name.toString()), share, Double::sum));
        return Blend.of(shares, by);
    }
}
