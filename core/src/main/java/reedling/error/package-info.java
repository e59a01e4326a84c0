// SPDX-License-Identifier: Apache-2.0
/** Findings that a user can act on, and the exit codes of the command line. */
@NullMarked
package reedling.error;

import org.jspecify.annotations.NullMarked;
