/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.eclipse.emf.common.util.BasicDiagnostic;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EValidator;
import org.eclipse.emf.ecore.impl.EValidatorRegistryImpl;
import org.eclipse.emf.ecore.util.Diagnostician;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Study;

/** Runs the rules of {@link StudyValidator} over a study. */
public final class StudyValidation {

    private StudyValidation() {
    }

    /**
     * Everything that the rules find in a study, errors first, then in the order of the file. Rules about sagged geometry belong to the study
     * bundle, which joins them.
     */
    public static List<Finding> validate(Study study) {
        EValidator.Registry registry = new EValidatorRegistryImpl();
        registry.put(SpanfieldPackage.eINSTANCE, new StudyValidator());
        BasicDiagnostic result = new BasicDiagnostic();
        Diagnostician diagnostician = new Diagnostician(registry);
        diagnostician.validate(study, result, diagnostician.createDefaultContext());
        List<Finding> findings = new ArrayList<>();
        collect(result, findings);
        findings.sort(Comparator.comparing(Finding::severity));
        return List.copyOf(findings);
    }

    private static void collect(Diagnostic diagnostic, List<Finding> findings) {
        if (diagnostic.getChildren().isEmpty()) {
            if (diagnostic.getSeverity() != Diagnostic.OK) {
                findings.add(finding(diagnostic));
            }
            return;
        }
        diagnostic.getChildren().forEach(child -> collect(child, findings));
    }

    private static Finding finding(Diagnostic diagnostic) {
        List<?> data = diagnostic.getData();
        EObject object = !data.isEmpty() && data.get(0) instanceof EObject first ? first : null;
        EStructuralFeature feature = data.size() > 1 && data.get(1) instanceof EStructuralFeature second ? second : null;
        String rule = data.size() > 2 && data.get(2) instanceof String third ? third : "Structure_Sound";
        Severity severity = diagnostic.getSeverity() >= Diagnostic.ERROR ? Severity.ERROR
            : diagnostic.getSeverity() == Diagnostic.WARNING ? Severity.WARNING : Severity.INFO;
        return new Finding(severity, rule, diagnostic.getMessage(), Places.path(object), object, feature);
    }
}
