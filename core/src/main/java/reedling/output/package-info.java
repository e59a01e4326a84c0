// SPDX-License-Identifier: Apache-2.0
/** What a run leaves in its folder: snapshots, tables, the run record, the log. */
@org.jspecify.annotations.NullMarked
package reedling.output;
