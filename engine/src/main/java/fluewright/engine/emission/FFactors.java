package fluewright.engine.emission;

import static fluewright.engine.species.Element.C;
import static fluewright.engine.species.Element.H;
import static fluewright.engine.species.Element.N;
import static fluewright.engine.species.Element.O;
import static fluewright.engine.species.Element.S;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.data.DataFile;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.Makeup;
import fluewright.engine.quantity.Units;
import fluewright.engine.species.Element;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The F-factors of a fuel: flue gas at zero excess air per gross heat fired, as amounts of gas.
 *
 * <p>Source: EPA Method 19 (40 CFR 60 Appendix A-7): tabulated, Table 19-2; computed, equations 19-13 to 19-15, with the
 * method's constants in scf/lb per mass percent: {@code Fd = 1e6 (3.64 H + 1.53 C + 0.57 S + 0.14 N - 0.46 O) / GCV},
 * {@code Fw} with 5.57 H and 0.21 moisture besides, {@code Fc = 1e6 0.321 C / GCV}. Worked number: methane (C 74.87,
 * H 25.13 %, 23867 Btu/lb) has Fd 8632.2 dscf/MMBtu.
 *
 * @param dry   dry flue gas [mol/J]
 * @param wet   wet flue gas [mol/J], absent where the table prints none
 * @param co2   carbon dioxide [mol/J]
 * @param label which factors these are, for people
 */
public record FFactors(double dry, OptionalDouble wet, double co2, String label) {

    private static final Map<String, NamedCsvRecord> TABLE = read();
    private static final double POUND_PER_BTU = Units.of("lb").toSi(1) / Units.of("Btu").toSi(1);

    private static Map<String, NamedCsvRecord> read() {
        Map<String, NamedCsvRecord> rows = new LinkedHashMap<>();
        DataFile.read(FFactors.class, "f-factors.csv").forEach(row -> rows.put(row.getField("fuel"), row));
        return rows;
    }

    /** Returns the rows of the table. */
    public static Iterable<String> rows() {
        return TABLE.keySet();
    }

    /** Returns the tabulated factors of a row, or nothing when the table has none. */
    public static Optional<FFactors> tabulated(String row) {
        NamedCsvRecord found = TABLE.get(row);
        if (found == null) {
            return Optional.empty();
        }
        OptionalDouble wet = found.getField("fw").isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(standardCubicFeet(number(found, "fw")));
        String table = found.getField("table").startsWith("Table") ? "Method 19 " + found.getField("table") : found.getField("table");
        return Optional.of(new FFactors(standardCubicFeet(number(found, "fd")), wet, standardCubicFeet(number(found, "fc")),
                table + ", " + row));
    }

    private static double number(NamedCsvRecord row, String column) {
        return Double.parseDouble(row.getField(column));
    }

    /** Returns the factors computed from a fuel's ultimate analysis and gross heating value. */
    public static FFactors computed(Fuel fuel) {
        Makeup m = fuel.makeup();
        double common = 1.53 * percent(m, C) + 0.57 * percent(m, S) + 0.14 * percent(m, N) - 0.46 * percent(m, O);
        double dry = common + 3.64 * percent(m, H);
        double wet = common + 5.57 * percent(m, H) + 0.21 * 100 * m.moistureMass();
        double perPound = 1e6 / (fuel.gross() * POUND_PER_BTU);
        return new FFactors(standardCubicFeet(dry * perPound), OptionalDouble.of(standardCubicFeet(wet * perPound)),
                standardCubicFeet(0.321 * percent(m, C) * perPound), "Method 19 Eq. 19-13 to 19-15, analysis of " + fuel.id());
    }

    private static double percent(Makeup m, Element element) {
        return 100 * m.massFraction(element);
    }

    private static double standardCubicFeet(double perMillionBtu) {
        return perMillionBtu * Units.of("scf68/MMBtu").toSi(1);
    }
}
