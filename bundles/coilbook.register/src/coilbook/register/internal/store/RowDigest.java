package coilbook.register.internal.store;

import java.io.DataOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.HexFormat;
import java.util.List;

import coilbook.fleet.Datum;
import coilbook.fleet.Labelled;

/**
 * SHA-256 over values in one canonical form: each with its type and length, so that no two lists of values give the same bytes. Used for the journal's
 * chain and for the fingerprints of status rows.
 */
public final class RowDigest {

    private final MessageDigest digest;
    private final DataOutputStream out;

    public RowDigest() {
        try {
            digest = MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
        out = new DataOutputStream(new java.io.BufferedOutputStream(new DigestOutputStream(OutputStream.nullOutputStream(), digest), 4096));
    }

    /** Takes one value; {@code null} too. */
    public RowDigest add(Object value) {
        try {
            write(value);
            return this;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Takes many values and their number. */
    public RowDigest addAll(Object[] values) {
        add(values.length);
        for (Object value : values) {
            add(value);
        }
        return this;
    }

    /** The added zero turns a negative zero, which the database does not keep, into zero. */
    private void write(Object value) throws IOException {
        if (value == null) {
            out.writeByte(0);
        } else if (value instanceof Datum datum) {
            out.writeByte(1);
            out.writeDouble(datum.value() + 0.0);
            out.writeByte(datum.provenance().ordinal());
        } else if (value instanceof Double number) {
            out.writeByte(2);
            out.writeDouble(number + 0.0);
        } else if (value instanceof Long || value instanceof Integer) {
            out.writeByte(3);
            out.writeLong(((Number) value).longValue());
        } else if (value instanceof Boolean yes) {
            out.writeByte(yes ? 5 : 4);
        } else if (value instanceof List<?> list) {
            out.writeByte(6);
            addAll(list.toArray());
        } else {
            out.writeByte(7);
            text(value instanceof Labelled term ? term.label()
                    : value instanceof BigDecimal amount ? amount.stripTrailingZeros().toPlainString()
                            : value instanceof LocalDateTime time ? time.truncatedTo(ChronoUnit.MICROS).toString() : value.toString());
        }
    }

    private void text(String text) throws IOException {
        out.writeInt(text.length());
        out.writeChars(text);
    }

    /** The digest of everything taken so far, in hex; nothing may be added afterwards. */
    public String hex() {
        try {
            out.flush();
            return HexFormat.of().formatHex(digest.digest());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
