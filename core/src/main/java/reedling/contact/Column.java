// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/**
 * Columns of a {@link ContactBlock}, in the order in which the step fills them. A row is one contact of a first body
 * (a grain) with a second (a grain, a wall facet, a point of a wire). Vectors take three columns, world axes.
 */
public final class Column {

    // Written by the gather stage.

    /** Unit normal from first to second. */
    public static final int NORMAL = 0;
    /** Signed overlap, m; negative is a gap. */
    public static final int OVERLAP = 3;
    /** Velocity of the first body relative to the second at the contact point, tangential part, m/s. */
    public static final int SLIDING = 4;
    /** True sum of inverse masses that the contact moves, 1/kg. */
    public static final int INVERSE_MASS = 7;
    /** Spin of the first body less that of the second, rad/s. */
    public static final int SPIN = 8;
    /** Sum of inverse moments of inertia, 1/(kg m2). */
    public static final int INVERSE_INERTIA = 11;
    /** Mean normal over the past step, for turning stored vectors with the contact. */
    public static final int MEAN_NORMAL = 12;
    /** Distance of the contact point from the first centre, m. */
    public static final int LEVER_FIRST = 15;
    /** Distance of the contact point from the second centre or axis, m. */
    public static final int LEVER_SECOND = 16;
    /** 1 where the overlap is above minus the reach of the laws, which is 0 for most, else 0. */
    public static final int TOUCH = 17;
    /** Effective radius R*, m, any geometry factor folded in. */
    public static final int EFFECTIVE_RADIUS = 18;
    /** Mass that damping is made from, kg. */
    public static final int EFFECTIVE_MASS = 19;
    /** Closing speed, m/s, positive when approaching. */
    public static final int CLOSING = 20;
    /** Inverse mass felt by a force along the surface, levers included, 1/kg. */
    public static final int INVERSE_MASS_SLIDING = 21;

    // Written by the stage NORMAL; the later normal stages add to them.

    /** Elastic normal force, N, repulsive positive. */
    public static final int ELASTIC_FORCE = 22;
    /** Coefficient of the normal dashpot, N s/m. */
    public static final int DAMPING = 23;
    /** Normal stiffness dF/d overlap, N/m. */
    public static final int STIFFNESS = 24;
    /** Radius of the contact area, m. */
    public static final int CONTACT_RADIUS = 25;

    // Written by the engine's solve stage.

    /** Normal force with its dashpot, N, as the later stages may use it: never below 0 where a law pulls. */
    public static final int NORMAL_FORCE = 26;
    /** Contact radius of the step before over that of now; 0 for a new contact. */
    public static final int RADIUS_RATIO = 27;

    // Written by tangential and rolling stages.

    /** Friction on the second body, N; the first gets the opposite. */
    public static final int FRICTION = 28;
    /** Tangential stiffness, N/m. */
    public static final int SLIDING_STIFFNESS = 31;
    /** Rolling moment on the second body, N m; the first gets the opposite. */
    public static final int ROLLING_MOMENT = 32;

    /** Energy stored in the springs of the row, J; filled only when {@link ContactBlock#energyDue()}. */
    public static final int STORED_ENERGY = 35;

    /** Relative spin about the normal, rad/s; filled only where the case has a twisting law, which reads it. */
    public static final int TWIST = 36;

    // Filled by normal stages only where one of them pulls; the engine clears them before.

    /** What is added to the normal force to make the load that friction, rolling and twisting limits come from, N. */
    public static final int ADHESIVE_LOAD = 37;
    /** Energy that a change of state of the contact, such as tearing, turned into heat in this step, J. */
    public static final int LOST_ENERGY = 38;
    /** The engine's: normal force, N, while the load of the limits stands in its column. */
    public static final int PULLING_FORCE = 39;

    /** Number of columns. */
    public static final int COUNT = 40;

    private Column() {}
}
