// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import reedling.error.RangeCheck;
import reedling.wall.Motion;

/**
 * Waves on a layer that is shaken up and down, z up. Errors: an extent or a frequency not positive; fewer than two cells;
 * periods not a positive multiple of 8. Threads: immutable.
 *
 * @param name as in the case file
 * @param area horizontal rectangle that is looked at, wall to wall
 * @param frequency of the drive, Hz
 * @param motion of the floor
 * @param periods of the drive in a window
 * @param onsetRatio how often the background the waves must exceed to count
 */
public record WavePlan(String name, Area area, double frequency, Motion motion, int periods, double onsetRatio)
        implements ProbePlan {

    /** Samples in a period of the drive. */
    static final int SAMPLES = 16;

    public WavePlan {
        new RangeCheck("probe." + name)
                .positive("frequency", frequency, "Hz")
                .positive("onset ratio", onsetRatio, "")
                .require(periods > 0 && periods % 8 == 0, "periods", periods, "", "8, 16, 24, ...")
                .finish();
    }

    /**
     * A horizontal rectangle cut into equal cells.
     *
     * @param lowX m
     * @param lowY m
     * @param width extent along x, m
     * @param depth extent along y, m
     * @param columns cells along x
     * @param rows cells along y
     */
    public record Area(double lowX, double lowY, double width, double depth, int columns, int rows) {

        public Area {
            new RangeCheck("probe.area")
                    .positive("width", width, "m")
                    .positive("depth", depth, "m")
                    .require(columns > 0 && rows > 0 && columns * rows > 1, "cells", columns * rows, "", "at least 2")
                    .finish();
        }

        /** Cell of a point (m); negative outside. */
        int cell(double x, double y) {
            int column = (int) Math.floor((x - lowX) / width * columns);
            int row = (int) Math.floor((y - lowY) / depth * rows);
            return column < 0 || row < 0 || column >= columns || row >= rows ? -1 : row * columns + column;
        }

        /** Area of a cell, m2. */
        double cellArea() {
            return width * depth / (columns * rows);
        }
    }

    @Override
    public BulkProbe open() {
        return new WaveProbe(this);
    }
}
