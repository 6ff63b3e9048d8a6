package coilbook.register;

import java.time.Instant;

/**
 * One recorded Change.
 *
 * @param seq counts from 1 without gaps
 * @param compensates the sequence it takes back, or 0
 * @param rows how many rows it changed
 * @param digest SHA-256 over this entry, its rows and the digest before, in hex
 */
public record JournalEntry(long seq, String who, Instant when, String why, long compensates, int rows, String digest) {
}
