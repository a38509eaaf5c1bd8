package fluewright.repl.language;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class EvaluatorTest implements Names, ResultSink {
    private final List<String> told = Collections.synchronizedList(new ArrayList<>());
    private final Evaluator evaluator = new Evaluator(this, this,
        new PlainErrors(() -> List.of("burn", "excess"), told::addAll), true);

    @Override
    public Object resolve(String name) {
        return "ng".equals(name) ? "natural gas" : null;
    }

    @Override
    public boolean isFunction(String name) {
        return "burn".equals(name) || "sleep".equals(name);
    }

    @Override
    public Object call(String name, Object[] arguments) {
        return name + Arrays.toString(arguments);
    }

    @Override
    public Collection<String> known() {
        return List.of("burn", "sleep", "ng");
    }

    @Override
    public void show(Object value) {
        told.add(value.toString());
    }

    @Override
    public void assigned(String name, Object value) {
        told.add(name + " is " + value);
    }

    @Override
    public void note(String text) {
        told.add("note " + text);
    }

    private List<String> after(String... inputs) {
        told.clear();
        for (String input : inputs) {
            evaluator.evaluate("input", input);
        }
        return List.copyOf(told);
    }

    @Test
    void tellsEveryTopLevelValueAndRemembersTheLast() {
        assertEquals(List.of("2", "x", "6"), after("1 + 1; a = 2; null; if (a) { 7 }; 'x'", "a * 3"));
        assertEquals(List.of("12"), after("_ * 2"));
        assertEquals(List.of("b is 4"), after("def local = 3; b = local + 1"));
    }

    @Test
    void keepsWhatInputsDeclare() {
        assertEquals(List.of("8", "5", "SECONDS"), after("def twice(n) { n * 2 }", "twice 4", "class Pot { int size = 5 }",
            "new Pot().size", "import java.util.concurrent.TimeUnit", "TimeUnit.SECONDS"));
    }

    @Test
    void callsFunctionsWhateverElseBearsTheirName() {
        assertEquals(List.of("burn[{air=15}, natural gas]"), after("burn ng, air: 15"));
        assertEquals(List.of("burn[{air=3}]", "sleep[5]"), after("burn air: 3", "sleep 5"));
        assertEquals(List.of("[burn[1], burn[2]]"), after("[1, 2].collect { burn it }"));
        List<String> shadowed = after("burn = 4", "burn = 5", "burn(burn)");
        assertEquals(4, shadowed.size());
        assertTrue(shadowed.get(0).startsWith("note 'burn' is also a function"));
        assertEquals("burn[5]", shadowed.get(3));
    }

    @Test
    void explainsFailuresShortly() {
        assertEquals(List.of("unknown name 'exces'; did you mean excess?"), after("exces + 1"));
        assertEquals(List.of("unknown function 'burm'; did you mean burn?"), after("burm 1"));
        assertEquals(List.of("String has no method 'frob' for (Integer)"), after("'a'.frob(1)"));
        List<String> syntax = after("a = 1\nb = * 2");
        assertTrue(syntax.get(0).startsWith("input line 2, column"), syntax.toString());
        assertEquals("  b = * 2", syntax.get(1));
        assertEquals("  at input line 2: 1 / 0", after("a = 1\n1 / 0").get(1));
    }

    @ParameterizedTest
    @ValueSource(strings = {"while (true) { }", "while (true) { try { Thread.sleep(10) } catch (InterruptedException e) { } }",
        "(1..10**9).each { }", "3G.pow(500000000)", "'a'.matches('(a*)*b') || 3G.pow(900000000).toString()"})
    void canBeStoppedAndKeepsItsVariables(String endless) throws Exception {
        evaluator.evaluate("input", "kept = 42");
        CompletableFuture<Outcome> running = CompletableFuture.supplyAsync(() -> evaluator.evaluate("input", endless));
        Thread.sleep(300);
        evaluator.interrupt();
        assertEquals(Outcome.STOPPED, running.get(10, TimeUnit.SECONDS));
        assertEquals(List.of("42"), after("kept"));
    }
}
