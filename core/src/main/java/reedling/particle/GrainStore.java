// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * All grains of a run, in memory order: rows as {@link GrainRow} describes, and beside them material, lot, stable id
 * and orientation. Two ghost rows follow the last grain, far apart and at rest; pair lists are filled up to whole tiles
 * with them.
 *
 * <p>Threads: between two barriers each grain belongs to one chunk; only that chunk's task writes its rows.
 */
public final class GrainStore implements Persistent {

    /** Ghost rows after the last grain. */
    public static final int GHOSTS = 2;

    private static final double GHOST_DISTANCE = 1e6; // m, farther than any case reaches
    private static final double GHOST_RADIUS = 1e-3; // m

    private int count;
    private double[] rows = new double[GrainRow.at(GHOSTS)];
    private double[] forces = new double[GrainRow.forceAt(GHOSTS)];
    private int[] material = new int[GHOSTS];
    private int[] lot = new int[GHOSTS];
    private long[] id = new long[GHOSTS];
    private double[] orientation = new double[4 * GHOSTS];
    private long nextId;

    /** Number of grains. */
    public int count() {
        return count;
    }

    /** Row index of the first ghost; the second follows it. */
    public int ghost() {
        return count;
    }

    /** Grain rows, see {@link GrainRow}; replaced when grains are added. */
    public double[] rows() {
        return rows;
    }

    /** Force rows, see {@link GrainRow}; replaced when grains are added. */
    public double[] forces() {
        return forces;
    }

    /** Material number of each grain. */
    public int[] material() {
        return material;
    }

    /** Lot number of each grain. */
    public int[] lot() {
        return lot;
    }

    /** Stable id of each grain, never reused. */
    public long[] id() {
        return id;
    }

    /** Orientation quaternions (w, x, y, z), four doubles a grain. */
    public double[] orientation() {
        return orientation;
    }

    /** Id the next grain will get. */
    public long nextId() {
        return nextId;
    }

    public void nextId(long value) {
        nextId = value;
    }

    /** Makes room for so many grains and places the ghosts after them; rows beyond the old count are zero. */
    public void resize(int grains) {
        ensureCapacity(grains);
        if (grains > count) {
            Arrays.fill(rows, GrainRow.at(count), GrainRow.at(grains), 0);
        }
        count = grains;
        for (int g = 0; g < GHOSTS; g++) {
            writeBody(count + g, (g + 1) * GHOST_DISTANCE, 0, 0, GHOST_RADIUS, 1, 1);
        }
        Arrays.fill(forces, GrainRow.forceAt(count), GrainRow.forceAt(count + GHOSTS), 0);
    }

    /** Makes room for so many grains without adding any. */
    public void reserve(int grains) {
        ensureCapacity(grains);
        resize(count);
    }

    private void ensureCapacity(int grains) {
        int held = material.length - GHOSTS;
        if (grains > held) {
            int capacity = Math.max(grains, held + held / 4);
            rows = Arrays.copyOf(rows, GrainRow.at(capacity + GHOSTS));
            forces = Arrays.copyOf(forces, GrainRow.forceAt(capacity + GHOSTS));
            material = Arrays.copyOf(material, capacity + GHOSTS);
            lot = Arrays.copyOf(lot, capacity + GHOSTS);
            id = Arrays.copyOf(id, capacity + GHOSTS);
            orientation = Arrays.copyOf(orientation, 4 * (capacity + GHOSTS));
        }
    }

    private void writeBody(int g, double x, double y, double z, double radius, double mass, double inertia) {
        int at = GrainRow.at(g);
        Arrays.fill(rows, at, at + GrainRow.LENGTH, 0);
        rows[at + GrainRow.X] = x;
        rows[at + GrainRow.X + 1] = y;
        rows[at + GrainRow.X + 2] = z;
        rows[at + GrainRow.RADIUS] = radius;
        rows[at + GrainRow.INVERSE_MASS] = 1 / mass;
        rows[at + GrainRow.INVERSE_INERTIA] = 1 / inertia;
        rows[at + GrainRow.RADIUS_AGAIN] = radius;
    }

