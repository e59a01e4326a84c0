// SPDX-License-Identifier: Apache-2.0
/** Checks that a plugin keeps the contract of its interface, measurements of what it does, and the certificate of both. */
@NullMarked
package reedling.conform;

import org.jspecify.annotations.NullMarked;
