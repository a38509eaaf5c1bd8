/**
 * Fuels: composition on any basis, heating value, density, gas quality, blends, and the service interface through which
 * fuels come from files and plugins.
 */
package fluewright.engine.fuel;
