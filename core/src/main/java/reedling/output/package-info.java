// SPDX-License-Identifier: Apache-2.0
/** Snapshots, tables and the record of a run. */
@NullMarked
package reedling.output;

import org.jspecify.annotations.NullMarked;
