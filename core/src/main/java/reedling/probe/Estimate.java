// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/**
 * A figure with its interval of 95 % from batch means: the batches of a long enough stationary run are nearly
 * independent, so their mean scatters by their own scatter over the square root of their number.
 *
 * <p>Formula: value +- t s / sqrt(n), t of Student with n - 1 degrees of freedom; trend: t value of the least-squares
 * slope over the batch number.
 * <p>Source: A. M. Law and W. D. Kelton, Simulation Modeling and Analysis, 1982 (from memory).
 * <p>Not for: runs shorter than a few times the stay of a grain; then batches hang together and the interval is too
 * small.
 *
 * @param value the figure
 * @param halfWidth half the width of the interval; not a number with fewer than two batches
 * @param batches number of batches n
 * @param trend t value of the slope; not a number with fewer than three batches
 */
public record Estimate(double value, double halfWidth, int batches, double trend) {

    /** Fewer batches than this make a run too short. */
    public static final int ENOUGH = 5;

    /** 97.5 % points of Student's t for 1 to 30 degrees of freedom; standard tables. */
    private static final double[] STUDENT = {
        12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306, 2.262, 2.228, 2.201, 2.179, 2.160, 2.145, 2.131,
        2.120, 2.110, 2.101, 2.093, 2.086, 2.080, 2.074, 2.069, 2.064, 2.060, 2.056, 2.052, 2.048, 2.045, 2.042
    };

    /** The mean of the batches that are numbers, with its interval. */
    public static Estimate of(double[] batches) {
        return around(Double.NaN, batches);
    }

    /** A figure of the whole window, with the interval that its batches give; batches that are no numbers are left out. */
    public static Estimate around(double figure, double[] batches) {
        int n = 0;
        double sum = 0;
        for (double batch : batches) {
            if (!Double.isNaN(batch)) {
                n++;
                sum += batch;
            }
        }
        double mean = n > 0 ? sum / n : Double.NaN;
        double value = Double.isNaN(figure) ? mean : figure;
        double squares = 0;
        for (double batch : batches) {
            squares += Double.isNaN(batch) ? 0 : (batch - mean) * (batch - mean);
        }
        double half = n > 1 ? student(n - 1) * Math.sqrt(squares / (n - 1) / n) : Double.NaN;
        return new Estimate(value, half, n, trend(batches, n, mean));
    }

    /** Whether there were too few batches for an interval to be trusted. */
    public boolean tooShort() {
        return batches < ENOUGH;
    }

    /** Whether the batches rise or fall by more than their scatter explains, at 95 %. */
    public boolean drifts() {
        return batches > 2 && Math.abs(trend) > student(batches - 2);
    }

    /** 97.5 % point of Student's t. */
    static double student(int freedom) {
        if (freedom <= STUDENT.length) {
            return STUDENT[freedom - 1];
        }
        return 1.96 + 2.42 / freedom; // within 0.002 above 30 degrees of freedom
    }

    private static double trend(double[] batches, int n, double mean) {
        if (n < 3) {
            return Double.NaN;
        }
        double middle = 0;
        for (int k = 0; k < batches.length; k++) {
            middle += Double.isNaN(batches[k]) ? 0 : (double) k / n;
        }
        double across = 0;
        double along = 0;
        for (int k = 0; k < batches.length; k++) {
            if (!Double.isNaN(batches[k])) {
                across += (k - middle) * (batches[k] - mean);
                along += (k - middle) * (k - middle);
            }
        }
        double slope = across / along;
        double left = 0;
        for (int k = 0; k < batches.length; k++) {
            double miss = Double.isNaN(batches[k]) ? 0 : batches[k] - mean - slope * (k - middle);
            left += miss * miss;
        }
        return left == 0
                ? (slope == 0 ? 0 : Math.copySign(Double.POSITIVE_INFINITY, slope))
                : slope / Math.sqrt(left / (n - 2) / along);
    }
}
