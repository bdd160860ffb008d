/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.io;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Iterator;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.NamedElement;
import spanfield.model.Study;

/** Stable identifiers: made once from kind and name when an element has none, never changed afterwards, so that files differ little. */
public final class StudyIds {

    private StudyIds() {
    }

    /** Gives every element of the study without an identifier one that is unique in the study. */
    public static void assignMissing(Study study) {
        Set<String> used = new HashSet<>();
        forEach(study, element -> {
            if (element.getId() != null && !element.getId().isBlank()) {
                used.add(element.getId());
            }
        });
        forEach(study, element -> {
            if (element.getId() == null || element.getId().isBlank()) {
                element.setId(unique(element, used));
            }
        });
    }

    /** Gives an element that is about to join a study an identifier that is unique there, unless it has one. */
    public static void assign(NamedElement element, Study study) {
        if (element.getId() == null || element.getId().isBlank()) {
            Set<String> used = new HashSet<>();
            forEach(study, other -> used.add(String.valueOf(other.getId())));
            element.setId(unique(element, used));
        }
    }

    /** An identifier that is used twice, or null. */
    static String duplicate(Study study) {
        Map<String, NamedElement> seen = new HashMap<>();
        String[] found = new String[1];
        forEach(study, element -> {
            if (element.getId() != null && seen.put(element.getId(), element) != null && found[0] == null) {
                found[0] = element.getId();
            }
        });
        return found[0];
    }

    private static void forEach(Study study, java.util.function.Consumer<NamedElement> action) {
        action.accept(study);
        for (Iterator<EObject> all = study.eAllContents(); all.hasNext();) {
            if (all.next() instanceof NamedElement element) {
                action.accept(element);
            }
        }
    }

    private static String unique(NamedElement element, Set<String> used) {
        String kind = element.eClass().getName().toLowerCase(Locale.ROOT);
        String name = Normalizer.normalize(String.valueOf(element.getName() == null ? "" : element.getName()), Normalizer.Form.NFD)
            .toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "-").replaceAll("(^-+|-+$)", "");
        String stem = name.isEmpty() ? kind : kind + "-" + name;
        String id = stem;
        for (int i = 2; !used.add(id); i++) {
            id = stem + "-" + i;
        }
        return id;
    }
}
