/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.Wire;
import spanfield.solver.line.LineConductor;
import spanfield.solver.line.ShieldWireCurrents;
import spanfield.study.internal.ParallelGroups.Group;
import spanfield.study.internal.StudyData.BondingData;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.ElementRef;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.result.CurrentTable;
import spanfield.study.result.CurrentTable.CircuitCurrents;
import spanfield.study.result.CurrentTable.CurrentSplit;
import spanfield.study.result.CurrentTable.PhaseCurrent;
import spanfield.study.result.CurrentTable.ShieldCurrent;
import spanfield.study.result.CurrentTable.ShieldCurrent.Origin;
import spanfield.study.result.Phasor;

/**
 * Currents of every phase and shield wire in a geometry state. Bonded shield wires carry I_s = -Z_ss^-1 Z_sp I_p of all conductors of
 * their group of parallel lines; the operator is computed once for the state and applied to each load case. Immutable.
 *
 * <p>Line theory sees every wire at its mean height above the earth plane and its mean offset; the current of a bundle is spread evenly
 * over its subconductors.
 */
final class Excitation {

    /**
     * Resistance in ohm per metre that stands in for conductors whose resistance is not stated. Only that of bonded shield wires enters the
     * induced currents, and theirs is required.
     */
    private static final double UNUSED_RESISTANCE = 1e-4;

    private final StudyData data;
    private final GeometryState state;
    private final ParallelGroups groups;
    private final boolean induction;
    private final List<InducedGroup> induced = new ArrayList<>();

    /** The operator of a group: conductors with known current, conductors with induced current, current factors. */
    private record InducedGroup(int[] sources, int[] bonded, Complex[][] factors) {
    }

    Excitation(StudyData data, StudyGeometry geometry, GeometryState state, ParallelGroups groups) {
        this.data = data;
        this.state = state;
        this.groups = groups;
        this.induction = data.frequencyHertz() > 0 && !Double.isNaN(data.resistivity());
        if (induction) {
            EarthReturn earth = new EarthReturn(EarthModel.EXACT_HALF_SPACE, data.resistivity(), data.frequencyHertz(), geometry.earthPlane());
            groups.groups().forEach(group -> addOperator(group, earth));
        }
    }

    private void addOperator(Group group, EarthReturn earth) {
        int[] bonded = members(group, true);
        int[] sources = members(group, false);
        if (bonded.length == 0 || sources.length == 0) {
            return;
        }
        List<LineConductor> sourceWires = new ArrayList<>();
        List<Integer> sourceOfWire = new ArrayList<>();
        for (int s = 0; s < sources.length; s++) {
            for (LineConductor wire : lineConductors(sources[s], group, earth)) {
                sourceWires.add(wire);
                sourceOfWire.add(s);
            }
        }
        List<LineConductor> bondedWires = Arrays.stream(bonded).mapToObj(b -> lineConductors(b, group, earth).get(0)).toList();
        ShieldWireCurrents operator = ShieldWireCurrents.of(sourceWires, bondedWires, earth, data.impedanceFormula());
        Complex[][] factors = new Complex[bonded.length][sources.length];
        for (int b = 0; b < bonded.length; b++) {
            Arrays.fill(factors[b], Complex.ZERO);
            for (int w = 0; w < sourceWires.size(); w++) {
                int s = sourceOfWire.get(w);
                double share = group.sign(lineOf(bonded[b])) * group.sign(lineOf(sources[s]))
                    / (double) state.conductors().get(sources[s]).element().bundleCount();
                factors[b][s] = factors[b][s].add(operator.factor(b, w).multiply(share));
            }
        }
        induced.add(new InducedGroup(sources, bonded, factors));
    }

    private int lineOf(int conductor) {
        return state.conductors().get(conductor).line().index();
    }

    private int[] members(Group group, boolean bonded) {
        List<Integer> result = new ArrayList<>();
        for (int i = 0; i < state.conductors().size(); i++) {
            BondingData bonding = state.conductors().get(i).element().bonding();
            boolean wanted = bonded ? bonding == BondingData.BONDED : bonding == BondingData.NONE || bonding == BondingData.GIVEN;
            if (wanted && group.contains(lineOf(i))) {
                result.add(i);
            }
        }
        return result.stream().mapToInt(Integer::intValue).toArray();
    }

