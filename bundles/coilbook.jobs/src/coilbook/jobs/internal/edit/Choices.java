package coilbook.jobs.internal.edit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

import coilbook.fleet.Circuit;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Kind;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.jobs.internal.merge.References;
import coilbook.register.AsOf;
import coilbook.register.Register;
import coilbook.register.StatusColumn;

/** What a cell with choices may hold: codes of the catalogue, circuits of the site, settings of the driver fitted. */
public final class Choices {

    private Choices() {
    }

    public static List<String> of(Register register, String station, StatusColumn column, LocalDate today) throws CoilbookException {
        EditColumns.Target target = EditColumns.target(column);
        if (target == null || !EditColumns.hasChoices(column)) {
            return List.of();
        }
        TreeSet<String> codes = new TreeSet<>();
        if (target.part() != null) {
            register.read(References.catalogue(target.part()), row -> codes.add(row.key()));
            return new ArrayList<>(codes);
        }
        StationView view = register.station(station, AsOf.on(today));
        if (view == null) {
            return List.of();
        }
        if (target.row() == SettingChoice.class) {
            for (InputSetting setting : view.settings()) {
                codes.add(setting.code());
            }
        } else if (target.row() == Supply.class) {
            register.read(Kind.of(Circuit.class), circuit -> {
                if (circuit.site().equals(view.station().site())) {
                    codes.add(circuit.code());
                }
            });
        }
        return new ArrayList<>(codes);
    }
}
