package fluewright.repl.editor;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CompletenessTest {
    @ParameterizedTest
    @ValueSource(strings = {"(1 +", "[1, 2", "f {", "'''a", "\"\"\"a\nb", "a \\", "a +", "a,", "burn ng,", "x =", "/* note",
        "if (a)", "for (i in 1..3)", "a ? b :", "$/ text", "\"${[1, 2].collect { it }}\" +", "x instanceof", "a ?:", "(')'"})
    void goesOn(String text) {
        assertTrue(Completeness.needsMore(text), text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "1 + 1", "a)", "(a]", "'abc", "\"abc", "i++", "i--", "x // a +", "import java.util.*",
        "10 / 2 / 5", "a / b", "x =~ /a(b/", "'it''s'", "\"${a + \"}\"}\"", "do { i++ } while (i < 3)", "f(/[(]/)", "1..5",
        "'''a'''", "[a: '(', b: ')']", "/* ( */ 1", "$/ a ( /$", "x.collect { it * 2 }", "a // (", "1.5e-3", "20.degC"})
    void isFinished(String text) {
        assertFalse(Completeness.needsMore(text), text);
    }
}
