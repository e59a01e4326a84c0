// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import reedling.probe.Estimate;
import reedling.probe.Partition;
import reedling.probe.Separation;
import reedling.probe.SizePassage;
import reedling.probe.WireLoads;

/**
 * The figures a screen is judged by, from the finished batches of the measured window.
 *
 * @param batches finished batches
 * @param throughput mass fed a second and metre of deck width, kg/(s m)
 * @param recovery part of the decided undersize that passed, by mass
 * @param loss part of the decided product that passed, by mass
 * @param separation masses of the whole window
 * @param partition partition curve of the whole window
 * @param cutSize diameter of which half passes, m
 * @param pegged part of the open area pegged, per cent
 * @param stressRange upper bound of the stress range of the worst wire, Pa
 * @param stressRangeLower lower bound at the same element, Pa
 * @param worstBody body number of that wire
 * @param worstElement its element, counted from 0
 */
record ScreenFigures(
        int batches,
        Estimate throughput,
        Estimate recovery,
        Estimate loss,
        Separation separation,
        Partition partition,
        Estimate cutSize,
        Estimate pegged,
        Estimate stressRange,
        double stressRangeLower,
        int worstBody,
        int worstElement) {

    static ScreenFigures of(RunProbes probes, ScreenPlan plan, double time) {
        int batches = probes.window().finished(time);
        SizePassage sizes = probes.sizes();
        WireLoads loads = probes.wireLoads();
        RunProbes.Deck deck = probes.deck().orElseThrow();
        int worst = worstBody(plan, loads);
        double perWidth = 1 / (deck.frame().width() * probes.window().batchLength());
        double[] fed = each(
                batches,
                batch -> IntStream.of(plan.undersizeLot(), plan.productLot())
                        .distinct()
                        .mapToDouble(lot -> sizes.fedMass(batch, lot) * perWidth)
                        .sum());
        double[] cuts =
                each(batches, batch -> partition(sizes, plan, batch, batch + 1).cutSize());
        Separation whole = separation(sizes, plan, 0, batches);
        Partition partition = partition(sizes, plan, 0, batches);
        double[] ranges = java.util.Arrays.copyOf(loads.batchRanges(worst), batches);
        return new ScreenFigures(
                batches,
                Estimate.of(fed),
                Estimate.around(
                        whole.undersizeRecovery(),
                        each(batches, b -> separation(sizes, plan, b, b + 1).undersizeRecovery())),
                Estimate.around(
                        whole.productLoss(),
                        each(batches, b -> separation(sizes, plan, b, b + 1).productLoss())),
                whole,
                partition,
                Estimate.around(partition.cutSize(), cuts),
                Estimate.of(deck.openAreaLost().means(batches)),
                Estimate.around(loads.rangeUpper(worst), ranges),
                loads.rangeLower(worst),
                worst,
                loads.worstElement(worst));
    }

    private static int worstBody(ScreenPlan plan, WireLoads loads) {
        int worst = plan.bodies()[0];
        for (int body : plan.bodies()) {
            worst = loads.rangeUpper(body) > loads.rangeUpper(worst) ? body : worst;
        }
        return worst;
    }

    private static double[] each(int batches, IntToDoubleFunction value) {
        return IntStream.range(0, batches).mapToDouble(value).toArray();
    }

    private static Partition partition(SizePassage sizes, ScreenPlan plan, int from, int to) {
        return Partition.of(sizes, plan.passedOutlet(), plan.overOutlet(), from, to);
    }

    private static Separation separation(SizePassage sizes, ScreenPlan plan, int from, int to) {
        return new Separation(
                left(sizes, plan.passedOutlet(), plan.undersizeLot(), from, to),
                left(sizes, plan.passedOutlet(), plan.productLot(), from, to),
                left(sizes, plan.overOutlet(), plan.undersizeLot(), from, to),
                left(sizes, plan.overOutlet(), plan.productLot(), from, to));
    }

    /** Mass of a lot that left through an outlet in the batches from one (inclusive) to another, kg. */
    private static double left(SizePassage sizes, int outlet, int lot, int from, int to) {
        double sum = 0;
        for (int batch = from; batch < to; batch++) {
            sum += sizes.leftMass(batch, outlet, lot);
        }
        return sum;
    }
}
