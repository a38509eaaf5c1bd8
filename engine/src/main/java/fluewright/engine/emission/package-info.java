/** Emissions: correction to a reference O2, mass rates per heat by F-factors, and the units between them. */
package fluewright.engine.emission;
