/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.results;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.ImageTransfer;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import spanfield.model.FieldMeasure;
import spanfield.model.LoadCase;
import spanfield.model.ProfileStation;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Survey;
import spanfield.model.SurveyReading;
import spanfield.model.io.StudyIds;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.ProfileReport;
import spanfield.report.Units;
import spanfield.report.plot.PlotOptions;
import spanfield.report.plot.ProfilePlot;
import spanfield.study.StudyInputException;
import spanfield.study.SurveyCsv;
import spanfield.study.result.LateralProfile;
import spanfield.ui.common.DisplayUnits;
import spanfield.ui.common.ProfileCanvas;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyPage;

/** The lateral profile at a chosen station. */
public final class ProfilePage extends StudyPage {

    private static final int PICTURE_WIDTH = 1600;
    /** Distance along the corridor up to which a reading counts as taken at a station. */
    private static final double SAME_STATION_METRES = 1;

    private ProfileCanvas canvas;
    private Combo stations;
    private Combo measures;
    private Combo fieldUnits;
    private Combo lengthUnits;
    private Button logarithmic;
    private Table cases;
    private final List<String> stationIds = new ArrayList<>();
    private LateralProfile shown;

    @Override
    public Control createControl(Composite parent) {
        Composite page = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).margins(6, 6).applyTo(page);
        Composite bar = new Composite(page, SWT.NONE);
        RowLayout row = new RowLayout(SWT.HORIZONTAL);
        row.center = true;
        bar.setLayout(row);
        GridDataFactory.fillDefaults().span(2, 1).grab(true, false).applyTo(bar);
        label(bar, "Station");
        stations = combo(bar);
        label(bar, "Measure");
        measures = combo(bar, "Resultant", "Major axis");
        label(bar, "Units");
        fieldUnits = combo(bar, FieldUnit.MICROTESLA.symbol(), FieldUnit.MILLIGAUSS.symbol());
        lengthUnits = combo(bar, "m", "ft");
        logarithmic = new Button(bar, SWT.CHECK);
        logarithmic.setText("Logarithmic");
        logarithmic.addListener(SWT.Selection, event -> configure());
        button(bar, "Import survey...", this::importSurvey);
        button(bar, "Export...", this::export);
        button(bar, "Copy", this::copy);
        canvas = new ProfileCanvas(page, false);
        GridDataFactory.fillDefaults().grab(true, true).applyTo(canvas);
        Composite side = new Composite(page, SWT.NONE);
        GridLayoutFactory.fillDefaults().applyTo(side);
        GridDataFactory.fillDefaults().hint(180, SWT.DEFAULT).grab(false, true).applyTo(side);
        label(side, "Load cases");
        cases = new Table(side, SWT.CHECK | SWT.BORDER | SWT.V_SCROLL);
        GridDataFactory.fillDefaults().grab(true, true).applyTo(cases);
        cases.addListener(SWT.Selection, event -> configure());
        Units units = DisplayUnits.get();
        fieldUnits.select(units.field().ordinal());
        lengthUnits.select(units.length().ordinal());
        measures.select(0);
        modelChanged();
        return page;
    }

    private static void label(Composite parent, String text) {
        new Label(parent, SWT.NONE).setText(text);
    }

    private Combo combo(Composite parent, String... items) {
        Combo combo = new Combo(parent, SWT.READ_ONLY);
        combo.setItems(items);
        combo.addListener(SWT.Selection, event -> configure());
        return combo;
    }

    private static void button(Composite parent, String text, Runnable action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
    }

    @Override
    public void modelChanged() {
        String before = stationId();
        stationIds.clear();
        stations.removeAll();
        for (ProfileStation station : document().study().getStations()) {
            stationIds.add(String.valueOf(station.getId()));
            stations.add(station.getName() + " (" + station.getStationMetres() + " m)");
        }
        stations.select(Math.max(0, stationIds.indexOf(before)));
        List<String> off = new ArrayList<>();
        for (TableItem item : cases.getItems()) {
            if (!item.getChecked()) {
                off.add((String) item.getData());
            }
        }
        cases.removeAll();
        for (LoadCase loadCase : document().study().getLoadCases()) {
            TableItem item = new TableItem(cases, SWT.NONE);
            item.setText(String.valueOf(loadCase.getName()));
            item.setData(loadCase.getId());
            item.setChecked(!off.contains(loadCase.getId()));
        }
        configure();
    }

    private String stationId() {
        int index = stations.getSelectionIndex();
        return index >= 0 && index < stationIds.size() ? stationIds.get(index) : "";
    }

    private Units units() {
        return new Units(FieldUnit.values()[fieldUnits.getSelectionIndex()], LengthUnit.values()[lengthUnits.getSelectionIndex()]);
    }

    private FieldMeasure measure() {
        return measures.getSelectionIndex() == 1 ? FieldMeasure.MAJOR_AXIS : FieldMeasure.RESULTANT;
    }

    private void configure() {
        if (!units().equals(DisplayUnits.get())) {
            DisplayUnits.set(units());
        }
        editor().computation().prefer(stationId());
        List<String> chosen = new ArrayList<>();
        for (TableItem item : cases.getItems()) {
            if (item.getChecked()) {
                chosen.add(String.valueOf(item.getData()));
            }
        }
        canvas.configure(units(), measure(), chosen::contains, logarithmic.getSelection());
        canvas.overlay(readings());
        computed(editor().computation().outcome());
    }

    @Override
    public void computed(StudyComputation.Outcome outcome) {
        LateralProfile fresh = outcome.profiles().get(stationId());
        if (fresh != null || outcome.state() != StudyComputation.State.COMPUTING) {
            shown = fresh;
        }
        canvas.show(shown, fresh == null && outcome.state() == StudyComputation.State.COMPUTING);
    }

    @Override
    public boolean reveal(org.eclipse.emf.ecore.EObject object) {
        if (object instanceof ProfileStation station && stationIds.contains(station.getId())) {
            stations.select(stationIds.indexOf(station.getId()));
            configure();
            return true;
        }
        return false;
    }

    /** Readings of all surveys that were taken at the station shown. */
    private List<ProfileCanvas.Reading> readings() {
        List<ProfileCanvas.Reading> readings = new ArrayList<>();
        int index = stations.getSelectionIndex();
        if (index >= 0 && index < document().study().getStations().size()) {
            double station = document().study().getStations().get(index).getStationMetres();
            for (Survey survey : document().study().getSurveys()) {
                for (SurveyReading reading : survey.getReadings()) {
                    if (Math.abs(reading.getStationMetres() - station) <= SAME_STATION_METRES) {
                        readings.add(new ProfileCanvas.Reading(reading.getOffsetMetres(), reading.getResultantTesla(), survey.getRelativeUncertainty()));
                    }
                }
            }
        }
        return readings;
    }

    private void importSurvey() {
        FileDialog dialog = new FileDialog(canvas.getShell(), SWT.OPEN);
        dialog.setText("Import survey");
        dialog.setFilterExtensions(new String[] {"*.csv", "*"});
        dialog.setFilterNames(new String[] {"Comma-separated values", "All files"});
        String chosen = dialog.open();
        if (chosen != null) {
            importSurvey(Path.of(chosen));
        }
    }

    /** Adds the readings of a file to the study, as one command; tells the user when the file is not a survey. */
    public void importSurvey(Path file) {
        try {
            String name = file.getFileName().toString().replaceFirst("[.]csv$", "");
            Survey survey = SurveyCsv.read(Files.readString(file), name);
            StudyIds.assign(survey, document().study());
            CompoundCommand command = new CompoundCommand("Import survey " + name);
            command.append(AddCommand.create(document().domain(), document().study(), SpanfieldPackage.eINSTANCE.getStudy_Surveys(), survey));
            document().execute(command);
        } catch (IOException | StudyInputException failure) {
            MessageDialog.openError(canvas.getShell(), "The survey was not imported", "'" + file + "': " + failure.getMessage());
        }
    }

    private void export() {
        if (shown == null) {
            MessageDialog.openInformation(canvas.getShell(), "Nothing to export", "There are no results yet. See Findings.");
            return;
        }
        FileDialog dialog = new FileDialog(canvas.getShell(), SWT.SAVE);
        dialog.setFilterExtensions(new String[] {"*.svg", "*.png", "*.pdf", "*.csv"});
        dialog.setFilterNames(new String[] {"Drawing (SVG)", "Picture (PNG)", "Document (PDF)", "Table (CSV)"});
        dialog.setFileName("profile.svg");
        dialog.setOverwrite(true);
        String chosen = dialog.open();
        if (chosen != null) {
            exportTo(Path.of(chosen));
        }
    }

    /** Writes the profile to a file, in the format that its ending names; tells the user when that fails. */
    public void exportTo(Path file) {
        try {
            Files.write(file, content(file.getFileName().toString()));
        } catch (IOException | IllegalArgumentException failure) {
            MessageDialog.openError(canvas.getShell(), "The profile was not exported", "'" + file + "' cannot be written: " + failure.getMessage());
        }
    }

    private byte[] content(String name) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        if (name.endsWith(".svg")) {
            new ProfilePlot(shown, new PlotOptions(units(), measure())).svg(out);
        } else if (name.endsWith(".png")) {
            new ProfilePlot(shown, new PlotOptions(units(), measure())).png(out, PICTURE_WIDTH);
        } else if (name.endsWith(".pdf")) {
            new ProfilePlot(shown, new PlotOptions(units(), measure())).pdf(out);
        } else if (name.endsWith(".csv")) {
            StringBuilder text = new StringBuilder();
            ProfileReport.csv(shown, units(), text);
            out.write(text.toString().getBytes(StandardCharsets.UTF_8));
        } else {
            throw new IllegalArgumentException("end the name with .svg, .png, .pdf or .csv");
        }
        return out.toByteArray();
    }

    private void copy() {
        if (shown == null) {
            return;
        }
        Clipboard clipboard = new Clipboard(canvas.getDisplay());
        try {
            String text = new String(content("x.csv"), StandardCharsets.UTF_8);
            ImageData picture = new ImageData(new ByteArrayInputStream(content("x.png")));
            clipboard.setContents(new Object[] {text, picture}, new Transfer[] {TextTransfer.getInstance(), ImageTransfer.getInstance()});
        } catch (IOException failure) {
            MessageDialog.openError(canvas.getShell(), "The profile was not copied", String.valueOf(failure.getMessage()));
        } finally {
            clipboard.dispose();
        }
    }

    @Override
    public void setFocus() {
        canvas.setFocus();
    }
}
