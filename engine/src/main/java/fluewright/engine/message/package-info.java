/** What the project says to its user: message constants, their circumstances, errors and notes. Depends on nothing. */
package fluewright.engine.message;
