// SPDX-License-Identifier: Apache-2.0
/** The container of saved states: named, checksummed sections that owners of state fill and read themselves. */
@org.jspecify.annotations.NullMarked
package reedling.checkpoint;
