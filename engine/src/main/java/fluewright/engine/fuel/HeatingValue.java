package fluewright.engine.fuel;

import fluewright.engine.species.Element;
import fluewright.engine.species.SpeciesTable;

/**
 * The gross heating value of a fuel as fired, and how it is known.
 *
 * @param gross  gross heating value at constant pressure and 25 degC [J/kg as fired]
 * @param method how it is known, for people: measured, or the method's name
 */
public record HeatingValue(double gross, String method) {

    /** Heat of vaporization of water at 25 degC [J/mol]: ISO 6976:2016, gross value of water vapour. */
    public static final double VAPORIZATION = 44013;

    /** Heat of combustion of carbon monoxide at 25 degC [J/mol]: NASA Glenn enthalpies of formation; ISO 6976 has 282.98. */
    public static final double CARBON_MONOXIDE =
            SpeciesTable.get("CO").enthalpyOfFormation() - SpeciesTable.get("CO2").enthalpyOfFormation();

    /** Heat of combustion of carbon in ash and soot at 25 degC [J/kg]: graphite 393.51 kJ/mol (NASA Glenn, CO2 formation). */
    public static final double CARBON = -SpeciesTable.get("CO2").enthalpyOfFormation() / Element.C.molarMass();

    /** Returns the net heating value [J/kg as fired]: the gross one less the heat of condensing all water formed. */
    public double net(Makeup makeup) {
        return gross - makeup.waterFormed() * VAPORIZATION;
    }
}
