package fluewright.engine.message;

/** What the engine has to say: errors first, then notes on results. */
public enum EngineMessage implements Message {
    /** No unit has this symbol. */
    UNKNOWN_UNIT("there is no such unit"),
    /** Two values cannot be added, compared or converted. */
    UNITS_DO_NOT_FIT("these units do not fit together"),
    /** A number is infinite or not a number. */
    NOT_A_NUMBER("this is not a finite number"),
    /** A number of another kind than the argument asks for. */
    WRONG_UNIT("the unit does not fit the argument"),
    /** A dry number where a wet one is asked for, or gross for net. */
    WRONG_BASIS("the basis does not fit the argument"),
    /** A number without a unit where one is needed. */
    UNIT_MISSING("a unit is missing"),
    /** A value outside what is physically possible. */
    IMPOSSIBLE("the value is impossible"),
    /** A value of another type than the argument asks for. */
    WRONG_TYPE("the value is of the wrong type"),
    /** No calculation has this name. */
    UNKNOWN_CALCULATION("there is no such calculation"),
    /** A calculation has no argument of this name. */
    UNKNOWN_ARGUMENT("there is no such argument"),
    /** A result has no component of this name. */
    UNKNOWN_COMPONENT("the result has no such component"),
    /** An argument without a default was not given. */
    ARGUMENT_MISSING("an argument is missing"),
    /** More unnamed values than the calculation takes. */
    TOO_MANY_VALUES("there are more unnamed values than the function takes"),
    /** Two calculations of the same name. */
    DUPLICATE_CALCULATION("two calculations have the same name"),
    /** Exactly one of several arguments is needed. */
    ONE_OF("exactly one of these arguments is needed"),
    /** Two arguments exclude each other. */
    NOT_BOTH("these arguments exclude each other"),
    /** One argument needs another. */
    NEEDS_ALSO("this argument needs another one"),
    /** Text that was to be a number with a unit. */
    NOT_A_VALUE("this is not a number with a unit"),

    /** No fuel has this id. */
    UNKNOWN_FUEL("there is no such fuel"),
    /** A fuel has no component of this name. */
    UNKNOWN_FUEL_COMPONENT("there is no such fuel component"),
    /** A composition's shares are too far from 100 %. */
    NOT_CLOSED("the composition does not add up to 100 %"),
    /** A fuel without anything to burn. */
    NOTHING_TO_BURN("the fuel has nothing to burn"),
    /** A blend that cannot be made on this basis. */
    CANNOT_BLEND("these fuels cannot be blended on this basis"),
    /** A request that only gases can answer. */
    ONLY_FOR_GASES("only a gas has this"),

    /** A flue gas whose oxygen would be negative. */
    TOO_LITTLE_AIR("there is less air than complete combustion needs"),
    /** A measured O2 at or above that of the air. */
    OXYGEN_OF_AIR("a flue gas cannot hold as much oxygen as the air it came from"),
    /** A measured CO2 above the fuel's maximum. */
    CO2_ABOVE_MAXIMUM("the CO2 is above the maximum of this fuel"),
    /** A reading that cannot belong to the fuel. */
    READING_CONTRADICTS("the reading cannot come from this fuel"),
    /** More carbon unburned than the fuel holds. */
    MORE_CARBON_THAN_FUEL("more carbon is unburned than the fuel holds"),

    /** A fuel without the F-factor that is asked for. */
    NO_F_FACTOR("this F-factor is not to be had"),

    /** An input outside the method's valid range. */
    OUTSIDE_VALID_RANGE("outside the valid range of the method"),
    /** A composition was scaled to 100 %. */
    NORMALISED("the composition was scaled to 100 %"),
    /** A heating value from a correlation. */
    HEATING_VALUE_ESTIMATED("the heating value is an estimate"),
    /** A measured heating value that the composition does not bear out. */
    HEATING_VALUE_CONTRADICTS("the measured heating value and the composition disagree"),
    /** A fuel file hides another of the same id. */
    HIDES_FUEL("this fuel file hides one of the same id in a lower place"),
    /** A component's data are not of ISO 6976. */
    NOT_IN_ISO_6976("the component is not in ISO 6976; its heating value is from NASA Glenn data"),
    /** Flue gas colder than its water dew point. */
    BELOW_DEW_POINT("the flue gas is below its water dew point; all water is counted as vapour, so the true loss is smaller"),
    /** Losses of more than all the heat there is. */
    LOSSES_EXCEED_HEAT("the losses are more than the heat fired"),
    /** Flue gas colder than the combustion air. */
    COLDER_THAN_AIR("the flue gas is colder than the combustion air"),
    /** A dew point below the triple point of water. */
    FROST_POINT("the water freezes out: this is the frost point, over ice"),
    /** A correction that magnifies every error of the O2 reading. */
    ILL_CONDITIONED("the O2 is close to that of air: the correction magnifies every error of the reading"),
    /** Moisture of the flue gas taken from the fuel's stoichiometry. */
    MOISTURE_COMPUTED("the moisture of the flue gas is computed from the fuel and dry air"),
    /** A setting follows from the number: people may be hurt. */
    SETTING_CAUTION("before you set a burner by this number: carbon monoxide and unburned fuel can kill; verify with a "
            + "calibrated analyzer, follow the local codes, leave it to licensed service");

    private final String sentence;

    EngineMessage(String sentence) {
        this.sentence = sentence;
    }

    @Override
    public String sentence() {
        return sentence;
    }
}
