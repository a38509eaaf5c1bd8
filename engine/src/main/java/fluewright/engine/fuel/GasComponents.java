package fluewright.engine.fuel;

import static fluewright.engine.data.DataFile.number;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.data.DataFile;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.species.Element;
import fluewright.engine.species.Species;
import fluewright.engine.species.SpeciesTable;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;

/**
 * The components that a fuel gas may have: those of ISO 6976:2016 ({@code components.csv} beside this class) and stable
 * fuel species that the standard lacks, computed from NASA Glenn data and marked.
 */
public final class GasComponents {

    private static final String[] COMBUSTION = {"gross_0", "gross_15", "gross_15.55", "gross_20", "gross_25"};
    private static final String[] METERING = {"s_0", "s_15", "s_15.55", "s_20"};
    /** Stable species that may stand in a fuel gas; radicals of the species table may not. */
    private static final List<String> BEYOND_ISO = List.of("CH3OCH3", "C2H5OH", "C3H4-propyne", "C3H6-cyclo", "C3H7OH-1",
            "C3H7OH-2", "CH3CHO", "C3H6O-acetone", "CH2O", "C8H8", "i-C8H18", "C10H8");
    private static final Map<String, NamedCsvRecord> ROWS = read();
    private static final Map<String, String> SYMBOLS = symbols();
    private static final Map<String, GasComponent> MADE = new ConcurrentHashMap<>();

    private GasComponents() {
    }

    /** Returns the names in words of all components by symbol. */
    public static Map<String, String> titles() {
        Map<String, String> titles = new LinkedHashMap<>();
        ROWS.forEach((symbol, row) -> titles.put(symbol, row.getField("component")));
        BEYOND_ISO.forEach(symbol -> titles.put(symbol, SpeciesTable.get(symbol).title()));
        return titles;
    }

    /**
     * Returns the component of a symbol ({@code n-C4H10}, or {@code nC4H10} where a hyphen cannot be typed) or of a name
     * in words ({@code n-butane}).
     *
     * @throws InputException when there is none
     */
    public static GasComponent of(String name) {
        String symbol = SYMBOLS.get(name);
        if (symbol == null) {
            throw new InputException(EngineMessage.UNKNOWN_FUEL_COMPONENT, Detail.at("gas").found(name)
                    .expected("a component of ISO 6976 such as CH4, C2H6, nC4H10, CO2, N2")
                    .nearest(NearestName.of(name, new TreeSet<>(SYMBOLS.keySet()))));
        }
        return MADE.computeIfAbsent(symbol, GasComponents::make);
    }

    private static Map<String, String> symbols() {
        Map<String, String> symbols = new LinkedHashMap<>();
        titles().forEach((symbol, title) -> {
            symbols.put(symbol, symbol);
            symbols.putIfAbsent(symbol.replace("-", "").replace(",", ""), symbol);
            symbols.putIfAbsent(title, symbol);
        });
        return symbols;
    }

    private static GasComponent make(String symbol) {
        NamedCsvRecord row = ROWS.get(symbol);
        return row == null ? fromThermodynamicData(SpeciesTable.get(symbol))
                : new GasComponent(symbol, row.getField("component"), Element.atoms(row.getField("elements")),
                        number(row, "molar_mass") / 1000, numbers(row, COMBUSTION, 1000), numbers(row, METERING, 1), true);
    }

    private static Map<String, NamedCsvRecord> read() {
        Map<String, NamedCsvRecord> rows = new LinkedHashMap<>();
        for (NamedCsvRecord row : DataFile.read(GasComponents.class, "components.csv")) {
            rows.put(row.getField("species").isEmpty() ? row.getField("component") : row.getField("species"), row);
        }
        return rows;
    }

    private static double[] numbers(NamedCsvRecord row, String[] columns, double factor) {
        double[] values = new double[columns.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = number(row, columns[i]) * factor;
        }
        return values;
    }

    /** The heat of reaction of the gases at each temperature, plus that of condensing the water; Z is taken as 1. */
    private static GasComponent fromThermodynamicData(Species fuel) {
        double[] gross = new double[IsoTemperature.values().length];
        for (IsoTemperature t : IsoTemperature.values()) {
            gross[t.ordinal()] = netAt(fuel, t.kelvin()) + fuel.atoms(Element.H) / 2 * t.vaporization();
        }
        return new GasComponent(fuel.name(), fuel.title(), fuel.atoms(), fuel.molarMass(), gross, new double[METERING.length], false);
    }

    private static double netAt(Species fuel, double t) {
        double carbon = fuel.atoms(Element.C);
        double hydrogen = fuel.atoms(Element.H);
        double oxygen = carbon + hydrogen / 4 - fuel.atoms(Element.O) / 2;
        return fuel.enthalpy(t) + oxygen * SpeciesTable.get("O2").enthalpy(t)
                - carbon * SpeciesTable.get("CO2").enthalpy(t) - hydrogen / 2 * SpeciesTable.get("H2O").enthalpy(t);
    }
}
