/** Where the heat of the fuel goes: flue losses and efficiency on gross and net heating value. */
package fluewright.engine.loss;
