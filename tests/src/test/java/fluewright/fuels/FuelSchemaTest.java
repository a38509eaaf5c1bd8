package fluewright.fuels;

import static org.junit.jupiter.api.Assertions.assertEquals;

import fluewright.engine.emission.FFactors;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.UltimateAnalysis;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

/** The schema for editors says what the reader does. JSON is YAML, so the reader's own parser can read it. */
class FuelSchemaTest {

    private final Object schema = schema();

    private static Object schema() {
        try (InputStream stream = FuelFile.class.getResourceAsStream("fuel.schema.json")) {
            return new Load(LoadSettings.builder().build()).loadFromInputStream(stream);
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    private Object at(String... path) {
        Object node = schema;
        for (String step : path) {
            node = ((Map<?, ?>) node).get(step);
        }
        return node;
    }

    private Set<Object> keysAt(String... path) {
        return Set.copyOf(((Map<?, ?>) at(path)).keySet());
    }

    private List<Object> listAt(String... path) {
        return List.copyOf((Collection<?>) at(path));
    }

    @Test
    void keysAreThoseOfTheReader() {
        assertEquals(Set.copyOf(FuelKeys.OF_FILE), keysAt("properties"));
        assertEquals(Set.copyOf(FuelKeys.OF_COMPOSITION), keysAt("properties", "composition", "properties"));
        assertEquals(Set.copyOf(FuelKeys.OF_NUMBER), keysAt("properties", "gross-heating-value", "properties"));
        assertEquals(Set.copyOf(FuelKeys.OF_NUMBER), keysAt("properties", "density", "properties"));
    }

    @Test
    void requiredKeysAreThoseOfTheReader() {
        assertEquals(List.of(FuelKeys.ID, FuelKeys.TITLE, FuelKeys.PHASE, FuelKeys.COMPOSITION), listAt("required"));
        assertEquals(FuelKeys.OF_COMPOSITION, listAt("properties", "composition", "required"));
        assertEquals(FuelKeys.OF_NUMBER, listAt("properties", "gross-heating-value", "required"));
        assertEquals(FuelKeys.OF_NUMBER, listAt("properties", "density", "required"));
    }

    @Test
    void wordsAreThoseOfTheReader() {
        assertEquals(FuelContent.PHASES, listAt("properties", "phase", "enum"));
        assertEquals(FuelContent.GAS_BASES, listAt("then", "properties", "composition", "properties", "basis", "enum"));
        assertEquals(FuelContent.bases(), listAt("else", "properties", "composition", "properties", "basis", "enum"));
        List<Object> rows = new ArrayList<>();
        FFactors.rows().forEach(rows::add);
        assertEquals(rows, listAt("properties", "method-19", "enum"));
    }

    @Test
    void componentsAreThoseOfTheEngine() {
        assertEquals(UltimateAnalysis.NAMES, listAt("else", "properties", "composition", "properties", "shares", "propertyNames", "enum"));
        Set<String> names = new TreeSet<>();
        GasComponents.titles().forEach((symbol, title) -> names.addAll(
                List.of(symbol, symbol.replace("-", "").replace(",", ""), title)));
        assertEquals(List.copyOf(names), listAt("$defs", "component", "enum"));
    }

    @Test
    void unknownKeysAreRefusedAsByTheReader() {
        for (String[] path : List.of(new String[] {}, new String[] {"properties", "composition"}, new String[] {"properties", "density"},
                new String[] {"properties", "gross-heating-value"})) {
            assertEquals(false, ((Map<?, ?>) at(path)).get("additionalProperties"));
        }
    }
}
