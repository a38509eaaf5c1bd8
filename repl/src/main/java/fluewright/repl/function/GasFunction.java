package fluewright.repl.function;

import fluewright.engine.fuel.Blend;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.quantity.Kind;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** {@code gas CH4: 91.2.pct, ...}: a fuel gas from its composition. */
final class GasFunction implements ShellFunction {

    private final Workbench workbench;

    GasFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "gas";
    }

    @Override
    public String title() {
        return "a fuel gas from its composition";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of(
                ArgumentDoc.choice("by", "what the shares are counted on", "volume", List.of("volume", "mass")),
                ArgumentDoc.optional("hhv", "an energy per mass, mole or gas volume, such as 38.MJ/Sm3",
                        "measured gross heating value at 25 degC; computed from the composition without it"),
                ArgumentDoc.optional("name", "a text", "the id it is called by in results"));
    }

    @Override
    public List<String> examples() {
        return List.of("gas CH4: 91.2.pct, C2H6: 5.pct, N2: 3.8.pct");
    }

    @Override
    public List<String> remarks() {
        return List.of("All other names are components with their shares: symbols of ISO 6976 such as CH4, C2H6, nC4H10,",
                "iC4H10, CO2, N2, H2, CO, H2S. Shares make 100 % within 1 %; they are scaled, and a remark says so.");
    }

    @Override
    public Map<String, String> openNames() {
        Map<String, String> names = new LinkedHashMap<>();
        GasComponents.titles().forEach((symbol, title) -> names.put(typed(symbol), title));
        return names;
    }

    private static String typed(String symbol) {
        return symbol.chars().allMatch(Character::isJavaIdentifierPart) ? symbol : "'" + symbol + "'";
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.atMost(name(), unnamed, 0);
        NamedValues values = new NamedValues(name(), workbench, named);
        Blend.By by = values.choice("by", Blend.By.VOLUME);
        if (by == Blend.By.ENERGY) {
            throw new InputException(EngineMessage.WRONG_TYPE, Detail.at("gas by").found("energy").expected("volume or mass"));
        }
        String id = values.text("name", "gas");
        var hhv = values.value("hhv", Kind.ENERGY_PER_MASS, Kind.ENERGY_PER_GAS);
        FuelBuilder builder = FuelBuilder.gas(id, values.sharesByName(), by == Blend.By.MASS).source("typed in the session");
        hhv.ifPresent(value -> {
            if (Kind.ENERGY_PER_MASS.accepts(value.named())) {
                builder.measuredPerMass(value.si());
            } else {
                builder.measuredPerMole(value.si());
            }
        });
        return builder.build();
    }
}
