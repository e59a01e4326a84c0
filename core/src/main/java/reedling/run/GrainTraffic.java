// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import reedling.check.EnergyLedger;
import reedling.coupling.Interactions;
import reedling.feed.GrainSeeds;
import reedling.field.Field;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.probe.GrainWatch;
import reedling.wall.WallPose;

/**
 * Grains that come and go: what feeds release is placed where there is room, what reached an exit is marked to be dropped
 * by the next search; both are counted by lot and booked in the energy balance.
 *
 * <p>Threads: one, between phases.
 */
final class GrainTraffic {

    /** Feeds are asked so often, s; a search follows when they gave grains. */
    private static final double RELEASE_EVERY = 2e-3;

    private final Model model;
    private final Interactions interactions;
    private final Passage passage;
    private final EnergyLedger ledger;
    private final GrainSeeds seeds = new GrainSeeds();
    private final double[] uniform = new double[3];
    private double nextRelease;
    private GrainWatch watch = GrainWatch.NONE;

    GrainTraffic(Model model, Interactions interactions, Passage passage, EnergyLedger ledger) {
        this.model = model;
        this.interactions = interactions;
        this.passage = passage;
        this.ledger = ledger;
        for (Field field : model.fields()) {
            double[] acceleration = field.uniformAcceleration();
            for (int axis = 0; axis < 3; axis++) {
                uniform[axis] += acceleration[axis];
            }
        }
    }

    void watch(GrainWatch watcher) {
        watch = watcher;
    }

    /** Counts the grains that are there before the first step. */
    void bookInitialGrains() {
        for (int g = 0; g < model.grains().count(); g++) {
            passage.fed(model.grains().lot()[g], model.grains().mass(g));
        }
    }

    boolean releaseDue(double time) {
        return !model.feeds().isEmpty() && time >= nextRelease;
    }

    /**
     * Lets the feeds release what is due.
     *
     * @param past the past step, s, whose closing half kick new grains will get too; 0 if none is to come
     * @return grains added
     */
    int release(double time, double past) {
        nextRelease = (StrictMath.floor(time / RELEASE_EVERY) + 1) * RELEASE_EVERY;
        int added = 0;
        for (Model.FeedLine line : model.feeds()) {
            seeds.clear();
            line.feed().release(time, this::free, seeds);
            for (int k = 0; k < seeds.size(); k++) {
                add(k, line.lotNumbers()[seeds.lot(k)], time, past);
            }
            added += seeds.size();
        }
        return added;
    }

    private void add(int k, int lot, double time, double past) {
        GrainStore grains = model.grains();
        double density = model.materials().materials().get(seeds.material(k)).density();
        int g = grains.add(seeds.x(k), seeds.y(k), seeds.z(k), seeds.radius(k), density, seeds.material(k), lot);
        grains.velocity(g, seeds.velocityX(k), seeds.velocityY(k), seeds.velocityZ(k));
        passage.fed(lot, grains.mass(g));
        watch.fed(lot, grains.mass(g), time);
        if (time > 0) {
            ledger.brought(energy(g, past));
        }
    }

    /** Kinetic and potential energy of a grain at the end of the past step, J. */
    private double energy(int g, double past) {
        double[] rows = model.grains().rows();
        int at = GrainRow.at(g);
        double mass = 1 / rows[at + GrainRow.INVERSE_MASS];
        double squared = 0;
        double spinSquared = 0;
        for (int axis = 0; axis < 3; axis++) {
            double v = rows[at + GrainRow.V + axis] + 0.5 * past * uniform[axis];
            double w = rows[at + GrainRow.W + axis];
            squared += v * v;
            spinSquared += w * w;
        }
        double potential = 0;
        for (Field field : model.fields()) {
            potential += field.potentialEnergy(model.grains(), g, g + 1);
        }
        return 0.5 * mass * squared + 0.5 * spinSquared / rows[at + GrainRow.INVERSE_INERTIA] + potential;
    }

    private boolean free(double x, double y, double z, double radius) {
        GrainStore grains = model.grains();
        double[] rows = grains.rows();
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            double dx = rows[at] - x, dy = rows[at + 1] - y, dz = rows[at + 2] - z;
            double reach = rows[at + GrainRow.RADIUS] + radius;
            if (dx * dx + dy * dy + dz * dz < reach * reach) {
                return false;
            }
        }
        return interactions.gapToSurfaces(x, y, z) >= radius;
    }

    /** Marks the grains that reached an exit and counts them; an empty array if there are none. */
    boolean[] leaving(double time, double past) {
        GrainStore grains = model.grains();
        double[] rows = grains.rows();
        boolean[] removed = new boolean[0];
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            int exit = model.exits().exitOf(rows[at], rows[at + 1], rows[at + 2]);
            if (exit != Exits.STAYS) {
                removed = removed.length == 0 ? new boolean[grains.count()] : removed;
                removed[g] = true;
                passage.left(exit, grains.lot()[g], grains.mass(g));
                watch.left(exit, grains.lot()[g], 2 * grains.radius(g), grains.mass(g), time);
                ledger.taken(energy(g, past));
            }
        }
        return removed;
    }

    double speed(int g) {
        int at = GrainRow.at(g) + GrainRow.V;
        double[] rows = model.grains().rows();
        return Math.sqrt(rows[at] * rows[at] + rows[at + 1] * rows[at + 1] + rows[at + 2] * rows[at + 2]);
    }

    /** Largest speed of any wall, m/s; a turning wall is taken at the farthest grain. */
    double wallSpeed() {
        double largest = 0;
        for (WallPose pose : interactions.facets().walls()) {
            double vx = pose.velocityX(), vy = pose.velocityY(), vz = pose.velocityZ();
            double speed = Math.sqrt(vx * vx + vy * vy + vz * vz);
            double spin =
                    Math.sqrt(pose.spinX() * pose.spinX() + pose.spinY() * pose.spinY() + pose.spinZ() * pose.spinZ());
            if (spin > 0) {
                speed += spin * farthestGrain(pose);
            }
            largest = Math.max(largest, speed);
        }
        return largest;
    }

    private double farthestGrain(WallPose pose) {
        double[] rows = model.grains().rows();
        double squared = 0;
        for (int g = 0; g < model.grains().count(); g++) {
            int at = GrainRow.at(g);
            double dx = rows[at] - pose.centreX(),
                    dy = rows[at + 1] - pose.centreY(),
                    dz = rows[at + 2] - pose.centreZ();
            squared = Math.max(squared, dx * dx + dy * dy + dz * dz);
        }
        return Math.sqrt(squared);
    }

    double nextRelease() {
        return nextRelease;
    }

    void nextRelease(double value) {
        nextRelease = value;
    }
}
