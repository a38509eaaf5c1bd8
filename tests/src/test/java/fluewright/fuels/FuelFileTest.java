package fluewright.fuels;

import static fluewright.engine.species.Element.C;
import static fluewright.engine.species.Element.H;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.Phase;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Message;
import fluewright.engine.quantity.Units;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a fuel file may look like, and what its bytes may be. */
class FuelFileTest {

    static final String OIL = """
            id: my-oil
            title: My oil
            phase: liquid
            composition:
              basis: mass, as received
              source: a laboratory
              shares:
                C: 87.0 %
                H: 13.0 %
            gross-heating-value:
              value: 45.6 MJ/kg
              source: a bomb
            density:
              value: 0.865 kg/L
              source: a hydrometer
            method-19: oil
            """;
    static final String GAS = """
            id: my-gas
            title: My gas
            phase: gas
            composition:
              basis: mole
              source: a laboratory
              shares:
                CH4: 94.995 %
                nC4H10: 5 %
                H2S: 50 ppm
            """;

    @TempDir
    Path folder;

    static Fuel parse(String id, String text) {
        return FuelFile.parse(text.getBytes(StandardCharsets.UTF_8), id + ".yaml", id);
    }

    private static InputException refused(String id, String text, Message reason) {
        return refused(id, text.getBytes(StandardCharsets.UTF_8), reason);
    }

    private static InputException refused(String id, byte[] bytes, Message reason) {
        InputException error = assertThrows(InputException.class, () -> FuelFile.parse(bytes, id + ".yaml", id));
        assertSame(reason, error.reason());
        return error;
    }

    private Path file(String name, byte[] bytes) throws IOException {
        return Files.write(folder.resolve(name), bytes);
    }

    @Test
    void readsALiquidWithEveryKey() throws IOException {
        Path file = file("my-oil.yaml", OIL.getBytes(StandardCharsets.UTF_8));
        Fuel fuel = FuelFile.read(file);
        assertEquals("my-oil", fuel.id());
        assertEquals("My oil", fuel.title());
        assertSame(Phase.LIQUID, fuel.phase());
        assertEquals(0.87, fuel.makeup().massFraction(C), 1e-12);
        assertEquals(45.6e6, fuel.gross(), 1);
        assertEquals(865, fuel.density().orElseThrow(), 1e-9);
        assertEquals("oil", fuel.factorClass());
        assertEquals(file.toString(), fuel.origin());
        assertEquals(List.of("composition: a laboratory", "gross heating value: a bomb", "density: a hydrometer"), fuel.sources());
        assertTrue(fuel.notes().isEmpty());
    }

    @Test
    void readsAGasWithTraces() {
        Fuel fuel = parse("my-gas", GAS);
        assertEquals(50e-6, fuel.gas().orElseThrow().fractions().get(GasComponents.of("H2S")), 1e-12);
        assertEquals(0.05, fuel.gas().orElseThrow().fractions().get(GasComponents.of("n-butane")), 1e-12);
    }

    @Test
    void readsAGasByMass() {
        Fuel fuel = parse("my-gas", GAS.replace("basis: mole", "basis: mass").replace("50 ppm", "0.005 %"));
        assertEquals(0.94995 * 12.0107 / 16.04246 + 0.05 * 4 * 12.0107 / 58.1222, fuel.makeup().massFraction(C), 1e-6);
    }

    @Test
    void readsTheHeatingValueOfAGasByAnyAmount() {
        double molarMass = GasComponents.of("CH4").molarMass();
        String methane = GAS.replaceAll("(?s)shares:.*", "shares:\n    CH4: 100 %\n"
                + "gross-heating-value:\n  value: VALUE\n  source: a meter\n");
        assertEquals(890e3, parse("my-gas", methane.replace("VALUE", "890 kJ/mol")).gross() * molarMass, 1e-6);
        assertEquals(39.7e6, parse("my-gas", methane.replace("VALUE", "39.7 MJ/Nm3")).gross()
                * molarMass * Units.of("Nm3").toSi(1), 1e-3);
        assertEquals(37.6e6, parse("my-gas", methane.replace("VALUE", "37.6 MJ/Sm3")).gross()
                * molarMass * Units.of("Sm3").toSi(1), 1e-3);
        assertEquals(55.5e6, parse("my-gas", methane.replace("VALUE", "55.5 MJ/kg")).gross(), 1e-3);
    }

    @Test
    void countsADryAnalysisAndItsHeatingValueDown() {
        Fuel fuel = parse("my-oil", OIL.replace("mass, as received", "mass, dry")
                .replace("H: 13.0 %", "H: 12.0 %\n    ash: 1.0 %\n    moisture: 20 %"));
        assertEquals(0.87 * 0.8, fuel.makeup().massFraction(C), 1e-12);
        assertEquals(0.2, fuel.makeup().moistureMass(), 1e-12);
        assertEquals(45.6e6 * 0.8, fuel.gross(), 1);
    }

    @Test
    void countsADryAshFreeAnalysisDown() {
        Fuel fuel = parse("my-oil", OIL.replace("mass, as received", "mass, dry ash-free")
                .replace("H: 13.0 %", "H: 13.0 %\n    ash: 10 %\n    moisture: 20 %"));
        assertEquals(0.13 * 0.8 * 0.9, fuel.makeup().massFraction(H), 1e-12);
        assertEquals(0.08, fuel.makeup().ash(), 1e-12);
    }

