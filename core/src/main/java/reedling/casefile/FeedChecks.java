// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.joml.Vector3d;
import reedling.material.Material;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Feeds and outlets against each other and the bounds. */
final class FeedChecks {

    /** Random close packing of equal spheres; common figure, no source. */
    private static final double DENSEST = 0.64;

    private final Draft draft;
    private final Rules rules;

    private FeedChecks(Draft draft, Rules rules) {
        this.draft = draft;
        this.rules = rules;
    }

    static void run(Draft draft, Rules rules) {
        FeedChecks checks = new FeedChecks(draft, rules);
        List<FeedSpecification> feeds = new ArrayList<>(draft.feeds.values());
        feeds.forEach(checks::insideBounds);
        feeds.forEach(checks::roomEnough);
        checks.blocksApart(feeds);
        checks.outlets(new ArrayList<>(draft.outlets.values()));
        checks.unusedLots(feeds);
    }

    private void insideBounds(FeedSpecification feed) {
        draft.bounds.ifPresent(bounds -> {
            if (!bounds.contains(feed.region().surroundings())) {
                rules.error(
                        path(feed),
                        "partly outside of the bounds",
                        "a region inside of them",
                        "Grains put in out there would be spilled at once: move the region or widen [bounds].");
            }
        });
    }

    private static String path(FeedSpecification feed) {
        return "feeds." + feed.name() + ".region";
    }

    private void blocksApart(List<FeedSpecification> feeds) {
        for (int k = 0; k < feeds.size(); k++) {
            for (int earlier = 0; earlier < k; earlier++) {
                if (feeds.get(k) instanceof FeedSpecification.PackedBlock b
                        && feeds.get(earlier) instanceof FeedSpecification.PackedBlock a
                        && a.region().overlaps(b.region())) {
                    rules.error(
                            path(b),
                            "overlapping the packed block feeds." + a.name(),
                            "blocks that share no volume",
                            "Their grains would start inside each other: move feeds." + b.name() + " or feeds."
                                    + a.name() + ".");
                }
            }
        }
    }

    private void roomEnough(FeedSpecification feed) {
        if (!(feed instanceof FeedSpecification.PackedBlock block)
                || !draft.lots.keySet().containsAll(feed.shares().keySet())) {
            return;
        }
        double side = shortestSide(block.region());
        double largest = block.shares().keySet().stream()
                .mapToDouble(lot ->
                        Objects.requireNonNull(draft.lots.get(lot)).diameter().largest())
                .max()
                .orElse(0);
        if (side < largest) {
            rules.error(
                    path(block),
                    "a box of shortest side " + length(side),
                    "room for the largest grain, " + length(largest),
                    "Widen the box or cut the sizes.");
        }
        double volume = volume(block.region());
        block.count().ifPresent(count -> {
            double solid = count * meanVolume(block.shares()) / volume;
            if (solid > DENSEST) {
                rules.error(
                        "feeds." + block.name() + ".count",
                        count + ", a solid fraction of " + QuantityText.of(solid, Dimension.NUMBER),
                        "a solid fraction ≤ " + DENSEST,
                        "Put in fewer grains or widen the box.");
            }
        });
    }

    private static double shortestSide(BoxRegion box) {
        Vector3d sides = new Vector3d(box.maximum()).sub(box.minimum());
        return Math.min(sides.x, Math.min(sides.y, sides.z));
    }

    private static double volume(BoxRegion box) {
        Vector3d sides = new Vector3d(box.maximum()).sub(box.minimum());
        return sides.x * sides.y * sides.z;
    }

    /** Mean volume of a grain (m3) of a mixture given by mass: volume of a unit of mass over its number of grains. */
    private double meanVolume(Map<String, Double> shares) {
        double volume = 0;
        double number = 0;
        for (Map.Entry<String, Double> share : shares.entrySet()) {
            LotSpecification lot = Objects.requireNonNull(draft.lots.get(share.getKey()));
            Material material = draft.materials.get(lot.material());
            double grain = Math.PI / 6 * Math.pow(lot.diameter().typical(), 3);
            double part = share.getValue() / (material == null ? 1 : material.density());
            volume += part;
            number += part / grain;
        }
        return volume / number;
    }

    private void outlets(List<OutletSpecification> outlets) {
        for (int k = 0; k < outlets.size(); k++) {
            OutletSpecification outlet = outlets.get(k);
            String path = "outlets." + outlet.name();
            draft.bounds
                    .filter(bounds -> !bounds.overlaps(outlet.box()))
                    .ifPresent(bounds -> rules.error(
                            path,
                            "outside of the bounds",
                            "a box that shares a volume with them",
                            "No grain would ever reach it."));
            for (int earlier = 0; earlier < k; earlier++) {
                if (outlets.get(earlier).box().overlaps(outlet.box())) {
                    String other = "outlets." + outlets.get(earlier).name();
                    rules.error(
                            path,
                            "overlapping " + other,
                            "outlets that share no volume",
                            "A grain in both could be counted in either: move one.");
                }
            }
        }
    }

    private void unusedLots(List<FeedSpecification> feeds) {
        boolean all = feeds.size() == draft.root.<Values>named("feeds").size();
        for (String lot : draft.lots.keySet()) {
            if (all && feeds.stream().noneMatch(feed -> feed.shares().containsKey(lot))) {
                rules.caution("lots." + lot, "in no feed", "a feed that names it", "Remove it, or feed it.");
            }
        }
    }

    private static String length(double metres) {
        return QuantityText.of(metres, Dimension.LENGTH);
    }
}
