// SPDX-License-Identifier: Apache-2.0
package reedling.time;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.math.StepLadder;

/**
 * Chooses the step from its limits. While anything touches, steps stand on the rungs of {@link StepLadder}: down at once,
 * up one rung after as many permitting steps as a contact takes, so that a step never follows the phase of a contact
 * (which would lose energy systematically). While nothing touches, the step is the limit itself.
 *
 * <p>Threads: one thread, between phases.
 */
public final class StepControl implements Persistent {

    private static final double RISE = 1.02 * StepLadder.RATIO;
    private static final double LARGEST_GROWTH = 2;
    private static final double FREE = 0; // rung while nothing touches

    private final int stepsPerContact;
    private final double maximum;
    private double rung = FREE;
    private int permitting;
    private double step;

    /**
     * @param stepsPerContact steps in the duration of an impact
     * @param maximum longest step of the case, s
     */
    public StepControl(int stepsPerContact, double maximum) {
        this.stepsPerContact = stepsPerContact;
        this.maximum = maximum;
    }

    /** Length that the next step will not exceed, s. */
    public double longestNext() {
        return step == 0 ? maximum : Math.min(maximum, LARGEST_GROWTH * step);
    }

    /**
     * Next step, s.
     *
     * @param limit smallest of all limits, s, > 0
     * @param touching whether any bodies overlap
     */
    public double choose(double limit, boolean touching) {
        double bounded = Math.min(limit, longestNext());
        if (!touching) {
            rung = FREE;
            permitting = 0;
            step = bounded;
            return step;
        }
        if (rung == FREE || rung > bounded) {
            rung = StepLadder.floor(bounded);
            permitting = 0;
        } else if (bounded > RISE * rung) {
            permitting++;
            if (permitting >= stepsPerContact) {
                rung = StepLadder.floor(rung * RISE);
                permitting = 0;
            }
        } else {
            permitting = 0;
        }
        step = rung;
        return step;
    }

    /** Halves the step chosen last, which turned out too long. */
    public void halve() {
        step *= 0.5;
        rung *= 0.5; // four rungs down, exactly
        permitting = 0;
    }

    /** The step chosen last, s; 0 before the first. */
    public double step() {
        return step;
    }

    @Override
    public String section() {
        return "step control";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeDouble(rung);
        out.writeInt(permitting);
        out.writeDouble(step);
    }

    @Override
    public void restore(SectionReader in) {
        rung = in.readDouble();
        permitting = in.readInt();
        step = in.readDouble();
    }
}
