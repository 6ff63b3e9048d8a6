package coilbook.jobs.internal.demo;

import java.util.List;

import coilbook.fleet.Connection;
import coilbook.fleet.WiringSystem;

/**
 * Where an invented plant can stand.
 *
 * @param country ISO 3166 code
 * @param region two letters of the site's code where a country has more than one supply; else the country
 * @param volts nominal voltage of the ordinary circuit, V
 * @param hertz nominal frequency
 * @param otherVolts nominal voltage of the site's other circuit, V: the higher one in countries of about 120 V
 */
record Market(String country, String region, String timeZone, double volts, double hertz, double otherVolts, WiringSystem system,
        Connection connection) {

    /** Both mains families, both Japanese frequencies, and countries with two voltages. The first eight are eight countries. */
    static final List<Market> ALL = List.of(
            new Market("DE", "DE", "Europe/Berlin", 230, 50, 230, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("US", "US", "America/Chicago", 120, 60, 240, WiringSystem.SPLIT_PHASE, Connection.LINE_TO_NEUTRAL),
            new Market("JP", "JE", "Asia/Tokyo", 100, 50, 200, WiringSystem.SPLIT_PHASE, Connection.LINE_TO_NEUTRAL),
            new Market("BR", "BR", "America/Sao_Paulo", 127, 60, 220, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("GB", "GB", "Europe/London", 230, 50, 230, WiringSystem.SINGLE_PHASE, Connection.LINE_TO_NEUTRAL),
            new Market("MX", "MX", "America/Mexico_City", 127, 60, 220, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("IN", "IN", "Asia/Kolkata", 230, 50, 230, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("ZA", "ZA", "Africa/Johannesburg", 230, 50, 230, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("JP", "JW", "Asia/Tokyo", 100, 60, 200, WiringSystem.SPLIT_PHASE, Connection.LINE_TO_NEUTRAL),
            new Market("CN", "CN", "Asia/Shanghai", 220, 50, 220, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("KR", "KR", "Asia/Seoul", 220, 60, 220, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL),
            new Market("AU", "AU", "Australia/Melbourne", 230, 50, 230, WiringSystem.STAR, Connection.LINE_TO_NEUTRAL));

    boolean isLow() {
        return volts < 160;
    }

    /** The circuit whose voltage is above 160 V. */
    String highCircuit() {
        return isLow() ? "C2" : "C1";
    }
}
