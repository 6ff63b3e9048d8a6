package coilbook.register;

import coilbook.fleet.CoilbookException;

/** The status rows of one past state. They are complete from the beginning and never change; they are gone once closed. */
public interface PastStatus extends Status, AutoCloseable {

    @Override
    void close() throws CoilbookException;
}
