package coilbook.exchange;

import java.util.List;

import coilbook.fleet.InputProblem;

/**
 * What input files say, before it is compared with a register. A line is taken whole or not at all: one value that cannot be taken rejects its line.
 *
 * @param read how many lines were read (headings, blanks and totals not counted; rejected lines are)
 * @param patches in an order in which a row comes after those it refers to
 * @param rejected what could not be taken, in the order of the files
 * @param notices what a person should know though nothing is wrong: columns nobody asked for, rows passed over
 * @param partial whether a workbook said that it holds part of a fleet
 * @param pastDate whether a workbook said that it shows a past date, which import refuses
 */
public record Incoming(int read, List<RowPatch> patches, List<InputProblem> rejected, List<InputProblem> notices, boolean partial,
        boolean pastDate) {

    public Incoming {
        patches = List.copyOf(patches);
        rejected = List.copyOf(rejected);
        notices = List.copyOf(notices);
    }

    public Incoming(int read, List<RowPatch> patches, List<InputProblem> rejected, boolean partial, boolean pastDate) {
        this(read, patches, rejected, List.of(), partial, pastDate);
    }
}
