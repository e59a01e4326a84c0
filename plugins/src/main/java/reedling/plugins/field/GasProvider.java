// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.field.Field;
import reedling.field.FieldProvider;
import reedling.field.MotionForce;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/**
 * Offers a gas under the name {@code gas}: drag, lift, spin damping and buoyancy of grains in a gas whose motion is given.
 * One plugin holds them all, because they must feel the same gas and are solved together at one velocity.
 */
public final class GasProvider implements FieldProvider {

    private static final List<String> AXES = List.of("x", "y", "z");
    private static final double FASTEST = 1e4; // m/s
    private static final double FAR = 1e6; // m

    @Override
    public String name() {
        return "gas";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Drag, lift, spin damping and buoyancy in a gas whose motion is given.";
    }

    @Override
    public String source() {
        return "Drag: Stokes 1851; Schiller and Naumann 1933; Haider and Levenspiel, Drag coefficient and terminal velocity"
                + " of spherical and nonspherical particles, 1989. Lift: Rubinow and Keller, The transverse force on a"
                + " spinning sphere moving in a viscous fluid, 1961";
    }

    @Override
    public List<Parameter> parameters() {
        List<Parameter> all = new ArrayList<>();
        all.add(new Parameter("density", Dimension.DENSITY, 1e-6, 1e4, 1.204, "Density of the gas; air at 20 C."));
        all.add(new Parameter("viscosity", Dimension.VISCOSITY, 1e-9, 1e3, 1.82e-5, "Viscosity of the gas."));
        all.add(Parameter.choice("drag", DragCurve.words(), "schiller-naumann", "Drag curve."));
        all.add(number("drag_coefficient", Dimension.NUMBER, 0, 100, 0.44, "C_D of constant drag."));
        all.add(Parameter.choice("lift", LiftLaw.words(), "none", "Lift of spinning grains."));
        all.add(number("lift_coefficient", Dimension.NUMBER, 0, 100, 0.2, "C_L of constant lift."));
        all.add(Parameter.choice("spin_damping", List.of("none", "stokes"), "none", "Torque that slows spin."));
        three(all, "gravity_", Dimension.ACCELERATION, 1e4, "Acceleration of gravity on the gas, for buoyancy, along ");
        flow(all);
        return all;
    }

    private static void flow(List<Parameter> all) {
        all.add(Parameter.choice("flow", List.of("uniform", "shear", "vortex", "table"), "uniform", "How it moves."));
        three(all, "velocity_", Dimension.SPEED, FASTEST, "Uniform part of the flow, not with a table, along ");
        three(all, "centre_", Dimension.LENGTH, FAR, "Point of the vortex axis, or where the shear is zero, along ");
        all.add(number("shear_rate", Dimension.SHEAR_RATE, -1e6, 1e6, 0, "Growth of the sheared velocity."));
        all.add(Parameter.choice("shear_along", AXES, "x", "Axis of the sheared velocity."));
        all.add(Parameter.choice("shear_across", AXES, "z", "Axis along which it grows."));
        all.add(Parameter.choice("vortex_axis", AXES, "z", "Axis about which the vortex turns, right-handed."));
        all.add(number("vortex_spin", Dimension.ANGULAR_SPEED, -1e6, 1e6, 0, "Angular speed of the core."));
        String core = "Radius of the core that turns as a rigid body; all of the gas by default.";
        all.add(number("vortex_core", Dimension.LENGTH, 0, FAR, FAR, core));
        all.add(Parameter.file("table", "CSV file of velocities on a regular grid; header " + FlowTable.HEADER + "."));
        all.add(number("ramp", Dimension.TIME, 0, 1e9, 0, "Time in which the flow grows to its full velocity."));
        all.add(number("swing", Dimension.NUMBER, 0, 1, 0, "Share by which the flow swings about its mean."));
        all.add(number("swing_frequency", Dimension.FREQUENCY, 0, 1e6, 0, "Frequency of the swing."));
    }

    private static Parameter number(
            String key, Dimension dimension, double least, double most, double preset, String is) {
        return new Parameter(key, dimension, least, most, preset, is);
    }

    private static void three(List<Parameter> all, String key, Dimension dimension, double most, String meaning) {
        for (String axis : AXES) {
            all.add(new Parameter(key + axis, dimension, -most, most, 0, meaning + axis + "."));
        }
    }

