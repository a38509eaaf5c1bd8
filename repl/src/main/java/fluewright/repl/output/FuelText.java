package fluewright.repl.output;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.GasQuality;
import fluewright.engine.fuel.IsoTemperature;
import fluewright.engine.fuel.Makeup;
import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import fluewright.engine.species.Element;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A fuel as text: composition, heating values, where it comes from. */
final class FuelText {

    private final Fuel fuel;
    private final UnitSystem system;

    FuelText(Fuel fuel, UnitSystem system) {
        this.fuel = fuel;
        this.system = system;
    }

    /** Returns the fuel on one line. */
    String oneLine() {
        String id = fuel.title().equals(fuel.id()) ? "" : " (" + fuel.id() + ")";
        String phase = fuel.title().equals(fuel.phase().label()) ? "" : ", " + fuel.phase().label();
        return fuel.title() + id + phase + ", " + shown(fuel.gross(), Kind.ENERGY_PER_MASS, Basis.GROSS);
    }

    List<String> lines() {
        TableText table = new TableText();
        table.row("  heating value", shown(fuel.gross(), Kind.ENERGY_PER_MASS, Basis.GROSS), fuel.heat().method() + ", 25 degC");
        table.row("", shown(fuel.net(), Kind.ENERGY_PER_MASS, Basis.NET), "");
        fuel.gas().ifPresent(gas -> {
            boolean si = system == UnitSystem.SI;
            GasQuality quality = new GasQuality(gas, si ? IsoTemperature.T15 : IsoTemperature.T60F, si ? IsoTemperature.T15 : IsoTemperature.T60F);
            table.row("", shown(quality.gross(), Kind.ENERGY_PER_VOLUME, Basis.GROSS), "from the composition, real gas, "
                    + (si ? "15/15 degC" : "60/60 degF") + ", 101.325 kPa");
            table.row("  Wobbe index", shown(quality.grossWobbe(), Kind.ENERGY_PER_VOLUME, Basis.GROSS), "relative density "
                    + Numbers.rounded(quality.relativeDensity(), OutcomeText.DIGITS));
        });
        fuel.density().ifPresent(density -> table.row("  density", shown(density, Kind.DENSITY, Basis.NONE), ""));
        List<String> lines = new ArrayList<>(List.of(oneLine()));
        lines.addAll(composition());
        lines.addAll(table.lines());
        fuel.sources().forEach(source -> lines.add("  source: " + source));
        lines.add("  from: " + fuel.origin());
        return lines;
    }

    private List<String> composition() {
        TableText table = new TableText();
        shares().forEach((name, share) -> table.row("  " + name, Numbers.rounded(share * 100, OutcomeText.DIGITS), "%"));
        List<String> lines = new ArrayList<>(List.of("  composition " + (fuel.gas().isPresent() ? "by volume" : "by mass, as received")));
        table.lines(1).forEach(line -> lines.add("  " + line));
        return lines;
    }

    /** Returns the composition: of a gas by volume, of other fuels by mass as received [-]. */
    Map<String, Double> shares() {
        Map<String, Double> shares = new LinkedHashMap<>();
        if (fuel.gas().isPresent()) {
            fuel.gas().get().fractions().forEach((component, x) -> shares.put(component.symbol(), x));
            return shares;
        }
        Makeup makeup = fuel.makeup();
        for (Element element : List.of(Element.C, Element.H, Element.O, Element.N, Element.S)) {
            shares.put(element.name(), makeup.massFraction(element));
        }
        shares.put("moisture", makeup.moistureMass());
        shares.put("ash", makeup.ash());
        shares.values().removeIf(share -> share == 0);
        return shares;
    }

    private String shown(double si, Kind kind, Basis basis) {
        return OutcomeText.rounded(Value.ofSi(si, kind.shown(system), basis));
    }
}
