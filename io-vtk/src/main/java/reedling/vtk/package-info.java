// SPDX-License-Identifier: Apache-2.0
/** Snapshots as VTK XML files with raw appended data, and the index of a run. */
@org.jspecify.annotations.NullMarked
package reedling.vtk;
