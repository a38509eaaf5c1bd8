/** Laws that hold for every fuel, air and reading, tried on random ones. */
package fluewright.properties;
