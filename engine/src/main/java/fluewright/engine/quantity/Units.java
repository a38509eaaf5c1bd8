package fluewright.engine.quantity;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import fluewright.engine.data.DataFile;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import javax.measure.Quantity;

/**
 * The units known by name. They stand in {@code units.csv} beside this class; products and quotients such as
 * {@code lb/MMBtu} are made of them when asked for.
 */
public final class Units {

    private static final Map<String, NamedCsvRecord> ROWS = read();
    private static final Map<String, NamedUnit> MADE = new ConcurrentHashMap<>();

    private Units() {
    }

    /** Returns the simple units with their one-line docs, in the order of the file. */
    public static Map<String, String> docs() {
        Map<String, String> docs = new LinkedHashMap<>();
        ROWS.forEach((symbol, row) -> docs.put(symbol, row.getField("doc")));
        return docs;
    }

    /** Tells whether a simple unit of this symbol exists. */
    public static boolean isUnit(String symbol) {
        return ROWS.containsKey(symbol);
    }

    /** Returns the unit of a symbol or of a product or quotient of symbols, or nothing. */
    public static Optional<NamedUnit> find(String symbol) {
        NamedUnit made = MADE.get(symbol);
        if (made == null) {
            made = make(symbol);
            if (made != null) {
                MADE.put(symbol, made);
            }
        }
        return Optional.ofNullable(made);
    }

    /**
     * Returns the unit of a symbol such as {@code MJ/kg}.
     *
     * @throws InputException when there is none
     */
    public static NamedUnit of(String symbol) {
        return find(symbol).orElseThrow(() -> new InputException(EngineMessage.UNKNOWN_UNIT,
                Detail.at("unit").found(symbol).expected("a unit such as pct, degC, kPa, MJ/kg")
                        .nearest(NearestName.of(symbol, ROWS.keySet()))));
    }

    private static NamedUnit make(String symbol) {
        int operator = Math.max(symbol.lastIndexOf('/'), symbol.lastIndexOf('*'));
        if (operator > 0) {
            NamedUnit left = find(symbol.substring(0, operator)).orElse(null);
            NamedUnit right = find(symbol.substring(operator + 1)).orElse(null);
            return left == null || right == null ? null : symbol.charAt(operator) == '/' ? left.per(right) : left.times(right);
        }
        if (symbol.equals("1")) {
            return new NamedUnit("1", CoherentUnits.of("1"), 1, 0, Quantity.Scale.ABSOLUTE, Basis.NONE);
        }
        String plain = symbol.equals("%") ? "pct" : symbol;
        return ROWS.containsKey(plain) ? fromRow(plain, ROWS.get(plain)) : null;
    }

    private static NamedUnit fromRow(String symbol, NamedCsvRecord row) {
        Basis basis = row.getField("basis").isEmpty() ? Basis.NONE : Basis.valueOf(row.getField("basis").toUpperCase(Locale.ROOT));
        Quantity.Scale scale = row.getField("scale").equals("relative") ? Quantity.Scale.RELATIVE : Quantity.Scale.ABSOLUTE;
        return new NamedUnit(symbol, CoherentUnits.of(row.getField("si")), product(row.getField("factor")),
                Double.parseDouble(row.getField("offset")), scale, basis);
    }

    private static double product(String text) {
        double value = 1;
        int start = 0;
        char operator = '*';
        for (int i = 0; i <= text.length(); i++) {
            if (i == text.length() || text.charAt(i) == '*' || text.charAt(i) == '/') {
                double part = Double.parseDouble(text.substring(start, i));
                value = operator == '*' ? value * part : value / part;
                operator = i < text.length() ? text.charAt(i) : operator;
                start = i + 1;
            }
        }
        return value;
    }

    private static Map<String, NamedCsvRecord> read() {
        Map<String, NamedCsvRecord> rows = new LinkedHashMap<>();
        DataFile.read(Units.class, "units.csv").forEach(row -> rows.put(row.getField("symbol"), row));
        return Collections.unmodifiableMap(rows);
    }
}
