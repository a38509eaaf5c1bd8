package fluewright.repl.editor;

import java.util.List;

/** A small vocabulary with one of everything. */
class SampleVocabulary implements Vocabulary {
    @Override
    public List<Word> functions() {
        return List.of(new Word("burn", "burns a fuel"));
    }

    @Override
    public boolean isFunction(String name) {
        return "burn".equals(name);
    }

    @Override
    public List<Argument> arguments(String function) {
        return List.of(new Argument("air", "%", "excess air", List.of()),
            new Argument("method", "", "basis", List.of("wet", "dry")));
    }

    @Override
    public List<Word> variableWords() {
        return List.of(new Word("result", "a result"));
    }

    @Override
    public List<Word> units() {
        return List.of(new Word("kW", "kilowatt"), new Word("degC", "degree"));
    }

    @Override
    public List<Word> units(String function, String argument) {
        return argument.equals("air") ? List.of(new Word("pct", "percent")) : List.of();
    }

    @Override
    public List<Word> texts(String function) {
        return List.of(new Word("natural gas", "a gas"));
    }

    @Override
    public List<Word> members(String path) {
        return "result".equals(path) ? List.of(new Word("CO2", "carbon dioxide")) : List.of();
    }
}
