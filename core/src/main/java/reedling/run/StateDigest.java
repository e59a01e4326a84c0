// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.BufferedOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.List;
import reedling.math.Lanes;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * SHA-256 of a simulation's state: time, step, grains in the order of their ids, structures, histories of contacts in
 * the order of the ids they join, feeds. Two runs with the same digest are in the same state, bit for bit; the number of
 * threads does not enter.
 */
public final class StateDigest {

    private final Simulation simulation;

    private StateDigest(Simulation simulation) {
        this.simulation = simulation;
    }

    /** Digest as 64 hexadecimal digits; one thread, between steps. */
    public static String of(Simulation simulation) {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            try (DataOutputStream out = new DataOutputStream(new BufferedOutputStream(
                    new DigestOutputStream(OutputStream.nullOutputStream(), digest), 1 << 16))) {
                new StateDigest(simulation).write(out);
            }
            return HexFormat.of().formatHex(digest.digest());
        } catch (NoSuchAlgorithmException missing) {
            throw new IllegalStateException("every Java platform has SHA-256", missing);
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
    }

    private void write(DataOutputStream out) throws IOException {
        out.writeDouble(simulation.time());
        out.writeLong(simulation.stepCount());
        writeGrains(out);
        simulation.model().structure().write(out);
        writeContacts(simulation.interactions().pairRows(), true, out);
        writeContacts(simulation.interactions().wallRows(), false, out);
        writeContacts(simulation.interactions().wireRows(), false, out);
        for (Model.FeedLine line : simulation.model().feeds()) {
            line.feed().save(out);
        }
    }

    private void writeGrains(DataOutputStream out) throws IOException {
        GrainStore grains = simulation.model().grains();
        out.writeInt(grains.count());
        out.writeLong(grains.nextId());
        for (int g : GrainOrder.byId(grains)) {
            out.writeLong(grains.id()[g]);
            out.writeInt(grains.material()[g]);
            out.writeInt(grains.lot()[g]);
            writeDoubles(grains.rows(), GrainRow.at(g), GrainRow.LENGTH, out);
            writeDoubles(grains.orientation(), 4 * g, 4, out);
        }
    }

    /** A row of contact history: the ids it joins and where it stands. */
    private record Row(long first, long second, PairSegment segment, int number) {}

    /** Rows whose history is all zero say nothing; whether they are listed depends on when lists were made. */
    private void writeContacts(List<PairSegment> segments, boolean secondIsGrain, DataOutputStream out)
            throws IOException {
        long[] id = simulation.model().grains().id();
        List<Row> rows = new ArrayList<>();
        for (PairSegment segment : segments) {
            for (int row = 0; row < segment.activeCount(); row++) {
                if (hasHistory(segment, row)) {
                    int second = segment.second()[row];
                    rows.add(new Row(id[segment.first()[row]], secondIsGrain ? id[second] : second, segment, row));
                }
            }
        }
        rows.sort(Comparator.comparingLong(Row::first).thenComparingLong(Row::second));
        out.writeInt(rows.size());
        for (Row row : rows) {
            out.writeLong(row.first);
            out.writeLong(row.second);
            writeHistory(row.segment, row.number, out);
        }
    }

    private static boolean hasHistory(PairSegment segment, int row) {
        for (int column = 0; column < segment.historyColumns(); column++) {
            if (history(segment, row, column) != 0) {
                return true;
            }
        }
        return false;
    }

    private static void writeHistory(PairSegment segment, int row, DataOutputStream out) throws IOException {
        for (int column = 0; column < segment.historyColumns(); column++) {
            out.writeDouble(history(segment, row, column));
        }
    }

    private static double history(PairSegment segment, int row, int column) {
        int tile = row & -Lanes.TILE;
        return segment.history()[segment.historyAt(tile) + Lanes.TILE * column + row - tile];
    }

    private static void writeDoubles(double[] values, int from, int count, DataOutputStream out) throws IOException {
        for (int k = from; k < from + count; k++) {
            out.writeDouble(values[k]);
        }
    }
}
