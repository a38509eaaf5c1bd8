package fluewright.engine.fuel;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.species.Element;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Makes a {@link Fuel} of a composition and what else is known of it, and checks that they fit together. */
public final class FuelBuilder {

    /** A measured and a computed heating value of a gas may differ by this much before it is reported [-]. */
    private static final double GAS_TOLERANCE = 0.01;

    private final String id;
    private final Phase phase;
    private final Notes notes = new Notes();
    private final List<String> sources = new ArrayList<>();
    private String title;
    private String origin = "session";
    private String factorClass = "";
    private Makeup makeup;
    private GasComposition gas;
    private double toAsReceived = 1;
    private OptionalDouble density = OptionalDouble.empty();
    private OptionalDouble measured = OptionalDouble.empty();

    private FuelBuilder(String id, Phase phase) {
        this.id = id;
        this.title = id;
        this.phase = phase;
    }

    /**
     * Begins a gas.
     *
     * @param shares the shares of the components by name, by volume (that is, by mole) or by mass [-]
     * @param byMass whether they are by mass
     * @throws InputException when a component is unknown or the shares do not add up
     */
    public static FuelBuilder gas(String id, Map<String, Double> shares, boolean byMass) {
        FuelBuilder builder = new FuelBuilder(id, Phase.GAS);
        Map<String, Double> closed = Closure.close(shares, id, "", builder.notes);
        builder.gas = moleFractions(closed, byMass);
        builder.makeup = builder.gas.makeup();
        builder.gas.fractions().keySet().stream().filter(component -> !component.inIso6976()).forEach(component ->
                builder.notes.remark(EngineMessage.NOT_IN_ISO_6976, Detail.at(component.symbol())));
        return builder;
    }

    /**
     * Begins a liquid or solid.
     *
     * @throws InputException when the shares do not add up
     */
    public static FuelBuilder ultimate(String id, Phase phase, UltimateAnalysis analysis) {
        FuelBuilder builder = new FuelBuilder(id, phase);
        builder.makeup = analysis.makeup(builder.notes);
        builder.toAsReceived = analysis.toAsReceived();
        return builder;
    }

    private static GasComposition moleFractions(Map<String, Double> shares, boolean byMass) {
        Map<GasComponent, Double> moles = new LinkedHashMap<>();
        shares.forEach((name, share) -> {
            GasComponent component = GasComponents.of(name);
            moles.merge(component, byMass ? share / component.molarMass() : share, Double::sum);
        });
        double total = moles.values().stream().mapToDouble(Double::doubleValue).sum();
        moles.replaceAll((component, n) -> n / total);
        return new GasComposition(moles);
    }

    /** Sets the name in words. */
    public FuelBuilder title(String words) {
        this.title = words;
        return this;
    }

    /** Sets where the fuel was read. */
    public FuelBuilder origin(String place) {
        this.origin = place;
        return this;
    }

    /** Sets the row in Table 19-2 of EPA Method 19. */
    public FuelBuilder factorClass(String row) {
        this.factorClass = row;
        return this;
    }

    /** Sets the density [kg/m3]. */
    public FuelBuilder density(double kilogramsPerCubicMetre) {
        this.density = OptionalDouble.of(kilogramsPerCubicMetre);
        return this;
    }

    /** Sets the measured gross heating value at 25 degC [J/kg], on the basis of the composition. */
    public FuelBuilder measuredPerMass(double gross) {
        this.measured = OptionalDouble.of(gross * toAsReceived);
        return this;
    }

    /** Sets the measured gross heating value of a gas at 25 degC [J/mol]. */
    public FuelBuilder measuredPerMole(double gross) {
        if (gas == null) {
            throw new InputException(EngineMessage.ONLY_FOR_GASES, Detail.at(id).found("a heating value by volume or mole")
                    .expected("a heating value by mass, such as 45.4 MJ/kg"));
        }
        this.measured = OptionalDouble.of(gross / gas.molarMass());
        return this;
    }

    /** Adds the source of a number. */
    public FuelBuilder source(String text) {
        sources.add(text);
        return this;
    }

    /**
     * Returns the fuel.
     *
     * @throws InputException when there is nothing to burn
     */
    public Fuel build() {
        if (!(makeup.oxygenDemand() > 0)) {
            throw new InputException(EngineMessage.NOTHING_TO_BURN, Detail.at(id)
                    .found("oxygen demand " + Numbers.rounded(makeup.oxygenDemand(), 4) + " mol/kg").expected("carbon, hydrogen or sulfur to burn"));
        }
        HeatingValue heat = measured.isPresent() ? measuredHeat() : computedHeat();
        requireHeat(heat);
        return new Fuel(id, title, phase, makeup, heat, Optional.ofNullable(gas), density, factorClass, notes.list(), sources, origin);
    }

    private HeatingValue computedHeat() {
        if (gas != null) {
            return new HeatingValue(isoHeat(), gas.inIso6976() ? "ISO 6976:2016" : "ISO 6976:2016 and NASA Glenn data");
        }
        notes.warn(EngineMessage.HEATING_VALUE_ESTIMATED, Detail.at(id)
                .found(Numbers.rounded(HeatingValueEstimate.gross(makeup) / 1e6, 5) + " MJ/kg")
                .expected("Channiwala and Parikh (2002), mean error 1.45 %"));
        if (!HeatingValueEstimate.isValidFor(makeup)) {
            notes.warn(EngineMessage.OUTSIDE_VALID_RANGE, Detail.at(id + " heating value").expected("Channiwala and Parikh (2002), composition"));
        }
        return new HeatingValue(HeatingValueEstimate.gross(makeup), "estimate, Channiwala and Parikh");
    }

    private double isoHeat() {
        return gas.gross(IsoTemperature.T25) / gas.molarMass();
    }

    private HeatingValue measuredHeat() {
        double gross = measured.getAsDouble();
        double computed = gas != null ? isoHeat() : HeatingValueEstimate.gross(makeup);
        double tolerance = gas != null ? GAS_TOLERANCE : 3 * HeatingValueEstimate.MEAN_ERROR;
        boolean comparable = gas != null || HeatingValueEstimate.isValidFor(makeup);
        if (comparable && Math.abs(gross / computed - 1) > tolerance) {
            notes.warn(EngineMessage.HEATING_VALUE_CONTRADICTS, Detail.at(id).found(Numbers.rounded(gross / 1e6, 5) + " MJ/kg")
                    .expected(Numbers.rounded(computed / 1e6, 5) + " MJ/kg from the composition"));
        }
        return new HeatingValue(gross, "measured");
    }

    private void requireHeat(HeatingValue heat) {
        double latent = makeup.atoms(Element.H) / 2 * HeatingValue.VAPORIZATION;
        if (!(heat.gross() > latent && Double.isFinite(heat.gross()))) {
            throw new InputException(EngineMessage.IMPOSSIBLE, Detail.at(id + " gross heating value")
                    .found(Numbers.rounded(heat.gross() / 1e6, 6) + " MJ/kg")
                    .expected("more than the latent heat of the water formed, " + Numbers.rounded(latent / 1e6, 4) + " MJ/kg"));
        }
    }
}
