/** Elements, gas species with their thermodynamic polynomials, gas mixtures, and the saturation line of water. */
package fluewright.engine.species;
