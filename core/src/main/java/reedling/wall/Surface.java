// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/**
 * Shape of a rigid wall in its own frame, seen as one or more facets; a sphere touches every facet whose gap is smaller
 * than its radius, and each such facet is a contact of its own.
 *
 * <p>Distances in m. Threads: implementations are immutable, queries may run on any thread and allocate nothing.
 */
public interface Surface {

    /** Number of facets, numbered from 0; never changes. */
    int facets();

    /**
     * Signed distance from a point to a facet.
     *
     * @param facet 0 to {@link #facets()} - 1
     * @param x point, m, frame of the surface; likewise y and z
     * @param normal filled in its first three places with the unit vector from the point to the nearest point of the
     * facet
     *     where the point is outside the material, and with its continuation where it is inside
     * @return distance, m, negative inside the material; plus infinity where another facet stands for this point, and
     * the
     *     normal is then without meaning
     */
    double gap(int facet, double x, double y, double z, double[] normal);

    /**
     * Radius Re (m) with which F = 4/3 E* sqrt(Re) d^1.5 is the Hertz force of a sphere on this facet.
     *
     * @param facet 0 to {@link #facets()} - 1
     * @param grainRadius m, > 0
     */
    double effectiveRadius(int facet, double grainRadius);
}
