// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.Arrays;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.coupling.WireContacts;
import reedling.particle.GrainStore;

/**
 * Finds grains stuck in the gaps of a deck, by {@link PegRule}. A grain is followed from the first sample at which its
 * centre is nearer to the deck plane than its radius and it touches two wires. It counts as pegged once it was in the
 * layer and within the distance for the time, and touches two wires again. A moment without touch between samples, as
 * wires swing, does not end its stay; leaving the layer or the place does.
 *
 * <p>A pegged grain closes its gap over a length of its diameter: that, over the length of all gaps, is the open area
 * lost.
 *
 * <p>Threads: one, between steps.
 */
public final class PeggingWatch implements Persistent {

    private final DeckFrame deck;
    private final PegRule rule;
    private final boolean[] isDeck;
    private final long[] count;
    private final double[] mass;
    private double blockedLength;
    private Map<Long, Stay> stays = new TreeMap<>();
    private int[] firstWire = new int[0];
    private boolean[] twoWires = new boolean[0];

    /** Where in the deck's frame (m) a grain stays, since when (s), and whether it is pegged. */
    private record Stay(double[] place, double since, boolean pegged) {}

    /**
     * @param bodies number of bodies of the structure
     * @param lots number of lots
     */
    public PeggingWatch(DeckFrame deck, PegRule rule, int bodies, int lots) {
        this.deck = deck;
        this.rule = rule;
        isDeck = new boolean[bodies];
        for (int body : deck.bodies()) {
            isDeck[body] = true;
        }
        count = new long[lots];
        mass = new double[lots];
    }

    /** Looks at all grains at a time, s. */
    public void sample(double time, GrainStore grains, WireContacts wires) {
        deck.update();
        findTouches(grains, wires);
        Map<Long, Stay> next = new TreeMap<>();
        double[] place = new double[3];
        for (int g = 0; g < grains.count(); g++) {
            deck.place(grains.position(g, 0), grains.position(g, 1), grains.position(g, 2), place);
            if (Math.abs(place[2]) < grains.radius(g)) {
                Stay stay = next(stays.get(grains.id()[g]), place, time, twoWires[g]);
                if (stay != null) {
                    next.put(grains.id()[g], stay);
                }
            }
        }
        stays = next;
        countUp(grains);
    }

    private void findTouches(GrainStore grains, WireContacts wires) {
        if (firstWire.length < grains.count()) {
            firstWire = new int[2 * grains.count()];
            twoWires = new boolean[2 * grains.count()];
        }
        Arrays.fill(firstWire, -1);
        Arrays.fill(twoWires, false);
        wires.visitOverlaps(grains, (grain, body, overlap) -> {
            if (isDeck[body]) {
                twoWires[grain] |= firstWire[grain] >= 0 && firstWire[grain] != body;
                firstWire[grain] = body;
            }
        });
    }

    private @Nullable Stay next(@Nullable Stay stay, double[] place, double time, boolean touchesTwo) {
        if (stay == null || distance(stay.place, place) > rule.distance()) {
            return touchesTwo ? new Stay(place.clone(), time, false) : null;
        }
        boolean longEnough = time - stay.since >= rule.time();
        return stay.pegged || !longEnough || !touchesTwo ? stay : new Stay(stay.place, stay.since, true);
    }

    private static double distance(double[] a, double[] b) {
        double dx = a[0] - b[0], dy = a[1] - b[1], dz = a[2] - b[2];
        return Math.sqrt(dx * dx + dy * dy + dz * dz);
    }

    private void countUp(GrainStore grains) {
        Arrays.fill(count, 0);
        Arrays.fill(mass, 0);
        blockedLength = 0;
        for (int g = 0; g < grains.count(); g++) {
            if (pegged(grains.id()[g])) {
                count[grains.lot()[g]]++;
                mass[grains.lot()[g]] += grains.mass(g);
                blockedLength += 2 * grains.radius(g);
            }
        }
    }

    /** Whether a grain counts as pegged at the last sample. */
    public boolean pegged(long id) {
        Stay stay = stays.get(id);
        return stay != null && stay.pegged;
    }

    /** Pegged grains of a lot. */
    public long count(int lot) {
        return count[lot];
    }

    /** Mass of the pegged grains of a lot, kg. */
    public double mass(int lot) {
        return mass[lot];
    }

    /** Part of the open area that pegged grains close, per cent. */
    public double openAreaLost() {
        return 100 * blockedLength / deck.openLength();
    }

    @Override
    public String section() {
        return "pegging";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeInt(stays.size());
        for (Map.Entry<Long, Stay> entry : stays.entrySet()) {
            out.writeLong(entry.getKey());
            out.writeDoubles(entry.getValue().place, 0, 3);
            out.writeDouble(entry.getValue().since);
            out.writeBoolean(entry.getValue().pegged);
        }
        out.writeLongs(count, 0, count.length);
        out.writeDoubles(mass, 0, mass.length);
        out.writeDouble(blockedLength);
    }

    @Override
    public void restore(SectionReader in) {
        stays = new TreeMap<>();
        for (int left = in.readInt(); left > 0; left--) {
            long id = in.readLong();
            double[] place = new double[3];
            in.readDoubles(place, 0, 3);
            double since = in.readDouble();
            stays.put(id, new Stay(place, since, in.readBoolean()));
        }
        in.readLongs(count, 0, count.length);
        in.readDoubles(mass, 0, mass.length);
        blockedLength = in.readDouble();
    }
}
