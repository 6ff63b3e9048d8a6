package coilbook.register.internal.status;

import coilbook.fleet.StationView;

/** Computes and judges a station; safe to call from many threads at once. */
public interface Judging {

    Judged judge(StationView station);

    /** What a result depends on beside the station: it changes when the electrics or the criteria do. */
    String version();
}
