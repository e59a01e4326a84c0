// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import org.joml.Vector3d;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * One impact along x, from a little before the touch until the bodies are apart: a grain on a second grain, or on a
 * rigid plane that fills x > 0. Watches overlap and force from outside, from positions and velocities only.
 */
final class Impact {

    static final double[] REST = {0, 0, 0};

    /** A plane this stiff adds nothing to the compliance of the contact. */
    static final Material RIGID = new Material("rigid", 1, 1e30, 0.3);

    /**
     * What was seen.
     *
     * @param overlap largest overlap, m
     * @param force largest force, N, from the change of velocity
     * @param duration from zero overlap to zero overlap, s, interpolated between steps
     */
    record Seen(double overlap, double force, double duration) {}

    private final Rig rig;
    private final long first;
    private final long second;
    private final double radii;

    private Impact(Rig rig, long first, long second, double radii) {
        this.rig = rig;
        this.first = first;
        this.second = second;
        this.radii = radii;
    }

    /** A grain of material 0 hits the plane; material 1 of the rig must be {@link #RIGID}. */
    static Impact onPlane(Rig rig, double radius, double[] velocity, double[] spin, double gap) {
        rig.wall(new Wall(
                "plane", 1, new HalfSpace(), Placement.facing(new Vector3d(), new Vector3d(-1, 0, 0)), new Still()));
        long grain = rig.grain(0, radius, new double[] {-radius - gap, 0, 0}, velocity, spin);
        return new Impact(rig, grain, -1, radius);
    }

    /** A body of an impact of two grains. */
    record Ball(double radius, double[] velocity, double[] spin) {}

    /** The first grain comes from the side of negative x. */
    static Impact ofTwo(Rig rig, Ball one, Ball two, double gap) {
        long a = rig.grain(0, one.radius, new double[] {-one.radius - gap, 0, 0}, one.velocity, one.spin);
        long b = rig.grain(0, two.radius, new double[] {two.radius, 0, 0}, two.velocity, two.spin);
        return new Impact(rig, a, b, one.radius + two.radius);
    }

    long first() {
        return first;
    }

    long second() {
        return second;
    }

    private double overlap() {
        double[] a = rig.centre(first);
        if (second < 0) {
            return radii + a[0];
        }
        double[] b = rig.centre(second);
        return radii - Math.hypot(Math.hypot(b[0] - a[0], b[1] - a[1]), b[2] - a[2]);
    }

    /** Steps until the bodies have touched and parted. */
    Seen run(WorkerTeam team) {
        Simulation run = rig.start(team);
        double mass = rig.grains().mass(rig.row(first));
        double deepest = 0;
        double force = 0;
        double begin = Double.NaN;
        double before = overlap();
        double oldStep = 0;
        double oldSpeed = rig.velocity(first)[0];
        while (true) {
            run.step();
            double now = overlap();
            double speed = rig.velocity(first)[0];
            double step = run.pastStep();
            force = Math.max(force, mass * (oldSpeed - speed) / (0.5 * (oldStep + step)));
            deepest = Math.max(deepest, now);
            if (before <= 0 && now > 0) {
                begin = run.time() - step * now / (now - before);
            }
            if (before > 0 && now <= 0) {
                double end = run.time() - step * now / (now - before);
                run.step(); // the closing half kick of the last touching step, and no more
                return new Seen(deepest, force, end - begin);
            }
            if (run.stepCount() > 1_000_000) {
                throw new IllegalStateException("the bodies did not part");
            }
            before = now;
            oldStep = step;
            oldSpeed = speed;
        }
    }
}
