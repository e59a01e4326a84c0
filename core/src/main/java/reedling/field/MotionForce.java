// SPDX-License-Identifier: Apache-2.0
package reedling.field;

/**
 * The part of a field that depends on velocity, or has no potential: drag, lift, a magnetic force. It is asked after all
 * other forces of the step, because its velocity is that of the present time, which the others help to decide; so it
 * solves for its own force and the velocity together. Kick-drift-kick then keeps its order of two, drag cannot make a
 * grain turn round, and a magnetic force leaves the speed as it is. Its work is booked in the energy balance.
 *
 * <p>Threads: immutable; called by many tasks at once, each with a block of its own.
 */
@FunctionalInterface
public interface MotionForce {

    /**
     * Writes the force and torque on each grain of a block into its own rows (assigns, does not add), and notes rates.
     * The grains' rows and force rows are only read.
     *
     * <p>Stable step: the engine keeps the step below a tenth of the time 1/rate.
     */
    void push(MotionBlock block);
}
