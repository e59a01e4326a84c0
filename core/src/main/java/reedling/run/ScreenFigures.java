// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import reedling.probe.Estimate;
import reedling.probe.Partition;
import reedling.probe.SizePassage;
import reedling.probe.WireLoads;

/**
 * The figures a screen is judged by, from the finished batches of the measured window.
 *
 * @param batches finished batches
 * @param throughput mass fed a second and metre of deck width, kg/(s m)
 * @param recovery part of the decided undersize that passed, by mass
 * @param loss part of the decided product that passed, by mass
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
        double[] cuts = each(batches, batch -> cut(sizes, plan, batch, batch + 1));
        double[] ranges = java.util.Arrays.copyOf(loads.batchRanges(worst), batches);
        return new ScreenFigures(
                batches,
                Estimate.of(fed),
                passed(sizes, plan, plan.undersizeLot(), batches),
                passed(sizes, plan, plan.productLot(), batches),
                Estimate.around(cut(sizes, plan, 0, batches), cuts),
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

    private static double cut(SizePassage sizes, ScreenPlan plan, int from, int to) {
        return Partition.of(sizes, plan.passedOutlet(), plan.overOutlet(), from, to)
                .cutSize();
    }

    /** Part of a lot that passed: of the whole window, with the scatter of its batches. */
    private static Estimate passed(SizePassage sizes, ScreenPlan plan, int lot, int batches) {
        double through = 0;
        double over = 0;
        double[] parts = new double[batches];
        for (int batch = 0; batch < batches; batch++) {
            double a = sizes.leftMass(batch, plan.passedOutlet(), lot);
            double b = sizes.leftMass(batch, plan.overOutlet(), lot);
            through += a;
            over += b;
            parts[batch] = a / (a + b);
        }
        return Estimate.around(through / (through + over), parts);
    }
}
