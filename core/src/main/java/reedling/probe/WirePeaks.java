// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/** Largest loads of each wire over some time. Threads: one. */
public final class WirePeaks {

    private final double[] axialForce;
    private final double[] bendingMoment;
    private final double[] fibreStress;
    private final int[] stressedElement;
    private final double[] sag;
    private final double[] contactForce;

    WirePeaks(int bodies) {
        axialForce = new double[bodies];
        bendingMoment = new double[bodies];
        fibreStress = new double[bodies];
        stressedElement = new int[bodies];
        sag = new double[bodies];
        contactForce = new double[bodies];
        clear();
    }

    void clear() {
        for (double[] column : columns()) {
            Arrays.fill(column, Double.NaN);
        }
        Arrays.fill(stressedElement, -1);
    }

    private double[][] columns() {
        return new double[][] {axialForce, bendingMoment, fibreStress, sag, contactForce};
    }

    void element(int body, int number, double axial, double moment, double stress) {
        axialForce[body] = larger(axial, axialForce[body]);
        bendingMoment[body] = larger(moment, bendingMoment[body]);
        if (stress > fibreStress[body] || Double.isNaN(fibreStress[body])) {
            fibreStress[body] = stress;
            stressedElement[body] = number;
        }
    }

    void sag(int body, double value) {
        sag[body] = larger(value, sag[body]);
    }

    void contactForce(int body, double value) {
        contactForce[body] = larger(value, contactForce[body]);
    }

    private static double larger(double value, double old) {
        return value > old || Double.isNaN(old) ? value : old;
    }

    /** Largest axial force of a body, N; not a number if there was no sample. */
    public double axialForce(int body) {
        return axialForce[body];
    }

    /** Largest bending moment, N m. */
    public double bendingMoment(int body) {
        return bendingMoment[body];
    }

    /** Largest fibre stress, Pa. */
    public double fibreStress(int body) {
        return fibreStress[body];
    }

    /** Element of the body, counted from 0 at its start, with the largest fibre stress; -1 if there was no sample. */
    public int stressedElement(int body) {
        return stressedElement[body];
    }

    /** Largest distance of a node from its place between the ends, m. */
    public double sag(int body) {
        return sag[body];
    }

    /** Largest force of all contacts on the body together, N. */
    public double contactForce(int body) {
        return contactForce[body];
    }

    void save(SectionWriter out) throws IOException {
        for (double[] column : columns()) {
            out.writeDoubles(column, 0, column.length);
        }
        out.writeInts(stressedElement, 0, stressedElement.length);
    }

    void restore(SectionReader in) {
        for (double[] column : columns()) {
            in.readDoubles(column, 0, column.length);
        }
        in.readInts(stressedElement, 0, stressedElement.length);
    }
}
