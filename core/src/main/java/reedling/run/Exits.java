// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;

/**
 * Where grains leave a run: boxes that count what enters them, in order, and the bounds, outside of which a grain counts
 * as spilled.
 *
 * @param outlets boxes by name
 * @param bounds low corner 3 and high corner 3, m; infinite sides are never crossed
 */
public record Exits(List<Outlet> outlets, double[] bounds) {

    /** Number that {@link #exitOf} gives for a grain that stays. */
    public static final int STAYS = -1;

    /**
     * A box that takes grains whose centre is inside.
     *
     * @param name as in the case file
     * @param box low corner 3 and high corner 3, m
     */
    public record Outlet(String name, double[] box) {}

    /** No exits at all. */
    public static Exits none() {
        double far = Double.POSITIVE_INFINITY;
        return new Exits(List.of(), new double[] {-far, -far, -far, far, far, far});
    }

    /** Number of the outlet a point is in; the number of outlets for one outside the bounds; or {@link #STAYS}. */
    public int exitOf(double x, double y, double z) {
        for (int k = 0; k < outlets.size(); k++) {
            if (inside(outlets.get(k).box(), x, y, z)) {
                return k;
            }
        }
        return inside(bounds, x, y, z) ? STAYS : outlets.size();
    }

    private static boolean inside(double[] box, double x, double y, double z) {
        return x >= box[0] && x <= box[3] && y >= box[1] && y <= box[4] && z >= box[2] && z <= box[5];
    }
}
