package fluewright.repl.function;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** {@code fuels}: the fuels there are, or those that match a word. */
final class FuelListFunction implements ShellFunction {

    private final Workbench workbench;

    FuelListFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "fuels";
    }

    @Override
    public String title() {
        return "the fuels there are, or those whose id, title or phase holds a word";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of();
    }

    @Override
    public List<String> examples() {
        return List.of("fuels", "fuels 'oil'");
    }

    @Override
    public boolean isCalledByName() {
        return true;
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.noNames(name(), named);
        Unnamed.atMost(name(), unnamed, 1);
        String word = unnamed.isEmpty() ? "" : unnamed.get(0).toString().toLowerCase(Locale.ROOT);
        List<FuelEntry> found = new ArrayList<>();
        for (String id : workbench.fuelIds()) {
            FuelEntry entry = workbench.fuelEntry(id);
            if ((entry.id() + " " + entry.title() + " " + entry.phase()).toLowerCase(Locale.ROOT).contains(word)) {
                found.add(entry);
            }
        }
        return found;
    }
}
