// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import reedling.contact.LawSet;
import reedling.feed.RainFeed;
import reedling.field.Field;
import reedling.material.MaterialTable;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.structure.Structure;
import reedling.wall.Wall;

/**
 * Everything a run starts from, made from a case or by a test.
 *
 * @param materials materials and pairs
 * @param lots lots of grain, by number
 * @param grains grains present at the start
 * @param structure parts that bend, possibly without any node
 * @param materialOfBody material number of each body of the structure
 * @param walls rigid walls
 * @param fields fields
 * @param laws bound contact laws
 * @param feeds raining feeds with the lot number of each of their mix's entries
 * @param exits where grains leave the run
 * @param steps how it steps
 */
public record Model(
        MaterialTable materials,
        List<Lot> lots,
        GrainStore grains,
        Structure structure,
        int[] materialOfBody,
        List<Wall> walls,
        List<Field> fields,
        LawSet laws,
        List<FeedLine> feeds,
        Exits exits,
        StepSettings steps) {

    /**
     * A raining feed.
     *
     * @param feed state of the feed
     * @param lotNumbers number in {@link Model#lots()} of each lot of its mix
     */
    public record FeedLine(RainFeed feed, int[] lotNumbers) {}
}
