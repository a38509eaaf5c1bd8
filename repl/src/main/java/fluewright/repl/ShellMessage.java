package fluewright.repl;

import fluewright.engine.message.Message;

/** What the shell has to say on its own account. */
public enum ShellMessage implements Message {
    /** The folder of {@code --plugins} cannot be read. */
    NO_PLUGIN_FOLDER("the folder of the plugins cannot be read"),
    /** A plugin jar whose service entry or class is faulty. */
    BAD_PLUGIN("a plugin cannot be loaded");

    private final String sentence;

    ShellMessage(String sentence) {
        this.sentence = sentence;
    }

    @Override
    public String sentence() {
        return sentence;
    }
}
