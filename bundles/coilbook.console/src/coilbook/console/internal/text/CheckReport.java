package coilbook.console.internal.text;

import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Predicate;

import com.fasterxml.jackson.core.JsonGenerator;

import coilbook.console.internal.Json;
import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Unit;
import coilbook.jobs.CheckedFleet;
import coilbook.register.Status;

/** Counts and findings of a checked fleet, for a person and for a program. Findings are never gathered in memory. */
public final class CheckReport {

    private static final String CAUTIONS = "Before anyone touches equipment: isolate and lock out, prove dead, wait for capacitors to discharge; hot "
            + "adhesive burns.\nThis says which criteria are met. Local codes and a licensed electrician decide what may be done.";

    private final CheckedFleet fleet;
    private final Map<String, List<String>> remedies;

    /** @param remedies kinds of remedy by criterion, to be named with each nonconformity; empty for none */
    public CheckReport(CheckedFleet fleet, Map<String, List<String>> remedies) {
        this.fleet = fleet;
        this.remedies = remedies;
    }

    /** Counts by verdict, hazards first. */
    public static void counts(PrintStream out, LocalDate asOf, Status.Counts counts) {
        out.println("Stations computed and judged as of " + asOf + ": " + counts.stations());
        line(out, "hazard", counts.hazards());
        line(out, "nonconformity", counts.nonconformities());
        line(out, "observation", counts.observations());
        line(out, "undetermined", counts.undetermined());
        line(out, "conceded", counts.conceded());
    }

    private static void line(PrintStream out, String word, long count) {
        out.println(String.format(Locale.ROOT, "  %-14s %8d", word, count));
    }

    /** What to heed before anyone acts on a report. */
    public static void cautions(PrintStream out) {
        out.println();
        out.println(CAUTIONS);
    }

    /** Counts, then every finding, the hazards first. */
    public void text(PrintStream out) throws CoilbookException {
        counts(out, fleet.asOf(), fleet.counts());
        section(out, "Hazards", f -> f.hazard() && !f.conceded());
        section(out, "Nonconformities", f -> f.verdict() == Verdict.NONCONFORMITY && !f.hazard() && !f.conceded());
        section(out, "Observations", f -> f.verdict() == Verdict.OBSERVATION && !f.conceded());
        section(out, "Undetermined", f -> f.verdict() == Verdict.UNDETERMINED && !f.conceded());
        section(out, "Conceded", Finding::conceded);
        cautions(out);
    }

    private void section(PrintStream out, String heading, Predicate<Finding> wanted) throws CoilbookException {
        boolean[] any = new boolean[1];
        fleet.findings(found -> {
            Finding finding = found.finding();
            if (!wanted.test(finding)) {
                return;
            }
            if (!any[0]) {
                any[0] = true;
                out.println();
                out.println(heading);
            }
            out.println("  " + place(found) + "  " + finding.criterion() + "  " + finding.evidence().sentence());
            List<String> kinds = remediesOf(finding);
            if (!kinds.isEmpty()) {
                out.println("      to consider: " + String.join("; ", kinds));
            }
        });
    }

    private static String place(Status.StationFinding found) {
        if (found.station() != null) {
            return found.station();
        } else if (found.line() != null) {
            return found.site() + "/" + found.line();
        }
        return found.site() == null ? "-" : found.site();
    }

    private List<String> remediesOf(Finding finding) {
        return finding.verdict() == Verdict.NONCONFORMITY ? remedies.getOrDefault(finding.criterion(), List.of()) : List.of();
    }

    /** Counts and findings, for a program. */
    public void json(PrintStream out) throws CoilbookException {
        Status.Counts counts = fleet.counts();
        Json.write(out, generator -> {
            head(generator, fleet.asOf(), counts);
            generator.writeArrayFieldStart("findings");
            fleet.findings(found -> {
                try {
                    write(generator, found);
                } catch (IOException e) {
                    throw new UncheckedIOException(e);
                }
            });
            generator.writeEndArray();
        });
    }

    /** Date and counts, as every report for a program begins. */
    public static void head(JsonGenerator generator, LocalDate asOf, Status.Counts counts) throws IOException {
        generator.writeStringField("asOf", asOf.toString());
        generator.writeNumberField("stations", counts.stations());
        generator.writeObjectFieldStart("counts");
        generator.writeNumberField("hazard", counts.hazards());
        generator.writeNumberField("nonconformity", counts.nonconformities());
        generator.writeNumberField("observation", counts.observations());
        generator.writeNumberField("undetermined", counts.undetermined());
        generator.writeNumberField("conceded", counts.conceded());
        generator.writeEndObject();
    }

    private void write(JsonGenerator generator, Status.StationFinding found) throws IOException {
        Finding finding = found.finding();
        Evidence evidence = finding.evidence();
        generator.writeStartObject();
        Json.text(generator, "site", found.site());
        Json.text(generator, "line", found.line());
        Json.text(generator, "station", found.station());
        generator.writeStringField("criterion", finding.criterion());
        generator.writeStringField("verdict", finding.verdict().label());
        generator.writeBooleanField("hazard", finding.hazard());
        Json.number(generator, "value", shown(evidence.value(), evidence.unit()));
        Json.number(generator, "limit", shown(evidence.limit(), evidence.unit()));
        Json.text(generator, "unit", evidence.unit().symbol());
        Json.text(generator, "corner", evidence.corner());
        generator.writeStringField("evidence", evidence.sentence());
        texts(generator, "missing", finding.missing());
        texts(generator, "remedies", remediesOf(finding));
        generator.writeBooleanField("conceded", finding.conceded());
        generator.writeEndObject();
    }

    private static double shown(double si, Unit unit) {
        return Double.isNaN(si) || Double.isInfinite(si) ? si : unit.fromSi(si);
    }

    private static void texts(JsonGenerator generator, String key, List<String> texts) throws IOException {
        generator.writeArrayFieldStart(key);
        for (String text : texts) {
            generator.writeString(text);
        }
        generator.writeEndArray();
    }
}
