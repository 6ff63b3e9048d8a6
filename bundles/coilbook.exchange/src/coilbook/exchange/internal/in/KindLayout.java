package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.ExchangeSheets.SheetColumn;
import coilbook.fleet.Duty;
import coilbook.fleet.Kind;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;

/** The columns of one kind's sheet in the exchange workbook. */
final class KindLayout implements Layout {

    static final String PROVENANCE = ".provenance";

    private final Kind<?> kind;
    private final Map<String, Named> byName = new LinkedHashMap<>();
    private final Map<String, Target> byId = new LinkedHashMap<>();

    KindLayout(Kind<?> kind) {
        this.kind = kind;
        for (SheetColumn column : ExchangeSheets.columns(kind)) {
            boolean provenance = column.field() == null;
            String id = column.kind().id() + (provenance ? PROVENANCE : "." + column.field().id());
            String heading = provenance ? column.heading() : column.field().heading();
            Target target = new Target(id, column.heading(), column.kind(), column.field(), null);
            byId.put(id, target);
            byName.put(Texts.fold(heading), new Named(target, ""));
        }
        byName.putIfAbsent(Texts.fold(ExchangeSheets.PROVENANCE), new Named(Target.IGNORED, ""));
    }

    Kind<?> kind() {
        return kind;
    }

    boolean isStations() {
        return kind.type() == Station.class;
    }

    /** The kinds whose rows a line of this sheet makes, its own first. */
    List<Kind<?>> kinds() {
        return isStations() ? List.of(kind, Kind.of(Supply.class), Kind.of(SettingChoice.class), Kind.of(Duty.class)) : List.of(kind);
    }

    @Override
    public String name() {
        return kind.sheet();
    }

    @Override
    public Named find(String foldedHeading) {
        return byName.get(foldedHeading);
    }

    @Override
    public Target byId(String id) {
        return byId.get(id);
    }

    @Override
    public List<String> missing(Set<String> ids) {
        List<String> missing = new ArrayList<>();
        kind.fields().stream().filter(field -> field.isRequired() && !ids.contains(kind.id() + "." + field.id()))
                .forEach(field -> missing.add(field.headingWithUnit()));
        return missing;
    }

    /** Whether the columns of the key are there, so that a line can be told from another. */
    boolean hasKeys(Set<String> ids) {
        return kind.keyFields().stream().allMatch(field -> !field.isRequired() || ids.contains(kind.id() + "." + field.id()));
    }

    @Override
    public Collection<String> names() {
        return byName.keySet();
    }
}
