package fluewright.properties;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.fuel.Blend;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.GasComponent;
import fluewright.engine.species.Element;
import java.util.LinkedHashMap;
import java.util.Map;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import net.jqwik.api.domains.Domain;
import net.jqwik.api.domains.DomainContext;

/** Blending two fuels and then a third is blending the three. */
@Domain(DomainContext.Global.class)
class BlendPropertiesTest {

    private static final double RELATIVE = 1e-10;

    @Property
    @Domain(RandomGases.class)
    void blends_of_gases_are_associative(@ForAll Fuel a, @ForAll Fuel b, @ForAll Fuel c, @ForAll Blend.By by,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.9) double first,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.95) double second) {
        Fuel atOnce = blend(by, a, first, b, (1 - first) * second, c, (1 - first) * (1 - second));
        Fuel later = blend(by, b, second, c, 1 - second);
        Fuel inSteps = blend(by, a, first, later, 1 - first);
        assertSame(atOnce, inSteps);
        assertEquals(atOnce.molarMass().orElseThrow(), inSteps.molarMass().orElseThrow(), RELATIVE * atOnce.molarMass().orElseThrow());
        Map<GasComponent, Double> expected = atOnce.gas().orElseThrow().fractions();
        Map<GasComponent, Double> actual = inSteps.gas().orElseThrow().fractions();
        assertEquals(expected.keySet(), actual.keySet());
        expected.forEach((component, x) -> assertEquals(x, actual.get(component), RELATIVE, component::symbol));
    }

    @Property
    @Domain(RandomFuels.class)
    void blends_of_any_fuels_by_mass_and_energy_are_associative(@ForAll Fuel a, @ForAll Fuel b, @ForAll Fuel c, @ForAll boolean byMass,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.9) double first,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.95) double second) {
        Blend.By by = byMass ? Blend.By.MASS : Blend.By.ENERGY;
        Fuel atOnce = blend(by, a, first, b, (1 - first) * second, c, (1 - first) * (1 - second));
        assertSame(atOnce, blend(by, a, first, blend(by, b, second, c, 1 - second), 1 - first));
    }

    /** Shares of mass are means of what a kilogram has; shares of volume are means of what a mole has. */
    @Property
    @Domain(RandomGases.class)
    void blends_by_mass_and_volume_are_means(@ForAll Fuel a, @ForAll Fuel b,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.95) double share) {
        Fuel byMass = blend(Blend.By.MASS, a, share, b, 1 - share);
        double gross = share * a.gross() + (1 - share) * b.gross();
        assertEquals(gross, byMass.gross(), RELATIVE * gross);
        Fuel byVolume = blend(Blend.By.VOLUME, a, share, b, 1 - share);
        double molar = share * a.molarMass().orElseThrow() + (1 - share) * b.molarMass().orElseThrow();
        assertEquals(molar, byVolume.molarMass().orElseThrow(), RELATIVE * molar);
    }

    /** Of a blend by energy, each fuel's mass share times its heating value is its share of the heat. */
    @Property
    @Domain(RandomFuels.class)
    void blends_by_energy_share_the_heat(@ForAll Fuel a, @ForAll Fuel b,
            @ForAll @Scale(6) @DoubleRange(min = 0.05, max = 0.95) double share) {
        Fuel blend = blend(Blend.By.ENERGY, a, share, b, 1 - share);
        assertEquals(1 / blend.gross(), share / a.gross() + (1 - share) / b.gross(), RELATIVE / blend.gross());
    }

    private static Fuel blend(Blend.By by, Object... fuelsAndShares) {
        Map<Fuel, Double> shares = new LinkedHashMap<>();
        for (int i = 0; i < fuelsAndShares.length; i += 2) {
            shares.merge((Fuel) fuelsAndShares[i], (Double) fuelsAndShares[i + 1], Double::sum);
        }
        return Blend.of(shares, by);
    }

    private static void assertSame(Fuel expected, Fuel actual) {
        assertEquals(expected.gross(), actual.gross(), RELATIVE * expected.gross());
        assertEquals(expected.net(), actual.net(), RELATIVE * expected.gross());
        assertEquals(expected.makeup().ash(), actual.makeup().ash(), RELATIVE);
        assertEquals(expected.makeup().moisture(), actual.makeup().moisture(), RELATIVE * (1 + expected.makeup().moisture()));
        for (Element element : Element.values()) {
            double atoms = expected.makeup().atoms(element);
            assertEquals(atoms, actual.makeup().atoms(element), RELATIVE * (1 + atoms), element::name);
        }
    }
}
