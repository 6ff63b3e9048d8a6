package coilbook.criteria.internal.records;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.DescribedCriterion;
import coilbook.criteria.internal.Description;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Fitting;
import coilbook.fleet.StationView;

/** An item, known by its kind and serial number, is at one place at a time. */
public final class SerialUnique extends DescribedCriterion {

    public SerialUnique() {
        super(new Description("serial-unique", "Is every item with a serial number at one place at a time?", "records", Scope.ITEM,
                List.of("Serial of what is fitted"), "One piece cannot be at two places (common practice, no source)", "", "",
                List.of("look at the nameplates and correct the record")));
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        List<String> doubles = new ArrayList<>();
        int items = 0;
        for (Fitting fitting : station.fittings()) {
            String key = fitting.itemKey();
            if (key == null) {
                continue;
            }
            items++;
            TreeSet<String> elsewhere = new TreeSet<>(station.itemPlaces().getOrDefault(key, List.of()));
            elsewhere.remove(station.code());
            if (!elsewhere.isEmpty()) {
                doubles.add(fitting.kind().label() + " " + fitting.serial() + " is also recorded at " + String.join(", ", elsewhere));
            }
        }
        if (!doubles.isEmpty()) {
            String sentence = String.join("; ", doubles);
            return judgement().is(Verdict.NONCONFORMITY, Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1));
        } else if (items == 0) {
            return judgement().notApplicable("Nothing fitted here has a recorded serial number");
        }
        return judgement().is(Verdict.CONFORMITY, items == 1 ? "The one item with a serial number is recorded only here"
                : "All " + items + " items with a serial number are recorded only here");
    }
}
