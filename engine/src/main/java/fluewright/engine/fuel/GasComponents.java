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
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;

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
    private static final Map<String, GasComponent> BY_SYMBOL = read();
    private static final Map<String, GasComponent> BY_ANY_NAME = names();

    private GasComponents() {
    }

    /** Returns all components by symbol. */
    public static Map<String, GasComponent> all() {
        return BY_SYMBOL;
    }

    /**
     * Returns the component of a symbol ({@code n-C4H10}, or {@code nC4H10} where a hyphen cannot be typed) or of a name
     * in words ({@code n-butane}).
     *
     * @throws InputException when there is none
     */
    public static GasComponent of(String name) {
        GasComponent component = BY_ANY_NAME.get(name);
        if (component == null) {
            throw new InputException(EngineMessage.UNKNOWN_FUEL_COMPONENT, Detail.at("gas").found(name)
                    .expected("a component of ISO 6976 such as CH4, C2H6, nC4H10, CO2, N2")
                    .nearest(NearestName.of(name, new TreeSet<>(BY_ANY_NAME.keySet()))));
        }
        return component;
    }

    private static Map<String, GasComponent> names() {
        Map<String, GasComponent> names = new LinkedHashMap<>();
        BY_SYMBOL.forEach((symbol, component) -> {
            names.put(symbol, component);
            names.putIfAbsent(symbol.replace("-", "").replace(",", ""), component);
            names.putIfAbsent(component.title(), component);
        });
        return names;
    }

    private static Map<String, GasComponent> read() {
        Map<String, GasComponent> components = new LinkedHashMap<>();
        for (NamedCsvRecord row : DataFile.read(GasComponents.class, "components.csv")) {
            String symbol = row.getField("species").isEmpty() ? row.getField("component") : row.getField("species");
            components.put(symbol, new GasComponent(symbol, row.getField("component"), Element.atoms(row.getField("elements")),
                    number(row, "molar_mass") / 1000, numbers(row, COMBUSTION, 1000), numbers(row, METERING, 1), true));
        }
        for (String symbol : BEYOND_ISO) {
            components.put(symbol, fromThermodynamicData(SpeciesTable.get(symbol)));
        }
        return Collections.unmodifiableMap(components);
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
