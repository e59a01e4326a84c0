// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.joml.Vector3dc;

/** Where grains come from. Shares are by lot name, fractions of the mass, and add up to 1. */
public sealed interface FeedSpecification {

    String name();

    /** Mass shares by lot name. */
    Map<String, Double> shares();

    Region region();

    /** m/s, of every grain put in. */
    Vector3dc velocity();

    /**
     * Grains that lie in a box when the run starts; exactly one of count and solidFraction is present.
     *
     * @param count number of grains
     * @param solidFraction volume of grains over volume of the box
     */
    record PackedBlock(
            String name,
            Map<String, Double> shares,
            BoxRegion region,
            OptionalLong count,
            OptionalDouble solidFraction,
            Vector3dc velocity)
            implements FeedSpecification {}

    /** What a stream looks like: grains scattered over a region, or one behind the other through it. */
    enum StreamKind {
        RAIN,
        JET
    }

    /**
     * Grains put in over time; exactly one of massRate and countRate, at most one of stop, totalMass and totalCount.
     *
     * @param massRate kg/s
     * @param countRate 1/s
     * @param start s
     * @param stop s
     * @param totalMass kg
     * @param totalCount number of grains
     * @param jitter largest random deviation of each velocity component, m/s
     */
    record Stream(
            String name,
            StreamKind kind,
            Map<String, Double> shares,
            Region region,
            OptionalDouble massRate,
            OptionalDouble countRate,
            double start,
            OptionalDouble stop,
            OptionalDouble totalMass,
            OptionalLong totalCount,
            Vector3dc velocity,
            double jitter)
            implements FeedSpecification {}
}
