/**
 * Units at the edge (JSR-385), the kinds of number that calculations take and give, and the basis they refer to.
 * Inside the engine numbers are doubles in coherent SI units.
 */
package fluewright.engine.quantity;
