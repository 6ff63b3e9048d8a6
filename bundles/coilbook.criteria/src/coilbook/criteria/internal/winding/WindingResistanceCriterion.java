package coilbook.criteria.internal.winding;

import java.util.List;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.DescribedCriterion;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.Names;
import coilbook.criteria.internal.station.WindingReading;
import coilbook.criteria.internal.station.WindingResistance;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The newest reading of this coil, corrected to 20 °C, lies in its type's tolerance; without a temperature only what lies wholly on one side is judged. */
public final class WindingResistanceCriterion extends DescribedCriterion {

    public WindingResistanceCriterion() {
        super(new Description("winding-resistance", "Does the winding’s resistance, corrected to 20 °C, lie in its type’s tolerance?",
                "winding condition", Scope.STATION,
                List.of("Reading of winding resistance", "Temperature of the reading", "Resistance at 20 °C", "Resistance tolerance"),
                "Resistance at 20 °C and its tolerance (catalogue entry of the coil type; 10 % assumed where it states none)", "",
                "R₂₀ = R · (234.5 + 20) / (234.5 + θ) (resistance method, copper); R₂₀,type · (1 − tolerance) ≤ R₂₀ ≤ R₂₀,type · (1 + tolerance)",
                List.of("measure again with the winding’s temperature", "another coil", "look at joints and connector")));
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        if (station.coil() == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.COIL, station)));
        }
        WindingReading reading = WindingReading.of(station);
        if (reading == null) {
            return judgement().notYetRecorded(Names.ofStation("Reading of winding resistance", station),
                    "No winding resistance of this coil has been read yet");
        }
        Fact nominal = Fact.of(station.coil().resistance20(), () -> Names.ofCoil("Resistance at 20 °C", station));
        Fact tolerance = WindingResistance.typeTolerance(station);
        if (!nominal.isKnown()) {
            return judgement().undetermined(nominal.missing());
        }
        return judge(station, reading, nominal, tolerance);
    }

    private Finding judge(StationView station, WindingReading reading, Fact nominal, Fact tolerance) {
        double least = nominal.value() * (1 - tolerance.value());
        double most = nominal.value() * (1 + tolerance.value());
        Judgement judgement = judgement().restsOn(Fact.weakest(nominal, tolerance)).restsOn(Provenance.MEASURED)
                .number("Reading", reading.reading().value(), Unit.OHM).number("Winding temperature", reading.coldest(), Unit.CELSIUS)
                .number("Resistance at 20 °C, type", nominal.value(), Unit.OHM)
                .number("Resistance tolerance", tolerance.value(), Unit.PERCENT)
                .number("Lowest", least, Unit.OHM).number("Highest", most, Unit.OHM)
                .number("Uncertainty", reading.uncertainty(), Unit.PERCENT);
        String read = "Read " + Shown.of(reading.reading().value(), Unit.OHM) + " on " + reading.reading().takenAt().toLocalDate();
        String corrected = reading.hasTemperature()
                ? read + " at " + Shown.of(reading.coldest(), Unit.CELSIUS) + ", " + Shown.of(reading.lowest(), Unit.OHM) + " at 20 °C"
                : read + ", winding temperature not recorded and taken as " + Shown.of(reading.coldest(), Unit.CELSIUS) + " to "
                        + Shown.of(reading.hottest(), Unit.CELSIUS) + ", " + Shown.of(reading.lowest(), Unit.OHM) + " to "
                        + Shown.of(reading.highest(), Unit.OHM) + " at 20 °C";
        String band = "; type " + station.coil().code() + " has " + Shown.of(least, Unit.OHM) + " to " + Shown.of(most, Unit.OHM);
        if (!Compare.atLeast(reading.highest(), least)) {
            return judgement.compared(reading.highest(), least, Unit.OHM).is(Verdict.NONCONFORMITY,
                    corrected + band + ": low, as with shorted turns or another coil");
        } else if (!Compare.atMost(reading.lowest(), most)) {
            return judgement.compared(reading.lowest(), most, Unit.OHM).is(Verdict.NONCONFORMITY,
                    corrected + band + ": high, as with a bad joint, an open winding or another coil");
        } else if (!Compare.atLeast(reading.lowest(), least) || !Compare.atMost(reading.highest(), most)) {
            return judgement.undetermined(List.of(Names.ofStation("Temperature of the reading of winding resistance", station)),
                    corrected + band);
        } else if (!reading.inDate()) {
            return judgement.undetermined(
                    List.of(Names.ofStation("Reading of winding resistance no older than the fleet’s interval", station)),
                    corrected + band + "; the reading is out of date");
        }
        boolean nearLeast = reading.lowest() - least < most - reading.highest();
        return judgement.compared(nearLeast ? reading.lowest() : reading.highest(), nearLeast ? least : most, Unit.OHM).is(
                Verdict.CONFORMITY,
                corrected + band);
    }
}
