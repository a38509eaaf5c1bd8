/** Plain Groovy as the shell evaluates it: compiling, showing results, interrupting, telling errors. */
package fluewright.repl.language;
