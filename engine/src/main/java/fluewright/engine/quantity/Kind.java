package fluewright.engine.quantity;

/**
 * The kinds of number that calculations take and give. Each names the coherent SI unit it is stored in and the units
 * it is shown in.
 */
public enum Kind {
    /** A pure number [-]. */
    PURE("a pure number", "1", "1", "1"),
    /** A share of something [-], shown in percent. */
    SHARE("a share", "1", "pct", "pct"),
    /** A small share of a gas by volume [-], shown in ppm. */
    TRACE("a share by volume", "1", "ppm", "ppm"),
    /** Mass over mass [kg/kg]. */
    MASS_RATIO("a mass per mass", "1", "kg/kg", "lb/lb"),
    /** Gas volume over gas volume at one state [m3/m3]. */
    VOLUME_RATIO("a volume per volume", "1", "m3/m3", "ft3/ft3"),
    /** Temperature on a scale with its zero [K]. */
    TEMPERATURE("a temperature", "K", "degC", "degF"),
    /** Difference of two temperatures [K]. */
    TEMPERATURE_DIFFERENCE("a difference of temperatures", "K", "deltaC", "deltaF"),
    /** Absolute pressure [Pa]. */
    PRESSURE("an absolute pressure", "Pa", "kPa", "psi"),
    /** Density [kg/m3]. */
    DENSITY("a density", "kg/m3", "kg/m3", "lb/ft3"),
    /** Molar mass [kg/mol]. */
    MOLAR_MASS("a molar mass", "kg/mol", "g/mol", "lb/lbmol"),
    /** Energy per mass [J/kg]. */
    ENERGY_PER_MASS("an energy per mass", "J/kg", "MJ/kg", "Btu/lb"),
    /** Energy per amount of substance [J/mol]. */
    ENERGY_PER_AMOUNT("an energy per mole", "J/mol", "kJ/mol", "Btu/lbmol"),
    /** Energy per amount of gas [J/mol], shown per volume of ideal gas at a stated state. */
    ENERGY_PER_GAS("an energy per gas volume", "J/mol", "MJ/Nm3", "Btu/scf60"),
    /** Energy per real volume [J/m3]. */
    ENERGY_PER_VOLUME("an energy per volume", "J/m3", "MJ/m3", "Btu/ft3"),
    /** Amount of gas per mass [mol/kg], shown as a volume at a stated state. */
    GAS_PER_MASS("a gas volume per mass", "mol/kg", "Nm3/kg", "scf60/lb"),
    /** Amount of gas per energy [mol/J], shown as a volume at a stated state. */
    GAS_PER_ENERGY("a gas volume per energy", "mol/J", "Nm3/GJ", "scf68/MMBtu"),
    /** Mass of a main stream per energy [kg/J]. */
    MASS_PER_ENERGY("a mass per energy", "kg/J", "kg/GJ", "lb/MMBtu"),
    /** Mass of a pollutant per energy [kg/J]. */
    EMISSION_PER_ENERGY("a mass per energy", "kg/J", "g/GJ", "lb/MMBtu"),
    /** Mass of a pollutant per amount of gas [kg/mol], shown per volume at a stated state. */
    MASS_PER_GAS("a mass per gas volume", "kg/mol", "mg/Nm3", "mg/m3at20"),
    /** Difference of two pressures, such as a draft [Pa]. */
    PRESSURE_DIFFERENCE("a difference of pressures", "Pa", "Pa", "inH2O"),
    /** Length [m]. */
    LENGTH("a length", "m", "m", "ft"),
    /** Area [m2]. */
    AREA("an area", "m2", "m2", "ft2"),
    /** Volume as it stands [m3]. */
    VOLUME("a volume", "m3", "m3", "ft3"),
    /** Duration [s]. */
    DURATION("a duration", "s", "h", "h"),
    /** Velocity [m/s]. */
    VELOCITY("a velocity", "m/s", "m/s", "ft/s"),
    /** Mass [kg]. */
    MASS("a mass", "kg", "kg", "lb"),
    /** Mass flow [kg/s]. */
    MASS_FLOW("a mass flow", "kg/s", "kg/h", "lb/h"),
    /** Volume flow as it stands [m3/s]. */
    VOLUME_FLOW("a volume flow", "m3/s", "m3/h", "ft3/min"),
    /** Flow of gas as an amount [mol/s], shown as a volume flow at a stated state. */
    GAS_FLOW("a gas flow", "mol/s", "Nm3/h", "scf60/h"),
    /** Energy [J]. */
    ENERGY("an energy", "J", "GJ", "MMBtu"),
    /** Power, such as a firing rate [W]. */
    POWER("a power", "W", "kW", "MMBtu/h");

    private final String title;
    private final String si;
    private final String shownSi;
    private final String shownUs;

    Kind(String title, String si, String shownSi, String shownUs) {
        this.title = title;
        this.si = si;
        this.shownSi = shownSi;
        this.shownUs = shownUs;
    }

    /** Returns the name for people, with its article. */
    public String title() {
        return title;
    }

    /** Returns the coherent SI unit that numbers of this kind are stored in. */
    public NamedUnit si() {
        return Units.of(si);
    }

    /** Returns the unit that numbers of this kind are shown in. */
    public NamedUnit shown(UnitSystem system) {
        return Units.of(system == UnitSystem.SI ? shownSi : shownUs);
    }

    /** Tells whether a number in this unit can be of this kind. */
    public boolean accepts(NamedUnit unit) {
        return unit.hasDimensionOf(si()) && (this == TEMPERATURE_DIFFERENCE) == unit.isDifference();
    }

    /** Tells whether a number of this kind needs no unit: a pure number, or a ratio that is the same in all units. */
    public boolean isPure() {
        return this == PURE || this == MASS_RATIO || this == VOLUME_RATIO;
    }
}
