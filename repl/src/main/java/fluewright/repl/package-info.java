/** The command: options, scripts, the interactive run, plugins, and the session that joins language and functions. */
package fluewright.repl;
