// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.util.Map;
import java.util.TreeMap;

/**
 * What a checkpoint says of itself before any section is read.
 *
 * @param programVersion version of the program that wrote it
 * @param caseDigest digest of the resolved case it belongs to, so that another case is refused
 * @param step number of the last finished step
 * @param time s
 * @param plugins name of each plugin in use and the version of the history it keeps (0 for none), in name order
 */
public record CheckpointHeader(
        String programVersion, String caseDigest, long step, double time, Map<String, Integer> plugins) {

    public CheckpointHeader {
        plugins = java.util.Collections.unmodifiableMap(new TreeMap<>(plugins));
    }
}
