package fluewright.repl.editor;

import fluewright.repl.editor.Vocabulary.Argument;
import fluewright.repl.editor.Vocabulary.Word;
import java.util.List;
import java.util.function.Supplier;
import org.jline.reader.Candidate;
import org.jline.reader.Completer;
import org.jline.reader.LineReader;
import org.jline.reader.ParsedLine;

/** Offers what can stand at the cursor, each with a word about it. */
final class InputCompleter implements Completer {
    private final Supplier<Vocabulary> vocabulary;

    InputCompleter(Supplier<Vocabulary> vocabulary) {
        this.vocabulary = vocabulary;
    }

    @Override
    public void complete(LineReader reader, ParsedLine line, List<Candidate> candidates) {
        Vocabulary words = vocabulary.get();
        Site site = Site.at(line.line(), line.cursor());
        Site.Call call = site.call(words::isFunction);
        if (site.inComment()) {
            return;
        }
        if (site.inString()) {
            addAll(candidates, strings(words, site, call), false);
        } else if (site.afterNumberDot()) {
            addAll(candidates, units(words, site, call), false);
        } else if (site.afterDot()) {
            addAll(candidates, words.members(site.path()), false);
        } else {
            addNames(candidates, words, site, call);
        }
    }

    private static List<Word> strings(Vocabulary words, Site site, Site.Call call) {
        if (call == null) {
            return List.of();
        }
        String argument = site.argumentBeingSet();
        if (!argument.isEmpty()) {
            return values(words, call, argument);
        }
        return call.atFirstArgument() ? words.texts(call.function) : List.of();
    }

    /** Those that fit the argument; all of them where none is known. */
    private static List<Word> units(Vocabulary words, Site site, Site.Call call) {
        List<Word> fitting = call == null || site.argumentBeingSet().isEmpty() ? List.of()
            : words.units(call.function, site.argumentBeingSet());
        return fitting.isEmpty() ? words.units() : fitting;
    }

    private static List<Word> values(Vocabulary words, Site.Call call, String argument) {
        return words.arguments(call.function).stream()
            .filter(known -> known.name().equals(argument))
            .flatMap(known -> known.values().stream().map(value -> new Word(value, known.about()))).toList();
    }

    private static void addNames(List<Candidate> candidates, Vocabulary words, Site site, Site.Call call) {
        if (call != null && !site.argumentBeingSet().isEmpty()) {
            addQuoted(candidates, values(words, call, site.argumentBeingSet()));
        } else if (call != null) {
            addArguments(candidates, words.arguments(call.function), call.given());
            if (!candidates.isEmpty() && site.isAtWordStart() && !call.atFirstArgument()) {
                return;
            }
        }
        addAll(candidates, words.variableWords(), false);
        addAll(candidates, words.functions(), true);
    }

    private static void addArguments(List<Candidate> candidates, List<Argument> arguments, List<String> given) {
        for (Argument argument : arguments) {
            if (!given.contains(argument.name())) {
                String about = argument.unit().isEmpty() ? argument.about() : argument.about() + ", " + argument.unit();
                candidates.add(candidate(argument.name() + ":", about, true));
            }
        }
    }

    /** Words that the user has to write as strings. */
    private static void addQuoted(List<Candidate> candidates, List<Word> values) {
        values.forEach(value -> candidates.add(candidate("'" + value.text() + "'", value.about(), false)));
    }

    private static void addAll(List<Candidate> candidates, List<Word> words, boolean space) {
        words.forEach(word -> candidates.add(candidate(word.text(), word.about(), space)));
    }

    private static Candidate candidate(String text, String about, boolean space) {
        return new Candidate(text, text, null, about.isEmpty() ? null : about, null, null, space);
    }
}
