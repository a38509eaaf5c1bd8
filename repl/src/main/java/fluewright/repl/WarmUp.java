package fluewright.repl;

import fluewright.repl.function.ShellFunction;
import fluewright.repl.function.Workbench;
import fluewright.repl.output.Printer;
import java.util.List;
import java.util.Map;
import org.codehaus.groovy.runtime.InvokerHelper;

/** Does once what the first results will need: behind the prompt, or on the other core while a text is compiled. */
final class WarmUp {

    private WarmUp() {
    }

    /** Runs one calculation to its printed lines, the way Groovy would, so that tables are read and classes are ready. */
    static void firstResult(Workbench workbench) {
        Map<Object, Object> reading = Map.of("o2", InvokerHelper.getProperty(3, "pct"), "stack", InvokerHelper.getProperty(180, "degC"));
        Object losses = workbench.function("losses").orElseThrow().call(List.of("methane"), reading);
        new Printer(workbench::shown).lines(losses, 80);
    }

    /** Prepares besides what completion looks up. */
    static void completion(Workbench workbench) {
        workbench.functions().forEach(ShellFunction::arguments);
        workbench.fuelIds().forEach(workbench::fuelEntry);
    }
}
