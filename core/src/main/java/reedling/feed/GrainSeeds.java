// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.Arrays;

/**
 * Grains about to enter a run, as flat columns of equal length; SI units, world frame.
 *
 * <p>Threads: confined to its owner.
 */
public final class GrainSeeds {

    private int size;
    private double[] x = new double[16];
    private double[] y = new double[16];
    private double[] z = new double[16];
    private double[] radius = new double[16];
    private double[] velocityX = new double[16];
    private double[] velocityY = new double[16];
    private double[] velocityZ = new double[16];
    private int[] lot = new int[16];
    private int[] material = new int[16];

    /** Number of grains. */
    public int size() {
        return size;
    }

    /** Forgets all grains and keeps the memory. */
    public void clear() {
        size = 0;
    }

    /** Adds a grain at rest (centre and radius in m) of lot and material 0 and returns its row. */
    int add(double centreX, double centreY, double centreZ, double grainRadius) {
        if (size == x.length) {
            grow(2 * size);
        }
        x[size] = centreX;
        y[size] = centreY;
        z[size] = centreZ;
        radius[size] = grainRadius;
        setVelocity(size, 0, 0, 0);
        setKind(size, 0, 0);
        return size++;
    }

    void setVelocity(int row, double vx, double vy, double vz) {
        velocityX[row] = vx;
        velocityY[row] = vy;
        velocityZ[row] = vz;
    }

    void setKind(int row, int lotNumber, int materialNumber) {
        lot[row] = lotNumber;
        material[row] = materialNumber;
    }

    /** Whether a sphere (m) overlaps none of these grains. */
    boolean free(double centreX, double centreY, double centreZ, double grainRadius) {
        for (int k = 0; k < size; k++) {
            double dx = x[k] - centreX;
            double dy = y[k] - centreY;
            double dz = z[k] - centreZ;
            double reach = radius[k] + grainRadius;
            if (dx * dx + dy * dy + dz * dz < reach * reach) {
                return false;
            }
        }
        return true;
    }

    /** Centre, m. */
    public double x(int row) {
        return x[row];
    }

    public double y(int row) {
        return y[row];
    }

    public double z(int row) {
        return z[row];
    }

    /** Radius, m. */
    public double radius(int row) {
        return radius[row];
    }

    /** Velocity, m/s. */
    public double velocityX(int row) {
        return velocityX[row];
    }

    public double velocityY(int row) {
        return velocityY[row];
    }

    public double velocityZ(int row) {
        return velocityZ[row];
    }

    /** Number of the lot in the mix of the feed that made the grain. */
    public int lot(int row) {
        return lot[row];
    }

    /** Number in the material table. */
    public int material(int row) {
        return material[row];
    }

    private void grow(int capacity) {
        x = Arrays.copyOf(x, capacity);
        y = Arrays.copyOf(y, capacity);
        z = Arrays.copyOf(z, capacity);
        radius = Arrays.copyOf(radius, capacity);
        velocityX = Arrays.copyOf(velocityX, capacity);
        velocityY = Arrays.copyOf(velocityY, capacity);
        velocityZ = Arrays.copyOf(velocityZ, capacity);
        lot = Arrays.copyOf(lot, capacity);
        material = Arrays.copyOf(material, capacity);
    }
}
