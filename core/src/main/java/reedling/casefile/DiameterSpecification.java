// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.particle.SizeDistribution;

/** Sizes of the grains of a lot; all lengths in m. */
public sealed interface DiameterSpecification {

    /** Smallest diameter that can occur, m. */
    double smallest();

    /** Largest diameter that can occur, m. */
    double largest();

    /** Middle of the sizes, for estimates: the mean before truncation, m. */
    double typical();

    /** All grains alike. */
    record Single(double diameter) implements DiameterSpecification {

        @Override
        public double smallest() {
            return diameter;
        }

        @Override
        public double largest() {
            return diameter;
        }

        @Override
        public double typical() {
            return diameter;
        }
    }

    /** Normal distribution of given mean and standard deviation before it is cut at both ends. */
    record TruncatedNormal(double mean, double deviation, double smallest, double largest)
            implements DiameterSpecification {

        @Override
        public double typical() {
            return mean;
        }
    }

    /** All sizes between two limits equally likely, by number. */
    record Uniform(double smallest, double largest) implements DiameterSpecification {

        @Override
        public double typical() {
            return 0.5 * (smallest + largest);
        }
    }

    /** A distribution made when it was read; its typical size is that of the grain of mean volume. */
    record Graded(SizeDistribution sizes) implements DiameterSpecification {

        @Override
        public double smallest() {
            return sizes.smallest();
        }

        @Override
        public double largest() {
            return sizes.largest();
        }

        @Override
        public double typical() {
            return StrictMath.cbrt(sizes.meanCube());
        }
    }
}
