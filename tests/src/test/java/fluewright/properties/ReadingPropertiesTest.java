package fluewright.properties;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.combustion.Stoichiometry;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.Value;
import fluewright.engine.species.Element;
import fluewright.support.Bench;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;

/** A reading of the flue gas gives back the air that it came from. */
@Domain(RandomFuels.class)
@Domain(DomainContext.Global.class)
class ReadingPropertiesTest {

    private static final double RELATIVE = 1e-9;

    @Property
    void dry_oxygen_gives_back_the_excess_air(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1, max = 5) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.05) double humidity,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.02) double co) {
        Stoichiometry s = new Stoichiometry(fuel.makeup(), 0);
        double dryGas = (lambda * s.theoreticalAir() + s.dryGasAboveAir()) / (1 - co / 2);
        Assume.that(co * dryGas < s.carbon());
        Outcome burn = burn(fuel, humidity, co, "lambda", lambda, "1");
        Outcome again = burn(fuel, humidity, co, "o2", Bench.si(burn, "o2"), "1");
        assertEquals(lambda, Bench.si(again, "lambda"), RELATIVE * lambda);
        assertEquals(Bench.si(burn, "o2"), Bench.si(again, "o2"), RELATIVE);
    }

    @Property
    void wet_oxygen_gives_back_the_excess_air(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1.001, max = 5) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.05) double humidity) {
        Outcome burn = burn(fuel, humidity, 0, "lambda", lambda, "1");
        Outcome again = burn(fuel, humidity, 0, "o2Wet", Bench.percent(burn, "wet", "O2"), "pct");
        assertEquals(lambda, Bench.si(again, "lambda"), RELATIVE * lambda);
    }

    @Property
    void carbon_dioxide_gives_back_the_excess_air(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 1.001, max = 5) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.05) double humidity) {
        Assume.that(fuel.makeup().atoms(Element.C) > 0.1 * fuel.makeup().oxygenDemand());
        Outcome burn = burn(fuel, humidity, 0, "lambda", lambda, "1");
        Outcome again = burn(fuel, humidity, 0, "co2", Bench.percent(burn, "dry", "CO2"), "pct");
        assertEquals(lambda, Bench.si(again, "lambda"), 1e-8 * lambda);
    }

    @Property
    void excess_air_and_lambda_are_one_setting(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 0, max = 4) double excess) {
        Outcome a = burn(fuel, 0, 0, "excessAir", excess, "1");
        Outcome b = burn(fuel, 0, 0, "lambda", 1 + excess, "1");
        assertEquals(Bench.si(a, "dryAir"), Bench.si(b, "dryAir"), 1e-12 * Bench.si(b, "dryAir"));
        assertEquals(excess, Bench.si(a, "excessAir"), 1e-12 * (1 + excess));
    }

    /** More air thins the water of dry air and the dew point falls; and it thins CO2. */
    @Property
    void dew_point_and_carbon_dioxide_fall_with_excess_air(@ForAll Fuel fuel,
            @ForAll @Scale(6) @DoubleRange(min = 1, max = 4) double lambda,
            @ForAll @Scale(6) @DoubleRange(min = 0.01, max = 1) double more) {
        Assume.that(fuel.makeup().waterFormed() > 0.01 && fuel.makeup().atoms(Element.C) > 0.1 * fuel.makeup().oxygenDemand());
        Outcome lean = burn(fuel, 0, 0, "lambda", lambda + more, "1");
        Outcome rich = burn(fuel, 0, 0, "lambda", lambda, "1");
        assertTrue(Bench.si(lean, "dewPoint") < Bench.si(rich, "dewPoint"));
        assertTrue(Bench.percent(lean, "dry", "CO2") < Bench.percent(rich, "dry", "CO2"));
        assertTrue(Bench.percent(rich, "dry", "CO2") <= Bench.in("pct", rich, "co2Max") + 1e-9);
    }

    private static Outcome burn(Fuel fuel, double humidityRatio, double co, String setting, double value, String unit) {
        return Bench.run("burn", fuel, setting, Value.of(value, unit), "humidityRatio", Value.of(humidityRatio, "kg/kg"),
                "co", Value.of(co, "1"));
    }
}
