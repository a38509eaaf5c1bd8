package fluewright.repl;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import groovy.json.JsonSlurper;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whole sessions as a user has them. */
class SessionTest {
    @TempDir Path folder;

    /** The README's session is typed as it stands there: nothing in it may fail. */
    @Test
    void theSessionOfTheReadmeRuns() throws Exception {
        String readme = Files.readString(Path.of("..", "README.md"));
        StringBuilder typed = new StringBuilder();
        Matcher lines = Pattern.compile("(?m)^    flue> (.*)$").matcher(readme);
        while (lines.find()) {
            typed.append(lines.group(1)).append('\n');
        }
        ShellRun run = ShellRun.of(folder, typed.toString());
        assertEquals("", run.err());
        assertEquals(0, run.code());
        assertTrue(run.out().contains("grossEfficiency"), run.out());
    }

    @Test
    void theOwnFuelOfTheReadmeIsRead() throws Exception {
        String readme = Files.readString(Path.of("..", "README.md"));
        Matcher file = Pattern.compile("(?m)(^    id: refinery-gas\n(?:^    .*\n)+)").matcher(readme);
        assertTrue(file.find());
        Path fuels = Files.createDirectories(folder.resolve(".fluewright").resolve("fuels"));
        Files.writeString(fuels.resolve("refinery-gas.yaml"), file.group(1).replaceAll("(?m)^    ", ""));
        ShellRun run = ShellRun.of(folder, "burn 'refinery-gas', lambda: 1.1");
        assertEquals("", run.err());
        assertTrue(run.out().startsWith("burn: refinery-gas, lambda 1.1"), run.out());
    }

    @Test
    void jsonIsOneObjectALineWithValueUnitAndBasis() throws Exception {
        ShellRun run = ShellRun.of(folder, "1.2\nburn 'methane', lambda: 1\nx = 3\n'text'\n", "--json");
        List<String> lines = run.out().lines().toList();
        assertEquals(3, lines.size());
        Map<?, ?> burn = (Map<?, ?>) new JsonSlurper().parseText(lines.get(1));
        Map<?, ?> largest = (Map<?, ?>) burn.get("co2Max");
        assertEquals("%", largest.get("unit"));
        assertEquals("dry", largest.get("basis"));
        // 1 mol CO2 and 2 / 0.20939 mol air, of which 0.0004 is CO2, in 1 + 2 / 0.20939 - 2 mol dry gas: by hand
        // 1.003821 / 8.551555.
        assertEquals(11.7385, ((Number) largest.get("value")).doubleValue(), 0.0001);
    }

    @Test
    void bareNumbersAreRefusedUntilAUnitSystemIsChosen() throws Exception {
        ShellRun refused = ShellRun.of(folder, "losses 'methane', o2: 3, stack: 350");
        assertEquals(1, refused.code());
        assertTrue(refused.err().contains("o2: 3.pct, or 'units si' / 'units us'"), refused.err());
        ShellRun bare = ShellRun.of(folder, "units us\n(losses('methane', o2: 3, stack: 350, air: 70).grossEfficiency"
            + " - losses('methane', o2: 3.pct, stack: 350.degF, air: 70.degF).grossEfficiency).number()");
        assertEquals("0.0", bare.out().lines().toList().get(1));
    }

    @Test
    void errorsTakeFiveLinesAtMostAndNameWhatIsNear() throws Exception {
        for (String wrong : List.of("losses 'natural-gs', o2: 3.pct, stack: 180.degC", "losses 'methane', o2: 3.pct, stak: 180.degC",
                "losses 'methane', o2: 3.pc, stack: 180.degC", "lossez 'methane', o2: 3.pct")) {
            ShellRun run = ShellRun.of(folder, wrong);
            assertEquals(1, run.code());
            assertTrue(run.err().lines().count() <= 5, run.err());
        }
        assertTrue(ShellRun.of(folder, "fuel 'natural-gs'").err().contains("natural-gas"));
        assertTrue(ShellRun.of(folder, "losses 'methane', stak: 180.degC").err().contains("stack"));
        assertTrue(ShellRun.of(folder, "lossez 'methane'").err().contains("losses"));
    }

    @Test
    void everyExampleOfHelpRuns() throws Exception {
        ShellRun help = ShellRun.of(folder, "help");
        StringBuilder examples = new StringBuilder();
        help.out().lines().filter(line -> line.matches("  [a-zA-Z]+ +.*")).map(line -> line.strip().split(" ")[0])
            .forEach(name -> examples.append("help '").append(name).append("'\n"));
        ShellRun pages = ShellRun.of(folder, examples.toString());
        String calls = pages.out().lines().filter(line -> line.matches("  (fuel|fuels|gas|liquid|solid|blend|burn|losses|correct|dewPoint"
            + "|properties|units)\\b.*['.:].*")).map(String::strip).reduce("", (a, b) -> a + b + "\n");
        assertTrue(calls.lines().count() >= 10, calls);
        ShellRun run = ShellRun.of(folder, calls);
        assertEquals("", run.err(), calls);
        assertEquals(0, run.code());
    }
}