    @Override
    public Field create(ParameterValues values) {
        List<Finding> unused = unused(values);
        if (!unused.isEmpty()) {
            throw new ReedlingException(ExitCode.CASE, unused);
        }
        GasForce.Gas gas = new GasForce.Gas(values.get("density"), values.get("viscosity"));
        GasForce.Choices choices = new GasForce.Choices(
                DragCurve.of(values.word("drag")),
                values.get("drag_coefficient"),
                LiftLaw.of(values.word("lift")),
                values.get("lift_coefficient"),
                values.word("spin_damping").equals("stokes"));
        FlowVariation variation =
                new FlowVariation(values.get("ramp"), values.get("swing"), values.get("swing_frequency"));
        double[] gravity = vector(values, "gravity_");
        return new GasField(
                gas.density(), gravity[0], gravity[1], gravity[2], new GasForce(gas, choices, flow(values), variation));
    }

    /** What is written but would not be felt: most likely the choice that needs it was forgotten. */
    private static List<Finding> unused(ParameterValues values) {
        List<Finding> findings = new ArrayList<>();
        String flow = values.word("flow");
        if (!flow.equals("shear") && values.get("shear_rate") != 0) {
            findings.add(unused("shear rate", "a shear"));
        }
        if (!flow.equals("vortex") && values.get("vortex_spin") != 0) {
            findings.add(unused("vortex spin", "a vortex"));
        }
        if (!flow.equals("table") && !values.word("table").isEmpty()) {
            findings.add(unused("table", "a table"));
        }
        for (String axis : AXES) {
            if (flow.equals("table") && values.get("velocity_" + axis) != 0) {
                findings.add(unused("velocity " + axis, "no table"));
            }
        }
        return findings;
    }

    private static Finding unused(String what, String flow) {
        return new Finding("gas", what, "without effect", "flow to be " + flow, "Correct flow, or remove this key.");
    }

    private static GasFlow flow(ParameterValues values) {
        double[] velocity = vector(values, "velocity_");
        double[] centre = vector(values, "centre_");
        return switch (values.word("flow")) {
            case "shear" -> shear(values, velocity, centre);
            case "vortex" ->
                new VortexFlow(
                        velocity,
                        values.get("vortex_spin"),
                        AXES.indexOf(values.word("vortex_axis")),
                        values.get("vortex_core"),
                        centre);
            case "table" -> table(values.word("table"));
            default -> new LinearFlow(velocity, 0, 0, 1, centre);
        };
    }

    private static GasFlow shear(ParameterValues values, double[] velocity, double[] centre) {
        int along = AXES.indexOf(values.word("shear_along"));
        int across = AXES.indexOf(values.word("shear_across"));
        if (along == across) {
            String remedy = "Name the axis along which the velocity grows.";
            throw new ReedlingException(
                    ExitCode.CASE,
                    new Finding("gas", "shear across", AXES.get(across), "another axis than shear_along", remedy));
        }
        return new LinearFlow(velocity, values.get("shear_rate"), along, across, centre);
    }

    private static GasFlow table(String file) {
        if (file.isEmpty()) {
            Finding missing =
                    new Finding("gas", "table", "missing", "the path of a CSV file", "flow = \"table\" needs it.");
            throw new ReedlingException(ExitCode.CASE, missing);
        }
        return FlowTable.read(file);
    }

    private static double[] vector(ParameterValues values, String key) {
        return new double[] {values.get(key + "x"), values.get(key + "y"), values.get(key + "z")};
    }

    /**
     * Buoyancy F = -rho V g, which has a potential, and the forces of motion.
     *
     * @param density of the gas, kg/m3
     * @param x acceleration of gravity, m/s2
     */
    private record GasField(double density, double x, double y, double z, GasForce force) implements Field {

        @Override
        public void apply(GrainStore grains, int from, int to, double time) {
            if (x == 0 && y == 0 && z == 0) {
                return;
            }
            double[] forces = grains.forces();
            for (int g = from; g < to; g++) {
                double mass = -displaced(grains.radius(g));
                int f = GrainRow.forceAt(g) + GrainRow.FORCE;
                forces[f] = Math.fma(mass, x, forces[f]);
                forces[f + 1] = Math.fma(mass, y, forces[f + 1]);
                forces[f + 2] = Math.fma(mass, z, forces[f + 2]);
            }
        }

        /** Mass of the gas in the place of a grain, kg. */
        private double displaced(double radius) {
            return density * 4 / 3 * Math.PI * radius * radius * radius;
        }

        @Override
        public double potentialEnergy(GrainStore grains, int from, int to) {
            double energy = 0;
            double[] rows = grains.rows();
            for (int g = from; g < to; g++) {
                int at = GrainRow.at(g);
                energy += displaced(grains.radius(g)) * (x * rows[at] + y * rows[at + 1] + z * rows[at + 2]);
            }
            return energy;
        }

        @Override
        public double[] uniformAcceleration() {
            return new double[3]; // buoyancy depends on the density of each grain
        }

        @Override
        public Optional<MotionForce> motionForce() {
            return Optional.of(force);
        }
    }
}