    @Test
    void scalesASumNearHundredAndSaysSo() {
        Fuel fuel = parse("my-oil", OIL.replace("13.0 %", "12.5 %"));
        assertEquals(1, fuel.makeup().massFraction(C) + fuel.makeup().massFraction(H), 1e-12);
        assertSame(EngineMessage.NORMALISED, fuel.notes().get(0).message());
    }

    @Test
    void keepsScalarsAsTheyAreWritten() {
        Fuel fuel = parse("007", OIL.replace("my-oil", "007").replace("My oil", "no")
                .replace("a bomb", "010").replace("a hydrometer", "2020-01-01"));
        assertEquals("no", fuel.title());
        assertEquals("007", fuel.id());
        assertEquals("gross heating value: 010", fuel.sources().get(1));
    }

    @Test
    void takesQuotesFoldedTextFlowStyleAndNoBreakSpaces() {
        Fuel fuel = parse("my-oil", OIL.replace("My oil", "\"My oil\"").replace("a bomb", ">\n    a bomb\n    of steel")
                .replace("shares:\n    C: 87.0 %\n    H: 13.0 %", "shares: {C: 87.0%, H: 13.0\u00a0%}")
                .replace("phase: liquid", "'phase': liquid"));
        assertEquals("My oil", fuel.title());
        assertEquals("gross heating value: a bomb of steel", fuel.sources().get(1));
    }

    @Test
    void takesWindowsLineEndsAndAByteOrderMark() {
        assertEquals("my-oil", parse("my-oil", "\uFEFF" + OIL.replace("\n", "\r\n")).id());
        InputException error = refused("my-oil", "\uFEFF" + OIL.replace("\n", "\r\n").replace("13.0 %", "13.0"),
                FuelFileMessage.NUMBER_WITHOUT_UNIT);
        assertEquals("my-oil.yaml, line 9, column 8", error.detail().where());
        assertTrue(error.detail().expected().contains("%"));
    }

    @Test
    void countsColumnsInCharactersNotBytes() {
        String text = "id: my-oil\ntitle: {\u00e9\u00e9\ud83d\udd25: [}\n";
        assertEquals("my-oil.yaml, line 2, column 15", refused("my-oil", text, FuelFileMessage.NOT_YAML).detail().where());
    }

    @Test
    void refusesAnEmptyFile() {
        for (String text : List.of("", "# nothing\n", "---\n", "\uFEFF")) {
            assertSame(FuelFileMessage.EMPTY, assertThrows(InputException.class, () -> parse("my-oil", text)).reason(), text);
        }
    }

    @Test
    void refusesWhatIsNotUtf8() {
        byte[] latin = OIL.replace("My oil", "\u00d6l").getBytes(StandardCharsets.ISO_8859_1);
        assertEquals("my-oil.yaml, line 2, column 8", refused("my-oil", latin, FuelFileMessage.NOT_UTF8).detail().where());
        refused("my-oil", OIL.getBytes(StandardCharsets.UTF_16), FuelFileMessage.NOT_UTF8);
        byte[] cut = OIL.concat("# \u00e9").getBytes(StandardCharsets.UTF_8);
        refused("my-oil", Arrays.copyOf(cut, cut.length - 1), FuelFileMessage.NOT_UTF8);
    }

    @Test
    void refusesWhatIsTooLarge() throws IOException {
        Path file = file("my-oil.yaml", (OIL + "#".repeat(1_000_000)).getBytes(StandardCharsets.UTF_8));
        assertSame(FuelFileMessage.TOO_LARGE, assertThrows(InputException.class, () -> FuelFile.read(file)).reason());
    }

    @Test
    void refusesDeepNestingWithoutExhaustingTheStack() {
        refused("my-oil", "[".repeat(900_000), FuelFileMessage.TOO_DEEP);
        refused("my-oil", "- ".repeat(400_000), FuelFileMessage.TOO_DEEP);
    }

    @Test
    void refusesOtherFilesAndNames() throws IOException {
        Path text = file("my-oil.txt", OIL.getBytes(StandardCharsets.UTF_8));
        assertSame(FuelFileMessage.WRONG_FILE_NAME, assertThrows(InputException.class, () -> FuelFile.read(text)).reason());
        assertSame(FuelFileMessage.WRONG_FILE_NAME, assertThrows(InputException.class, () -> FuelFile.read(Path.of("/"))).reason());
        Path directory = Files.createDirectory(folder.resolve("dir.yaml"));
        assertSame(FuelFileMessage.UNREADABLE, assertThrows(InputException.class, () -> FuelFile.read(directory)).reason());
        InputException absent = assertThrows(InputException.class, () -> FuelFile.read(folder.resolve("absent.yaml")));
        assertSame(FuelFileMessage.UNREADABLE, absent.reason());
        assertEquals("no such file", absent.detail().found());
    }

    @Test
    void namesTheNearestValidName() {
        assertEquals("density", refused("my-oil", OIL.replace("density", "densiti"), FuelFileMessage.UNKNOWN_KEY)
                .detail().nearest());
        assertEquals("liquid", refused("my-oil", OIL.replace("liquid", "Liquid"), FuelFileMessage.UNKNOWN_WORD)
                .detail().nearest());
        assertEquals("nC4H10", refused("my-gas", GAS.replace("nC4H10", "nC4H11"), EngineMessage.UNKNOWN_FUEL_COMPONENT)
                .detail().nearest());
    }
}
