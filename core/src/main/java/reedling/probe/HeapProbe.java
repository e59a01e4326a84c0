// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.ArrayList;
import java.util.List;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/** Figures of a heap as it lies, by {@link HeapProfile}; remembers nothing. Threads: one. */
final class HeapProbe implements BulkProbe {

    private final HeapPlan plan;

    HeapProbe(HeapPlan plan) {
        this.plan = plan;
    }

    @Override
    public String name() {
        return plan.name();
    }

    @Override
    public double every() {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public void sample(double time, GrainStore grains) {
        // the heap is looked at when figures are asked for
    }

    @Override
    public List<Reading> readings(GrainStore grains) {
        HeapProfile profile = new HeapProfile(plan, grains);
        return List.of(
                new Reading("angle of repose", "deg", profile.angle()),
                new Reading("foot radius", "m", profile.footRadius()),
                new Reading("top height", "m", profile.topHeight()),
                new Reading("flank deviation", "m", profile.deviation()),
                new Reading("flank rings", "", profile.flankRings()),
                new Reading("rms speed", "m/s", speed(grains)));
    }

    /** Root mean square speed of the grains, m/s: whether the heap has come to rest. */
    private static double speed(GrainStore grains) {
        double squares = 0;
        for (int g = 0; g < grains.count(); g++) {
            int v = GrainRow.at(g) + GrainRow.V;
            for (int axis = 0; axis < 3; axis++) {
                squares += grains.rows()[v + axis] * grains.rows()[v + axis];
            }
        }
        return Math.sqrt(squares / Math.max(1, grains.count()));
    }

    @Override
    public List<String> closingTable(GrainStore grains) {
        HeapProfile profile = new HeapProfile(plan, grains);
        List<String> rows = new ArrayList<>();
        rows.add("radius [m],height [m],fitted height [m]");
        for (int ring = 0; ring < profile.rings() && profile.middle(ring) < 1.5 * profile.footRadius(); ring++) {
            String fitted = profile.inFlank(ring) ? Double.toString(profile.fitted(ring)) : "";
            rows.add(profile.middle(ring) + "," + profile.height(ring) + "," + fitted);
        }
        return rows;
    }

    @Override
    public void save(SectionWriter out) {
        // nothing to remember
    }

    @Override
    public void restore(SectionReader in) {
        // nothing to remember
    }
}
