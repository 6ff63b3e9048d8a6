package coilbook.exchange.internal.in;

import static coilbook.exchange.internal.in.Books.read;
import static coilbook.exchange.internal.in.Books.rejected;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.Proxy;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.Consumer;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.ExchangeWriter;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.MarketView;
import coilbook.fleet.Progress;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.register.Register;

/** Rows of every kind with values drawn at random from all that their columns may hold are written and read back without a difference. */
class RandomRoundTripTest {

    private static final long SEED = 20_260_331;
    private static final int ROWS = 40;
    private static final String LETTERS = "abcXYZ019 -=+@'\"<>&;,.äßéΩ漢_x0041_\n";

    @TempDir
    Path folder;

    private final Random random = new Random(SEED);
    private final Map<Kind<?>, List<Row>> fleet = new LinkedHashMap<>();

    @Test
    void everyRowComesBackAsItWas() throws Exception {
        for (Kind<?> kind : Kind.ALL) {
            fleet.put(kind,
                    kind.type() == Supply.class || kind.type() == SettingChoice.class || kind.type() == Duty.class ? presentOfStations(kind)
                            : rows(kind));
        }
        Path file = folder.resolve("fleet.xlsx");
        new ExchangeWriter().write(register(), LocalDate.of(2026, 3, 31), file, Progress.NONE);
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        int compared = 0;
        for (Kind<?> kind : Kind.ALL) {
            List<RowPatch> patches = Books.of(incoming, kind.type());
            assertEquals(fleet.get(kind).size(), patches.size(), kind.sheet());
            for (int i = 0; i < patches.size(); i++) {
                Row row = fleet.get(kind).get(i);
                for (Map.Entry<Field, Object> entry : patches.get(i).values().entrySet()) {
                    assertEquals(entry.getKey().get(row), entry.getValue(), kind + " " + row.key() + " " + entry.getKey());
                    compared++;
                }
                assertTrue(patches.get(i).values().size() >= kind.fields().size() - 1, kind.sheet());
            }
        }
        assertTrue(compared > 8_000, "values compared: " + compared);
    }

    private List<Row> rows(Kind<?> kind) {
        Map<String, Row> rows = new LinkedHashMap<>();
        while (rows.size() < ROWS) {
            Row row = row(kind, Map.of());
            rows.putIfAbsent(row.key(), row);
        }
        return List.copyOf(rows.values());
    }

    private List<Row> presentOfStations(Kind<?> kind) {
        List<Row> rows = new ArrayList<>();
        for (Row station : fleet.get(Kind.of(Station.class))) {
            Map<String, Object> given = new LinkedHashMap<>();
            given.put("station", station.key());
            given.put("valid_to", null);
            given.put("circuit", ((Station) station).site() + "/M1");
            given.put("cycle_rate", Datum.measured(9));
            rows.add(row(kind, given));
        }
        return rows;
    }

    /** A row that its kind accepts; drawn again where an interval runs backwards. */
    private Row row(Kind<?> kind, Map<String, Object> given) {
        while (true) {
            Object[] values = new Object[kind.fields().size()];
            for (int i = 0; i < values.length; i++) {
                Field field = kind.fields().get(i);
                values[i] = given.containsKey(field.id()) ? given.get(field.id()) : value(kind, field);
            }
            if (kind.type() == Reading.class) {
                values[4] = ((ReadingQuantity) values[2]).unit().toSi(random.nextInt(1, 40_000) / 100.0);
            } else if (kind.type() == Station.class) {
                values[5] = values[5] == null ? null : values[0] + "/" + values[5];
            }
            try {
                return kind.create(values);
            } catch (InvalidValue e) {
                continue;
            }
        }
    }

    private Object value(Kind<?> kind, Field field) {
        if (!field.isRequired() && random.nextInt(4) == 0) {
            return null;
        }
        for (int tries = 0; tries < 10_000; tries++) {
            Object value = draw(kind, field);
            try {
                field.check(value);
                return value;
            } catch (InvalidValue e) {
                continue;
            }
        }
        throw new AssertionError("no value found for " + kind + " " + field);
    }

    private Object draw(Kind<?> kind, Field field) {
        return switch (field.type()) {
            case TEXT -> text(kind, field);
            case QUANTITY -> new Datum(number(), Provenance.values()[random.nextInt(5)]);
            case NUMBER -> number();
            case INTEGER -> random.nextInt(100);
            case YES_NO -> random.nextBoolean();
            case DATE -> LocalDate.of(2000, 1, 1).plusDays(random.nextInt(20_000));
            case DATE_TIME -> LocalDateTime.of(2000, 1, 1, 0, 0).plusSeconds(random.nextInt(1_000_000_000));
            case TERM -> field.terms().get(random.nextInt(field.terms().size()));
            case TEXTS -> List.of("one", "=two", "3");
            case MONEY -> BigDecimal.valueOf(random.nextInt(100_000), 2).stripTrailingZeros();
        };
    }

    /** Up to 14 digits, which is what people and catalogues write and every unit of a sheet can carry. */
    private double number() {
        double size = Math.pow(10, random.nextInt(-4, 6));
        return new BigDecimal(random.nextDouble() * size).round(new java.math.MathContext(random.nextInt(1, 15))).doubleValue();
    }

    private String text(Kind<?> kind, Field field) {
        boolean code = kind.type() == Site.class || kind.type() == Line.class;
        if (field.id().equals("country") && kind.type() == Site.class) {
            return List.of("DE", "JP", "NA", "NO").get(random.nextInt(4));
        } else if (field.id().equals("time_zone")) {
            return "Asia/Tokyo";
        }
        StringBuilder text = new StringBuilder();
        for (int i = random.nextInt(1, 12); i > 0; i--) {
            text.append(LETTERS.charAt(random.nextInt(LETTERS.length())));
        }
        String plain = text.toString().strip();
        return code ? plain.replace("/", "") : plain;
    }

    /** A register that only hands out the rows. */
    private Register register() {
        return (Register) Proxy.newProxyInstance(Register.class.getClassLoader(), new Class<?>[] { Register.class },
                (proxy, method, arguments) -> {
                    if (method.getName().equals("read") && arguments.length == 2) {
                        @SuppressWarnings("unchecked")
                        Consumer<Row> consumer = (Consumer<Row>) arguments[1];
                        fleet.get(arguments[0]).forEach(consumer);
                    } else if (method.getName().equals("stations")) {
                        @SuppressWarnings("unchecked")
                        Consumer<StationView> consumer = (Consumer<StationView>) arguments[2];
                        for (int i = 0; i < ROWS; i++) {
                            consumer.accept(view(i));
                        }
                    } else {
                        throw new UnsupportedOperationException(method.getName());
                    }
                    return null;
                });
    }

    private StationView view(int i) {
        return new StationView(LocalDate.of(2026, 3, 31), (Station) at(Station.class, i), null, null, null, (Supply) at(Supply.class, i),
                null, null,
                (SettingChoice) at(SettingChoice.class, i), null, List.of(), (Duty) at(Duty.class, i), null, null, null, null, null,
                List.of(), List.of(),
                List.of(), List.of(), Map.of(), new MarketView("DE", null, List.of(), List.of()), null);
    }

    private Row at(Class<? extends Row> type, int i) {
        return fleet.get(Kind.of(type)).get(i);
    }

    /** The sheets that were compared are all there are. */
    @Test
    void everyKindHasASheetOrStandsOnThatOfStations() {
        assertEquals(Kind.ALL.size(), ExchangeSheets.KINDS.size() + 3);
    }
}
