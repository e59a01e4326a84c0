// SPDX-License-Identifier: Apache-2.0
/** Commands: the only package that prints to the user and decides exit codes. */
@NullMarked
package reedling.cli;

import org.jspecify.annotations.NullMarked;
