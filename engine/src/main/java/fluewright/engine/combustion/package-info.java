/** Combustion air, the element balance of a fuel, and its flue gas from a stated excess air or an analyzer reading. */
package fluewright.engine.combustion;
