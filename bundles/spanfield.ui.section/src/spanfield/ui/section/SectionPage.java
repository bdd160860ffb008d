/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section;

import java.util.List;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.MenuItem;
import spanfield.model.Circuit;
import spanfield.model.FieldMeasure;
import spanfield.model.Line;
import spanfield.model.ProfileStation;
import spanfield.study.result.LateralProfile;
import spanfield.ui.common.DisplayUnits;
import spanfield.ui.common.ProfileCanvas;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyPage;
import spanfield.ui.section.internal.SectionView;

/** The corridor in section at a station, to scale, with the profile above it: wires, structures and edges are dragged, and the field follows. */
public final class SectionPage extends StudyPage {

    private SectionView view;
    private Combo stations;
    private ProfileCanvas profile;
    private Label reading;
    private Button phaseOrder;

    @Override
    public Control createControl(Composite parent) {
        Composite page = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(6, 6).applyTo(page);
        Composite bar = new Composite(page, SWT.NONE);
        RowLayout row = new RowLayout(SWT.HORIZONTAL);
        row.center = true;
        bar.setLayout(row);
        new Label(bar, SWT.NONE).setText("Station");
        stations = new Combo(bar, SWT.READ_ONLY);
        stations.addListener(SWT.Selection, event -> chooseStation());
        button(bar, "Fit", () -> view.fit());
        button(bar, "+", () -> view.zoom(1.25)).setToolTipText("Zoom in");
        button(bar, "\u2212", () -> view.zoom(0.8)).setToolTipText("Zoom out");
        Button snap = new Button(bar, SWT.CHECK);
        snap.setText("Snap to 0.1 m");
        snap.setSelection(true);
        snap.addListener(SWT.Selection, event -> view.setSnap(snap.getSelection()));
        button(bar, "Add circuit", () -> view.addCircuit());
        button(bar, "Remove", () -> view.removeSelected()).setToolTipText("Remove the chosen circuit or shield wire");
        phaseOrder = button(bar, "Phase order", this::showOrders);
        phaseOrder.setToolTipText("Change the order of the phases of the chosen circuit");
        SashForm halves = new SashForm(page, SWT.VERTICAL);
        GridDataFactory.fillDefaults().grab(true, true).applyTo(halves);
        profile = new ProfileCanvas(halves, true);
        view = new SectionView(halves, editor(), text -> {
            reading.setText(text);
            reading.requestLayout();
        });
        halves.setWeights(35, 65);
        reading = new Label(page, SWT.WRAP);
        reading.setText(SectionView.HINT);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(reading);
        modelChanged();
        return page;
    }

    private static Button button(Composite parent, String text, Runnable action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
        return button;
    }

    private void showOrders() {
        Circuit circuit = view.chosenCircuit();
        if (circuit == null) {
            reading.setText("Choose a phase first: the order of its circuit is changed.");
            reading.requestLayout();
            return;
        }
        List<List<String>> orders = view.orders(circuit);
        if (orders.isEmpty()) {
            reading.setText("The phases of '" + circuit.getName() + "' are placed one by one: choose a phase in the Outline and its attachment in Properties.");
            reading.requestLayout();
            return;
        }
        Menu menu = new Menu(phaseOrder);
        for (List<String> order : orders) {
            MenuItem item = new MenuItem(menu, SWT.RADIO);
            item.setText(circuit.getName() + ": " + SectionView.text(order));
            item.setSelection(order.equals(view.order(circuit)));
            item.addListener(SWT.Selection, event -> {
                if (item.getSelection()) {
                    view.reorder(circuit, order);
                }
            });
        }
        menu.setVisible(true);
    }

    private void chooseStation() {
        int index = stations.getSelectionIndex();
        if (index >= 0 && index < document().study().getStations().size()) {
            ProfileStation station = document().study().getStations().get(index);
            editor().computation().prefer(String.valueOf(station.getId()));
            view.show(station);
            computed(editor().computation().outcome());
        }
    }

    @Override
    public void modelChanged() {
        int before = Math.max(0, stations.getSelectionIndex());
        String[] names = document().study().getStations().stream().map(s -> s.getName() + " (" + s.getStationMetres() + " m)").toArray(String[]::new);
        if (!java.util.Arrays.equals(names, stations.getItems())) {
            stations.setItems(names);
            stations.select(Math.min(before, names.length - 1));
        }
        if (names.length == 0) {
            view.show(null);
        } else {
            chooseStation();
        }
    }

    @Override
    public void computed(StudyComputation.Outcome outcome) {
        view.computed(outcome);
        int index = stations.getSelectionIndex();
        String id = index >= 0 && index < document().study().getStations().size() ? document().study().getStations().get(index).getId() : "";
        boolean waiting = outcome.state() == StudyComputation.State.COMPUTING;
        LateralProfile fresh = outcome.profiles().get(id);
        profile.configure(DisplayUnits.get(), FieldMeasure.RESULTANT, any -> true, false);
        if (fresh != null || !waiting) {
            profile.show(fresh, false);
        }
    }

    @Override
    public boolean reveal(EObject object) {
        return !(object instanceof Line) && view.select(object);
    }

    /** The view, for tests that drive it. */
    public SectionView view() {
        return view;
    }

    @Override
    public void setFocus() {
        view.control().setFocus();
    }

    @Override
    public void dispose() {
        view.dispose();
    }
}
