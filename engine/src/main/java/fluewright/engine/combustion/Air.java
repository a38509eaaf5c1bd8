package fluewright.engine.combustion;

import fluewright.engine.species.GasMixture;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import fluewright.engine.species.WaterSaturation;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Combustion air: dry air and its water vapour.
 *
 * <p>Source of the dry air: CIPM-2007 (Picard et al., Metrologia 45, 2008), mole fractions N2 0.780848, O2 0.20939,
 * Ar 0.009332, CO2 0.0004; its trace gases, 0.00003 together, are counted as argon.
 *
 * @param waterRatio water vapour per dry air [mol/mol]
 */
public record Air(double waterRatio) {

    /** Mole fraction of oxygen in dry air [mol/mol]. */
    public static final double O2 = 0.20939;
    /** Mole fraction of carbon dioxide in dry air [mol/mol]. */
    public static final double CO2 = 0.0004;
    /** Mole fraction of nitrogen in dry air [mol/mol]. */
    public static final double N2 = 0.780848;
    /** Mole fraction of argon in dry air, trace gases included [mol/mol]. */
    public static final double AR = 1 - O2 - CO2 - N2;

    /** A mole of dry air. */
    public static final GasMixture DRY_MOLE = dryMole();
    /** Molar mass of dry air [kg/mol]. */
    public static final double MOLAR_MASS = DRY_MOLE.mass();
    /** Air without water vapour. */
    public static final Air DRY = new Air(0);

    private static final Species WATER = SpeciesTable.get("H2O");

    private static GasMixture dryMole() {
        Map<Species, Double> moles = new LinkedHashMap<>();
        moles.put(SpeciesTable.get("N2"), N2);
        moles.put(SpeciesTable.get("O2"), O2);
        moles.put(SpeciesTable.get("Ar"), AR);
        moles.put(SpeciesTable.get("CO2"), CO2);
        return GasMixture.of(moles);
    }

    /**
     * Returns humid air, {@code w = e / (p - e)} with {@code e = RH psat(T)}.
     *
     * @param temperature      temperature of the air [K], 50 to below boiling at the pressure
     * @param pressure         pressure [Pa]
     * @param relativeHumidity relative humidity [-], over ice below 273.16 K
     * @return the air; its ratio is NaN or negative when no such air exists
     */
    public static Air humid(double temperature, double pressure, double relativeHumidity) {
        double vapour = relativeHumidity * WaterSaturation.pressure(temperature);
        return new Air(vapour / (pressure - vapour));
    }

    /** Returns air with a humidity ratio [kg water/kg dry air]. */
    public static Air ofHumidityRatio(double massRatio) {
        return new Air(massRatio * MOLAR_MASS / WATER.molarMass());
    }

    /** Returns the humidity ratio [kg water/kg dry air]. */
    public double humidityRatio() {
        return waterRatio * WATER.molarMass() / MOLAR_MASS;
    }
}
