package coilbook.register.internal.store;

import java.util.IdentityHashMap;
import java.util.Map;

import coilbook.fleet.Kind;
import coilbook.fleet.Row;

/** The codec of every kind. */
public final class Codecs {

    private final Map<Kind<?>, RowCodec<?>> codecs = new IdentityHashMap<>();

    public Codecs() {
        KindTable.ALL.forEach(table -> codecs.put(table.kind(), new RowCodec<>(table)));
    }

    @SuppressWarnings("unchecked")
    public <R extends Row> RowCodec<R> of(Kind<R> kind) {
        return (RowCodec<R>) codecs.get(kind);
    }
}
