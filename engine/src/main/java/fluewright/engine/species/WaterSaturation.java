package fluewright.engine.species;

/**
 * The saturation line of water.
 *
 * <p>Over liquid water: IAPWS-IF97, region 4, equations 30 (pressure) and 31 (temperature); valid from 273.15 K to the
 * critical point, 647.096 K and 22.064 MPa. Worked number: 300 K gives 3536.58941 Pa (IF97, table 35).
 * Over ice: IAPWS R14-08(2011), equation 6; valid from 50 K to the triple point, 273.16 K and 611.657 Pa. Worked number:
 * 230 K gives 8.94735 Pa.
 */
public final class WaterSaturation {

    /** Temperature of the triple point, below which the line is that over ice [K]. */
    public static final double TRIPLE_POINT = 273.16;
    /** Temperature of the critical point, where the line ends [K]. */
    public static final double CRITICAL_POINT = 647.096;
    /** Pressure of the critical point [Pa]. */
    public static final double CRITICAL_PRESSURE = 22.064e6;
    /** Lowest temperature of the line over ice [K]. */
    public static final double COLDEST = 50;

    /** IF97 table 34, n1 to n10. */
    private static final double[] N = {0.11670521452767e4, -0.72421316703206e6, -0.17073846940092e2, 0.12020824702470e5,
        -0.32325550322333e7, 0.14915108613530e2, -0.48232657361591e4, 0.40511340542057e6, -0.23855557567849, 0.65017534844798e3};
    /** R14-08 table 2, a1 to a3 and b1 to b3. */
    private static final double[] ICE_A = {-0.212144006e2, 0.273203819e2, -0.610598130e1};
    private static final double[] ICE_B = {0.333333333e-2, 0.120666667e1, 0.170333333e1};
    private static final double TRIPLE_PRESSURE = 611.657;

    private WaterSaturation() {
    }

    /**
     * Returns the saturation pressure [Pa] at a temperature [K] from 50 to 647.096: over ice below 273.16 K, over liquid
     * water from there on. NaN outside.
     */
    public static double pressure(double t) {
        if (!(t >= COLDEST && t <= CRITICAL_POINT)) {
            return Double.NaN;
        }
        return t < TRIPLE_POINT ? pressureOverIce(t) : pressureOverLiquid(t);
    }

    /** Returns the saturation temperature [K] at a pressure [Pa] above zero and up to 22.064 MPa. NaN outside. */
    public static double temperature(double p) {
        if (!(p >= pressureOverIce(COLDEST) && p <= CRITICAL_PRESSURE)) {
            return Double.NaN;
        }
        return p < TRIPLE_PRESSURE ? temperatureOverIce(p) : temperatureOverLiquid(p);
    }

    private static double pressureOverLiquid(double t) {
        double v = t + N[8] / (t - N[9]);
        double a = v * v + N[0] * v + N[1];
        double b = N[2] * v * v + N[3] * v + N[4];
        double c = N[5] * v * v + N[6] * v + N[7];
        double root = 2 * c / (-b + Math.sqrt(b * b - 4 * a * c));
        return 1e6 * Math.pow(root, 4);
    }

    private static double temperatureOverLiquid(double p) {
        double beta = Math.pow(p / 1e6, 0.25);
        double e = beta * beta + N[2] * beta + N[5];
        double f = N[0] * beta * beta + N[3] * beta + N[6];
        double g = N[1] * beta * beta + N[4] * beta + N[7];
        double d = 2 * g / (-f - Math.sqrt(f * f - 4 * e * g));
        double sum = N[9] + d;
        return (sum - Math.sqrt(sum * sum - 4 * (N[8] + N[9] * d))) / 2;
    }

    private static double pressureOverIce(double t) {
        double theta = t / TRIPLE_POINT;
        double sum = 0;
        for (int i = 0; i < 3; i++) {
            sum += ICE_A[i] * Math.pow(theta, ICE_B[i]);
        }
        return TRIPLE_PRESSURE * Math.exp(sum / theta);
    }

    /** The equation gives the pressure only; Newton's method on its logarithm, nearly linear in 1/T, turns it round. */
    private static double temperatureOverIce(double p) {
        double t = 1 / (1 / TRIPLE_POINT - Math.log(p / TRIPLE_PRESSURE) / 6140);
        for (int i = 0; i < 30; i++) {
            double step = 1e-4;
            double here = Math.log(pressureOverIce(t) / p);
            double slope = Math.log(pressureOverIce(t + step) / pressureOverIce(t - step)) / (2 * step);
            double next = t - here / slope;
            if (Math.abs(next - t) < 1e-10 * t) {
                return next;
            }
            t = next;
        }
        return t;
    }
}
