package fluewright.properties;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.Value;
import fluewright.support.Bench;
import fluewright.support.TestFuels;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;

/** Corrections of emissions. */
class EmissionPropertiesTest {

    @Property
    void correction_to_the_measured_oxygen_changes_nothing(@ForAll @Scale(6) @DoubleRange(min = 0, max = 1000) double ppm,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 20) double o2) {
        Outcome outcome = correct(ppm, o2, o2);
        assertEquals(ppm, Bench.in("ppm", outcome, "corrected"), 1e-12 * ppm);
        assertEquals(1, Bench.si(outcome, "correctionFactor"), 1e-12);
    }

    @Property
    void correction_there_and_back_changes_nothing(@ForAll @Scale(6) @DoubleRange(min = 0, max = 1000) double ppm,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 20) double from, @ForAll @Scale(6) @DoubleRange(min = 0, max = 20) double to) {
        double there = Bench.in("ppm", correct(ppm, from, to), "corrected");
        assertEquals(ppm, Bench.in("ppm", correct(there, to, from), "corrected"), 1e-9 * ppm);
    }

    /** Thinner than measured means less, thicker more. */
    @Property
    void correction_to_less_oxygen_raises_the_number(@ForAll @Scale(6) @DoubleRange(min = 1, max = 1000) double ppm,
            @ForAll @Scale(6) @DoubleRange(min = 3.01, max = 20) double o2) {
        assertTrue(Bench.in("ppm", correct(ppm, o2, 3), "corrected") > ppm);
        assertTrue(Bench.in("ppm", correct(ppm, 3, o2), "corrected") < ppm);
    }

    /** The mass per heat does not depend on how much air a given emission was thinned with. */
    @Property
    void mass_per_heat_is_that_of_the_corrected_emission(@ForAll @Scale(6) @DoubleRange(min = 1, max = 1000) double ppm,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 18) double o2, @ForAll @Scale(6) @DoubleRange(min = 0, max = 18) double other) {
        Fuel fuel = TestFuels.ofClass("natural gas");
        Outcome here = Bench.run("correct", fuel, "nox", Value.of(ppm, "ppm"), "at", Value.of(o2, "pct"), "to", Value.of(other, "pct"));
        double corrected = Bench.in("ppm", here, "corrected");
        Outcome there = Bench.run("correct", fuel, "nox", Value.of(corrected, "ppm"), "at", Value.of(other, "pct"));
        assertEquals(Bench.si(here, "perMMBtu"), Bench.si(there, "perMMBtu"), 1e-9 * Bench.si(here, "perMMBtu"));
        Outcome back = Bench.run("correct", fuel, "nox", Value.of(Bench.in("lb/MMBtu", here, "perMMBtu"), "lb/MMBtu"), "to",
                Value.of(other, "pct"));
        assertEquals(corrected, Bench.in("ppm", back, "corrected"), 1e-9 * corrected);
    }

    /** One emission read dry, and read wet with the moisture of the flue gas, is one emission. */
    @Property
    @Domain(RandomFuels.class)
    @Domain(DomainContext.Global.class)
    void wet_and_dry_readings_agree(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1, max = 1000) double ppm,
            @ForAll @Scale(6) @DoubleRange(min = 1.001, max = 3) double lambda) {
        Outcome burn = Bench.run("burn", fuel, "lambda", Value.of(lambda, "1"));
        double moisture = Bench.percent(burn, "wet", "H2O") / 100;
        Outcome dry = Bench.run("correct", fuel, "co", Value.of(ppm, "ppmvd"), "at", Value.of(Bench.si(burn, "o2"), "1"), "to", "3 %");
        Outcome wet = Bench.run("correct", fuel, "co", Value.of(ppm * (1 - moisture), "ppmvw"),
                "atWet", Value.of(Bench.percent(burn, "wet", "O2"), "pct"), "to", "3 %");
        double corrected = Bench.si(dry, "corrected");
        assertEquals(corrected, Bench.si(wet, "corrected"), 1e-8 * corrected);
        assertEquals(Bench.si(dry, "perGJ"), Bench.si(wet, "perGJ"), 1e-8 * Bench.si(dry, "perGJ"));
    }

    private static Outcome correct(double ppm, double at, double to) {
        return Bench.run("correct", "nox", Value.of(ppm, "ppm"), "at", Value.of(at, "pct"), "to", Value.of(to, "pct"));
    }
}
