/** Fuels in files: the reader of fuel files, the fuels that come with the program, and the folders that add to them. */
package fluewright.fuels;
