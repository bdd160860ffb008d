/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.line.ImpedanceFormula;

/**
 * What a result rests on.
 *
 * @param softwareVersion           version of the software
 * @param studyId                   identifier of the study
 * @param studyName                 name of the study
 * @param studyDigest               SHA-256 of the study as saved, lower-case hexadecimal
 * @param frequencyHertz            frequency in hertz; 0 for direct current
 * @param earthModel                earth model of the reported values
 * @param earthResistivityOhmMetres earth resistivity in ohm metres; NaN where the study states none
 * @param earthPlaneMetres          elevation of the earth plane in metres
 * @param impedanceFormula          formula behind induced shield-wire currents
 * @param referenceHeightMetres     height of profile points above the local ground in metres
 * @param accuracyAsked             relative numerical accuracy asked of the resultant
 * @param accuracyReached           greatest ratio of numerical error bound to resultant over all values of the result; 0 without field
 * @param offsetResolutionMetres    offset resolution of the greatest values in metres; NaN where the result has none
 * @param methods                   methods and their sources
 * @param currents                  currents of each load case
 * @param geometry                  wires and clearances at the stations of the result, for each wind swing
 * @param notices                   what the reader must know
 * @param cautions                  cautions that go with every result
 */
public record Evidence(String softwareVersion, String studyId, String studyName, String studyDigest, double frequencyHertz,
    EarthModel earthModel, double earthResistivityOhmMetres, double earthPlaneMetres, ImpedanceFormula impedanceFormula,
    double referenceHeightMetres, double accuracyAsked, double accuracyReached, double offsetResolutionMetres, List<MethodNote> methods,
    List<CurrentTable> currents, List<StationGeometry> geometry, List<Notice> notices, List<String> cautions) {

    public Evidence {
        methods = List.copyOf(methods);
        currents = List.copyOf(currents);
        geometry = List.copyOf(geometry);
        notices = List.copyOf(notices);
        cautions = List.copyOf(cautions);
    }
}
