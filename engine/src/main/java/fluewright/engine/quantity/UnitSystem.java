package fluewright.engine.quantity;

/** Which units results are shown in. Display only: stored values never change. */
public enum UnitSystem {
    /** International System, with the trade's degC, MJ and Nm3. */
    SI,
    /** United States customary. */
    US
}
