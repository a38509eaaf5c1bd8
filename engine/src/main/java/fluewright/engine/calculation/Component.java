package fluewright.engine.calculation;

import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * Declares a component of an input or result record, once for all uses: the shell's named arguments, completion, help,
 * tables, JSON, and every study built on the catalog.
 *
 * <p>Numbers are {@code double} (needed, or with a default) or {@code OptionalDouble} (may be left out), in the coherent
 * SI unit of their kind. Other inputs are enums, {@code boolean}, {@code String}, a type of the project such as a fuel, an
 * {@code Optional} of these, or {@link Stated} where several kinds are accepted. Results may also be a
 * {@link Breakdown}. A component whose type is a record without this annotation is a group: its components count as
 * components of the outer record.
 */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Component {

    /** One line for help and completion. */
    String doc();

    /** The kind of number. */
    Kind kind() default Kind.PURE;

    /** Further kinds that a {@link Stated} input accepts. */
    Kind[] also() default {};

    /** The unit it is shown in whatever the unit system; empty: the kind's own. */
    String shown() default "";

    /** What the number refers to. */
    Basis basis() default Basis.NONE;

    /** The value when the input is left out, with its unit: {@code "25 degC"}. Empty: no default. */
    String byDefault() default "";

    /** The interval outside which an input is impossible, an error: {@code "[0 %, 100 %)"}; {@code inf} for no end. */
    String possible() default "";

    /** The method's valid interval, outside which an input is used and a warning stands on the result. */
    String valid() default "";
}
