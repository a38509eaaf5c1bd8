package fluewright.repl.output;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.Note;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import fluewright.repl.function.FuelEntry;
import fluewright.repl.function.FunctionHandle;
import fluewright.repl.function.HelpText;
import fluewright.repl.function.ResultView;
import groovy.json.JsonOutput;
import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;

/**
 * Turns values into one JSON object on one line. A result is an object with a member for each component, a quantity being
 * {@code {"value": 84.2, "unit": "%", "basis": "gross"}} with all its digits, besides {@code calculation} and, if there
 * are any, {@code notes}.
 */
public final class JsonLine {

    private final Supplier<UnitSystem> system;

    /** Makes a writer for the units in use. */
    public JsonLine(Supplier<UnitSystem> system) {
        this.system = system;
    }

    /** Returns a value as a JSON object on one line. */
    public String of(Object value) {
        Object json = value instanceof FunctionHandle handle ? json(handle.shown()) : json(value);
        return JsonOutput.toJson(json instanceof Map ? json : Map.of("value", json == null ? "" : json));
    }

    private Object json(Object value) {
        if (value instanceof ResultView view) {
            return result(view);
        }
        if (value instanceof Fuel fuel) {
            return fuel(fuel);
        }
        if (value instanceof Value<?> number) {
            return quantity(number);
        }
        if (value instanceof FuelEntry entry) {
            return Map.of("fuel", entry.id(), "phase", entry.phase(), "title", entry.title());
        }
        if (value instanceof HelpText text) {
            return Map.of("text", text.lines());
        }
        if (value instanceof Map<?, ?> map) {
            Map<String, Object> members = new LinkedHashMap<>();
            map.forEach((name, part) -> members.put(String.valueOf(name), json(part)));
            return members;
        }
        if (value instanceof Object[] array) {
            return json(Arrays.asList(array));
        }
        if (value instanceof Collection<?> parts) {
            return parts.stream().map(this::json).toList();
        }
        return value == null || value instanceof Boolean ? value : value instanceof Number number ? finite(number) : String.valueOf(value);
    }

    /** JSON has no infinities and no NaN; they go as text. */
    private static Object finite(Number number) {
        return Double.isFinite(number.doubleValue()) ? number : String.valueOf(number);
    }

    private Map<String, Object> result(ResultView view) {
        Map<String, Object> members = new LinkedHashMap<>();
        members.put("calculation", view.outcome().declaration().name());
        view.outcome().names().forEach(name -> members.put(name, json(view.outcome().get(name, system.get()))));
        addNotes(members, view.outcome().notes());
        return members;
    }

    private Map<String, Object> fuel(Fuel fuel) {
        Map<String, Object> members = new LinkedHashMap<>();
        members.put("fuel", fuel.id());
        members.put("title", fuel.title());
        members.put("phase", fuel.phase().label());
        members.put("gross", json(Value.ofSi(fuel.gross(), Kind.ENERGY_PER_MASS.shown(system.get()), Basis.GROSS)));
        members.put("net", json(Value.ofSi(fuel.net(), Kind.ENERGY_PER_MASS.shown(system.get()), Basis.NET)));
        Map<String, Object> shares = new LinkedHashMap<>();
        new FuelText(fuel, system.get()).shares().forEach((name, share) -> shares.put(name, json(Value.ofSi(share, Kind.SHARE.shown(system.get()), Basis.NONE))));
        members.put("composition", shares);
        members.put("compositionBy", fuel.gas().isPresent() ? "volume" : "mass, as received");
        members.put("sources", fuel.sources());
        members.put("origin", fuel.origin());
        addNotes(members, fuel.notes());
        return members;
    }

    private static Map<String, Object> quantity(Value<?> value) {
        Map<String, Object> members = new LinkedHashMap<>();
        members.put("value", value.number());
        members.put("unit", value.named().label());
        members.put("basis", value.basis().label());
        return members;
    }

    private static void addNotes(Map<String, Object> members, List<Note> notes) {
        if (!notes.isEmpty()) {
            members.put("notes", notes.stream().map(note -> Map.of("level", note.level().name().toLowerCase(Locale.ROOT),
                    "message", note.message().name(), "text", note.text())).toList());
        }
    }
}
