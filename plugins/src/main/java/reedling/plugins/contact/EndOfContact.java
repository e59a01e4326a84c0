// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

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
     * @throws ReedlingException where it is neither 0 nor 1
     */
    static boolean dashpotMayPull(ParameterValues values) {
        double value = values.get(NAME);
        if (value != 0 && value != 1) {
            throw new ReedlingException(
                    ExitCode.CASE,
                    new Finding("law", NAME, String.valueOf(value), "0 or 1", "It is a choice, not a degree."));
        }
        return value == 1;
    }
}