    /**
     * Adds a solid sphere at rest; lists must be rebuilt before the next step.
     *
     * @param x centre, m
     * @param radius m
     * @param density kg/m3
     * @return its row index
     */
    public int add(double x, double y, double z, double radius, double density, int materialNumber, int lotNumber) {
        int g = count;
        resize(count + 1);
        double mass = density * 4 / 3 * Math.PI * radius * radius * radius;
        writeBody(g, x, y, z, radius, mass, 0.4 * mass * radius * radius);
        material[g] = materialNumber;
        lot[g] = lotNumber;
        id[g] = nextId++;
        orientation[4 * g] = 1;
        orientation[4 * g + 1] = 0;
        orientation[4 * g + 2] = 0;
        orientation[4 * g + 3] = 0;
        return g;
    }

    /** Sets a velocity, m/s. */
    public void velocity(int g, double vx, double vy, double vz) {
        int at = GrainRow.at(g) + GrainRow.V;
        rows[at] = vx;
        rows[at + 1] = vy;
        rows[at + 2] = vz;
    }

    /** Sets a spin, rad/s. */
    public void spin(int g, double wx, double wy, double wz) {
        int at = GrainRow.at(g);
        double radius = rows[at + GrainRow.RADIUS];
        rows[at + GrainRow.W] = wx;
        rows[at + GrainRow.W + 1] = wy;
        rows[at + GrainRow.W + 2] = wz;
        rows[at + GrainRow.RADIUS_W] = radius * wx;
        rows[at + GrainRow.RADIUS_W + 1] = radius * wy;
        rows[at + GrainRow.RADIUS_W + 2] = radius * wz;
    }

    public double mass(int g) {
        return 1 / rows[GrainRow.at(g) + GrainRow.INVERSE_MASS];
    }

    public double radius(int g) {
        return rows[GrainRow.at(g) + GrainRow.RADIUS];
    }

    /** One coordinate (0, 1 or 2) of a centre, m. */
    public double position(int g, int axis) {
        return rows[GrainRow.at(g) + GrainRow.X + axis];
    }

    /**
     * Puts grains into a new memory order and drops those named last; in place, one cycle of the permutation after the
     * other, with a ghost's row as the spare place.
     *
     * @param order old row of each new row, a permutation of 0 .. count - 1; overwritten
     * @param kept number of grains kept, those of the first entries
     */
    public void reorder(int[] order, int kept) {
        int spare = count; // a ghost's row: written anew below
        for (int start = 0; start < count; start++) {
            if (order[start] < 0 || order[start] == start) {
                continue;
            }
            copy(start, spare);
            int to = start;
            for (int from = order[to]; from != start; from = order[to]) {
                copy(from, to);
                order[to] = -1;
                to = from;
            }
            order[to] = -1;
            copy(spare, to);
        }
        resize(kept);
    }

    private void copy(int from, int to) {
        System.arraycopy(rows, GrainRow.at(from), rows, GrainRow.at(to), GrainRow.LENGTH);
        System.arraycopy(orientation, 4 * from, orientation, 4 * to, 4);
        material[to] = material[from];
        lot[to] = lot[from];
        id[to] = id[from];
    }

    @Override
    public String section() {
        return "grains";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeInt(count);
        out.writeLong(nextId);
        out.writeDoubles(rows, GrainRow.at(0), GrainRow.at(count));
        out.writeInts(material, 0, count);
        out.writeInts(lot, 0, count);
        out.writeLongs(id, 0, count);
        out.writeDoubles(orientation, 0, 4 * count);
    }

    @Override
    public void restore(SectionReader in) {
        resize(0);
        resize(in.readInt());
        nextId = in.readLong();
        in.readDoubles(rows, GrainRow.at(0), GrainRow.at(count));
        in.readInts(material, 0, count);
        in.readInts(lot, 0, count);
        in.readLongs(id, 0, count);
        in.readDoubles(orientation, 0, 4 * count);
        Arrays.fill(forces, 0);
    }
}
