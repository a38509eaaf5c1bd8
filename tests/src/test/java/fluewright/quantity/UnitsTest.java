package fluewright.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.Value;
import fluewright.engine.quantity.ValueText;
import java.util.stream.Stream;
import javax.measure.IncommensurableException;
import javax.measure.Quantity;
import javax.measure.Unit;
import javax.measure.quantity.Pressure;
import javax.measure.quantity.Temperature;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Units and quantities. */
class UnitsTest {

    static Stream<String> symbols() {
        return Units.docs().keySet().stream();
    }

    /** Our factors and the library's conversion of the JSR-385 unit agree. */
    @ParameterizedTest
    @MethodSource("symbols")
    void everyUnitConvertsAsItsLibraryUnitDoes(String symbol) throws IncommensurableException {
        Unit<?> unit = Units.of(symbol).unit();
        double byLibrary = unit.getConverterToAny(unit.getSystemUnit()).convert(12.5);
        assertEquals(byLibrary, Units.of(symbol).toSi(12.5), Math.abs(byLibrary) * 1e-12);
        assertEquals(12.5, Units.of(symbol).fromSi(Units.of(symbol).toSi(12.5)), 1e-12);
        assertFalse(Units.docs().get(symbol).isEmpty());
    }

    /** NIST Special Publication 811 (2008), Appendix B; gas volumes by the ideal gas law at their state. */
    @ParameterizedTest
    @CsvSource({"350 degF, degC, 176.6666666667", "-40 degC, degF, -40", "1 psi, Pa, 6894.757", "1 inH2O, Pa, 249.0889", "1 MMBtu, GJ, 1.05505585262",
        "1 therm, kWh, 29.3071", "1 lb/MMBtu, g/GJ, 429.9226", "1 Btu/lb, kJ/kg, 2.326", "1 kmol, Nm3, 22.41397", "1 kmol, Sm3, 23.64483",
        "1 lbmol, scf60, 379.482", "1 lbmol, scf68, 385.326", "1 grain, mg, 64.79891", "18 deltaF, deltaC, 10", "100 pct, ppm, 1000000"})
    void convertsAsPrinted(String from, String to, double expected) {
        assertEquals(expected, ValueText.parse(from).to(to).number(), Math.abs(expected) * 2e-6);
    }

    @Test
    void absoluteTemperaturesAndDifferencesAreKeptApart() {
        Value<?> stack = Value.of(180, "degC");
        assertEquals(Value.of(160, "deltaC"), stack.minus(Value.of(20, "degC")));
        assertEquals(Value.of(200, "degC").si(), stack.plus(Value.of(20, "deltaC")).si(), 1e-9);
        assertEquals(EngineMessage.UNITS_DO_NOT_FIT, assertThrows(InputException.class, () -> stack.plus(Value.of(20, "degC"))).reason());
        assertThrows(InputException.class, () -> stack.multiply(2));
        assertThrows(InputException.class, () -> stack.to("deltaC"));
        assertFalse(Kind.TEMPERATURE.accepts(Units.of("deltaC")));
        assertFalse(Kind.TEMPERATURE_DIFFERENCE.accepts(Units.of("degC")));
    }

    @Test
    void basesAreKeptApart() {
        Value<?> dry = Value.of(45, "ppmvd");
        assertEquals(Basis.DRY, dry.basis());
        assertThrows(InputException.class, () -> dry.plus(Value.of(1, "ppmvw")));
        assertEquals(Basis.DRY, dry.plus(Value.of(1, "ppm")).basis());
    }

    @Test
    void everyKindIsShownInUnitsThatItAccepts() {
        for (Kind kind : Kind.values()) {
            for (UnitSystem system : UnitSystem.values()) {
                assertTrue(kind.accepts(kind.shown(system)), kind + " in " + system);
            }
        }
    }

    @Test
    void aValueIsAQuantityOfTheStandardInterface() {
        Quantity<?> draft = Value.of(2, "mbar");
        Quantity<Pressure> pressure = draft.asType(Pressure.class);
        assertEquals(200, pressure.toSystemUnit().getValue().doubleValue(), 1e-9);
        assertThrows(ClassCastException.class, () -> draft.asType(Temperature.class));
        assertEquals(Quantity.Scale.RELATIVE, Value.of(5, "deltaC").getScale());
    }

    @Test
    void wrongTextsNameWhatIsNear() {
        InputException unit = assertThrows(InputException.class, () -> ValueText.parse("3 degc"));
        assertEquals(EngineMessage.UNKNOWN_UNIT, unit.reason());
        assertEquals("degC", unit.detail().nearest());
        assertEquals(EngineMessage.NOT_A_VALUE, assertThrows(InputException.class, () -> ValueText.parse("three pct")).reason());
        assertEquals(EngineMessage.NOT_A_NUMBER, assertThrows(InputException.class, () -> Value.of(Double.NaN, "pct")).reason());
    }
}
