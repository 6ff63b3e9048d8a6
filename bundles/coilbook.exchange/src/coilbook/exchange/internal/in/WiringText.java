package coilbook.exchange.internal.in;

import java.util.HashMap;
import java.util.Map;

import coilbook.fleet.Connection;
import coilbook.fleet.FieldText;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Circuit;
import coilbook.fleet.WiringSystem;

/**
 * A circuit's wiring in one cell: a system, a connection, or both ({@code star, L-N}).
 *
 * @param system {@code null} if not said
 * @param connection {@code null} if not said
 */
record WiringText(WiringSystem system, Connection connection) {

    private static final Map<String, WiringSystem> SYSTEMS = new HashMap<>();
    private static final Map<String, Connection> CONNECTIONS = new HashMap<>();

    static {
        add(SYSTEMS, WiringSystem.SINGLE_PHASE, "single phase", "1 phase", "1 ph", "1ph", "1 p", "1", "1~", "einphasig", "monophase",
                "monofasico");
        add(SYSTEMS, WiringSystem.SPLIT_PHASE, "split phase", "single phase three wire", "single phase 3 wire", "1 phase 3 wire");
        add(SYSTEMS, WiringSystem.STAR, "star", "wye", "y", "three phase star", "3 phase star", "three phase wye", "3 phase wye", "stern",
                "etoile", "estrella");
        add(SYSTEMS, WiringSystem.DELTA, "delta", "three phase delta", "3 phase delta", "dreieck", "triangle", "triangulo", "δ");
        add(SYSTEMS, WiringSystem.HIGH_LEG, "high leg", "high leg delta", "delta with high leg", "delta high leg");
        add(CONNECTIONS, Connection.LINE_TO_NEUTRAL, "l n", "ln", "line to neutral", "line neutral", "phase neutral", "p n", "l n pe",
                "phase to neutral");
        add(CONNECTIONS, Connection.LINE_TO_LINE, "l l", "ll", "line to line", "line line", "phase phase", "phase to phase", "p p", "l1 l2",
                "l l pe");
    }

    private static <T> void add(Map<String, T> map, T term, String... names) {
        for (String name : names) {
            map.put(Texts.fold(name), term);
        }
    }

    static WiringText parse(String heading, String text) throws InvalidValue {
        WiringText whole = one(text);
        if (whole != null) {
            return whole;
        }
        WiringSystem system = null;
        Connection connection = null;
        for (String piece : text.split("[,;/]|\\s-\\s")) {
            WiringText part = one(piece);
            if (part == null || part.system != null && system != null || part.connection != null && connection != null) {
                throw new InvalidValue(heading, text,
                        FieldText.expected(Kind.of(Circuit.class).field("system")) + ", and line to neutral or line to line");
            }
            system = part.system == null ? system : part.system;
            connection = part.connection == null ? connection : part.connection;
        }
        return new WiringText(system, connection);
    }

    private static WiringText one(String text) {
        String folded = Texts.fold(text);
        WiringSystem system = SYSTEMS.get(folded);
        Connection connection = CONNECTIONS.get(folded);
        return system == null && connection == null ? null : new WiringText(system, connection);
    }
}
