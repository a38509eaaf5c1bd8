/** The functions of the shell: fuels, calculations of the catalog, units and help. */
package fluewright.repl.function;
