package fluewright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.calculation.Outcome;
import fluewright.support.Bench;
import fluewright.support.TestFuels;
import org.junit.jupiter.api.Test;

/**
 * Textbook cases worked by hand, the arithmetic in the comments. Dry air is that of CIPM-2007, in mol/mol: O2 0.20939, N2 0.780848,
 * CO2 0.0004, the rest 0.009362 argon.
 */
class HandWorkedTest {

    /**
     * CH4 + 2 O2 -> CO2 + 2 H2O with 1.2 times the air, per mole of methane. Air: 1.2 x 2 / 0.20939 = 11.46186 mol.
     * CO2: 1 + 0.0004 x 11.46186 = 1.004585. H2O: 2. O2: 0.2 x 2 = 0.4. N2: 0.780848 x 11.46186 = 8.949971. Ar: 0.107306.
     * Wet 12.461862, dry 10.461862. CO2 dry 9.6024 %, O2 dry 3.8234 %, N2 dry 85.5485 %, Ar dry 1.0257 %; H2O wet 16.0490 %.
     */
    @Test
    void methane_with_a_fifth_too_much_air() {
        Outcome burn = Bench.run("burn", TestFuels.METHANE, "excessAir", "20 %");
        assertEquals(11.46186, Bench.in("m3/m3", burn, "dryAirPerGas"), 1e-5);
        assertEquals(12.46186, Bench.in("m3/m3", burn, "wetPerGas"), 1e-5);
        assertEquals(10.46186, Bench.in("m3/m3", burn, "dryPerGas"), 1e-5);
        assertEquals(9.6024, Bench.percent(burn, "dry", "CO2"), 1e-4);
        assertEquals(3.8234, Bench.percent(burn, "dry", "O2"), 1e-4);
        assertEquals(85.5485, Bench.percent(burn, "dry", "N2"), 1e-4);
        assertEquals(1.0257, Bench.percent(burn, "dry", "Ar"), 1e-4);
        assertEquals(16.0490, Bench.percent(burn, "wet", "H2O"), 1e-4);
    }

    /**
     * No. 6 oil, C 87.0 H 10.5 S 2.0 N 0.3 O 0.2 % by mass, 25 % excess air, per kilogram [mol]. C: 870/12.0107 = 72.4354;
     * H: 105/1.00794 = 104.1729; S: 20/32.065 = 0.62373; N: 3/14.0067 = 0.21418; O: 2/15.9994 = 0.12500.
     * O2 needed: 72.4354 + 26.0432 + 0.62373 - 0.0625 = 99.0398. Air: 1.25 x 99.0398 / 0.20939 = 591.240.
     * CO2: 72.4354 + 0.0004 x 591.240 = 72.6719; H2O: 52.0865; SO2: 0.62373; O2: 0.25 x 99.0398 = 24.7600;
     * N2: 0.10709 + 0.780848 x 591.240 = 461.7756; Ar: 5.5352. Dry 565.3664, wet 617.4529.
     * Dry: CO2 12.8540 %, SO2 0.11032 %, O2 4.3794 %; wet: H2O 8.4357 %.
     * By mass: air 591.240 x 28.9655 g = 17.1256 kg, flue gas 1 + 17.1256 = 18.1256 kg.
     */
    @Test
    void residual_oil_with_a_quarter_too_much_air() {
        Outcome burn = Bench.run("burn", TestFuels.OIL_6, "excessAir", "25 %");
        assertEquals(591.240, Bench.si(burn, "dryAirVolume"), 0.01);
        assertEquals(565.366, Bench.si(burn, "dryVolume"), 0.01);
        assertEquals(617.453, Bench.si(burn, "wetVolume"), 0.01);
        assertEquals(12.8540, Bench.percent(burn, "dry", "CO2"), 5e-4);
        assertEquals(0.11032, Bench.percent(burn, "dry", "SO2"), 5e-5);
        assertEquals(4.3794, Bench.percent(burn, "dry", "O2"), 5e-4);
        assertEquals(8.4357, Bench.percent(burn, "wet", "H2O"), 5e-4);
        assertEquals(17.126, Bench.in("kg/kg", burn, "dryAir"), 0.002);
        assertEquals(18.126, Bench.in("kg/kg", burn, "flueMass"), 0.002);
    }

    /**
     * Air of 20 degC and 60 % relative humidity: psat 2339.215 Pa (IAPWS-IF97), e = 1403.53 Pa,
     * w = 1403.53 / (101325 - 1403.53) = 0.0140463 mol/mol, x 18.01528 / 28.9655 = 8.7362 g per kg of dry air.
     * Methane at lambda 1: water 2 + 0.0140463 x 9.55155 = 2.134164 mol in 8.55155 + 2.134164 = 10.685716 mol: 19.9721 %.
     */
    @Test
    void humid_air_brings_water() {
        Outcome burn = Bench.run("burn", TestFuels.METHANE, "lambda", "1", "humidity", "60 %", "ambient", "20 degC");
        assertEquals(8.7362e-3, Bench.si(burn, "humidityRatio"), 5e-7);
        assertEquals(19.9721, Bench.percent(burn, "wet", "H2O"), 2e-4);
    }

    /**
     * Incomplete combustion of methane, 1.1 times the air, 1000 ppm CO dry. Air 1.1 x 2/0.20939 = 10.50671 mol. Dry gas
     * n = (10.50671 - 1) / (1 - 0.0005) = 9.511465; CO 0.009511; CO2 1 - 0.009511 + 0.004203 = 0.994691: 10.4578 %;
     * O2 0.1 x 2 + 0.009511/2 = 0.204756: 2.1527 %.
     */
    @Test
    void carbon_monoxide_takes_the_place_of_carbon_dioxide() {
        Outcome burn = Bench.run("burn", TestFuels.METHANE, "lambda", "1.1", "co", "1000 ppm");
        assertEquals(0.1, Bench.percent(burn, "dry", "CO"), 1e-9);
        assertEquals(10.4578, Bench.percent(burn, "dry", "CO2"), 1e-4);
        assertEquals(2.1527, Bench.percent(burn, "dry", "O2"), 1e-4);
    }

    /**
     * Coal with 8 % ash that leaves with 10 % carbon in the residue: 0.08 x 0.1/0.9 = 0.0088889 kg of carbon unburned, 0.74008 mol.
     * C 75 %: 750/12.0107 = 62.44432 mol, burned 61.70425; H 5 %: 49.60613 mol; S 1 %: 0.311867 mol; O 9 %: 5.625211 mol.
     * O2 needed: 61.70425 + 12.40153 + 0.311867 - 2.812605 = 71.605042; air / 0.20939 = 341.9697 mol/kg.
     */
    @Test
    void theoretical_air_is_that_of_the_carbon_that_burns() {
        Outcome burn = Bench.run("burn", TestFuels.solid("C 75 H 5 O 9 N 2 S 1 ash 8", 0), "lambda", "1", "carbonInAsh", "10 %");
        assertEquals(341.970, Bench.si(burn, "theoreticalAirVolume"), 0.001);
    }
}
