/**
 * The catalog: calculations declared once, by two records and one method, and found as services. It knows none of them
 * by name.
 */
package fluewright.engine.calculation;
