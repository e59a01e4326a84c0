// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import reedling.error.RangeCheck;

/**
 * All grains of one diameter. Errors: diameter not positive. Threads: immutable.
 *
 * @param diameter m
 */
public record SingleSize(double diameter) implements SizeDistribution {

    public SingleSize {
        new RangeCheck("size").positive("diameter", diameter, "m").finish();
    }

    @Override
    public double diameter(RandomStream random) {
        return diameter;
    }

    @Override
    public double meanCube() {
        return diameter * diameter * diameter;
    }

    @Override
    public double smallest() {
        return diameter;
    }

    @Override
    public double largest() {
        return diameter;
    }

    @Override
    public double massPassing(double size) {
        return size < diameter ? 0 : 1;
    }
}
