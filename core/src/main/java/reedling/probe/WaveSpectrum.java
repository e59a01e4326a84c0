// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import reedling.probe.WavePlan.Area;

/**
 * Standing waves between walls: mean squares of a map that oscillates at one frequency, by wave number.
 *
 * <p>Formula: a_ij = w / (n m) sum of h cos(pi i (x - x0)/X) cos(pi j (y - y0)/Y), w = 1, 2 or 4 with none, one or both of
 * i and j above 0, so that the map is the sum of a_ij times the cosines; its mean square over area and time is the sum of
 * |a_ij|^2 / (2 w), h and a complex amplitudes. Modes are gathered in rings of k = pi sqrt((i/X)^2 + (j/Y)^2), each as wide as
 * the lowest k; i = j = 0, the layer as a whole, is left out.
 * <p>Source: discrete cosine transform, N. Ahmed, T. Natarajan and K. R. Rao, Discrete cosine transform, 1974. Threads:
 * confined to its owner.
 */
final class WaveSpectrum {

    private final double ringWidth;
    private final double[] meanSquare;
    private final double[] moment;

    /**
     * @param real cosine part of the complex amplitude of each cell
     * @param imaginary sine part
     */
    WaveSpectrum(Area area, double[] real, double[] imaginary) {
        ringWidth = Math.PI / Math.max(area.width(), area.depth());
        double largest = Math.PI * Math.hypot(area.columns() / area.width(), area.rows() / area.depth());
        meanSquare = new double[2 + (int) (largest / ringWidth)];
        moment = new double[meanSquare.length];
        double[][] alongX = cosines(area.columns());
        double[][] alongY = cosines(area.rows());
        for (int j = 0; j < area.rows(); j++) {
            for (int i = j == 0 ? 1 : 0; i < area.columns(); i++) {
                double k = Math.PI * Math.hypot(i / area.width(), j / area.depth());
                double square = (i > 0 ? 2 : 1) * (j > 0 ? 2 : 1) * squared(alongX[i], alongY[j], real, imaginary);
                int ring = (int) Math.rint(k / ringWidth);
                meanSquare[ring] += square;
                moment[ring] += square * k;
            }
        }
    }

    /** Half the squared size of the mean of a map times a mode. */
    private static double squared(double[] alongX, double[] alongY, double[] real, double[] imaginary) {
        double a = 0;
        double b = 0;
        int cell = 0;
        for (double y : alongY) {
            for (double x : alongX) {
                a += x * y * real[cell];
                b += x * y * imaginary[cell++];
            }
        }
        double cells = real.length;
        return 0.5 * (a * a + b * b) / (cells * cells);
    }

    private static double[][] cosines(int cells) {
        double[][] modes = new double[cells][cells];
        for (int mode = 0; mode < cells; mode++) {
            for (int cell = 0; cell < cells; cell++) {
                modes[mode][cell] = StrictMath.cos(Math.PI * mode * (cell + 0.5) / cells);
            }
        }
        return modes;
    }

    /** The ring of the largest mean square. */
    int strongest() {
        int best = 1;
        for (int ring = 2; ring < meanSquare.length; ring++) {
            best = meanSquare[ring] > meanSquare[best] ? ring : best;
        }
        return best;
    }

    /** Root mean square over area and time of a ring and its two neighbours, m: a wave may lie between two modes. */
    double amplitude(int ring) {
        return Math.sqrt(near(meanSquare, ring));
    }

    /** Wavelength of a ring and its two neighbours, m, from their mean wave number. */
    double wavelength(int ring) {
        return 2 * Math.PI * near(meanSquare, ring) / near(moment, ring);
    }

    private static double near(double[] rings, int ring) {
        return rings[ring - 1] + rings[ring] + (ring + 1 < rings.length ? rings[ring + 1] : 0);
    }

    int rings() {
        return meanSquare.length;
    }

    /** Wave number of a ring, rad/m. */
    double waveNumber(int ring) {
        return ring * ringWidth;
    }

    /** Mean square of a ring over area and time, m2. */
    double meanSquare(int ring) {
        return meanSquare[ring];
    }
}
