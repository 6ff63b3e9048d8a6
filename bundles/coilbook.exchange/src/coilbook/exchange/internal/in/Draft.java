package coilbook.exchange.internal.in;

import coilbook.exchange.RowPatch;

/** What a line says of one row, and how that joins what other lines say of the same row. */
record Draft(RowPatch patch, Mode mode) {

    enum Mode {
        /** The line stands for the row: no second line may. */
        OWN,
        /** Many lines name the row; what they say must agree. */
        SHARED,
        /** Many lines name a catalogue entry; where they contradict one another, nothing is taken. */
        TYPE,
        /** Many lines may name a piece by mistake, which is a finding and not a fault of the file: the first counts. */
        FIRST,
        /** The row belongs to a row that only this line stands for. */
        CHILD
    }
}
