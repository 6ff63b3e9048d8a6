package coilbook.electrics.internal;

/** Takes the pieces of a cycle as they are settled, for a trace. Times since switch-on, s. */
interface SampleSink {

    /** The source voltage over a stretch is that of the piece. */
    void source(Piece piece, double start, double length);

    /** The coil current over a stretch is that of the piece. */
    void coil(Piece piece, double start, double length);
}
