// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.OptionalDouble;
import org.joml.Vector3dc;

/** A probe of a case. */
public sealed interface ProbeSpecification {

    /** As in the case file. */
    String name();

    /**
     * Angle of repose of a heap.
     *
     * @param centre middle of the plate, on its surface, m
     * @param ringWidth m; empty for the largest grain of the case
     * @param flankFrom where the flank begins, part of the foot radius
     * @param flankTo where it ends, part of the foot radius
     */
    record Heap(String name, Vector3dc centre, OptionalDouble ringWidth, double flankFrom, double flankTo)
            implements ProbeSpecification {}

    /**
     * Waves on a shaken layer.
     *
     * @param area box whose horizontal outline is looked at
     * @param cell width of a cell at most, m
     * @param motion name of the vibration of the floor
     * @param periods of the drive in a window, a multiple of 8
     * @param onsetRatio how often the background the waves must exceed to count
     */
    record Waves(String name, BoxRegion area, double cell, String motion, int periods, double onsetRatio)
            implements ProbeSpecification {}
}
