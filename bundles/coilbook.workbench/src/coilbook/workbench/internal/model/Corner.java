package coilbook.workbench.internal.model;

/** At which mains and temperature a waveform is shown. */
public enum Corner {
    /** Lowest mains, winding hot: the least current. */
    LOW,
    /** Nominal mains and temperature. */
    NOMINAL,
    /** Highest mains, winding cold: the most current. */
    HIGH,
    /** Highest mains and ambient: the most heat. */
    HOT
}
