package fluewright.repl.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.jline.reader.Candidate;
import org.jline.reader.Parser.ParseContext;
import org.junit.jupiter.api.Test;

class InputCompleterTest {
    private static List<String> offered(String text) {
        var line = new InputParser().parse(text, text.length(), ParseContext.COMPLETE);
        List<Candidate> candidates = new ArrayList<>();
        new InputCompleter(SampleVocabulary::new).complete(null, line, candidates);
        return candidates.stream().map(Candidate::value).filter(value -> value.startsWith(line.word())).toList();
    }

    @Test
    void offersFunctionsAndVariablesByTheirStart() {
        assertEquals(List.of("burn"), offered("bu"));
        assertEquals(List.of("result"), offered("x = re"));
        assertEquals(List.of("burn"), offered("x = (1 + bu"));
    }

    @Test
    void offersArgumentsThatAreNotYetGiven() {
        assertTrue(offered("burn ng, ").containsAll(List.of("air:", "method:")));
        assertEquals(List.of("method:"), offered("burn(ng, air: 3, ").stream().filter(name -> name.endsWith(":")).toList());
        assertEquals(List.of("air:"), offered("x = burn ng, a"));
    }

    @Test
    void offersValuesUnitsMembersAndTexts() {
        assertEquals(List.of("'wet'", "'dry'"), offered("burn ng, method: ").subList(0, 2));
        assertEquals(List.of("dry"), offered("burn ng, method: 'd"));
        assertEquals(List.of("kW"), offered("p = 123.k"));
        assertEquals(List.of("CO2"), offered("result.CO"));
        assertEquals(List.of("natural gas"), offered("burn 'nat"));
        assertEquals(List.of("natural gas"), offered("burn('nat"));
    }

    @Test
    void offersOnlyWhatFitsWhereAnArgumentOrItsUnitIsNext() {
        assertEquals(List.of("air:", "method:"), offered("burn ng, "));
        assertEquals(List.of("pct"), offered("burn ng, air: 3."));
        assertEquals(List.of("kW", "degC"), offered("burn ng, method: 3."));
    }

    @Test
    void offersNothingInComments() {
        assertEquals(List.of(), offered("1 // bu"));
    }
}
