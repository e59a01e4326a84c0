// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;
import java.util.ArrayDeque;
import java.util.Deque;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.particle.RandomStream;

/**
 * A raining feed at work: which grains are due, which wait for room, what has been fed.
 *
 * <p>A grain is due once the owed amount covers it in full. Due grains enter in the order drawn; one that finds no
 * room in its tries waits, and those behind it wait too, so that crowding never sorts the feed by size. Sizes and
 * places come from streams of their own: the sequence of sizes does not depend on what is in the way.
 * <p>Threads: confined to its owner; deterministic.
 */
public final class RainFeed {

    private final Rain plan;
    private final RandomStream sizes;
    private final RandomStream places;
    private final double[] drawnMass;
    private final Deque<Waiting> backlog = new ArrayDeque<>();
    private final double[] centre = new double[3];
    private double drawnAmount;
    private double fedMass;
    private long fedCount;
    private Waiting next;

    /** A grain drawn and not yet fed: lot number and radius, m. */
    private record Waiting(int lot, double radius) {}

    /**
     * @param plan what to do
     * @param random stream of the case; the feed splits off its own by its name
     */
    public RainFeed(Rain plan, RandomStream random) {
        this.plan = plan;
        RandomStream own = random.split(plan.name());
        sizes = own.split("sizes");
        places = own.split("places");
        drawnMass = new double[plan.mix().size()];
        next = drawNext();
    }

    public Rain plan() {
        return plan;
    }

    /**
     * Adds the grains that are due and find room to {@code out}; they also keep clear of the grains already there.
     *
     * @param time s
     * @param vacancy asked for each place tried
     * @param out seeds of this call, of all feeds
     * @return number of grains added
     */
    public int release(double time, Vacancy vacancy, GrainSeeds out) {
        double owed = plan.rate().owed(time);
        while (drawnAmount + amount(next) <= owed) {
            drawnAmount += amount(next);
            drawnMass[next.lot] += mass(next);
            backlog.add(next);
            next = drawNext();
        }
        int added = 0;
        while (!backlog.isEmpty() && place(backlog.element(), vacancy, out)) {
            Waiting grain = backlog.remove();
            fedMass += mass(grain);
            fedCount++;
            added++;
        }
        return added;
    }

    /** Whether no grain can come any more at any time. */
    public boolean finished() {
        return backlog.isEmpty() && drawnAmount + amount(next) > plan.rate().owed(Double.POSITIVE_INFINITY);
    }

    /** Grains due and waiting for room. */
    public int backlog() {
        return backlog.size();
    }

    /** Grains fed so far. */
    public long fedCount() {
        return fedCount;
    }

    /** Mass fed so far, kg. */
    public double fedMass() {
        return fedMass;
    }

    /** Writes everything that decides the grains to come. */
    public void save(DataOutput out) throws IOException {
        out.writeInt(drawnMass.length);
        for (double mass : drawnMass) {
            out.writeDouble(mass);
        }
        sizes.save(out);
        places.save(out);
        out.writeDouble(drawnAmount);
        out.writeDouble(fedMass);
        out.writeLong(fedCount);
        write(next, out);
        out.writeInt(backlog.size());
        for (Waiting grain : backlog) {
            write(grain, out);
        }
    }

    /**
     * Reads what {@link #save} wrote; this feed, made from the same plan, then continues where that one stood.
     *
     * @throws ReedlingException with {@link ExitCode#CHECKPOINT} if the saved feed had another number of lots
     */
    public void restore(DataInput in) throws IOException {
        int lots = in.readInt();
        if (lots != drawnMass.length) {
            String where = "feed." + plan.name();
            String expected = drawnMass.length + ", as in the case";
            String remedy = "Resume with the case that wrote the checkpoint.";
            throw new ReedlingException(
                    ExitCode.CHECKPOINT, new Finding(where, "number of lots saved", "" + lots, expected, remedy));
        }
        for (int k = 0; k < lots; k++) {
            drawnMass[k] = in.readDouble();
        }
        sizes.restore(in);
        places.restore(in);
        drawnAmount = in.readDouble();
        fedMass = in.readDouble();
        fedCount = in.readLong();
        next = read(in);
        backlog.clear();
        for (int left = in.readInt(); left > 0; left--) {
            backlog.add(read(in));
        }
    }

    private Waiting drawNext() {
        int lot = plan.mix().neediest(drawnMass);
        return new Waiting(lot, 0.5 * plan.mix().lot(lot).sizes().diameter(sizes));
    }

    private boolean place(Waiting grain, Vacancy vacancy, GrainSeeds out) {
        for (int attempt = 0; attempt < plan.launch().tries(); attempt++) {
            plan.region().draw(places, grain.radius, centre);
            if (out.free(centre[0], centre[1], centre[2], grain.radius)
                    && vacancy.free(centre[0], centre[1], centre[2], grain.radius)) {
                int row = out.add(centre[0], centre[1], centre[2], grain.radius);
                out.setKind(row, grain.lot, plan.mix().lot(grain.lot).material());
                launch(row, out);
                return true;
            }
        }
        return false;
    }

    private void launch(int row, GrainSeeds out) {
        double jitter = plan.launch().jitter();
        double vx = plan.launch().velocity().x() + jitter * (2 * places.uniform() - 1);
        double vy = plan.launch().velocity().y() + jitter * (2 * places.uniform() - 1);
        double vz = plan.launch().velocity().z() + jitter * (2 * places.uniform() - 1);
        out.setVelocity(row, vx, vy, vz);
    }

    private double mass(Waiting grain) {
        return plan.mix().grainMass(grain.lot, grain.radius);
    }

    private double amount(Waiting grain) {
        return plan.rate().measure() == FeedRate.Measure.MASS ? mass(grain) : 1;
    }

    private static void write(Waiting grain, DataOutput out) throws IOException {
        out.writeInt(grain.lot);
        out.writeDouble(grain.radius);
    }

    private static Waiting read(DataInput in) throws IOException {
        int lot = in.readInt();
        return new Waiting(lot, in.readDouble());
    }
}
