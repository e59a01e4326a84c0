// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.ArrayList;
import java.util.List;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** The choice, common to normal laws with a dashpot, of how a contact ends. */
final class EndOfContact {

    private static final String NAME = "dashpot_pulls";

    /** 0 or 1. */
    static final Parameter PARAMETER = new Parameter(
            NAME,
            Dimension.NUMBER,
            0,
            1,
            0,
            "0: the normal force never pulls; 1: its dashpot may pull until the overlap is used up. Restitution is the"
                    + " asked one in both.");

    private EndOfContact() {}

    /**
     * Reads the choice.
     *
     * @param faults what else is wrong with the law's values; thrown with what is wrong with this one
     * @throws ReedlingException where the value is neither 0 nor 1, or there are other faults
     */
    static boolean dashpotMayPull(ParameterValues values, Finding... faults) {
        List<Finding> all = new ArrayList<>(List.of(faults));
        double value = values.get(NAME);
        if (value != 0 && value != 1) {
            all.add(new Finding("law", NAME, String.valueOf(value), "0 or 1", "It is a choice, not a degree."));
        }
        if (!all.isEmpty()) {
            throw new ReedlingException(ExitCode.CASE, all);
        }
        return value == 1;
    }
}
