package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import fluewright.engine.species.Element;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** From one basis of composition to another, by hand: as received = dry x (1 - moisture), dry = dry ash-free x (1 - ash). */
class AnalysisBasisTest {

    /** C 75 % dry, moisture 10 %: C 67.5 %, ash 9 % of it dry is 8.1 % as received; 30 MJ/kg dry is 27 MJ/kg as received. */
    @Test
    void dry_to_as_received() {
        Fuel coal = solid(Map.of("C", 0.75, "H", 0.05, "O", 0.08, "N", 0.015, "S", 0.015, "ash", 0.09, "moisture", 0.1),
                AnalysisBasis.DRY, 30e6);
        assertEquals(0.675, coal.makeup().massFraction(Element.C), 1e-12);
        assertEquals(0.045, coal.makeup().massFraction(Element.H), 1e-12);
        assertEquals(0.081, coal.makeup().ash(), 1e-12);
        assertEquals(0.1, coal.makeup().moistureMass(), 1e-12);
        assertEquals(27e6, coal.gross(), 1e-3);
    }

    /** C 80 % dry ash-free, ash 10 % of the dry fuel, moisture 20 %: C 0.8 x 0.9 x 0.8 = 57.6 %, ash 8 %, heat 33 x 0.72 = 23.76 MJ/kg. */
    @Test
    void dry_ash_free_to_as_received() {
        Fuel coal = solid(Map.of("C", 0.80, "H", 0.05, "O", 0.15, "ash", 0.1, "moisture", 0.2), AnalysisBasis.DRY_ASH_FREE, 33e6);
        assertEquals(0.576, coal.makeup().massFraction(Element.C), 1e-12);
        assertEquals(0.108, coal.makeup().massFraction(Element.O), 1e-12);
        assertEquals(0.08, coal.makeup().ash(), 1e-12);
        assertEquals(0.2, coal.makeup().moistureMass(), 1e-12);
        assertEquals(23.76e6, coal.gross(), 1e-3);
    }

    /** Net of gross (heat of vaporization of ISO 6976): H 5 % and moisture 10 %: 44.013 (0.05/2/1.00794 + 0.1/18.01528) = 1.33597 MJ/kg. */
    @Test
    void net_of_gross() {
        Fuel coal = solid(Map.of("C", 0.70, "H", 0.05, "O", 0.15, "moisture", 0.1), AnalysisBasis.AS_RECEIVED, 27e6);
        assertEquals(27e6 - 1.33597e6, coal.net(), 100);
    }

    /** Half methane, half nitrogen by mass: CH4 (0.5/16.04246) / (0.5/16.04246 + 0.5/28.0134) = 0.0311673 / 0.0490159 = 63.586 %. */
    @Test
    void gas_by_mass() {
        Fuel gas = FuelBuilder.gas("lab", Map.of("CH4", 0.5, "N2", 0.5), true).build();
        assertEquals(0.63586, gas.gas().orElseThrow().fractions().get(GasComponents.of("CH4")), 0.000005);
        assertEquals(0.5 * 890.58e3 / 16.04246e-3, gas.gross(), 1);
    }

    private static Fuel solid(Map<String, Double> shares, AnalysisBasis basis, double gross) {
        return FuelBuilder.ultimate("coal", Phase.SOLID, new UltimateAnalysis(shares, basis)).measuredPerMass(gross).build();
    }
}
