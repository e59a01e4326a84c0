// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.List;
import reedling.wall.Wall;
import reedling.wall.WallPose;

/** All facets of all walls, numbered through; the walls' poses are advanced between phases. */
public final class WallFacets {

    private final List<WallPose> poses = new ArrayList<>();
    private final int[] wallOf;
    private final int[] facetOf;

    /**
     * @param time s, when the walls stand as they do now
     */
    public WallFacets(List<Wall> walls, double time) {
        int count = walls.stream().mapToInt(wall -> wall.surface().facets()).sum();
        wallOf = new int[count];
        facetOf = new int[count];
        int next = 0;
        for (Wall wall : walls) {
            for (int facet = 0; facet < wall.surface().facets(); facet++) {
                wallOf[next] = poses.size();
                facetOf[next++] = facet;
            }
            poses.add(new WallPose(wall, time));
        }
    }

    /** Number of facets. */
    public int count() {
        return wallOf.length;
    }

    /** Walls, each at its present place. */
    public List<WallPose> walls() {
        return poses;
    }

    int wallOf(int facet) {
        return wallOf[facet];
    }

    WallPose pose(int facet) {
        return poses.get(wallOf[facet]);
    }

    /** Gap between a point and a facet, m, with the normal towards the wall. */
    double gap(int facet, double x, double y, double z, double[] normal) {
        return pose(facet).gap(facetOf[facet], x, y, z, normal);
    }

    double effectiveRadius(int facet, double grainRadius) {
        return pose(facet).wall().surface().effectiveRadius(facetOf[facet], grainRadius);
    }
}
