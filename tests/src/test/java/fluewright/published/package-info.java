/** The engine against published values: rows of the resource folder {@code checks}, each with its source. */
package fluewright.published;
