// SPDX-License-Identifier: Apache-2.0
/** The team of worker threads that a run's phases are handed to. */
@NullMarked
package reedling.parallel;

import org.jspecify.annotations.NullMarked;
