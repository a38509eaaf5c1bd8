package fluewright.repl.language;

/** How an evaluation ended. */
public enum Outcome { DONE, FAILED, STOPPED, ABANDONED }
