package fluewright.boundaries;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.calculation.Declaration;
import fluewright.engine.calculation.Term;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.ValueText;
import fluewright.support.Bench;
import java.util.HashSet;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What each calculation of the catalog declares, since help, completion and tables are made of nothing else. */
class DeclarationTest {

    private static final Set<String> BUILT_IN = Set.of("burn", "correct", "dewPoint", "losses", "properties");

    static Stream<Declaration<?, ?>> declarations() {
        return Bench.CATALOG.names().stream().map(Bench.CATALOG::declaration);
    }

    @Test
    void the_catalog_has_the_built_in_calculations() {
        assertTrue(Bench.CATALOG.names().containsAll(new TreeSet<>(BUILT_IN)), () -> Bench.CATALOG.names().toString());
    }

    @ParameterizedTest
    @MethodSource("declarations")
    void every_component_has_a_doc_of_one_line(Declaration<?, ?> declaration) {
        assertFalse(declaration.input().terms().isEmpty());
        assertFalse(declaration.result().terms().isEmpty());
        components(declaration).forEach(term ->
                assertTrue(!term.doc().isBlank() && !term.doc().contains("\n"), () -> declaration.name() + "." + term.name()));
    }

    @ParameterizedTest
    @MethodSource("declarations")
    void every_calculation_names_a_source_and_shows_a_call(Declaration<?, ?> declaration) {
        assertFalse(declaration.title().isBlank());
        assertFalse(declaration.sources().isEmpty(), declaration::name);
        assertTrue(declaration.sources().stream().noneMatch(String::isBlank), declaration::name);
        assertTrue(declaration.example().contains(declaration.name() + " "), declaration::name);
        assertTrue(declaration.name().matches("[a-z][A-Za-z0-9]*"), declaration::name);
    }

    /** The named arguments of the example are arguments. */
    @ParameterizedTest
    @MethodSource("declarations")
    void examples_use_arguments_that_exist(Declaration<?, ?> declaration) {
        Set<String> used = new HashSet<>();
        Pattern.compile("([A-Za-z0-9]+):").matcher(declaration.example()).results().forEach(m -> used.add(m.group(1)));
        assertFalse(used.isEmpty(), declaration::name);
        used.forEach(argument -> assertEquals(argument, declaration.argument(argument).name()));
    }

    /** A default has to be of its kind, possible and valid. */
    @ParameterizedTest
    @MethodSource("declarations")
    void defaults_fit_their_arguments(Declaration<?, ?> declaration) {
        declaration.input().terms().stream().filter(Term::isNumber).filter(term -> !term.byDefault().isEmpty()).forEach(term -> {
            var value = ValueText.parse(term.byDefault());
            assertTrue(term.kind().accepts(value.named()), () -> declaration.name() + "." + term.name());
            assertTrue(term.possible().contains(value.si()) && term.valid().contains(value.si()),
                    () -> declaration.name() + "." + term.name());
        });
    }

    @ParameterizedTest
    @MethodSource("declarations")
    void shown_units_are_of_their_kind(Declaration<?, ?> declaration) {
        components(declaration).filter(term -> !term.kinds().isEmpty()).forEach(term -> Stream.of(UnitSystem.values())
                .forEach(system -> assertTrue(term.kind().accepts(Units.of(term.shown(system).symbol())),
                        () -> declaration.name() + "." + term.name())));
    }

    private static Stream<Term> components(Declaration<?, ?> declaration) {
        return Stream.concat(declaration.input().terms().stream(), declaration.result().terms().stream());
    }
}
