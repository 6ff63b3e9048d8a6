package coilbook.criteria;

import java.util.List;

import coilbook.electrics.StationElectrics;
import coilbook.fleet.StationView;

/** One question asked of a station; pure. Its id is stable: concessions and past audits refer to it. */
public interface Criterion {

    /** For example {@code pull-in-current}. */
    String id();

    /** The question in words. */
    String title();

    /** The heading it stands under in lists: mains to driver, driver to coil, temperature … */
    String group();

    Scope scope();

    /** The inputs it needs, in the words of the columns. */
    List<String> needs();

    /** The limit in words, and where it comes from: standard and clause, catalogue entry, "from memory" or "common practice, no source". */
    String limitSource();

    /** When breaking it can hurt someone, in words; empty if never. */
    String hazardRule();

    /** The formula as the Method sheet prints it; empty where the question is no computation. */
    String formula();

    /** The kinds of remedy there are, in words. */
    List<String> remedies();

    Finding judge(StationView station, StationElectrics electrics);
}
