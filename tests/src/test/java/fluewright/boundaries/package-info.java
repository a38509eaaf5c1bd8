/** The arrows between modules and packages, what the catalog declares, and how inputs are refused. */
package fluewright.boundaries;
