package fluewright.engine.calculation;

import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.UnitSystem;
import java.util.Locale;
import java.util.stream.Collectors;

/** Terms in words, for help, completion and errors. */
public final class TermText {

    private TermText() {
    }

    /** Returns what an argument takes: {@code a share in pct, dry}, {@code a fuel}, {@code one of table, analysis}. */
    public static String expects(Term term) {
        if (term.type().isEnum()) {
            return "one of " + String.join(", ", term.choices());
        }
        if (term.kinds().isEmpty()) {
            return term.type() == boolean.class ? "true or false" : "a " + term.type().getSimpleName().toLowerCase(Locale.ROOT);
        }
        String kinds = term.kinds().stream().map(TermText::kind).collect(Collectors.joining(", or "));
        return kinds + (term.basis() == Basis.NONE ? "" : ", " + term.basis().label());
    }

    /** Returns the two ways to mend a number without its unit. */
    public static String withUnit(String name, Number number, Kind kind) {
        return name + ": " + number + "." + kind.shown(UnitSystem.SI).symbol() + ", or 'units si' / 'units us' to read bare numbers";
    }

    private static String kind(Kind kind) {
        if (kind.isPure()) {
            return kind.title();
        }
        String si = kind.shown(UnitSystem.SI).symbol();
        String us = kind.shown(UnitSystem.US).symbol();
        return kind.title() + " such as 1." + si + (us.equals(si) ? "" : " or 1." + us);
    }
}
