// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.feed.FeedRate;
import reedling.feed.Rain;
import reedling.particle.SizeDistribution;
import reedling.run.Model;
import reedling.unit.Dimension;

/** What is fed, from rates and times: means, not draws. */
final class FeedFigures {

    private final CaseSpecification specification;
    private final Model model;

    FeedFigures(CaseAssembly assembly) {
        specification = assembly.reading().specification();
        model = assembly.model();
    }

    void writeTo(ForecastText text) {
        text.heading("Sizes (by mass; grains by number)");
        for (int lot = 0; lot < model.lots().size(); lot++) {
            lot(lot, text);
        }
        text.heading("Grains");
        int present = model.grains().count();
        double presentMass = 0;
        for (int g = 0; g < present; g++) {
            presentMass += model.grains().mass(g);
        }
        if (present > 0) {
            text.entry("at the start", amount(present, presentMass));
        }
        double count = present;
        double mass = presentMass;
        double end = specification.output().endTime();
        for (Model.FeedLine line : model.feeds()) {
            Rain rain = line.feed().plan();
            text.entry(
                    "feed " + rain.name(),
                    number(rain, rain.rate().perSecond()) + " grains/s, "
                            + mass(rain, rain.rate().perSecond()) + "/s");
            count += count(rain, rain.rate().owed(end));
            mass += kilograms(rain, rain.rate().owed(end));
        }
        text.entry("in all", "about " + amount(count, mass) + " in " + ForecastText.figure(end, Dimension.TIME));
        text.entry("present at once", present());
    }

    private void lot(int lot, ForecastText text) {
        SizeDistribution sizes = model.lots().get(lot).sizes();
        text.entry(
                "lot " + model.lots().get(lot).name(),
                "d10 " + length(sizes.diameterPassing(0.1)) + ", d50 " + length(sizes.diameterPassing(0.5)) + ", d90 "
                        + length(sizes.diameterPassing(0.9)) + "; about " + ForecastText.number(grainsOf(lot))
                        + " grains");
    }

    /** Grains of a lot in the whole run: those there at the start, and the mean number fed. */
    private double grainsOf(int lot) {
        double count = 0;
        for (int g = 0; g < model.grains().count(); g++) {
            count += model.grains().lot()[g] == lot ? 1 : 0;
        }
        double end = specification.output().endTime();
        for (Model.FeedLine line : model.feeds()) {
            Rain rain = line.feed().plan();
            for (int k = 0; k < line.lotNumbers().length; k++) {
                count += line.lotNumbers()[k] == lot
                        ? rain.mix().numberShare(k) * count(rain, rain.rate().owed(end))
                        : 0;
            }
        }
        return count;
    }

    private static String length(double metres) {
        return ForecastText.figure(metres, Dimension.LENGTH);
    }

    private String present() {
        if (specification.outlets().isEmpty()) {
            return "all that were fed: there is no outlet";
        }
        double rate = rate();
        return rate == 0
                ? "at most those of the start"
                : "about " + ForecastText.number(rate) + " for each second that a grain stays";
    }

    /** Grains fed per second by all streams. */
    double rate() {
        return model.feeds().stream()
                .mapToDouble(line ->
                        count(line.feed().plan(), line.feed().plan().rate().perSecond()))
                .sum();
    }

    /** Grains of the whole run. */
    double total() {
        double end = specification.output().endTime();
        return model.grains().count()
                + model.feeds().stream()
                        .mapToDouble(line -> count(
                                line.feed().plan(), line.feed().plan().rate().owed(end)))
                        .sum();
    }

    private static double count(Rain rain, double amount) {
        return rain.rate().measure() == FeedRate.Measure.COUNT
                ? amount
                : amount / rain.mix().meanGrainMass();
    }

    private static double kilograms(Rain rain, double amount) {
        return rain.rate().measure() == FeedRate.Measure.MASS
                ? amount
                : amount * rain.mix().meanGrainMass();
    }

    private static String number(Rain rain, double amount) {
        return ForecastText.number(count(rain, amount));
    }

    private static String mass(Rain rain, double amount) {
        return ForecastText.figure(kilograms(rain, amount), Dimension.MASS);
    }

    private static String amount(double count, double mass) {
        return ForecastText.number(count) + " grains, " + ForecastText.figure(mass, Dimension.MASS);
    }
}
