package fluewright.repl.function;

import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import fluewright.engine.quantity.Kind;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** {@code liquid C: 87.pct, ...} and {@code solid C: 70.pct, ...}: a fuel from its ultimate analysis. */
final class AnalysisFunction implements ShellFunction {

    private final Workbench workbench;
    private final Phase phase;
    private final String example;

    private AnalysisFunction(Workbench workbench, Phase phase, String example) {
        this.workbench = workbench;
        this.phase = phase;
        this.example = example;
    }

    static AnalysisFunction liquid(Workbench workbench) {
        return new AnalysisFunction(workbench, Phase.LIQUID, "liquid C: 87.pct, H: 12.6.pct, S: 0.4.pct, hhv: 45.4.MJ/kg, density: 865.kg/m3");
    }

    static AnalysisFunction solid(Workbench workbench) {
        return new AnalysisFunction(workbench, Phase.SOLID,
                "solid C: 50.pct, H: 6.pct, O: 43.2.pct, ash: 0.8.pct, moisture: 35.pct, basis: 'dry'");
    }

    @Override
    public String name() {
        return phase.label();
    }

    @Override
    public String title() {
        return "a " + phase.label() + " fuel from its ultimate analysis by mass";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of(
                ArgumentDoc.choice("basis", "what the shares are counted on; moisture is always as received", "as-received",
                        NamedValues.words(AnalysisBasis.class)),
                ArgumentDoc.optional("hhv", "an energy per mass, such as 45.4.MJ/kg",
                        "measured gross heating value at 25 degC, on the same basis; estimated without it"),
                ArgumentDoc.optional("density", "a density, such as 865.kg/m3", "density, for blends by volume"),
                ArgumentDoc.optional("name", "a text", "the id it is called by in results"));
    }

    @Override
    public List<String> examples() {
        return List.of(example);
    }

    @Override
    public List<String> remarks() {
        return List.of("All other names are shares: " + String.join(", ", UltimateAnalysis.NAMES) + ". H and O are those of the",
                "fuel itself, without the moisture. Without hhv the heating value is estimated after Channiwala and Parikh.");
    }

    @Override
    public Map<String, String> openNames() {
        Map<String, String> names = new LinkedHashMap<>();
        UltimateAnalysis.NAMES.forEach(name -> names.put(name, "share by mass"));
        return names;
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.atMost(name(), unnamed, 0);
        NamedValues values = new NamedValues(name(), workbench, named);
        AnalysisBasis basis = values.choice("basis", AnalysisBasis.AS_RECEIVED);
        String id = values.text("name", name());
        var hhv = values.value("hhv", Kind.ENERGY_PER_MASS);
        var density = values.value("density", Kind.DENSITY);
        FuelBuilder builder = FuelBuilder.ultimate(id, phase, new UltimateAnalysis(values.sharesByName(), basis)).source("typed in the session");
        hhv.ifPresent(value -> builder.measuredPerMass(value.si()));
        density.ifPresent(value -> builder.density(value.si()));
        return builder.build();
    }
}
