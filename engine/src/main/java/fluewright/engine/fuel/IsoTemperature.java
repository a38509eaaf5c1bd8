package fluewright.engine.fuel;

/** The reference temperatures of ISO 6976:2016: all five for combustion, the first four for metering. */
public enum IsoTemperature {
    /** 0 degC. */
    T0(273.15, 45.064e3, 0.999419),
    /** 15 degC. */
    T15(288.15, 44.431e3, 0.999595),
    /** 60 degF, 15.55 degC. */
    T60F(288.70, 44.408e3, 0.999601),
    /** 20 degC. */
    T20(293.15, 44.222e3, 0.999645),
    /** 25 degC; combustion only. */
    T25(298.15, 44.013e3, Double.NaN);

    private final double kelvin;
    private final double vaporization;
    private final double airCompression;

    IsoTemperature(double kelvin, double vaporization, double airCompression) {
        this.kelvin = kelvin;
        this.vaporization = vaporization;
        this.airCompression = airCompression;
    }

    /** Returns the temperature [K]. */
    public double kelvin() {
        return kelvin;
    }

    /** Returns the heat of vaporization of water that the standard uses [J/mol]. */
    double vaporization() {
        return vaporization;
    }

    /** Returns the compression factor of dry air at 101.325 kPa [-]. */
    double airCompression() {
        return airCompression;
    }
}
