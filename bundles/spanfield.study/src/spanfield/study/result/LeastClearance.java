/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * Where the wires of a line come nearest to the ground, over all spans and load cases. Heights are those of the axis of the lowest
 * subconductor, straight above the ground beneath it; tails beyond the outermost structures are left out.
 *
 * @param caseId          identifier of the load case in whose wind it is least; the first of equals
 * @param loadCase        name of that load case
 * @param wire            the wire in words, for example "phase A of 'North 1'"
 * @param fromStructure   name of the structure at the start of the span
 * @param toStructure     name of the structure at its end
 * @param clearanceMetres least height above the ground in metres; negative below ground
 * @param alongMetres     level length along the wire from the first structure of its line in metres
 * @param elevationMetres elevation of that axis there in metres
 */
public record LeastClearance(String caseId, String loadCase, String wire, String fromStructure, String toStructure, double clearanceMetres,
    double alongMetres, double elevationMetres) {
}
