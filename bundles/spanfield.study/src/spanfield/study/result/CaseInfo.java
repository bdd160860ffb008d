/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * A load case, as results name it.
 *
 * @param id               identifier in the study file
 * @param name             name for people; the identifier where the study gives none
 * @param basis            basis of the load (rating, peak, average ...); empty where the study gives none
 * @param windSwingRadians swing of all wires about their chords in radians, positive to the right seen along increasing station
 */
public record CaseInfo(String id, String name, String basis, double windSwingRadians) {
}
