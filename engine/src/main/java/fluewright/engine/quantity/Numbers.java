package fluewright.engine.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as text: exact for programs, rounded to significant digits for people. */
public final class Numbers {

    private static final double PLAIN_FROM = 1e-4;
    private static final double PLAIN_TO = 1e9;

    private Numbers() {
    }

    /** Returns the shortest text that reads back as the same number, without an exponent where that stays readable. */
    public static String exact(double number) {
        return text(BigDecimal.valueOf(number), number);
    }

    /** Returns the number rounded to significant digits. */
    public static String rounded(double number, int digits) {
        BigDecimal exact = BigDecimal.valueOf(number);
        BigDecimal rounded = exact.round(new MathContext(digits, RoundingMode.HALF_EVEN));
        return text(rounded, number);
    }

    /** Returns a share [-] in percent for people, to seven digits. */
    public static String percent(double share) {
        return Double.isFinite(share) ? rounded(share * 100, 7) + " %" : String.valueOf(share);
    }

    private static String text(BigDecimal decimal, double number) {
        double size = Math.abs(number);
        if (size == 0) {
            return "0";
        }
        if (size < PLAIN_FROM || size >= PLAIN_TO) {
            return decimal.stripTrailingZeros().toString().replace("E+", "E");
        }
        return decimal.stripTrailingZeros().toPlainString();
    }
}
