package fluewright.engine.combustion;

import fluewright.engine.fuel.Makeup;
import fluewright.engine.species.Element;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import fluewright.engine.species.GasMixture;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The element balance of a kilogram of fuel: what it needs of oxygen and what becomes of it. All amounts are mol per kg
 * of fuel as fired. Theoretical air is that of the carbon which burns, as in ASME PTC 4.
 *
 * <p>Products of complete combustion with a mol of dry air: {@code CO2 = C + air CO2}, {@code H2O = H/2 + moisture + w a},
 * {@code SO2 = S}, {@code N2 = N/2 + air N2}, {@code O2 = x_O2 a - nO2}. Carbon monoxide takes the place of as much CO2 and
 * leaves half as much O2. Source: first principles. Worked number: methane takes 9.5516 mol of dry air per mol (2 / 0.20939).
 */
public final class Stoichiometry {

    private static final Species CO2 = SpeciesTable.get("CO2");
    private static final Species CO = SpeciesTable.get("CO");
    private static final Species H2O = SpeciesTable.get("H2O");
    private static final Species SO2 = SpeciesTable.get("SO2");
    private static final Species O2 = SpeciesTable.get("O2");
    private static final Species N2 = SpeciesTable.get("N2");
    private static final Species AR = SpeciesTable.get("Ar");
    private static final Species HE = SpeciesTable.get("He");
    private static final Species NE = SpeciesTable.get("Ne");

    private final Makeup makeup;
    private final double carbon;

    /**
     * Makes the balance of a fuel.
     *
     * @param makeup         what a kilogram of it is made of
     * @param unburnedCarbon carbon that leaves with ash or soot [kg/kg fuel], at most what the fuel holds
     */
    public Stoichiometry(Makeup makeup, double unburnedCarbon) {
        this.makeup = makeup;
        this.carbon = makeup.atoms(Element.C) - unburnedCarbon / Element.C.molarMass();
    }

    /** Returns the carbon that burns [mol/kg]. */
    public double carbon() {
        return carbon;
    }

    /** Returns the oxygen needed for complete combustion [mol/kg]. */
    public double oxygenDemand() {
        return makeup.oxygenDemand() - (makeup.atoms(Element.C) - carbon);
    }

    /** Returns the theoretical dry air [mol/kg]. */
    public double theoreticalAir() {
        return oxygenDemand() / Air.O2;
    }

    /** Returns by how much the dry flue gas of complete combustion exceeds the dry air it came from [mol/kg]. */
    public double dryGasAboveAir() {
        double inert = makeup.atoms(Element.AR) + makeup.atoms(Element.HE) + makeup.atoms(Element.NE);
        return carbon + makeup.atoms(Element.S) + makeup.atoms(Element.N) / 2 + inert - oxygenDemand();
    }

    /** Returns the water from the fuel, moisture included [mol/kg]. */
    public double waterFromFuel() {
        return makeup.waterFormed();
    }

    /** Returns the largest CO2 of the dry flue gas, that at theoretical air [mol/mol]. */
    public double co2Maximum() {
        return (carbon + Air.CO2 * theoreticalAir()) / (theoreticalAir() + dryGasAboveAir());
    }

    /**
     * Returns the flue gas.
     *
     * @param dryAir dry air supplied [mol/kg]
     * @param air    the air's humidity
     * @param co     mole fraction of CO in the dry flue gas [mol/mol]
     */
    public FlueGas flueGas(double dryAir, Air air, double co) {
        double monoxide = co * (dryAir + dryGasAboveAir()) / (1 - co / 2);
        Map<Species, Double> wet = new LinkedHashMap<>();
        wet.put(CO2, carbon - monoxide + Air.CO2 * dryAir);
        wet.put(CO, monoxide);
        wet.put(H2O, waterFromFuel() + air.waterRatio() * dryAir);
        wet.put(SO2, makeup.atoms(Element.S));
        wet.put(O2, remainingOxygen(dryAir, monoxide));
        wet.put(N2, makeup.atoms(Element.N) / 2 + Air.N2 * dryAir);
        wet.put(AR, makeup.atoms(Element.AR) + Air.AR * dryAir);
        wet.put(HE, makeup.atoms(Element.HE));
        wet.put(NE, makeup.atoms(Element.NE));
        wet.values().removeIf(moles -> moles == 0);
        return new FlueGas(GasMixture.of(wet), dryAir, dryAir / theoreticalAir(), air);
    }

    /** Rounding may leave a trace below zero at theoretical air. */
    private double remainingOxygen(double dryAir, double monoxide) {
        double oxygen = Air.O2 * dryAir - oxygenDemand() + monoxide / 2;
        return Math.abs(oxygen) < 1e-12 * oxygenDemand() ? 0 : oxygen;
    }
}
