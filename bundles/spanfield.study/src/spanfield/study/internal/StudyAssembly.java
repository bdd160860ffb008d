/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.Study;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Places;
import spanfield.model.validation.StudyValidation;

/** Checks a study and, when it is sound, prepares it for runs. Reads the model on the calling thread. */
public final class StudyAssembly {

    private final List<Finding> findings;
    private final PreparedStudy prepared;

    public StudyAssembly(Study study) {
        List<Finding> all = new ArrayList<>(StudyValidation.validate(study));
        PreparedStudy result = null;
        if (all.stream().noneMatch(Finding::isError)) {
            StudyReader reader = new StudyReader(study);
            StudyGeometry geometry = new StudyGeometry(reader.data());
            GeometryChecks.check(reader.data(), geometry).forEach(problem -> all.add(finding(problem, reader)));
            if (all.stream().noneMatch(Finding::isError)) {
                result = PreparedStudy.of(reader.data(), geometry);
            }
        }
        all.sort(Comparator.comparing(Finding::severity));
        findings = List.copyOf(all);
        prepared = result;
    }

    private static Finding finding(GeometryProblem problem, StudyReader reader) {
        EObject object = reader.object(problem.key());
        return new Finding(problem.rule().severity(), problem.rule().ruleName(), problem.message(), Places.path(object), object, null);
    }

    /** Everything that was found, errors first. */
    public List<Finding> findings() {
        return findings;
    }

    /** The prepared study; null when there are errors. */
    public PreparedStudy prepared() {
        return prepared;
    }
}
