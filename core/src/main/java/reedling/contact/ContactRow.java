// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static reedling.contact.ContactBlock.at;

/**
 * One row of a {@link ContactBlock}, for laws that are written for a single contact: a window that is moved from row to
 * row. Vectors are asked for by axis (0, 1, 2), in world axes.
 *
 * <p>Threads: belongs to its block, and so to one worker.
 */
public final class ContactRow {

    private final ContactBlock block;
    private int row;
    private int historyColumn;

    ContactRow(ContactBlock block) {
        this.block = block;
    }

    void moveTo(int number, int firstHistoryColumn) {
        row = number;
        historyColumn = firstHistoryColumn;
    }

    /** Any column of {@link Column}. */
    public double get(int column) {
        return block.columns()[at(column) + row];
    }

    /** Writes any column of {@link Column}. */
    public void set(int column, double value) {
        block.columns()[at(column) + row] = value;
    }

    /** Adds to any column of {@link Column}. */
    public void add(int column, double value) {
        block.columns()[at(column) + row] += value;
    }

    /** Unit normal from first to second. */
    public double normal(int axis) {
        return get(Column.NORMAL + axis);
    }

    /** m, positive where the bodies overlap. */
    public double overlap() {
        return get(Column.OVERLAP);
    }

    /** Closing speed, m/s, positive when approaching. */
    public double closing() {
        return get(Column.CLOSING);
    }

    /** Velocity of the first surface against the second at the contact point, m/s. */
    public double sliding(int axis) {
        return get(Column.SLIDING + axis);
    }

    /** Spin of the first body less that of the second, rad/s. */
    public double spin(int axis) {
        return get(Column.SPIN + axis);
    }

    /** R*, m. */
    public double effectiveRadius() {
        return get(Column.EFFECTIVE_RADIUS);
    }

    /** Mass that damping is made from, kg. */
    public double effectiveMass() {
        return get(Column.EFFECTIVE_MASS);
    }

    /** Length of the step that led here, s; 0 at the start of a run. */
    public double step() {
        return block.step();
    }

    /** Normal stages: elastic force, N, repulsive positive. */
    public void elasticForce(double newtons) {
        set(Column.ELASTIC_FORCE, newtons);
    }

    /** Elastic force that the normal stages gave, N. */
    public double elasticForce() {
        return get(Column.ELASTIC_FORCE);
    }

    /** Normal stages: coefficient of the dashpot, N s/m. */
    public void damping(double newtonSecondsPerMetre) {
        set(Column.DAMPING, newtonSecondsPerMetre);
    }

    /** Normal stages: slope of the elastic force, N/m. */
    public void stiffness(double newtonsPerMetre) {
        set(Column.STIFFNESS, newtonsPerMetre);
    }

    /** Slope of the normal force, N/m. */
    public double stiffness() {
        return get(Column.STIFFNESS);
    }

    /** Normal stages: radius of the contact area, m, above 0. */
    public void contactRadius(double metres) {
        set(Column.CONTACT_RADIUS, metres);
    }

    /** Radius of the contact area, m. */
    public double contactRadius() {
        return get(Column.CONTACT_RADIUS);
    }

    /** Normal stages: how long an impact at the present speed lasts, s. */
    public void duration(double seconds) {
        block.reportDuration(seconds);
    }

    /** Normal force with its dashpot, N; known to the stages after the normal ones. */
    public double normalForce() {
        return get(Column.NORMAL_FORCE);
    }

    /** Tangential stage: friction on the second body, N. */
    public void friction(int axis, double newtons) {
        set(Column.FRICTION + axis, newtons);
    }

    /** Tangential stage: stiffness along the surface, N/m. */
    public void slidingStiffness(double newtonsPerMetre) {
        set(Column.SLIDING_STIFFNESS, newtonsPerMetre);
    }

    /** Rolling stage: moment on the second body, N m. */
    public void rollingMoment(int axis, double newtonMetres) {
        set(Column.ROLLING_MOMENT + axis, newtonMetres);
    }

    /** True when {@link #addStoredEnergy} is wanted. */
    public boolean energyDue() {
        return block.energyDue();
    }

    /** Energy in the springs of the row, J. */
    public void addStoredEnergy(double joules) {
        add(Column.STORED_ENERGY, joules);
    }

    /** A number remembered from the step before; columns count from the law's first. */
    public double history(int column) {
        return block.history()[block.historyAtRow(row, historyColumn + column)];
    }

    /** Remembers a number for the next step. */
    public void history(int column, double value) {
        block.history()[block.historyAtRow(row, historyColumn + column)] = value;
    }
}
