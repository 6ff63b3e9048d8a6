package coilbook.register.internal.read;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

import coilbook.criteria.MarketTables;
import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Controller;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverType;
import coilbook.fleet.FleetSetting;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.MarketMains;
import coilbook.fleet.MarketMark;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.MarketView;
import coilbook.fleet.Row;
import coilbook.fleet.Site;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.Versions;

/**
 * The rows that many stations share (places, circuits, catalogue, market tables, settings), as they were known at one sequence. They are few beside
 * the stations and are held while that state is read.
 */
public final class GroupRows {

    /** The kinds held here; a Change of any of them makes the held rows old. */
    public static final Set<Class<? extends Row>> KINDS = Set.of(Customer.class, Site.class, Line.class, Circuit.class,
            TransformerType.class,
            Controller.class, ValveType.class, CoilType.class, DriverType.class, InputSetting.class, CableType.class, MarketMains.class,
            MarketTolerance.class, MarketMark.class, FleetSetting.class);

    private final Map<Class<?>, Map<String, Row>> rows;
    private final Map<String, List<InputSetting>> settings = new HashMap<>();
    private final Map<String, MarketView> markets = new HashMap<>();
    private final FleetSettings fleetSettings;

    private GroupRows(Map<Class<?>, Map<String, Row>> rows) {
        this.rows = rows;
        for (InputSetting setting : all(InputSetting.class)) {
            settings.computeIfAbsent(setting.driverType(), type -> new ArrayList<>()).add(setting);
        }
        settings.replaceAll((type, list) -> List.copyOf(list));
        this.fleetSettings = FleetSettings.of(all(FleetSetting.class));
        for (Site site : all(Site.class)) {
            markets.computeIfAbsent(site.country(), this::market);
        }
    }

    /** Reads the rows as they were known at a sequence. */
    public static GroupRows load(Connection connection, Codecs codecs, long known) throws SQLException {
        Map<Class<?>, Map<String, Row>> rows = new HashMap<>();
        for (Class<? extends Row> type : KINDS) {
            rows.put(type, load(connection, codecs, Kind.of(type), known));
        }
        return new GroupRows(rows);
    }

    private static <R extends Row> Map<String, Row> load(Connection connection, Codecs codecs, Kind<R> kind, long known)
            throws SQLException {
        Map<String, Row> found = new TreeMap<>();
        new Versions<>(codecs.of(kind)).each(connection, KindTable.knownAt(known), List.of(),
                version -> found.put(version.key(), version.row()));
        return found;
    }

    private MarketView market(String country) {
        List<Row> tables = new ArrayList<>(all(MarketMains.class));
        tables.addAll(all(MarketTolerance.class));
        tables.addAll(all(MarketMark.class));
        return MarketTables.view(country, tables);
    }

    /** The row of a key, or {@code null}. */
    public <R extends Row> R find(Class<R> type, String key) {
        return key == null ? null : type.cast(rows.get(type).get(key));
    }

    /** Every row of a kind in the order of the keys. */
    @SuppressWarnings("unchecked")
    public <R extends Row> List<R> all(Class<R> type) {
        return (List<R>) List.copyOf(rows.get(type).values());
    }

    /** All input settings of a driver type. */
    public List<InputSetting> settings(String driverType) {
        return settings.getOrDefault(driverType, List.of());
    }

    /** What the market tables say of a site's country. */
    public MarketView market(Site site) {
        return markets.get(site.country());
    }

    public FleetSettings fleetSettings() {
        return fleetSettings;
    }
}
