/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.Attachment;
import spanfield.model.CircuitLoad;
import spanfield.model.NamedElement;
import spanfield.model.Phase;
import spanfield.model.Structure;
import spanfield.model.Study;

/** Names of objects as the user knows them. */
public final class Places {

    private Places() {
    }

    /** Path from the study's parts down to the object, e.g. "line 'North' &gt; circuit 'North 1' &gt; phase 'A'". */
    public static String path(EObject object) {
        Deque<String> parts = new ArrayDeque<>();
        for (EObject at = object; at != null && !(at instanceof Study); at = at.eContainer()) {
            parts.addFirst(name(at));
        }
        return parts.isEmpty() ? "study" : String.join(" > ", parts);
    }

    /** Kind and name of one object, e.g. "circuit 'North 1'"; unnamed objects are counted, e.g. "edge point 2". */
    public static String name(EObject object) {
        if (object == null) {
            return "nothing";
        }
        String kind = kind(object);
        String name = null;
        if (object instanceof NamedElement element) {
            name = element.getName() == null || element.getName().isBlank() ? element.getId() : element.getName();
        } else if (object instanceof Phase phase) {
            name = phase.getLabel();
        } else if (object instanceof Attachment attachment) {
            name = attachment.getName();
        } else if (object instanceof CircuitLoad load && load.getCircuit() != null) {
            return kind + " of " + name(load.getCircuit());
        }
        if (name != null && !name.isBlank()) {
            return kind + " '" + name + "'";
        }
        return kind + number(object);
    }

    private static String number(EObject object) {
        if (object.eContainer() != null && object.eContainer().eGet(object.eContainingFeature()) instanceof List<?> siblings) {
            return " " + (siblings.indexOf(object) + 1);
        }
        return object instanceof Structure ? " without a name" : "";
    }

    /** The kind of an object in plain words: the class name, split and in lower case. */
    static String kind(EObject object) {
        return words(object.eClass().getName());
    }

    /** A camel-case name as words in lower case. */
    public static String words(String camelCase) {
        return camelCase.replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(java.util.Locale.ROOT);
    }
}
