// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.structure.EndCondition;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.StructureEnergy;
import reedling.structure.SupportMotion;
import reedling.structure.WireDamping;
import reedling.structure.WireMesh;

/** Every joule of a driven, damped wire is booked. */
class StructureLedgerTest {

    private static final WireDamping DAMPED = new WireDamping(0, 0.05, 0.05);

    /** Largest gap of the ledger over 40 ms of shaking, over the work of the supports. */
    private static double residual(double stepPart, boolean changing) {
        Structure structure = Deck.shaken(2, DAMPED);
        structure.evaluateForces();
        double step = stepPart * structure.stableStep();
        structure.startWithSupports(0, step);
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double start = structure.energy(loop.strainEnergy).balance();
        double gap = 0;
        double work = 0;
        int count = 0;
        while (loop.time < 0.04) {
            boolean shorter = changing && count++ / 100 % 2 == 1;
            loop.step(shorter ? 0.84 * step : step);
            StructureEnergy energy = structure.energy(loop.strainEnergy);
            gap = Math.max(gap, Math.abs(energy.balance() - start));
            work = Math.max(work, Math.abs(energy.supportWork()));
            assertThat(energy.strainDissipation()).isNotNegative();
            assertThat(energy.modalDissipation()).isGreaterThan(-1e-12);
        }
        StructureEnergy end = structure.energy(loop.strainEnergy);
        assertThat(end.modalDissipation()).isGreaterThan(1e-3 * work);
        return gap / work;
    }

    @Test
    @Tag("conservation")
    void ledgerOfAShakenDeckCloses() {
        assertThat(residual(1, false)).isLessThan(1e-4);
        assertThat(residual(1, true)).isLessThan(2e-4);
    }

    @Test
    @Tag("convergence")
    void ledgerGapIsOfSecondOrder() {
        double coarse = residual(1, false);
        double fine = residual(0.5, false);
        assertThat(coarse / fine).isBetween(3.0, 5.5);
    }

    /**
     * With the kinetic energy 1/2 m v_(n-1/2) v_(n+1/2) kick-drift-kick conserves energy exactly when the work of each
     * force is the trapezoid times the displacement; so the booked modal dissipation and support work must balance the
     * work of element and gravity forces to round-off.
     */
    @Test
    @Tag("conservation")
    void modalDampingAndSupportWorkCloseToRoundOff() {
        Structure structure = Deck.shaken(2, DAMPED);
        NodeStore nodes = structure.nodes();
        double step = structure.stableStep();
        structure.startWithSupports(0, step);
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double work = 0;
        double start = Double.NaN;
        double largest = 0;
        for (int n = 0; n < 2000; n++) {
            double[] v = nodes.velocity.clone();
            double[] w = nodes.spin.clone();
            double[] f = nodes.force.clone();
            double[] m = nodes.moment.clone();
            loop.step(step);
            double kinetic = 0;
            for (int i = 0; i < v.length; i++) {
                work += 0.5 * step * ((f[i] + nodes.force[i]) * v[i] + (m[i] + nodes.moment[i]) * w[i]);
                kinetic += nodes.inverseMass[i / 3] > 0 ? 0.5 * nodes.mass[i / 3] * v[i] * nodes.velocity[i] : 0;
                double inverse = nodes.inverseInertia[i / 3];
                kinetic += inverse > 0 ? 0.5 / inverse * w[i] * nodes.spin[i] : 0;
            }
            StructureEnergy energy = structure.energy(loop.strainEnergy);
            double balance = kinetic - work + energy.modalDissipation() - energy.supportWork();
            start = n == 0 ? balance : start;
            largest = Math.max(largest, Math.abs(energy.supportWork()));
            assertThat(balance).isCloseTo(start, within(1e-12));
        }
        assertThat(largest).isGreaterThan(1e-4);
        assertThat(structure.energy(0).modalDissipation()).isGreaterThan(1e-7);
    }

    /** First mode of a plucked wire: amplitude falls by exp(-2 pi zeta) a period. */
    @Test
    void firstModeDecaysWithItsRatio() {
        StructureBuilder builder = new StructureBuilder();
        var wire = Deck.wire(0, -1, new WireDamping(0, 0, 0.02), false);
        WireMesh.add(builder, wire, new BeamElement());
        Structure structure = builder.build();
        NodeStore nodes = structure.nodes();
        double omega = WireMesh.firstAngularFrequency(wire);
        for (int n = 1; n < 60; n++) {
            // small enough that the tension does not change
            nodes.velocity[3 * n + 1] = 1e-3 * Math.sin(Math.PI * n / 60.0);
        }
        structure.evaluateForces();
        double step = structure.stableStep();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double[] peaks = new double[12];
        int half = 0;
        double before = 0;
        while (half < 12) {
            loop.step(step);
            double y = nodes.position[3 * 30 + 1];
            if (before != 0 && before * y < 0) {
                half++;
            }
            if (half < 12) {
                peaks[half] = Math.max(peaks[half], Math.abs(y));
            }
            before = y;
        }
        // skip the first half period: the sine is not quite the clamped mode
        double ratio = Math.log(peaks[1] / peaks[11]) / (10 * Math.PI);
        assertThat(ratio).isCloseTo(0.02, within(0.02 * 0.02));
        double period = 2 * Math.PI / omega;
        assertThat(loop.time).isCloseTo(6 * period, within(0.01 * 6 * period));
    }

