// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.coupling.WireContacts;
import reedling.structure.Body;
import reedling.structure.Structure;

/**
 * Loads of each wire: running extremes over every {@link #EVERY}th step, kept for the present table interval and for the
 * measured window, and the bounds of the stress range since measuring began, also batch by batch.
 *
 * <p>Sixteen steps are less than an impact takes and far less than a period of the first modes of a wire; a peak between
 * two samples is missed by little.
 *
 * <p>Threads: one, between steps.
 */
public final class WireLoads implements Persistent {

    /** Steps between two samples. */
    public static final int EVERY = 16;

    private final Structure structure;
    private final MeasuredWindow measured;
    private final ElementResults results;
    private final WirePeaks interval;
    private final WirePeaks window;
    private final FibreRange range;
    private final FibreRange batchRange;
    private final double[][] batchUpper;
    private final double[] contactForces;
    private int batch = MeasuredWindow.OUTSIDE;

    public WireLoads(Structure structure, MeasuredWindow measured) {
        this.structure = structure;
        this.measured = measured;
        results = new ElementResults(structure);
        int bodies = structure.bodies().size();
        interval = new WirePeaks(bodies);
        window = new WirePeaks(bodies);
        range = new FibreRange(results.count());
        batchRange = new FibreRange(results.count());
        batchUpper = new double[measured.batches()][bodies];
        for (double[] one : batchUpper) {
            Arrays.fill(one, Double.NaN);
        }
        contactForces = new double[3 * bodies];
    }

    /** Takes the loads at a time, s. */
    public void sample(double time, WireContacts wires) {
        results.take();
        int now = measured.batchOf(time);
        boolean inside = now != MeasuredWindow.OUTSIDE;
        if (now != batch) {
            batch = now;
            batchRange.clear();
        }
        List<Body> bodies = structure.bodies();
        Arrays.fill(contactForces, 0);
        boolean forces = wires.addForces(contactForces);
        for (int b = 0; b < bodies.size(); b++) {
            take(interval, b, forces);
            if (inside) {
                take(window, b, forces);
                takeRange(b);
            }
        }
    }

    private void take(WirePeaks peaks, int b, boolean forces) {
        Body body = structure.bodies().get(b);
        for (int k = 0; k < body.elementCount(); k++) {
            int e = body.firstElement() + k;
            double stress = Math.max(Math.abs(results.fibreStress()[e]), Math.abs(results.smallestFibreStress()[e]));
            peaks.element(b, k, results.axialForce()[e], results.bendingMoment()[e], stress);
        }
        peaks.sag(b, WireShape.largestSag(structure.nodes(), body));
        if (forces) {
            double x = contactForces[3 * b], y = contactForces[3 * b + 1], z = contactForces[3 * b + 2];
            peaks.contactForce(b, Math.sqrt(x * x + y * y + z * z));
        }
    }

    private void takeRange(int b) {
        Body body = structure.bodies().get(b);
        double upper = Double.NaN;
        for (int e = body.firstElement(); e < body.firstElement() + body.elementCount(); e++) {
            range.take(e, results.fibreStress()[e], results.smallestFibreStress()[e]);
            batchRange.take(e, results.fibreStress()[e], results.smallestFibreStress()[e]);
            double one = batchRange.upper(e);
            upper = one > upper || Double.isNaN(upper) ? one : upper;
        }
        batchUpper[batch][b] = upper;
    }

    /** Extremes since {@link #beginInterval}. */
    public WirePeaks interval() {
        return interval;
    }

    /** Extremes in the measured window. */
    public WirePeaks window() {
        return window;
    }

    /** Starts a new table interval. */
    public void beginInterval() {
        interval.clear();
    }

    /** Element of a body, counted from 0, whose stress range since measuring began may be largest. */
    public int worstElement(int body) {
        Body one = structure.bodies().get(body);
        int worst = 0;
        for (int k = 1; k < one.elementCount(); k++) {
            if (range.upper(one.firstElement() + k) > range.upper(one.firstElement() + worst)) {
                worst = k;
            }
        }
        return worst;
    }

    /** Upper bound of the stress range of a body's worst fibre since measuring began, Pa. */
    public double rangeUpper(int body) {
        return range.upper(structure.bodies().get(body).firstElement() + worstElement(body));
    }

    /** Lower bound of the stress range of the same element's worst fibre, Pa. */
    public double rangeLower(int body) {
        return range.lower(structure.bodies().get(body).firstElement() + worstElement(body));
    }

    /** Upper bound of the stress range of a body in each batch, Pa; not a number for one without a sample. */
    public double[] batchRanges(int body) {
        return Arrays.stream(batchUpper).mapToDouble(one -> one[body]).toArray();
    }

    @Override
    public String section() {
        return "wire loads";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        interval.save(out);
        window.save(out);
        range.save(out);
        batchRange.save(out);
        for (double[] one : batchUpper) {
            out.writeDoubles(one, 0, one.length);
        }
        out.writeInt(batch);
    }

    @Override
    public void restore(SectionReader in) {
        interval.restore(in);
        window.restore(in);
        range.restore(in);
        batchRange.restore(in);
        for (double[] one : batchUpper) {
            in.readDoubles(one, 0, one.length);
        }
        batch = in.readInt();
    }
}
