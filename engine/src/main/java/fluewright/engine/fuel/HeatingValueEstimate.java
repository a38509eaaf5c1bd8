package fluewright.engine.fuel;

import static fluewright.engine.species.Element.C;
import static fluewright.engine.species.Element.H;
import static fluewright.engine.species.Element.N;
import static fluewright.engine.species.Element.O;
import static fluewright.engine.species.Element.S;

/**
 * The gross heating value of a liquid or solid fuel from its ultimate analysis.
 *
 * <p>Source: Channiwala and Parikh, Fuel 81 (2002) 1051: {@code 34.91 C + 117.83 H + 10.05 S - 10.34 O - 1.51 N
 * - 2.11 ash} MJ/kg with mass fractions of dry fuel; mean error 1.45 % as stated there. Valid (from memory) for dry mass
 * shares of C to 92.25 %, H 0.43 to 25.15 %, O to 50 %, N to 5.6 %, ash to 71.4 %. Worked number: dry coal with C 75,
 * H 5, O 8, N 1.5, S 1.5, ash 9 % gives 31.185 MJ/kg.
 */
public final class HeatingValueEstimate {

    /** The mean error of the correlation as its authors state it [-]. */
    public static final double MEAN_ERROR = 0.0145;

    private HeatingValueEstimate() {
    }

    /** Returns the gross heating value [J/kg as fired] of a fuel's makeup. */
    public static double gross(Makeup m) {
        return 1e6 * (34.91 * m.massFraction(C) + 117.83 * m.massFraction(H) + 10.05 * m.massFraction(S)
                - 10.34 * m.massFraction(O) - 1.51 * m.massFraction(N) - 2.11 * m.ash());
    }

    /** Tells whether a makeup lies in the correlation's valid range. */
    public static boolean isValidFor(Makeup m) {
        double dry = 1 - m.moistureMass();
        return m.massFraction(C) <= 0.9225 * dry && m.massFraction(H) >= 0.0043 * dry && m.massFraction(H) <= 0.2515 * dry
                && m.massFraction(O) <= 0.50 * dry && m.massFraction(N) <= 0.056 * dry && m.ash() <= 0.714 * dry;
    }
}
