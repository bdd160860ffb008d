/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.emf.edit.domain.EditingDomain;
import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.Bonding;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.CurrentLoad;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.Phase;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StringingSection;
import spanfield.model.StrungElement;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.WireStringing;
import spanfield.model.io.StudyIds;

/** Larger changes of circuits as single commands: add, remove, change the phase order. */
final class CircuitEdits {

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;
    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;
    private static final double[] ANGLES = {0, -120, 120};
    /** A circuit of four phases has 24 orders; six would have 720. */
    private static final int MENU_PHASES = 4;
    private static final double CLEAR_METRES = 6;
    private static final double SPACING_METRES = 6;
    private static final double LEAST_HEIGHT_METRES = 14;
    private static final double INSULATOR_METRES = 1.5;

    private CircuitEdits() {
    }

    /** Where a new circuit goes by itself: to the right of the outermost attachment, as low as the lowest phase. Offset and wire height. */
    static double[] besideTheOthers(Line line) {
        double outermost = 0;
        double lowest = LEAST_HEIGHT_METRES;
        for (StructureType type : types(line)) {
            outermost = Math.max(outermost, type.getAttachments().stream().mapToDouble(Attachment::getOffsetMetres).max().orElse(0));
            lowest = Math.max(lowest, type.getAttachments().stream().filter(a -> a.getRole() == AttachmentRole.PHASE)
                .mapToDouble(a -> a.getHeightMetres() - a.getInsulatorLengthMetres()).min().orElse(LEAST_HEIGHT_METRES));
        }
        return new double[] {outermost + CLEAR_METRES, lowest};
    }

    private static Set<StructureType> types(Line line) {
        Set<StructureType> types = new LinkedHashSet<>();
        line.getStructures().stream().map(Structure::getType).filter(java.util.Objects::nonNull).forEach(types::add);
        return types;
    }

    private static void addAttachment(EditingDomain domain, Line line, String name, AttachmentRole role, double offset, double wireHeight, double insulator,
        CompoundCommand command) {
        for (StructureType type : types(line)) {
            Attachment attachment = F.createAttachment();
            attachment.setName(name);
            attachment.setRole(role);
            attachment.setOffsetMetres(SectionMoves.round(offset, 0.1));
            attachment.setHeightMetres(SectionMoves.round(Math.max(1, wireHeight) + insulator, 0.1));
            attachment.setInsulatorLengthMetres(insulator);
            command.append(AddCommand.create(domain, type, P.getStructureType_Attachments(), attachment));
        }
    }

    /**
     * Adds a three-phase circuit to a line: new attachments on every structure type of the line, the phases one above the other, and a current
     * of zero in every load case.
     *
     * @param offset     offset from the axis of the structures in metres
     * @param wireHeight height of the lowest phase at the structures in metres
     */
    static Command add(EditingDomain domain, Study study, Line line, double offset, double wireHeight) {
        CompoundCommand command = new CompoundCommand("Add circuit");
        String stem = unused(line, "circuit ");
        Circuit circuit = F.createCircuit();
        circuit.setName("Circuit " + (line.getCircuits().size() + 1) + " of " + line.getName());
        if (!line.getCircuits().isEmpty()) {
            circuit.setNominalVoltageVolts(line.getCircuits().get(0).getNominalVoltageVolts());
            circuit.setConductor(line.getCircuits().get(0).getConductor());
        } else if (!study.getConductors().isEmpty()) {
            circuit.setConductor(study.getConductors().get(0));
        }
        for (int i = 0; i < 3; i++) {
            String label = String.valueOf((char) ('A' + i));
            addAttachment(domain, line, stem + " phase " + label, AttachmentRole.PHASE, offset, wireHeight + (2 - i) * SPACING_METRES, INSULATOR_METRES, command);
            Phase phase = F.createPhase();
            phase.setLabel(label);
            phase.setAngleDegrees(ANGLES[i]);
            phase.setAttachment(stem + " phase " + label);
            circuit.getPhases().add(phase);
        }
        StudyIds.assign(circuit, study);
        command.append(AddCommand.create(domain, line, P.getLine_Circuits(), circuit));
        for (LoadCase loadCase : study.getLoadCases()) {
            CurrentLoad load = F.createCurrentLoad();
            load.setCircuit(circuit);
            command.append(AddCommand.create(domain, loadCase, P.getLoadCase_Loads(), load));
        }
        return command;
    }