    private List<LineConductor> lineConductors(int conductor, Group group, EarthReturn earth) {
        List<LineConductor> result = new ArrayList<>();
        int[] owner = state.conductorOfWire();
        for (int w = 0; w < owner.length; w++) {
            if (owner[w] == conductor) {
                Wire wire = state.wires().get(w);
                var catalogue = state.conductors().get(conductor).element().conductor();
                result.add(new LineConductor(wire.name(), ParallelGroups.meanOffset(wire.path(), group.reference()),
                    wire.path().meanElevationMetres() - earth.planeElevationMetres(), catalogue.geometricMeanRadius(),
                    Double.isNaN(catalogue.resistance()) ? UNUSED_RESISTANCE : catalogue.resistance()));
            }
        }
        return result;
    }

    /** Current phasors in amperes RMS of a load case, [conductor] of the state, positive in the structure order of the line. */
    Complex[] amperes(CaseData loadCase) {
        Complex[] result = new Complex[state.conductors().size()];
        for (int i = 0; i < result.length; i++) {
            StrungConductor conductor = state.conductors().get(i);
            Complex[] phases = loadCase.currents().get(new ElementRef(lineOf(i), conductor.element().index()));
            result[i] = conductor.element().shield() ? conductor.element().givenCurrent()
                : phases == null ? Complex.ZERO : phases[conductor.phaseIndex()];
        }
        for (InducedGroup group : induced) {
            for (int b = 0; b < group.bonded.length; b++) {
                Complex sum = Complex.ZERO;
                for (int s = 0; s < group.sources.length; s++) {
                    sum = sum.add(group.factors[b][s].multiply(result[group.sources[s]]));
                }
                result[group.bonded[b]] = sum;
            }
        }
        return result;
    }

    /** The currents of a load case as a table. */
    CurrentTable table(CaseData loadCase) {
        Complex[] amperes = amperes(loadCase);
        List<CircuitCurrents> circuits = new ArrayList<>();
        List<ShieldCurrent> shields = new ArrayList<>();
        for (LineData line : data.lines()) {
            for (ElementData element : line.elements()) {
                if (element.shield()) {
                    shields.add(new ShieldCurrent(line.name(), element.id(), element.name(), origin(element),
                        Phasor.of(amperes[find(line, element, 0)])));
                } else {
                    circuits.add(circuit(line, element, amperes));
                }
            }
        }
        return new CurrentTable(loadCase.info(), circuits, shields, groups.groups().stream().map(g -> split(g, amperes)).toList());
    }

    private CircuitCurrents circuit(LineData line, ElementData element, Complex[] amperes) {
        List<PhaseCurrent> phases = new ArrayList<>();
        for (int p = 0; p < element.phases().size(); p++) {
            phases.add(new PhaseCurrent(element.phases().get(p).label(), Phasor.of(amperes[find(line, element, p)])));
        }
        return new CircuitCurrents(line.name(), element.id(), element.name(), phases);
    }

    private int find(LineData line, ElementData element, int phase) {
        for (int i = 0; i < state.conductors().size(); i++) {
            StrungConductor c = state.conductors().get(i);
            if (c.line().index() == line.index() && c.element().index() == element.index() && c.phaseIndex() == phase) {
                return i;
            }
        }
        throw new IllegalStateException("no conductor for phase " + phase + " of " + element.name());
    }

    private Origin origin(ElementData element) {
        return switch (element.bonding()) {
            case GIVEN -> Origin.GIVEN;
            case BONDED -> induction ? Origin.INDUCED : Origin.NOT_INDUCED;
            default -> Origin.INSULATED;
        };
    }

    private CurrentSplit split(Group group, Complex[] amperes) {
        Complex residual = Complex.ZERO;
        Complex shields = Complex.ZERO;
        for (int i = 0; i < amperes.length; i++) {
            if (group.contains(lineOf(i))) {
                Complex current = amperes[i].multiply(group.sign(lineOf(i)));
                if (state.conductors().get(i).element().shield()) {
                    shields = shields.add(current);
                } else {
                    residual = residual.add(current);
                }
            }
        }
        List<String> names = group.lines().stream().map(l -> data.lines().get(l).name()).toList();
        return new CurrentSplit(names, Phasor.of(residual), Phasor.of(shields));
    }
}
