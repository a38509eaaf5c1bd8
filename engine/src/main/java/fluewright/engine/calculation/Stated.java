package fluewright.engine.calculation;

import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;

/**
 * A number whose kind the user chose among those that the component accepts.
 *
 * @param kind  the kind
 * @param value the value in the coherent SI unit of that kind
 * @param basis the basis that the user's unit stated, or none
 */
public record Stated(Kind kind, double value, Basis basis) {
}
