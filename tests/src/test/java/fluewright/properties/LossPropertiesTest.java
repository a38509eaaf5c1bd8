package fluewright.properties;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.Value;
import fluewright.support.Bench;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;

/** Where the heat goes: nothing is counted twice or left out. */
@Domain(RandomFuels.class)
@Domain(DomainContext.Global.class)
class LossPropertiesTest {

    private static final List<String> FLUE = List.of("dryGas", "waterFromHydrogen", "fuelMoisture", "airMoisture", "carbonMonoxide");

    @Property
    void losses_and_efficiency_make_one(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.15) double o2,
            @ForAll @Scale(6) @DoubleRange(min = 300, max = 1500) double stack,
            @ForAll @Scale(6) @DoubleRange(min = 250, max = 600) double air,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.1) double radiation,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.05) double humidity) {
        Outcome losses = Bench.run("losses", fuel, "o2", Value.of(o2, "1"), "stack", Value.of(stack, "K"), "air", Value.of(air, "K"),
                "radiation", Value.of(radiation, "1"), "other", Value.of(0.01, "1"), "humidityRatio", Value.of(humidity, "kg/kg"));
        double flue = FLUE.stream().mapToDouble(part -> Bench.si(losses, part)).sum() - Bench.si(losses, "airCredit");
        assertEquals(flue, Bench.si(losses, "flueLoss"), 1e-12 * (1 + Math.abs(flue)));
        double all = flue + Bench.si(losses, "unburnedCarbon") + radiation + 0.01;
        assertEquals(1, all + Bench.si(losses, "grossEfficiency"), 1e-12 * (1 + Math.abs(all)));
    }

    /** The useful heat is the same whichever heating value it is compared with. */
    @Property
    void useful_heat_is_the_same_on_gross_and_net(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.1) double o2,
            @ForAll @Scale(6) @DoubleRange(min = 300, max = 800) double stack) {
        Outcome losses = losses(fuel, o2, stack);
        double gross = Bench.si(losses, "grossEfficiency") * fuel.gross();
        assertEquals(gross, Bench.si(losses, "netEfficiency") * fuel.net(), 1e-9 * fuel.gross());
        assertEquals(1, Bench.si(losses, "netEfficiency") + Bench.si(losses, "netFlueLoss"), 1e-9);
    }

    @Property
    void flue_loss_rises_with_the_stack_temperature(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.15) double o2,
            @ForAll @Scale(6) @DoubleRange(min = 250, max = 1500) double stack,
            @ForAll @Scale(6) @DoubleRange(min = 0.1, max = 300) double more) {
        assertTrue(Bench.si(losses(fuel, o2, stack + more), "flueLoss") > Bench.si(losses(fuel, o2, stack), "flueLoss"));
    }

    /** More air leaves hotter than it came, so that it takes heat along. */
    @Property
    void flue_loss_rises_with_oxygen(@ForAll Fuel fuel, @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.15) double o2,
            @ForAll @Scale(6) @DoubleRange(min = 0.001, max = 0.04) double more,
            @ForAll @Scale(6) @DoubleRange(min = 300, max = 1500) double stack) {
        assertTrue(Bench.si(losses(fuel, o2 + more, stack), "flueLoss") > Bench.si(losses(fuel, o2, stack), "flueLoss"));
    }

    @Property
    void gross_heating_value_is_at_least_the_net_one(@ForAll Fuel fuel) {
        Outcome properties = Bench.run("properties", fuel);
        assertTrue(Bench.si(properties, "gross") >= Bench.si(properties, "net"));
        assertTrue(Bench.si(properties, "net") > 0);
        assertEquals(fuel.makeup().waterFormed() > 0, Bench.si(properties, "gross") > Bench.si(properties, "net"));
    }

    private static Outcome losses(Fuel fuel, double o2, double stack) {
        return Bench.run("losses", fuel, "o2", Value.of(o2, "1"), "stack", Value.of(stack, "K"));
    }
}
