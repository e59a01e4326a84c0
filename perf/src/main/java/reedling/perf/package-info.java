// SPDX-License-Identifier: Apache-2.0
/** Measurements of the engine's speed: the dense bed and the command that times it. */
@NullMarked
package reedling.perf;

import org.jspecify.annotations.NullMarked;
