/** Line editing: keys, colours, completion, history and multi-line input. */
package fluewright.repl.editor;
