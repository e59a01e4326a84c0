// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import reedling.feed.FeedRate;
import reedling.feed.GrainSeeds;
import reedling.feed.Launch;
import reedling.feed.LotMix;
import reedling.feed.LotShare;
import reedling.feed.PackedBlock;
import reedling.feed.Rain;
import reedling.feed.RainFeed;
import reedling.material.MaterialTable;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.particle.RandomStream;
import reedling.run.Model;

/** Feeds of a case: blocks fill the grain store before the start, streams become feed lines. */
final class FeedParts {

    /** Places tried for one grain in one step before it waits for the next. */
    private static final int TRIES = 20;

    private final CaseSpecification specification;
    private final MaterialTable table;
    private final List<Lot> lots;
    private final PartFaults faults;
    private final GrainStore grains = new GrainStore();
    private final List<Model.FeedLine> lines = new ArrayList<>();

    private FeedParts(CaseSpecification specification, MaterialTable table, List<Lot> lots, PartFaults faults) {
        this.specification = specification;
        this.table = table;
        this.lots = lots;
        this.faults = faults;
    }

    /** Makes all feeds; every lot they name must be in the list. */
    static FeedParts make(CaseSpecification specification, MaterialTable table, List<Lot> lots, PartFaults faults) {
        FeedParts parts = new FeedParts(specification, table, lots, faults);
        specification.feeds().forEach((name, feed) -> faults.make("feeds." + name, () -> parts.add(feed)));
        return parts;
    }

    GrainStore grains() {
        return grains;
    }

    List<Model.FeedLine> lines() {
        return lines;
    }

    private FeedSpecification add(FeedSpecification feed) {
        List<LotShare> shares = new ArrayList<>();
        feed.shares().forEach((lot, part) -> shares.add(new LotShare(lots.get(LotParts.number(lots, lot)), part)));
        LotMix mix = new LotMix(shares, table);
        int[] numbers = feed.shares().keySet().stream()
                .mapToInt(lot -> LotParts.number(lots, lot))
                .toArray();
        // every feed splits off streams of its own by its name
        RandomStream random = new RandomStream(specification.seed());
        switch (feed) {
            case FeedSpecification.PackedBlock block -> place(block(block, mix).fill(random), numbers);
            case FeedSpecification.Stream stream ->
                lines.add(new Model.FeedLine(new RainFeed(rain(stream, mix), random), numbers));
        }
        return feed;
    }

    private static PackedBlock block(FeedSpecification.PackedBlock block, LotMix mix) {
        PackedBlock.Amount amount = block.count().isPresent()
                ? PackedBlock.Amount.grains(Math.toIntExact(block.count().getAsLong()))
                : PackedBlock.Amount.fraction(block.solidFraction().orElseThrow());
        return new PackedBlock(block.name(), mix, box(block.region()), amount, block.velocity());
    }

    private void place(GrainSeeds seeds, int[] numbers) {
        grains.reserve(grains.count() + seeds.size());
        for (int k = 0; k < seeds.size(); k++) {
            double density = table.materials().get(seeds.material(k)).density();
            int g = grains.add(
                    seeds.x(k),
                    seeds.y(k),
                    seeds.z(k),
                    seeds.radius(k),
                    density,
                    seeds.material(k),
                    numbers[seeds.lot(k)]);
            grains.velocity(g, seeds.velocityX(k), seeds.velocityY(k), seeds.velocityZ(k));
        }
    }

    private Rain rain(FeedSpecification.Stream stream, LotMix mix) {
        reedling.feed.Region region = switch (stream.region()) {
            case BoxRegion box -> box(box);
            case DiscRegion disc -> new reedling.feed.DiscRegion(disc.centre(), disc.normal(), disc.radius());
        };
        return new Rain(
                stream.name(), mix, region, rate(stream), new Launch(stream.velocity(), stream.jitter(), TRIES));
    }

    private FeedRate rate(FeedSpecification.Stream stream) {
        double never = Double.POSITIVE_INFINITY;
        boolean byMass = stream.massRate().isPresent();
        String path = "feeds." + stream.name();
        if (byMass && stream.totalCount().isPresent()) {
            faults.add(path + ".total_count", "given with mass_rate", "total_mass", "Say how much in kg.");
        } else if (!byMass && stream.totalMass().isPresent()) {
            faults.add(path + ".total_mass", "given with count_rate", "total_count", "Say how many grains.");
        }
        return byMass
                ? new FeedRate(
                        FeedRate.Measure.MASS,
                        stream.massRate().getAsDouble(),
                        stream.totalMass().orElse(never),
                        stream.start(),
                        stream.stop().orElse(never))
                : new FeedRate(
                        FeedRate.Measure.COUNT,
                        stream.countRate().orElseThrow(),
                        stream.totalCount().isPresent() ? stream.totalCount().getAsLong() : never,
                        stream.start(),
                        stream.stop().orElse(never));
    }

    private static reedling.feed.BoxRegion box(BoxRegion box) {
        return new reedling.feed.BoxRegion(box.minimum(), box.maximum());
    }
}
