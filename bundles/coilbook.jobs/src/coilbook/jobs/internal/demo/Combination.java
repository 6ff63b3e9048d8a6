package coilbook.jobs.internal.demo;

import java.util.List;

/** Parts that stand together at a station; codes of the invented catalogue. The cable is chosen by place. */
record Combination(String valve, String coil, double coilOhms, String driver, String setting) {

    /** What belongs together on about 100 to 127 V. */
    private static final List<Combination> LOW = List.of(new Combination("TV-M30", "KM-24", 12.4, "DUO-44", "P115"),
            new Combination("TV-M30", "KM-36", 27.5, "DUO-66", "P115"), new Combination("TV-M30", "KM-48", 46, "DUO-88", "P115"),
            new Combination("TV-M30", "KM-24", 12.4, "DUO-44W", "W"), new Combination("TV-M30", "KD-24", 58, "STEP-24", "A"),
            new Combination("TV-M45", "KM-115", 285, "CAP-120", "120"));
    /** What belongs together on 100 V, where the line-operated driver is another one. */
    private static final List<Combination> JAPAN = List.of(LOW.get(0), LOW.get(1), LOW.get(2), LOW.get(3), LOW.get(4),
            new Combination("TV-M45", "KM-115", 285, "CAP-100", "100"));
    /** What belongs together on about 220 to 240 V. */
    private static final List<Combination> HIGH = List.of(new Combination("TV-M30", "KM-24", 12.4, "DUO-44", "S230"),
            new Combination("TV-M30", "KM-36", 27.5, "DUO-66", "S230"), new Combination("TV-M30", "KM-48", 46, "DUO-88", "S230"),
            new Combination("TV-M30", "KM-24", 12.4, "DUO-44W", "W"), new Combination("TV-M30", "KD-24", 58, "STEP-24", "B"),
            new Combination("TV-M45", "KM-230", 1140, "CAP-230", "230"));

    /** What may stand in a market; the first is the commonest. */
    static List<Combination> of(Market market) {
        if (!market.isLow()) {
            return HIGH;
        }
        return "JP".equals(market.country()) ? JAPAN : LOW;
    }
}
