package fluewright.engine.combustion;

/**
 * How much air there is: stated, or to be found from a reading of the flue gas. For a given fuel, humidity and CO the
 * flue gas is linear in the air, so a reading is solved for in closed form.
 */
public sealed interface AirSetting {

    /**
     * Returns the dry air [mol/kg fuel]; infinite or negative when no amount of air gives the reading.
     *
     * @param s   the fuel's balance
     * @param air the air's humidity
     * @param co  mole fraction of CO in the dry flue gas [mol/mol]
     */
    double dryAir(Stoichiometry s, Air air, double co);

    /** The ratio of the air to theoretical air [-]. */
    record Lambda(double lambda) implements AirSetting {
        @Override
        public double dryAir(Stoichiometry s, Air air, double co) {
            return lambda * s.theoreticalAir();
        }
    }

    /** Oxygen in the dry flue gas [mol/mol]. */
    record OxygenDry(double fraction) implements AirSetting {
        @Override
        public double dryAir(Stoichiometry s, Air air, double co) {
            double k = (fraction - co / 2) / (1 - co / 2);
            return (s.oxygenDemand() + k * s.dryGasAboveAir()) / (Air.O2 - k);
        }
    }

    /** Oxygen in the wet flue gas [mol/mol]. */
    record OxygenWet(double fraction) implements AirSetting {
        @Override
        public double dryAir(Stoichiometry s, Air air, double co) {
            double perAir = 1 / (1 - co / 2);
            double dry = s.dryGasAboveAir() * perAir;
            double oxygenAt0 = co / 2 * dry - s.oxygenDemand();
            double oxygenPerAir = Air.O2 + co / 2 * perAir;
            return (fraction * (dry + s.waterFromFuel()) - oxygenAt0) / (oxygenPerAir - fraction * (perAir + air.waterRatio()));
        }
    }

    /** Carbon dioxide in the dry flue gas, on the side of excess air [mol/mol]. */
    record CarbonDioxideDry(double fraction) implements AirSetting {
        @Override
        public double dryAir(Stoichiometry s, Air air, double co) {
            double q = (fraction + co) / (1 - co / 2);
            return (s.carbon() - q * s.dryGasAboveAir()) / (q - Air.CO2);
        }
    }
}
