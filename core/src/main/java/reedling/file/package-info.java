// SPDX-License-Identifier: Apache-2.0
/** Files that appear whole or not at all, and bulk output of numbers. */
@org.jspecify.annotations.NullMarked
package reedling.file;
