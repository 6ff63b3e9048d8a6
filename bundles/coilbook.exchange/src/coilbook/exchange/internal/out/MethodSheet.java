package coilbook.exchange.internal.out;

import java.util.List;
import java.util.Map;

import coilbook.criteria.Criterion;
import coilbook.criteria.Verdict;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.FieldText;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Provenance;

/** The sheet that says how everything was judged: each criterion with its limit and source, the corners, where values come from, settings and constants. */
final class MethodSheet {

    static final String NAME = "Method";

    private static final List<Column> COLUMNS = List.of(Column.of("Section", 13), Column.of("Name", 24),
            Column.of("Question or meaning", 46),
            Column.of("Formula or value", 44), Column.of("Needs", 34), Column.of("Limit and its source", 42), Column.of("Hazard when", 28),
            Column.of("What can be done", 34));

    private static final Map<Verdict, String> VERDICTS = Map.of(Verdict.NONCONFORMITY, "the criterion is not met (ISO 9000)",
            Verdict.CONFORMITY,
            "the criterion is met (ISO 9000)", Verdict.OBSERVATION,
            "met, but with a small margin (common audit practice, no term of ISO 9000)",
            Verdict.UNDETERMINED, "a value is missing or contradictory; what is missing is named", Verdict.NOT_APPLICABLE,
            "the criterion does not arise; not counted");

    private static final Map<Provenance, String> PROVENANCES = Map.of(Provenance.MEASURED,
            "a reading taken on the piece or the circuit itself",
            Provenance.NAMEPLATE, "read from the plate or the strap at the station", Provenance.CATALOGUE,
            "from the maker's data of the type",
            Provenance.ESTIMATED, "worked out from other values by a stated rule", Provenance.ASSUMED, "taken for want of anything better");

    private final SheetOut out;

    MethodSheet(Book book) {
        this.out = book.sheet(NAME, COLUMNS, 2);
    }

    void write(List<Criterion> criteria, FleetSettings settings) throws CoilbookException {
        for (String caution : Cautions.ALL) {
            line("Caution", "", caution, "", "");
        }
        for (Criterion criterion : criteria) {
            out.begin();
            out.text("Criterion");
            out.text(criterion.id(), Use.LABEL);
            out.text(criterion.title(), Use.WRAPPED);
            out.text(criterion.formula(), Use.WRAPPED);
            out.text(String.join("; ", criterion.needs()), Use.WRAPPED);
            out.text(criterion.limitSource(), Use.WRAPPED);
            out.text(criterion.hazardRule(), Use.WRAPPED);
            out.text(String.join("; ", criterion.remedies()), Use.WRAPPED);
        }
        for (Verdict verdict : Verdict.values()) {
            line("Verdict", verdict.label(), VERDICTS.get(verdict), "", "");
        }
        line("Verdict", "hazard", "a nonconformity that can hurt somebody: shock, burn, fire", "", "");
        line("Verdict", "conceded",
                "a nonconformity accepted with a reason, by a person, until a date (ISO 9000: concession); counted apart", "", "");
        line("Corner", "low", "mains at the lowest of the market's tolerance and any reading; winding hot (and cold, for hold)",
                "pull-in, hold, recovery", "common practice, no source");
        line("Corner", "high", "mains at the highest; winding cold, resistance at its lower tolerance",
                "output current, bus stress, insulation",
                "common practice, no source");
        line("Corner", "hot", "mains at the highest; highest ambient; the resistance tolerance that heats most",
                "winding temperature, dissipation",
                "common practice, no source");
        line("Corner", "nominal", "nominal mains, nominal ambient", "what is shown first", "common practice, no source");
        for (Provenance provenance : Provenance.values()) {
            line("Provenance", provenance.label(), PROVENANCES.get(provenance), "", "");
        }
        for (Map.Entry<String, Double> setting : settings.all().entrySet()) {
            line("Fleet setting", setting.getKey(), "", FieldText.number(setting.getValue()),
                    "this fleet's own limit; where none was set, common practice, no source");
        }
        constants();
        out.end();
    }

    private void constants() throws CoilbookException {
        line("Constant", "copper, zero-resistance temperature", "R(θ) = R20 · (234.5 + θ) / (234.5 + 20), θ in °C", "234.5 K",
                "annealed copper; IEC 60034-1 uses 235");
        line("Constant", "peak of a sine", "peak = √2 · rms", "1.414214", "elementary");
        line("Constant", "mean of a rectified sine", "mean = 2√2/π · rms", "0.900316", "elementary integration");
        line("Constant", "current in a coil", "i(t) = V/R · (1 − e^(−t·R/L)) with the plunger open", "", "ordinary circuit theory");
        line("Constant", "cable loop", "R = 2 · length · conductor resistance, corrected to the conductor's temperature as copper", "",
                "ordinary circuit theory");
        line("Formula cells", "Stations and Circuits",
                "Where a figure has a closed form its cell holds the formula over the cells it rests on, and the value that was "
                        + "computed; a changed input changes the answer. Figures without formula come from the waveform (exact pieces between switching events).",
                "", "");
    }

    private void line(String section, String name, String meaning, String formula, String source) throws CoilbookException {
        out.begin();
        out.text(section);
        out.text(name, Use.LABEL);
        out.text(meaning, Use.WRAPPED);
        out.text(formula, Use.WRAPPED);
        out.skip();
        out.text(source, Use.WRAPPED);
    }
}
