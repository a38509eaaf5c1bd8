package fluewright.engine.combustion;

import fluewright.engine.species.GasMixture;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import fluewright.engine.species.WaterSaturation;

/**
 * The flue gas of a kilogram of fuel.
 *
 * @param wet    the gas as it flows [mol/kg fuel]
 * @param dryAir dry air supplied [mol/kg fuel]
 * @param lambda ratio of the air to theoretical air [-]
 * @param air    the air's humidity
 */
public record FlueGas(GasMixture wet, double dryAir, double lambda, Air air) {

    private static final Species WATER = SpeciesTable.get("H2O");
    private static final Species OXYGEN = SpeciesTable.get("O2");

    /** Returns the gas with its water taken out [mol/kg fuel]. */
    public GasMixture dry() {
        return wet.without(WATER);
    }

    /** Returns the mole fraction of water in the wet gas [mol/mol]. */
    public double moisture() {
        return wet.fraction(WATER);
    }

    /** Returns the mole fraction of oxygen in the dry gas [mol/mol]. */
    public double oxygenDry() {
        return wet.moles(OXYGEN) / (wet.total() - wet.moles(WATER));
    }

    /** Returns the water that came with the air [mol/kg fuel]. */
    public double airMoisture() {
        return air.waterRatio() * dryAir;
    }

    /**
     * Returns the temperature at which water begins to condense, {@code Tsat(x_H2O p)} [K]; below 273.16 K the frost
     * point. NaN for a gas without water.
     *
     * @param pressure absolute pressure of the gas [Pa]
     */
    public double waterDewPoint(double pressure) {
        return WaterSaturation.temperature(moisture() * pressure);
    }
}