    /** Supports that travel at constant speed carry the wire along unbraked. */
    @Test
    void steadyTravelIsNotBraked() {
        SupportMotion travel = (time, pose) -> {
            pose[0] = 0.7 * time;
            pose[1] = -0.2 * time;
            pose[2] = 0.4 * time;
            pose[3] = 1;
            pose[4] = 0;
            pose[5] = 0;
            pose[6] = 0;
        };
        StructureBuilder builder = new StructureBuilder();
        int motion = builder.motion(travel);
        WireMesh.add(builder, Deck.wire(0, motion, new WireDamping(0, 0.1, 0.2), false), new BeamElement());
        Structure structure = builder.build();
        structure.evaluateForces();
        double step = structure.stableStep();
        structure.startWithSupports(0, step);
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        for (int n = 0; n < 2000; n++) {
            loop.step(step);
        }
        NodeStore nodes = structure.nodes();
        for (int n = 0; n < nodes.count; n++) {
            assertThat(nodes.velocity[3 * n]).isCloseTo(0.7, within(1e-8));
            assertThat(nodes.velocity[3 * n + 2]).isCloseTo(0.4, within(1e-8));
        }
        assertThat(structure.energy(loop.strainEnergy).modalDissipation()).isCloseTo(0, within(1e-15));
    }

    /** Rigid body on a turning support: nodes follow the pose, the support pays for every load. */
    @Test
    void rigidWireFollowsItsSupportAndBooksTheWork() {
        SupportMotion turning = (time, pose) -> {
            pose[0] = 0.1 * time;
            pose[1] = 0;
            pose[2] = 0;
            pose[3] = StrictMath.cos(0.5 * 3 * time);
            pose[4] = 0;
            pose[5] = 0;
            pose[6] = StrictMath.sin(0.5 * 3 * time);
        };
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        int motion = builder.motion(turning);
        WireMesh.add(builder, Deck.wire(0, motion, WireDamping.NONE, true), new BeamElement());
        Structure structure = builder.build();
        assertThat(structure.elementTasks()).isZero();
        NodalLoads push = (first, last, force, moment) -> {
            force[3 * 60 + 1] -= first <= 60 && 60 < last ? 2 : 0;
        };
        BeamBench.Loop loop = new BeamBench.Loop(structure, push);
        for (int n = 0; n < 200; n++) {
            loop.step(1e-3);
        }
        NodeStore nodes = structure.nodes();
        double y = 0.3 * Math.sin(3 * loop.time);
        assertThat(nodes.position[3 * 60 + 1]).isCloseTo(y, within(1e-13));
        assertThat(nodes.position[3 * 60]).isCloseTo(0.1 * loop.time + 0.3 * Math.cos(3 * loop.time), within(1e-13));
        assertThat(nodes.spin[3 * 60 + 2]).isCloseTo(3, within(1e-9));
        // booked up to the last closed step, one step before the present position
        double closed = 0.3 * Math.sin(3 * (loop.time - 1e-3));
        assertThat(structure.energy(0).supportWork()).isCloseTo(2 * closed, within(1e-13));
    }

    /** Cantilever on a slowly tilting clamp: ends up turned with it, moment work included in the ledger. */
    @Test
    @Tag("conservation")
    void tiltingClampBooksTheWorkOfItsMoment() {
        SupportMotion tilting = (time, pose) -> {
            double angle = 0.2 * (1 - StrictMath.cos(40 * time));
            pose[0] = 0;
            pose[1] = 0;
            pose[2] = 0;
            pose[3] = StrictMath.cos(0.5 * angle);
            pose[4] = 0;
            pose[5] = StrictMath.sin(0.5 * angle);
            pose[6] = 0;
        };
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        int motion = builder.motion(tilting);
        BeamBench.line(
                builder,
                BeamBench.law(new reedling.structure.CrossSection.SolidCircle(0.004), Deck.POLYURETHANE, 0),
                BeamBench.ORIGIN,
                new Position(0.1, 0, 0),
                20,
                0);
        builder.support(0, EndCondition.CLAMPED, motion);
        Structure structure = builder.build();
        structure.evaluateForces();
        double step = structure.stableStep();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double start = structure.energy(loop.strainEnergy).balance();
        double gap = 0;
        double work = 0;
        while (loop.time < 0.1) {
            loop.step(step);
            StructureEnergy energy = structure.energy(loop.strainEnergy);
            gap = Math.max(gap, Math.abs(energy.balance() - start));
            work = Math.max(work, Math.abs(energy.supportWork()));
        }
        assertThat(work).isGreaterThan(1e-4);
        assertThat(gap / work).isLessThan(1e-3);
    }
}
