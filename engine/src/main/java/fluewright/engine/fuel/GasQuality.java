package fluewright.engine.fuel;

import java.util.Map;

/**
 * Heating values, density and Wobbe index of a fuel gas by volume, as a real gas at 101.325 kPa.
 *
 * <p>Source: ISO 6976:2016: compression factor {@code Z = 1 - (p/p0) (sum x_i s_i)^2}, heating value by volume
 * {@code H / (Z R T / p)}, relative density {@code (M / M_air) (Z_air / Z)}, Wobbe index {@code H / sqrt(d)}. R is
 * 8.3144621 J/(mol K) and the molar mass of air 28.96546 g/mol, as in the standard. Valid for gases that are far from
 * condensing, Z above 0.9. Worked number: methane at 15/15 degC has 37.78 MJ/m3 gross, relative density 0.5547, Wobbe
 * index 50.72 MJ/m3 gross (EN 437 prints 37.78, 0.555, 50.72).
 */
public final class GasQuality {

    private static final double R = 8.3144621;
    private static final double PRESSURE = 101325;
    private static final double MOLAR_MASS_OF_AIR = 28.96546e-3;

    private final GasComposition gas;
    private final IsoTemperature combustion;
    private final IsoTemperature metering;

    /** Makes the quality of a gas at a combustion and a metering temperature (not 25 degC for the latter). */
    public GasQuality(GasComposition gas, IsoTemperature combustion, IsoTemperature metering) {
        this.gas = gas;
        this.combustion = combustion;
        this.metering = metering;
    }

    /** Returns the compression factor Z [-]. */
    public double compressionFactor() {
        double sum = 0;
        for (Map.Entry<GasComponent, Double> entry : gas.fractions().entrySet()) {
            sum += entry.getValue() * entry.getKey().summation(metering);
        }
        return 1 - sum * sum;
    }

    /** Returns the volume of a mole of the real gas [m3/mol]. */
    private double molarVolume() {
        return compressionFactor() * R * metering.kelvin() / PRESSURE;
    }

    /** Returns the gross heating value by volume [J/m3]. */
    public double gross() {
        return gas.gross(combustion) / molarVolume();
    }

    /** Returns the net heating value by volume [J/m3]. */
    public double net() {
        double water = gas.makeup().waterFormed() * gas.molarMass();
        return (gas.gross(combustion) - water * combustion.vaporization()) / molarVolume();
    }

    /** Returns the density [kg/m3]. */
    public double density() {
        return gas.molarMass() / molarVolume();
    }

    /** Returns the density relative to dry air [-]. */
    public double relativeDensity() {
        return gas.molarMass() / MOLAR_MASS_OF_AIR * metering.airCompression() / compressionFactor();
    }

    /** Returns the gross Wobbe index [J/m3]. */
    public double grossWobbe() {
        return gross() / Math.sqrt(relativeDensity());
    }

    /** Returns the net Wobbe index [J/m3]. */
    public double netWobbe() {
        return net() / Math.sqrt(relativeDensity());
    }
}
