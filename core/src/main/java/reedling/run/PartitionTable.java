// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import reedling.file.WholeFile;
import reedling.output.RunFolder;
import reedling.output.WriteQueue;
import reedling.probe.Partition;
import reedling.probe.SizePassage;

/** The partition curve of the measured window as {@code partition.csv}, one row a size class that has grains. */
final class PartitionTable {

    private PartitionTable() {}

    static WriteQueue.Job saving(SizePassage sizes, ScreenPlan screen, RunFolder folder) {
        Partition partition = Partition.of(
                sizes,
                screen.passedOutlet(),
                screen.overOutlet(),
                0,
                sizes.window().batches());
        StringBuilder text = new StringBuilder("diameter [m],grains passed,grains over,part over\n");
        for (int k = 0; k < partition.diameter().length; k++) {
            if (partition.passed()[k] + partition.over()[k] > 0) {
                text.append(partition.diameter()[k])
                        .append(',')
                        .append(partition.passed()[k])
                        .append(',')
                        .append(partition.over()[k])
                        .append(',')
                        .append(partition.partOver(k))
                        .append('\n');
            }
        }
        return () -> WholeFile.writeText(folder.resolve("partition.csv"), text.toString());
    }
}
