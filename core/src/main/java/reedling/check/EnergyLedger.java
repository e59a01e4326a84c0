// SPDX-License-Identifier: Apache-2.0
package reedling.check;

import java.io.IOException;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.coupling.ContactTally;
import reedling.coupling.Interactions;
import reedling.coupling.MoveTally;
import reedling.coupling.WallFacets;
import reedling.structure.Structure;
import reedling.structure.StructureEnergy;
import reedling.wall.WallPose;

/**
 * Balance of energy: what grains and structures hold, what contacts and damping took, what walls, supports, fields
 * without potential and feeds brought. Work is booked every step as 1/2 (old + new force) . displacement, which kick-drift-kick closes exactly, so
 * what is left over measures the discretisation: it falls by four when the steps per contact double.
 *
 * <p>Threads: one thread, between phases; sums run in chunk order.
 */
public final class EnergyLedger implements Persistent {

    private static final int LOAD = 6; // force 3, torque 3
    private static final int NUMBERS = 14; // saved beside the loads

    /**
     * What the bodies held at the last report, J.
     *
     * @param kinetic of grains and structures
     * @param potential in fields, of grains and structures
     * @param contacts elastic, of all contacts
     * @param strain elastic, of structures
     */
    public record Holdings(double kinetic, double potential, double contacts, double strain) {}

    private final double[] oldLoads;
    private double contactWork;
    private double wallWork;
    private double fieldWork;
    private double openedWork;
    private double brought;
    private double taken;
    private double start;
    private boolean started;
    private double residual;
    private double throughput;
    private double dissipated;
    private Holdings holdings = new Holdings(0, 0, 0, 0);

    /**
     * @param walls number of walls
     */
    public EnergyLedger(int walls) {
        oldLoads = new double[LOAD * walls];
    }

    /** Books the work of the contacts in the past step; call after every force phase, coarse or fine. */
    public void contacts(List<ContactTally> tallies) {
        for (int k = 0; k < tallies.size(); k++) {
            contactWork += tallies.get(k).work();
        }
    }

    /**
     * Books the work that walls did over the past step.
     *
     * @param loads force and torque on each wall now, six doubles a wall
     * @param past the past step, s
     */
    public void walls(double[] loads, WallFacets facets, double past) {
        for (int w = 0; w < facets.walls().size(); w++) {
            WallPose pose = facets.walls().get(w);
            int k = LOAD * w;
            double power = (oldLoads[k] + loads[k]) * pose.velocityX()
                    + (oldLoads[k + 1] + loads[k + 1]) * pose.velocityY()
                    + (oldLoads[k + 2] + loads[k + 2]) * pose.velocityZ()
                    + (oldLoads[k + 3] + loads[k + 3]) * pose.spinX()
                    + (oldLoads[k + 4] + loads[k + 4]) * pose.spinY()
                    + (oldLoads[k + 5] + loads[k + 5]) * pose.spinZ();
            wallWork -= 0.5 * power * past; // the wall does the opposite of what is done to it
        }
        System.arraycopy(loads, 0, oldLoads, 0, oldLoads.length);
    }

    /**
     * Books the work of fields without potential: that of the kicks that opened the past step and closed it. Call after a
     * move, before the report; needless where no field is of that kind.
     */
    public void fields(List<MoveTally> moves) {
        fieldWork += openedWork;
        openedWork = 0;
        for (int k = 0; k < moves.size(); k++) {
            fieldWork += moves.get(k).closingWork();
            openedWork += moves.get(k).openingWork();
        }
    }

    /** Books energy that a feed brought, J. */
    public void brought(double energy) {
        brought += energy;
    }

    /** Books energy that left with grains, J. */
    public void taken(double energy) {
        taken += energy;
    }

    /** Closes the balance after a move whose force phase was asked for energies. */
    public void report(Interactions interactions, Structure structure, double strainEnergy) {
        double kinetic = 0;
        for (MoveTally tally : interactions.moves()) {
            kinetic += tally.kinetic();
        }
        double stored = 0;
        double springs = 0;
        for (ContactTally tally : interactions.coarse()) {
            stored += tally.storedEnergy();
            springs += tally.springEnergy();
        }
        for (ContactTally tally : interactions.fine()) {
            stored += tally.storedEnergy();
            springs += tally.springEnergy();
        }
        StructureEnergy energy = structure.energy(strainEnergy);
        double held = kinetic + interactions.potentialEnergy() + stored + energy.balance();
        // the work against friction and rolling resistance holds what their springs store
        double balance = held + contactWork - wallWork - fieldWork - brought + taken;
        if (!started) {
            started = true;
            start = balance;
        }
        residual = balance - start;
        dissipated = contactWork - springs + energy.strainDissipation() + energy.modalDissipation();
        throughput = dissipated + Math.abs(fieldWork) + kinetic + energy.kinetic() + stored + springs + energy.strain();
        holdings = new Holdings(
                kinetic + energy.kinetic(),
                interactions.potentialEnergy() + energy.gravity(),
                stored + springs,
                energy.strain());
    }

    /** What the bodies held at the last report. */
    public Holdings holdings() {
        return holdings;
    }

    /** What is left over, J. */
    public double residual() {
        return residual;
    }

    /** Energy that contacts and damping turned into heat so far, J. */
    public double dissipated() {
        return dissipated;
    }

    /** Work that moving walls did on the grains so far, J. */
    public double wallWork() {
        return wallWork;
    }

    /** Work that fields without potential did on the grains so far, J; what drag took counts negative. */
    public double fieldWork() {
        return fieldWork;
    }

    /** Energy that went through the system so far, J. */
    public double throughput() {
        return throughput;
    }

    /** Residual over throughput; 0 while nothing moved. */
    public double relativeResidual() {
        return throughput > 0 ? residual / throughput : 0;
    }

    @Override
    public String section() {
        return "ledger";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        double[] numbers = {
            contactWork,
            wallWork,
            brought,
            taken,
            start,
            residual,
            throughput,
            dissipated,
            holdings.kinetic,
            holdings.potential,
            holdings.contacts,
            holdings.strain,
            fieldWork,
            openedWork
        };
        out.writeBoolean(started);
        out.writeDoubles(numbers, 0, numbers.length);
        out.writeDoubles(oldLoads, 0, oldLoads.length);
    }

    @Override
    public void restore(SectionReader in) {
        started = in.readBoolean();
        double[] saved = new double[NUMBERS];
        in.readDoubles(saved, 0, NUMBERS);
        contactWork = saved[0];
        wallWork = saved[1];
        brought = saved[2];
        taken = saved[3];
        start = saved[4];
        residual = saved[5];
        throughput = saved[6];
        dissipated = saved[7];
        holdings = new Holdings(saved[8], saved[9], saved[10], saved[11]);
        fieldWork = saved[12];
        openedWork = saved[13];
        in.readDoubles(oldLoads, 0, oldLoads.length);
    }
}
