// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import java.util.Map;

/**
 * What goes into the run record and the checkpoints besides results.
 *
 * @param title one line
 * @param programVersion version of this program
 * @param caseDigest digest of the resolved case
 * @param plugins name of each plugin in use and the version of the history it keeps
 * @param seed of every random stream
 * @param cautions lines that the check of the case raised
 */
public record RunIdentity(
        String title,
        String programVersion,
        String caseDigest,
        Map<String, Integer> plugins,
        long seed,
        List<String> cautions) {}