    /** Adds a shield wire to a line; it is insulated when its conductor has no resistance, since a bonded one needs it. */
    static Command addShield(EditingDomain domain, Study study, Line line, double offset, double wireHeight) {
        CompoundCommand command = new CompoundCommand("Add shield wire");
        String name = unused(line, "shield ");
        addAttachment(domain, line, name, AttachmentRole.SHIELD, offset, wireHeight, 0, command);
        ShieldWire wire = F.createShieldWire();
        wire.setName("Shield wire " + (line.getShieldWires().size() + 1) + " of " + line.getName());
        wire.setAttachment(name);
        wire.setConductor(!line.getShieldWires().isEmpty() ? line.getShieldWires().get(0).getConductor()
            : study.getConductors().isEmpty() ? null : study.getConductors().get(study.getConductors().size() - 1));
        boolean bondable = wire.getConductor() != null && wire.getConductor().getLowResistanceOhmsPerMetre() != null
            && study.getEarthResistivityOhmMetres() != null;
        wire.setBonding(bondable ? Bonding.BONDED : Bonding.INSULATED);
        StudyIds.assign(wire, study);
        command.append(AddCommand.create(domain, line, P.getLine_ShieldWires(), wire));
        return command;
    }

    /** A name that no attachment of the line begins with. */
    private static String unused(Line line, String stem) {
        for (int i = 1;; i++) {
            String name = stem + i;
            if (types(line).stream().flatMap(type -> type.getAttachments().stream()).noneMatch(a -> String.valueOf(a.getName()).startsWith(name))) {
                return name;
            }
        }
    }

    /** Removes a circuit or shield wire together with its loads and its exceptions of stringing. */
    static Command remove(EditingDomain domain, Study study, StrungElement element) {
        Line line = (Line) element.eContainer();
        CompoundCommand command = new CompoundCommand("Remove " + element.getName());
        for (LoadCase loadCase : study.getLoadCases()) {
            for (CircuitLoad load : loadCase.getLoads()) {
                if (load.getCircuit() == element) {
                    command.append(RemoveCommand.create(domain, loadCase, P.getLoadCase_Loads(), load));
                }
            }
        }
        for (StringingSection section : line.getSections()) {
            for (WireStringing exception : section.getExceptions()) {
                if (exception.getWires().contains(element)) {
                    command.append(RemoveCommand.create(domain, exception, P.getWireStringing_Wires(), element));
                }
            }
        }
        command.append(RemoveCommand.create(domain, line, element instanceof ShieldWire ? P.getLine_ShieldWires() : P.getLine_Circuits(), element));
        return command;
    }

    /** The labels of a circuit's phases in the order of its attachments on the structure; labels are of any length. */
    static List<String> order(Circuit circuit) {
        List<String> labels = new ArrayList<>();
        for (String attachment : positions(circuit)) {
            for (Phase phase : circuit.getPhases()) {
                if (attachment.equals(String.valueOf(phase.getAttachment()))) {
                    labels.add(String.valueOf(phase.getLabel()));
                }
            }
        }
        return labels;
    }

    /** An order as people write it: single letters side by side, longer labels with dashes between them. */
    static String text(List<String> order) {
        return String.join(order.stream().allMatch(label -> label.length() == 1) ? "" : "-", order);
    }

    /** The attachments that a circuit uses, in the order of the structure type. */
    private static List<String> positions(Circuit circuit) {
        List<String> used = new ArrayList<>();
        circuit.getPhases().forEach(phase -> used.add(String.valueOf(phase.getAttachment())));
        List<Structure> structures = ((Line) circuit.eContainer()).getStructures();
        StructureType type = structures.isEmpty() ? null : structures.get(0).getType();
        List<String> ordered = new ArrayList<>();
        if (type != null) {
            type.getAttachments().stream().map(Attachment::getName).filter(used::contains).forEach(ordered::add);
        }
        return ordered.size() == used.size() ? ordered : used;
    }

    /**
     * Every order of the labels of a circuit, the alphabetic one first; none where two phases share an attachment or a label, or for more
     * phases than a menu can hold.
     */
    static List<List<String>> orders(Circuit circuit) {
        List<List<String>> all = new ArrayList<>();
        List<String> labels = order(circuit).stream().sorted().toList();
        boolean apart = Set.copyOf(labels).size() == circuit.getPhases().size() && Set.copyOf(positions(circuit)).size() == labels.size();
        if (apart && labels.size() <= MENU_PHASES) {
            permute(List.of(), labels, all);
        }
        return all;
    }

    private static void permute(List<String> done, List<String> left, List<List<String>> all) {
        if (left.isEmpty()) {
            all.add(done);
        }
        for (String next : left) {
            List<String> longer = new ArrayList<>(done);
            longer.add(next);
            permute(List.copyOf(longer), left.stream().filter(label -> !label.equals(next)).toList(), all);
        }
    }

    /** Puts the phases of a circuit on its attachments in another order. */
    static Command reorder(EditingDomain domain, Circuit circuit, List<String> order) {
        CompoundCommand command = new CompoundCommand("Phase order " + text(order) + " of " + circuit.getName());
        List<String> positions = positions(circuit);
        for (Phase phase : circuit.getPhases()) {
            String attachment = positions.get(order.indexOf(phase.getLabel()));
            if (!attachment.equals(phase.getAttachment())) {
                command.append(SetCommand.create(domain, phase, P.getPhase_Attachment(), attachment));
            }
        }
        return command;
    }
}
