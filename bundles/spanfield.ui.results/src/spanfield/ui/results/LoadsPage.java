/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.results;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.EditingSupport;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.io.StudyIds;
import spanfield.ui.common.StudyPage;

/** Loads as a sheet: a row for each circuit, a column for each load case; cells are typed as in {@link LoadText}. */
public final class LoadsPage extends StudyPage {

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;

    private TableViewer viewer;
    private Label message;
    private List<String> columnIds = List.of();

    @Override
    public Control createControl(Composite parent) {
        Composite page = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(6, 6).applyTo(page);
        Composite bar = new Composite(page, SWT.NONE);
        bar.setLayout(new RowLayout(SWT.HORIZONTAL));
        button(bar, "Add load case", this::addCase);
        button(bar, "Remove last load case", this::removeCase);
        viewer = new TableViewer(page, SWT.FULL_SELECTION | SWT.BORDER | SWT.H_SCROLL | SWT.V_SCROLL);
        viewer.getTable().setHeaderVisible(true);
        viewer.getTable().setLinesVisible(true);
        viewer.setContentProvider(ArrayContentProvider.getInstance());
        GridDataFactory.fillDefaults().grab(true, true).applyTo(viewer.getTable());
        viewer.addSelectionChangedListener(event -> {
            if (!event.getStructuredSelection().isEmpty()) {
                editor().select(event.getStructuredSelection().getFirstElement());
            }
        });
        message = new Label(page, SWT.WRAP);
        message.setText(HINT);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(message);
        modelChanged();
        return page;
    }

    private static final String HINT = "Click a cell and type: 480 A, or 480 A -12 with an angle in degrees, or 42 MW 9 Mvar. Add reversed to turn the flow "
        + "round. An empty cell means no current.";

    private static void button(Composite parent, String text, Runnable action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
    }

    @Override
    public void modelChanged() {
        List<String> ids = document().study().getLoadCases().stream().map(c -> c.getId() + c.getName()).toList();
        if (!ids.equals(columnIds) || viewer.getTable().getColumnCount() == 0) {
            rebuildColumns();
            columnIds = ids;
        }
        List<Circuit> circuits = new ArrayList<>();
        for (Line line : document().study().getLines()) {
            circuits.addAll(line.getCircuits());
        }
        if (!viewer.isCellEditorActive()) {
            viewer.setInput(circuits);
        }
    }

    private void rebuildColumns() {
        while (viewer.getTable().getColumnCount() > 0) {
            viewer.getTable().getColumn(0).dispose();
        }
        TableViewerColumn names = column("Circuit", 180);
        names.setLabelProvider(new ColumnLabelProvider() {
            @Override
            public String getText(Object element) {
                Circuit circuit = (Circuit) element;
                return circuit.getName() + "  (" + ((Line) circuit.eContainer()).getName() + ")";
            }
        });
        for (int i = 0; i < document().study().getLoadCases().size(); i++) {
            int index = i;
            TableViewerColumn column = column(String.valueOf(document().study().getLoadCases().get(i).getName()), 190);
            column.setLabelProvider(new ColumnLabelProvider() {
                @Override
                public String getText(Object element) {
                    return index < document().study().getLoadCases().size() ? LoadText.of(load(index, (Circuit) element)) : "";
                }
            });
            column.setEditingSupport(new LoadEditing(index));
        }
    }

    private TableViewerColumn column(String title, int width) {
        TableViewerColumn column = new TableViewerColumn(viewer, SWT.LEFT);
        column.getColumn().setText(title);
        column.getColumn().setWidth(width);
        column.getColumn().setResizable(true);
        return column;
    }

    private CircuitLoad load(int index, Circuit circuit) {
        return document().study().getLoadCases().get(index).getLoads().stream().filter(load -> load.getCircuit() == circuit).findFirst().orElse(null);
    }

    /** Typing into the cells of a load case. */
    private final class LoadEditing extends EditingSupport {

        private final int index;
        private final TextCellEditor cell = new TextCellEditor(viewer.getTable());

        LoadEditing(int index) {
            super(viewer);
            this.index = index;
        }

        @Override
        protected boolean canEdit(Object element) {
            boolean typable = LoadText.typable(load(index, (Circuit) element));
            message.setText(typable ? HINT : "This load is unbalanced: choose it in the Outline and change it in Properties.");
            return typable;
        }

        @Override
        protected CellEditor getCellEditor(Object element) {
            return cell;
        }

        @Override
        protected Object getValue(Object element) {
            return LoadText.of(load(index, (Circuit) element));
        }

        @Override
        protected void setValue(Object element, Object value) {
            try {
                setLoad(index, (Circuit) element, LoadText.parse(String.valueOf(value), (Circuit) element));
                message.setText(HINT);
            } catch (IllegalArgumentException unreadable) {
                message.setText(unreadable.getMessage());
            }
            viewer.update(element, null);
        }
    }

    /** Replaces the load of a circuit in a load case as one command; null removes it. */
    void setLoad(int index, Circuit circuit, CircuitLoad fresh) {
        LoadCase loadCase = document().study().getLoadCases().get(index);
        CircuitLoad before = load(index, circuit);
        if (before == null && fresh == null || before != null && fresh != null && EcoreUtil.equals(before, fresh)) {
            return;
        }
        Command command;
        if (before == null) {
            command = AddCommand.create(document().domain(), loadCase, P.getLoadCase_Loads(), fresh);
        } else if (fresh == null) {
            command = RemoveCommand.create(document().domain(), loadCase, P.getLoadCase_Loads(), before);
        } else {
            command = SetCommand.create(document().domain(), loadCase, P.getLoadCase_Loads(), fresh, loadCase.getLoads().indexOf(before));
        }
        CompoundCommand labelled = new CompoundCommand("Change load of " + circuit.getName());
        labelled.append(command);
        document().execute(labelled);
    }

    private void addCase() {
        List<LoadCase> cases = document().study().getLoadCases();
        LoadCase fresh = cases.isEmpty() ? SpanfieldFactory.eINSTANCE.createLoadCase() : EcoreUtil.copy(cases.get(cases.size() - 1));
        fresh.setId(null);
        fresh.setName("Load case " + (cases.size() + 1));
        StudyIds.assign(fresh, document().study());
        CompoundCommand command = new CompoundCommand("Add load case");
        command.append(AddCommand.create(document().domain(), document().study(), P.getStudy_LoadCases(), fresh));
        document().execute(command);
    }

    private void removeCase() {
        List<LoadCase> cases = document().study().getLoadCases();
        if (!cases.isEmpty()) {
            CompoundCommand command = new CompoundCommand("Remove load case");
            command.append(RemoveCommand.create(document().domain(), document().study(), P.getStudy_LoadCases(), cases.get(cases.size() - 1)));
            document().execute(command);
        }
    }

    @Override
    public boolean reveal(org.eclipse.emf.ecore.EObject object) {
        return object instanceof LoadCase || object instanceof CircuitLoad;
    }

    @Override
    public void setFocus() {
        viewer.getControl().setFocus();
    }
}
