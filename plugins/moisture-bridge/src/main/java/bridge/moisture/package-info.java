// SPDX-License-Identifier: Apache-2.0
/** A plugin for moist grains, built against the published program only: liquid bridges between spheres. */
package bridge.moisture;
