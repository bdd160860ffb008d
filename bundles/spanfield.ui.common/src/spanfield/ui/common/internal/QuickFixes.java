/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.emf.edit.command.SetCommand;
import spanfield.model.Bonding;
import spanfield.model.Circuit;
import spanfield.model.EarthModel;
import spanfield.model.EdgePoint;
import spanfield.model.Line;
import spanfield.model.Phase;
import spanfield.model.ProfileStation;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StructureType;
import spanfield.model.validation.Finding;
import spanfield.ui.common.StudyDocument;

/** Safe ways to mend what a finding reports, as commands with labels. Most findings have none: only the user knows the right number. */
public final class QuickFixes {

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;
    private static final double[] ANGLES = {0, -120, 120};
    private static final double COMMON_RESISTIVITY = 100;

    private QuickFixes() {
    }

    /** The fixes of a finding: text for the menu and command. Empty when there is none. */
    public static Map<String, Command> of(Finding finding, StudyDocument document) {
        Map<String, Command> fixes = new LinkedHashMap<>();
        EObject object = finding.object();
        switch (finding.rule()) {
            case "Study_EarthHasResistivity" -> {
                add(fixes, "Set the earth resistivity to 100 ohm m", set(document, object, P.getStudy_EarthResistivityOhmMetres(), COMMON_RESISTIVITY));
                add(fixes, "Compute without earth", set(document, object, P.getStudy_EarthModel(), EarthModel.NONE));
            }
            case "ShieldWire_BondedHasEarth", "ShieldWire_BondedHasResistance" ->
                add(fixes, "Take the shield wire as insulated", set(document, (ShieldWire) object, P.getShieldWire_Bonding(), Bonding.INSULATED));
            case "Corridor_EdgesInOrder" -> add(fixes, "Exchange the edges", exchange(document, (EdgePoint) object));
            case "ProfileStation_OffsetsInOrder" -> add(fixes, "Exchange the offsets", exchange(document, (ProfileStation) object));
            case "Circuit_ThreePhaseAngles" -> add(fixes, "Set the angles to 0, -120 and 120 degrees", angles(document, (Circuit) object));
            case "Corridor_SlopeOrPoints" -> add(fixes, "Set the cross slope to 0", set(document, object, P.getCorridor_CrossSlope(), 0.0));
            case "Catalogue_EntryUsed" -> add(fixes, "Remove it from the catalogue", RemoveCommand.create(document.domain(), object));
            case "LoadCase_CircuitLoadedOnce" -> add(fixes, "Remove the second load", RemoveCommand.create(document.domain(), object));
            case "Circuit_PhasesOnDifferentAttachments", "Wire_AttachmentExists", "Wire_AttachmentExists.missing" -> {
                if (object instanceof Phase phase) {
                    free(phase).forEach(name -> add(fixes, "Put it on '" + name + "'", set(document, phase, P.getPhase_Attachment(), name)));
                }
            }
            default -> { }
        }
        return fixes;
    }

    private static void add(Map<String, Command> fixes, String text, Command command) {
        if (command != null && command.canExecute()) {
            CompoundCommand labelled = new CompoundCommand(text);
            labelled.append(command);
            fixes.put(text, labelled);
        }
    }

    private static Command set(StudyDocument document, EObject object, org.eclipse.emf.ecore.EStructuralFeature feature, Object value) {
        return SetCommand.create(document.domain(), object, feature, value);
    }

    private static Command exchange(StudyDocument document, EdgePoint edge) {
        CompoundCommand both = new CompoundCommand();
        both.append(set(document, edge, P.getEdgePoint_LeftOffsetMetres(), Math.min(edge.getLeftOffsetMetres(), edge.getRightOffsetMetres())));
        both.append(set(document, edge, P.getEdgePoint_RightOffsetMetres(), Math.max(edge.getLeftOffsetMetres(), edge.getRightOffsetMetres())));
        return edge.getLeftOffsetMetres() > edge.getRightOffsetMetres() ? both : null;
    }

    private static Command exchange(StudyDocument document, ProfileStation station) {
        CompoundCommand both = new CompoundCommand();
        both.append(set(document, station, P.getProfileStation_FromOffsetMetres(), station.getToOffsetMetres()));
        both.append(set(document, station, P.getProfileStation_ToOffsetMetres(), station.getFromOffsetMetres()));
        return station.getFromOffsetMetres() > station.getToOffsetMetres() ? both : null;
    }

    private static Command angles(StudyDocument document, Circuit circuit) {
        CompoundCommand all = new CompoundCommand();
        for (int i = 0; i < ANGLES.length; i++) {
            all.append(set(document, circuit.getPhases().get(i), P.getPhase_AngleDegrees(), ANGLES[i]));
        }
        return all;
    }

    /** Attachments that every structure type of the line has and no wire of the line uses. */
    private static List<String> free(Phase phase) {
        if (!(phase.eContainer() instanceof Circuit circuit) || !(circuit.eContainer() instanceof Line line)) {
            return List.of();
        }
        List<String> names = null;
        for (var structure : line.getStructures()) {
            StructureType type = structure.getType();
            if (type != null) {
                List<String> here = type.getAttachments().stream().map(a -> a.getName()).filter(java.util.Objects::nonNull).toList();
                names = names == null ? new ArrayList<>(here) : names;
                names.retainAll(here);
            }
        }
        if (names == null) {
            return List.of();
        }
        for (Circuit other : line.getCircuits()) {
            for (Phase used : other.getPhases()) {
                names.remove(used.getAttachment());
            }
        }
        for (ShieldWire used : line.getShieldWires()) {
            names.remove(used.getAttachment());
        }
        return names;
    }
}
