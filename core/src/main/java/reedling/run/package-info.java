// SPDX-License-Identifier: Apache-2.0
/** The simulation and its step loop. */
@NullMarked
package reedling.run;

import org.jspecify.annotations.NullMarked;
