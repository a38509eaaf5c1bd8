/** Temperatures at which something condenses from the flue gas. */
package fluewright.engine.dewpoint;
