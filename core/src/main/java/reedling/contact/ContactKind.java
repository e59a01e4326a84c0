// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** What touches what; a block holds rows of one kind. */
public enum ContactKind {
    GRAIN_GRAIN,
    GRAIN_WALL,
    GRAIN_WIRE
}
