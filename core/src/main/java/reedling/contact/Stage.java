// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** Stages of a contact law, in the order in which a step calls them. */
public enum Stage {
    NORMAL,
    TANGENTIAL,
    ROLLING
}
