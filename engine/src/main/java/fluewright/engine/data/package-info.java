/** Reads the data files that the engine ships beside its classes. */
package fluewright.engine.data;
