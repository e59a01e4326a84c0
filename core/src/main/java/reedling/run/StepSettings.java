// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/**
 * How a run steps.
 *
 * @param stepsPerContact steps in the duration of an impact, at least 10
 * @param maximum longest step, s
 * @param drivenPeriod period of the fastest prescribed motion, s; infinite without one
 * @param margin search margin: gaps below it are listed, m
 * @param reportEvery steps between two closings of the energy balance
 */
public record StepSettings(int stepsPerContact, double maximum, double drivenPeriod, double margin, int reportEvery) {}
