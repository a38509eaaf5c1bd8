package fluewright.engine.fuel;

/** What the mass shares of an ultimate analysis are counted on. */
public enum AnalysisBasis {
    /** The fuel as received: all shares, moisture and ash included, make 100 %. */
    AS_RECEIVED("as received"),
    /** The dry fuel: all shares, ash included, make 100 %; moisture is that as received. */
    DRY("dry"),
    /** The dry fuel without its ash: the elements make 100 %; ash is that of the dry fuel, moisture that as received. */
    DRY_ASH_FREE("dry ash-free");

    private final String label;

    AnalysisBasis(String label) {
        this.label = label;
    }

    /** Returns the words for people and files. */
    public String label() {
        return label;
    }
}
