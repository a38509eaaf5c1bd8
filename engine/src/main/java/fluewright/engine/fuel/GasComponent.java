package fluewright.engine.fuel;

import fluewright.engine.species.Element;
import java.util.Map;

/**
 * A component of fuel gas.
 *
 * @param symbol         the short name, such as {@code CH4} or {@code n-C4H10}
 * @param title          the name in words
 * @param atoms          the atoms of one molecule
 * @param molarMass      molar mass [kg/mol]
 * @param gross          gross molar heating values at the temperatures of {@link IsoTemperature}, in its order [J/mol]
 * @param summation      summation factors for the compression factor at the first four of them [-]
 * @param inIso6976      whether the figures are those of ISO 6976:2016; else they are from NASA Glenn data
 */
public record GasComponent(String symbol, String title, Map<Element, Double> atoms, double molarMass, double[] gross,
                           double[] summation, boolean inIso6976) {

    /** Returns the gross molar heating value [J/mol]. */
    public double gross(IsoTemperature combustion) {
        return gross[combustion.ordinal()];
    }

    /** Returns the summation factor [-]. */
    public double summation(IsoTemperature metering) {
        return summation[metering.ordinal()];
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof GasComponent that && symbol.equals(that.symbol);
    }

    @Override
    public int hashCode() {
        return symbol.hashCode();
    }

    @Override
    public String toString() {
        return symbol;
    }
}
