package coilbook.exchange.internal.in;

import java.util.List;

/** An open input file. */
interface InputFile extends AutoCloseable {

    /** The file's name without its folder, for messages. */
    String name();

    List<InputTable> tables();

    @Override
    void close();
}
