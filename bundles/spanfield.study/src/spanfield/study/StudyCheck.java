/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.List;
import spanfield.model.Study;
import spanfield.model.validation.Finding;
import spanfield.study.internal.StudyAssembly;

/**
 * Checks a study as a whole: the rules of the model, and where those hold, the rules of {@link GeometryRule} on the wires in space. A study
 * with an error is not computed.
 */
public final class StudyCheck {

    private StudyCheck() {
    }

    /**
     * Everything there is to find, errors first. Reads the study on the calling thread.
     *
     * <p>Errors of the model keep the wires from being built, so that findings about geometry appear only after they are mended.
     */
    public static List<Finding> check(Study study) {
        return new StudyAssembly(study).findings();
    }
}
