package fluewright.support;

import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Fuels of the published checks, made of the compositions that the checks write out. */
public final class TestFuels {

    private static final Pattern GAS_SHARE = Pattern.compile("\\b((?:n-)?[A-Z][A-Za-z0-9]*) ([0-9.]+)");
    private static final Pattern MASS_SHARE = Pattern.compile("\\b(C|H|O|N|S|ash|moisture|H2O)[ =]([0-9.]+)");

    /** The pipeline gas of the table of stack losses; its shares add up to 100.01 %. */
    public static final Fuel NATURAL_GAS = gas("CH4 94.9, C2H6 2.5, C3H8 0.25, n-C4H10 0.06, N2 1.6, CO2 0.7");
    /** Methane. */
    public static final Fuel METHANE = gas("CH4 100");
    /** Propane. */
    public static final Fuel PROPANE = gas("C3H8 100");
    /** Hydrogen. */
    public static final Fuel HYDROGEN = gas("H2 100");
    /** Coke-oven gas, typical (handbook range, from memory). */
    public static final Fuel COKE_OVEN_GAS = gas("H2 57 CH4 25 CO 6 CO2 2 N2 7 C2H4 3");
    /** No. 2 oil, typical; gross heating value 45.4 MJ/kg (handbook range, from memory). */
    public static final Fuel OIL_2 = solid("C 87.0 H 12.6 S 0.3", 45.4e6);
    /** No. 6 oil, typical; gross heating value 42.9 MJ/kg (handbook range, from memory). */
    public static final Fuel OIL_6 = solid("C 87.0 H 10.5 S 2.0 N 0.3 O 0.2", 42.9e6);
    /** Bituminous coal as received, the analysis of check AIR-17. */
    public static final Fuel BITUMINOUS_COAL = solid("C 70.0 H 4.8 O 8.0 N 1.4 S 1.2, moisture 6.0, ash 8.6", 0);
    /** Pennsylvania anthracite without moisture and ash, typical (handbook range, from memory). */
    public static final Fuel ANTHRACITE = solid("C 93.9 H 2.1 O 2.3 N 0.9 S 0.8", 0);

    private TestFuels() {
    }

    /** Returns a gas of a composition in percent by volume written as {@code CH4 87, C3H8 13}. */
    public static Fuel gas(String composition) {
        Map<String, Double> shares = new LinkedHashMap<>();
        Matcher matcher = GAS_SHARE.matcher(composition);
        while (matcher.find()) {
            if (GasComponents.titles().containsKey(matcher.group(1))) {
                shares.put(matcher.group(1), Double.parseDouble(matcher.group(2)) / 100);
            }
        }
        return FuelBuilder.gas(composition, shares, false).build();
    }

    /**
     * Returns a liquid or solid of an analysis in percent by mass written as {@code C 87 H 12.6 S 0.3}. Where more than one
     * percent is missing, the rest is ash, which such analyses leave out.
     *
     * @param gross measured gross heating value [J/kg]; zero to take the estimate
     */
    public static Fuel solid(String analysis, double gross) {
        FuelBuilder builder = FuelBuilder.ultimate(analysis, Phase.SOLID, new UltimateAnalysis(shares(analysis),
                AnalysisBasis.AS_RECEIVED));
        return (gross > 0 ? builder.measuredPerMass(gross) : builder).build();
    }

    private static Map<String, Double> shares(String analysis) {
        Map<String, Double> shares = new LinkedHashMap<>();
        Matcher matcher = MASS_SHARE.matcher(analysis);
        while (matcher.find()) {
            shares.put(matcher.group(1).replace("H2O", "moisture"), Double.parseDouble(matcher.group(2)) / 100);
        }
        double rest = 1 - shares.values().stream().mapToDouble(Double::doubleValue).sum();
        if (rest > 0.01) {
            shares.put("ash", rest);
        }
        return shares;
    }

    /** Returns any fuel with a row in Table 19-2 of Method 19; its composition must not matter. */
    public static Fuel ofClass(String row) {
        // Carbon monoxide allows any CO2 that a fuel of these rows can give; only the row counts here.
        return FuelBuilder.gas("class of " + row, Map.of("CO", 1.0), false).factorClass(row).build();
    }
}
