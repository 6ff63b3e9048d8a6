package coilbook.jobs.internal.demo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;

import org.junit.jupiter.api.Test;

import coilbook.criteria.Assessment;
import coilbook.criteria.Assessor;
import coilbook.criteria.Criteria;
import coilbook.criteria.Criterion;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.Row;
import coilbook.fleet.Station;

/** What the demo invents, judged: faults are found where they were planted, and the rest mostly belongs together. */
class FaultsTest {

    private static final LocalDate DAY = LocalDate.of(2026, 11, 30);

    private static List<Assessment> judged(long seed, int from, int stations) {
        Views views = new Views(DAY);
        DemoCatalogue.rows().forEach(views::add);
        FleetInventor inventor = new FleetInventor(seed);
        List<Station> invented = new ArrayList<>();
        for (int i = 0; i < from + stations; i++) {
            for (Row row : inventor.station(i)) {
                views.add(row);
                if (row instanceof Station station && i >= from) {
                    invented.add(station);
                }
            }
        }
        Assessor assessor = new Assessor();
        return invented.stream().map(station -> assessor.assess(views.of(station))).toList();
    }

    private static Set<String> broken(Assessment assessment) {
        return assessment.findings().stream().filter(f -> f.verdict() == Verdict.NONCONFORMITY).map(Finding::criterion)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    @Test
    void everyCriterionThereIsHasAWayToBreakIt() {
        assertEquals(Criteria.all().stream().map(Criterion::id).sorted().toList(), Faults.criteria().stream().sorted().toList());
    }

    @Test
    void aPlantedFaultIsFoundWhereItWasPlanted() {
        List<Assessment> judged = judged(11, 0, 9 * Faults.criteria().size() * 6);
        Map<String, Integer> missed = new TreeMap<>();
        Map<String, Integer> planted = new TreeMap<>();
        for (int i = 4; i < judged.size(); i += 9) {
            String criterion = Faults.criteria().get(i / 9 % Faults.criteria().size());
            planted.merge(criterion, 1, Integer::sum);
            if (!broken(judged.get(i)).contains(criterion)) {
                missed.merge(criterion + " in " + judged.get(i).station().site().country(), 1, Integer::sum);
            }
        }
        assertEquals(Faults.criteria().size(), planted.size());
        assertTrue(missed.isEmpty(), missed::toString);
    }

    @Test
    void stationsWithoutAPlantedFaultMostlyConform() {
        List<Assessment> judged = judged(5, 0, 240);
        Map<String, Integer> found = new HashMap<>();
        int plain = 0;
        int sound = 0;
        for (int i = 0; i < judged.size(); i++) {
            if (i % 9 != 4) {
                plain++;
                Set<String> broken = broken(judged.get(i));
                sound += broken.isEmpty() ? 1 : 0;
                String place = judged.get(i).station().site().country() + " " + judged.get(i).station().driver().code() + " "
                        + judged.get(i).station().coil().code();
                broken.forEach(criterion -> found.merge(criterion + " " + place, 1, Integer::sum));
            }
        }
        int share = 100 * sound / plain;
        assertTrue(share >= 90, () -> share + " % of the plain stations conform; broken: " + new TreeMap<>(found));
    }

    @Test
    void anyTwoHundredStationsShowAtLeastTenCriteria() {
        for (long seed = 1; seed <= 2; seed++) {
            for (int from : List.of(0, 137)) {
                Set<String> shown = new TreeSet<>();
                judged(seed, from, 200).forEach(assessment -> shown.addAll(broken(assessment)));
                assertTrue(shown.size() >= 10, shown::toString);
            }
        }
    }

    @Test
    void theFirstStationsDoNotDependOnHowManyFollowAndSeedsDiffer() {
        List<Row> one = new ArrayList<>();
        List<Row> other = new ArrayList<>();
        List<Row> another = new ArrayList<>();
        FleetInventor first = new FleetInventor(1);
        FleetInventor second = new FleetInventor(1);
        FleetInventor third = new FleetInventor(2);
        for (int i = 0; i < 60; i++) {
            one.addAll(first.station(i));
            other.addAll(second.station(i));
            another.addAll(third.station(i));
        }
        assertEquals(one, other);
        assertTrue(!one.equals(another), "two seeds give the same fleet");
    }

    @Test
    void sixtyStationsStandInEightCountriesOfBothMainsFamilies() {
        List<Assessment> judged = judged(1, 0, 60);
        assertTrue(judged.stream().map(a -> a.station().site().country()).distinct().count() >= 8);
        assertTrue(judged.stream().anyMatch(a -> a.station().circuit().nominalFrequency().value() == 50));
        assertTrue(judged.stream().anyMatch(a -> a.station().circuit().nominalFrequency().value() == 60));
    }
}
