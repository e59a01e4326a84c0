// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import reedling.particle.Lot;
import reedling.probe.PegRule;
import reedling.run.Exits;
import reedling.run.ScreenPlan;

/** Where grains leave, and the screen that is reported on. */
final class ExitParts {

    private ExitParts() {}

    static Exits exits(CaseSpecification specification) {
        List<Exits.Outlet> outlets = specification.outlets().values().stream()
                .map(outlet -> new Exits.Outlet(outlet.name(), corners(outlet.box())))
                .toList();
        return new Exits(outlets, corners(specification.bounds()));
    }

    private static double[] corners(BoxRegion box) {
        return new double[] {
            box.minimum().x(), box.minimum().y(), box.minimum().z(),
            box.maximum().x(), box.maximum().y(), box.maximum().z()
        };
    }

    static Optional<ScreenPlan> screen(
            CaseSpecification specification, WireParts wires, List<Lot> lots, PartFaults faults) {
        return specification.screen().flatMap(screen -> {
            WireParts.Row row = wires.rows().get(screen.wires());
            if (row == null) {
                return Optional.empty(); // the row itself was refused
            }
            if (row.count() < 2) {
                faults.add("screen.wires", "a single wire", "two wires or more", "A deck has gaps: raise count.");
                return Optional.empty();
            }
            List<String> outlets = List.copyOf(specification.outlets().keySet());
            return Optional.of(new ScreenPlan(
                    IntStream.range(row.first(), row.first() + row.count()).toArray(),
                    LotParts.number(lots, screen.undersizeLot()),
                    LotParts.number(lots, screen.productLot()),
                    outlets.indexOf(screen.passed()),
                    outlets.indexOf(screen.over()),
                    new PegRule(screen.pegTime(), screen.pegDistance()),
                    screen.measureFrom(),
                    ScreenPlan.Limits.UNKNOWN));
        });
    }
}
