// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import reedling.checkpoint.Persistent;

/** Gives everything whose state decides the next bits of a simulation, in the order in which it is restored. */
@FunctionalInterface
public interface StateOwners {

    List<Persistent> persistents();
}
