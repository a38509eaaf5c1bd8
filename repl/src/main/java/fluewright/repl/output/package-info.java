/** What the shell prints: tables for people, JSON lines for programs. */
package fluewright.repl.output;
