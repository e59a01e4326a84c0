// SPDX-License-Identifier: Apache-2.0
/** Search and contact between grains, walls and structures, and the phases of a step. */
@NullMarked
package reedling.coupling;

import org.jspecify.annotations.NullMarked;
