package coilbook.jobs.internal.demo;

/** What one invented station is to be, before it becomes rows. A planted fault alters it. Values in SI, temperatures in °C. */
final class StationPlan {

    final Market market;
    final int index;
    String valve;
    String coil;
    double coilOhms;
    String driver;
    String setting;
    String circuit = "C1";
    String cable = "LC-2x0.75";
    Double cableLength;
    double rate;
    double onTime;
    Double coilAmbientHighest;
    /** Winding resistance measured, at {@link #readingTemperature}; {@code null} for none. */
    Double winding;
    double readingTemperature = 22;
    String coilSerial;

    StationPlan(Market market, int index) {
        this.market = market;
        this.index = index;
    }

    void use(Combination combination) {
        valve = combination.valve();
        coil = combination.coil();
        coilOhms = combination.coilOhms();
        driver = combination.driver();
        setting = combination.setting();
    }

    /** The commonest combination of the market: a two-level driver. */
    void useTwoLevel() {
        use(Combination.of(market).get(0));
    }

    boolean isLineOperated() {
        return driver.startsWith("CAP-");
    }

    void useCoil(String code, double ohms) {
        coil = code;
        coilOhms = ohms;
    }
}
