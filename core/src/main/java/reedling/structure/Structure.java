// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * Flexible and rigid bodies of one run, advanced by stages that an outside step loop calls.
 *
 * <p>One step: {@link #elementForces} for every element task, then {@link #poseSupports} once, then {@link #moveNodes}
 * for every node task. Tasks of one stage may run on different threads; stages must be separated by a barrier. The
 * number and ranges of tasks depend on the mesh only and all sums are added in task order, so results do not depend on
 * threads. Between {@code elementForces} and {@code moveNodes} of the same step strain energies and element results
 * belong to the positions in {@link #nodes}; after {@code moveNodes} they belong to the positions before the drift.
 */
public final class Structure {

    /** Elements or nodes of one task; small enough that a deck of 900 elements keeps several threads busy. */
    static final int RANGE = 64;

    /** Part of the bound of the highest element frequency that is used. */
    static final double STABLE_PART = 0.9;

    private final Mesh mesh;
    private final SupportPoses poses;
    private final ModalDamping damping;
    private final NodeSums sums;
    private final NodeStage nodeStage;
    private final List<ElementTask> elementTasks = new ArrayList<>();
    private final double[] strainDissipation;

    Structure(Mesh mesh, List<SupportMotion> motions, ModalDamping damping, Position gravity) {
        this.mesh = mesh;
        this.damping = damping;
        this.poses = new SupportPoses(motions);
        this.sums = new NodeSums(nodeTasks());
        this.nodeStage = new NodeStage(mesh, damping, poses, sums, gravity);
        for (ElementSet set : mesh.sets()) {
            for (int first = 0; first < set.count(); first += RANGE) {
                elementTasks.add(new ElementTask(set, first, Math.min(set.count(), first + RANGE)));
            }
        }
        this.strainDissipation = new double[8 * elementTasks.size()];
    }

    private record ElementTask(ElementSet set, int first, int last) {}

    /** Arrays of all nodes. */
    public NodeStore nodes() {
        return mesh.nodes();
    }

    /** Bodies in order of their nodes. */
    public List<Body> bodies() {
        return mesh.bodies();
    }

    /** Elements that carry forces, one set per flexible body, in body order. */
    public List<ElementSet> elementSets() {
        return mesh.sets();
    }

    /** Number of tasks of the element stage. */
    public int elementTasks() {
        return elementTasks.size();
    }

    /** Number of tasks of the node stage. */
    public int nodeTasks() {
        return (mesh.nodes().count + RANGE - 1) / RANGE;
    }

    /**
     * Element forces of one task at the present positions; {@code oldStep} is the step that led here, s (0 at the
     * start).
     */
    public void elementForces(int task, double oldStep) {
        ElementTask t = elementTasks.get(task);
        strainDissipation[8 * task] += t.set.law.forces(t.set, mesh.nodes(), t.first, t.last, oldStep);
    }

    /** Places the supports at the end of the coming step; one thread, before {@link #moveNodes}. Times in s. */
    public void poseSupports(double timeAfterStep, double newStep) {
        poses.moveTo(timeAfterStep);
        damping.refresh(mesh.nodes(), poses, newStep);
    }

    /** Gathers forces, closes the old step, books energies and opens the new step (s, > 0) with its drift. */
    public void moveNodes(int task, double oldStep, double newStep, NodalLoads loads) {
        int first = task * RANGE;
        int last = Math.min(mesh.nodes().count, first + RANGE);
        nodeStage.gather(first, last);
        loads.addTo(first, last, mesh.nodes().force, mesh.nodes().moment);
        nodeStage.move(task, first, last, oldStep, newStep);
    }

    /** Element forces and their sums per node without moving anything: for statics and inspection. One thread. */
    public void evaluateForces() {
        for (int task = 0; task < elementTasks(); task++) {
            elementForces(task, 0);
        }
        nodeStage.gather(0, mesh.nodes().count);
    }

    /** Gives all nodes of driven bodies the velocity of their support over the first step from a time, both in s. */
    public void startWithSupports(double time, double step) {
        SupportStart.apply(mesh, poses, time, step);
    }

    /**
     * Largest stable step with a margin of 10 %, at the strains of the last force pass, s; infinite without elements.
     */
    public double stableStep() {
        double step = Double.POSITIVE_INFINITY;
        for (ElementTask t : elementTasks) {
            double frequency = Math.sqrt(t.set.law.squaredFrequency(t.set, t.first, t.last));
            double ratio = 0.5 * t.set.law.dampingTime() * frequency;
            step = Math.min(step, 2 / frequency * (Math.sqrt(1 + ratio * ratio) - ratio));
        }
        return STABLE_PART * step;
    }

    /**
     * Largest squared element frequency at the strains of the last force pass, 1/s2; add contact stiffness / mass to
     * it.
     */
    public double squaredFrequency() {
        double largest = 0;
        for (ElementTask t : elementTasks) {
            largest = Math.max(largest, t.set.law.squaredFrequency(t.set, t.first, t.last));
        }
        return largest;
    }

    /**
     * Energies; exact for the last closed step when called after the node stage with {@code strain} taken before it.
     */
    public StructureEnergy energy(double strain) {
        double dissipated = 0;
        for (int task = 0; task < elementTasks(); task++) {
            dissipated += strainDissipation[8 * task];
        }
        return new StructureEnergy(
                sums.total(NodeSums.KINETIC),
                sums.total(NodeSums.GRAVITY),
                strain,
                dissipated,
                sums.total(NodeSums.MODAL),
                sums.total(NodeSums.SUPPORT));
    }

    /** Strain energy of all elements at the positions of the last force pass, added in task order, J. One thread. */
    public double strainEnergy() {
        double energy = 0;
        for (ElementTask t : elementTasks) {
            energy += t.set.law.strainEnergy(t.set, t.first, t.last);
        }
        return energy;
    }

    /** Writes everything that decides the next bits, to be taken after {@link #moveNodes}. */
    public void write(DataOutput out) throws IOException {
        mesh.nodes().write(out);
        for (ElementSet set : mesh.sets()) {
            Columns.write(set.history, out);
        }
        Columns.write(sums.rows, out);
        Columns.write(strainDissipation, out);
    }

    /** Reads what {@link #write} wrote into a structure built from the same mesh; IOException if it is another one. */
    public void read(DataInput in) throws IOException {
        mesh.nodes().read(in);
        for (ElementSet set : mesh.sets()) {
            Columns.read(set.history, in);
        }
        Columns.read(sums.rows, in);
        Columns.read(strainDissipation, in);
    }
}
