package coilbook.criteria;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Locale;

import coilbook.criteria.internal.market.TableReader;
import coilbook.fleet.Kind;
import coilbook.fleet.MarketMains;
import coilbook.fleet.MarketMark;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.MarketView;
import coilbook.fleet.Row;

/**
 * What countries' mains are and which marks they ask for: the tables a new register starts with, and what they say of one country. Every row names its
 * source; the rows are the register's own to change afterwards.
 */
public final class MarketTables {

    /** The country of a tolerance that counts where no other row fits. */
    public static final String ANY_COUNTRY = "*";

    private MarketTables() {
    }

    /** Every shipped row: mains, tolerances, marks; read afresh at each call. */
    public static List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        rows.addAll(TableReader.read("mains_by_country.tsv", Kind.of(MarketMains.class)));
        rows.addAll(TableReader.read("tolerances.tsv", Kind.of(MarketTolerance.class)));
        rows.addAll(TableReader.read("marks.tsv", Kind.of(MarketMark.class)));
        return List.copyOf(rows);
    }

    /**
     * What the rows say of a country. The bands of the country itself come first, those for any country after them, so that a nominal voltage outside
     * the country's own rows still has a band.
     *
     * @param country ISO 3166 code; may be {@code null}
     * @param rows any rows; those of other kinds are passed over
     */
    public static MarketView view(String country, Collection<? extends Row> rows) {
        String code = country == null ? "" : country.strip().toUpperCase(Locale.ROOT);
        MarketMains mains = null;
        List<MarketTolerance> own = new ArrayList<>();
        List<MarketTolerance> any = new ArrayList<>();
        List<MarketMark> marks = new ArrayList<>();
        for (Row row : rows) {
            if (row instanceof MarketMains candidate && candidate.country().equals(code)) {
                mains = candidate;
            } else if (row instanceof MarketTolerance tolerance) {
                if (tolerance.country().equals(code)) {
                    own.add(tolerance);
                } else if (tolerance.country().equals(ANY_COUNTRY)) {
                    any.add(tolerance);
                }
            } else if (row instanceof MarketMark mark && mark.country().equals(code)) {
                marks.add(mark);
            }
        }
        own.addAll(any);
        return new MarketView(code, mains, own, marks);
    }
}
