// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.Map;
import reedling.field.Field;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/** One grain that nothing touches, in fields, with a step of its own choice. */
final class FreeFlight implements AutoCloseable {

    private static final double MARGIN = 10; // m: never the limit of a step

    private final WorkerTeam team = new WorkerTeam(1);
    private final Rig rig;
    private final Simulation run;

    /** Starts a grain at the origin. */
    FreeFlight(double radius, double density, double step, double[] velocity, double[] spin, Field... fields) {
        this(radius, density, step, new double[3], velocity, spin, fields);
    }

    FreeFlight(
            double radius,
            double density,
            double step,
            double[] centre,
            double[] velocity,
            double[] spin,
            Field... fields) {
        rig = new Rig()
                .material(new Material("grain", density, 1e9, 0.3), 1, 0, 0)
                .maximumStep(step)
                .margin(MARGIN);
        for (Field field : fields) {
            rig.field(field);
        }
        rig.grain(0, radius, centre, velocity, spin);
        run = rig.start(team);
    }

    static Field gas(Map<String, Double> numbers, Map<String, String> words) {
        GasProvider provider = new GasProvider();
        return provider.create(ParameterValues.of(provider, numbers, words));
    }

    static Field charged(Map<String, Double> numbers) {
        ElectromagneticProvider provider = new ElectromagneticProvider();
        return provider.create(ParameterValues.of(provider, numbers));
    }

    static Field gravity(double x, double y, double z) {
        GravityProvider provider = new GravityProvider();
        return provider.create(ParameterValues.of(provider, Map.of("x", x, "y", y, "z", z)));
    }

    /** Runs to the step nearest to a time, s. */
    FreeFlight until(double time) {
        while (run.time() + 0.5 * run.pastStep() < time) {
            run.step();
        }
        return this;
    }

    void step() {
        run.step();
    }

    Simulation run() {
        return run;
    }

    double time() {
        return run.time();
    }

    /** Time that the velocity belongs to: the middle of the past step, s. */
    double middle() {
        return run.time() - 0.5 * run.pastStep();
    }

    double x(int axis) {
        return rig.grains().position(0, axis);
    }

    /** Velocity in the middle of the past step, m/s. */
    double v(int axis) {
        return rig.grains().rows()[GrainRow.at(0) + GrainRow.V + axis];
    }

    double spin(int axis) {
        return rig.grains().rows()[GrainRow.at(0) + GrainRow.W + axis];
    }

    double speed() {
        return Math.sqrt(v(0) * v(0) + v(1) * v(1) + v(2) * v(2));
    }

    double[] orientation() {
        return rig.grains().orientation().clone();
    }

    @Override
    public void close() {
        team.close();
    }
}
