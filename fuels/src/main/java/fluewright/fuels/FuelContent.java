package fluewright.fuels;

import fluewright.engine.emission.FFactors;
import fluewright.engine.fuel.AnalysisBasis;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelBuilder;
import fluewright.engine.fuel.GasComponents;
import fluewright.engine.fuel.Phase;
import fluewright.engine.fuel.UltimateAnalysis;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Value;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;

/** Makes the fuel of a fuel file's keys and values. */
final class FuelContent {

    static final String BY_MOLE = "mole";
    static final List<String> GAS_BASES = List.of(BY_MOLE, "mass");
    static final List<String> PHASES = List.of("gas", "liquid", "solid");

    private final Section file;
    private final Section composition;
    private final String id;
    private final Phase phase;

    private FuelContent(Section file, String id) {
        this.file = file.only(FuelKeys.OF_FILE);
        this.id = FuelId.require(file.text(FuelKeys.ID), id);
        this.phase = Phase.valueOf(file.text(FuelKeys.PHASE).oneOf(PHASES).toUpperCase(Locale.ROOT));
        this.composition = file.section(FuelKeys.COMPOSITION).only(FuelKeys.OF_COMPOSITION);
    }

    /**
     * Returns the fuel.
     *
     * @param id     the id that the file's name promises
     * @param origin where the file was read
     * @throws InputException when the content is no fuel
     */
    static Fuel read(Section file, String id, String origin) {
        return new FuelContent(file, id).fuel(origin);
    }

    private Fuel fuel(String origin) {
        String title = file.text(FuelKeys.TITLE).value();
        String source = composition.source();
        FuelBuilder builder = phase == Phase.GAS ? gas() : ultimate();
        builder.title(title).origin(origin).source("composition: " + source);
        file.optionalSection(FuelKeys.HEAT).ifPresent(section -> heat(section.only(FuelKeys.OF_NUMBER), builder));
        file.optionalSection(FuelKeys.DENSITY).ifPresent(section -> density(section.only(FuelKeys.OF_NUMBER), builder));
        file.optionalText(FuelKeys.METHOD_19).ifPresent(row -> builder.factorClass(row.oneOf(factorRows())));
        return built(builder);
    }

    private FuelBuilder gas() {
        boolean byMole = composition.text(FuelKeys.BASIS).oneOf(GAS_BASES).equals(BY_MOLE);
        Map<String, Double> shares = shares(byMole);
        return located(composition.at(FuelKeys.SHARES), () -> FuelBuilder.gas(id, shares, !byMole));
    }

    private FuelBuilder ultimate() {
        Text words = composition.text(FuelKeys.BASIS);
        AnalysisBasis basis = AnalysisBasis.values()[bases().indexOf(words.oneOf(bases()))];
        Map<String, Double> shares = shares(false);
        return located(composition.at(FuelKeys.SHARES), () -> FuelBuilder.ultimate(id, phase, new UltimateAnalysis(shares, basis)));
    }

    /** Returns the words for the bases of a liquid or solid, in the order of {@link AnalysisBasis}. */
    static List<String> bases() {
        return Arrays.stream(AnalysisBasis.values()).map(basis -> "mass, " + basis.label()).toList();
    }

    private Map<String, Double> shares(boolean byMole) {
        Section section = composition.section(FuelKeys.SHARES);
        Map<String, Double> shares = new LinkedHashMap<>();
        for (Text key : section.keys()) {
            String name = phase == Phase.GAS ? component(key) : element(key);
            if (shares.put(name, share(section.text(key.value()), byMole)) != null) {
                throw key.at().error(FuelFileMessage.DUPLICATE_KEY, key.value(), "one share of " + name);
            }
        }
        return shares;
    }

    private static String component(Text key) {
        return located(key.at(), () -> GasComponents.of(key.value())).symbol();
    }

    private static String element(Text key) {
        if (!UltimateAnalysis.NAMES.contains(key.value())) {
            throw key.at().error(EngineMessage.UNKNOWN_FUEL_COMPONENT, key.value(), UltimateAnalysis.NAMES,
                    NearestName.of(key.value(), UltimateAnalysis.NAMES));
        }
        return key.value();
    }

    private static double share(Text text, boolean byMole) {
        Value<?> share = text.number("12.6 %");
        String unit = share.named().symbol();
        // A ppm is one by volume everywhere in the project, so by mass it would be read wrong.
        if (!unit.equals("pct") && !(byMole && unit.equals("ppm"))) {
            throw text.at().error(FuelFileMessage.WRONG_UNIT, text.value(), byMole ? "% or ppm" : "%");
        }
        if (!(share.si() >= 0 && share.si() <= 1)) {
            throw text.at().error(FuelFileMessage.SHARE_OUTSIDE, text.value(), "0 % to 100 %");
        }
        return share.si();
    }

    private void heat(Section section, FuelBuilder builder) {
        boolean gas = phase == Phase.GAS;
        Text text = section.text(FuelKeys.VALUE);
        Value<?> value = text.positive("45.4 MJ/kg");
        if (Kind.ENERGY_PER_MASS.accepts(value.named())) {
            builder.measuredPerMass(value.si());
        } else if (gas && Kind.ENERGY_PER_GAS.accepts(value.named())) {
            builder.measuredPerMole(value.si());
        } else {
            throw text.at().error(FuelFileMessage.WRONG_UNIT, text.value(), gas
                    ? "MJ/kg, kJ/mol, or MJ of a volume at a stated state: MJ/Nm3, MJ/Sm3, Btu/scf60" : "MJ/kg, kJ/kg, Btu/lb");
        }
        builder.source("gross heating value: " + section.source());
    }

    private void density(Section section, FuelBuilder builder) {
        if (phase == Phase.GAS) {
            throw section.at().error(FuelFileMessage.KEY_DOES_NOT_FIT, "density of a gas", "no density; it follows from the composition");
        }
        Text text = section.text(FuelKeys.VALUE);
        Value<?> value = text.positive("865 kg/m3");
        if (!Kind.DENSITY.accepts(value.named())) {
            throw text.at().error(FuelFileMessage.WRONG_UNIT, text.value(), "kg/m3, kg/L, lb/gal, lb/ft3");
        }
        builder.density(value.si()).source("density: " + section.source());
    }

    private static List<String> factorRows() {
        List<String> rows = new ArrayList<>();
        FFactors.rows().forEach(rows::add);
        return rows;
    }

    private Fuel built(FuelBuilder builder) {
        try {
            return builder.build();
        } catch (InputException e) {
            boolean heat = e.reason() == EngineMessage.IMPOSSIBLE && file.has(FuelKeys.HEAT);
            throw (heat ? file.at(FuelKeys.HEAT) : composition.at()).relocated(e);
        }
    }

    private static <T> T located(FilePosition at, Supplier<T> step) {
        try {
            return step.get();
        } catch (InputException e) {
            throw at.relocated(e);
        }
    }
}
