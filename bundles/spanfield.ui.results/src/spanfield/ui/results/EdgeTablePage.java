/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.results;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.Viewer;
import org.eclipse.jface.viewers.ViewerComparator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.TableColumn;
import spanfield.report.EdgeReport;
import spanfield.report.Numbers;
import spanfield.report.Units;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.LimitComparison.Verdict;
import spanfield.study.result.PlacedField;
import spanfield.ui.common.DisplayUnits;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyPage;

/** The edge-of-right-of-way table. Sorts by any column; rows can be copied; verdicts are words as well as marks. */
public final class EdgeTablePage extends StudyPage {

    private TableViewer viewer;
    private Label note;
    private EdgeTable table;
    private final List<Column> columns = new ArrayList<>();

    /** A column: its title in the units shown, its text, and its order. */
    private record Column(Function<Units, String> title, Function<EdgeRow, String> text, Comparator<EdgeRow> order) {
    }

    @Override
    public Control createControl(Composite parent) {
        Composite page = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(6, 6).applyTo(page);
        Composite bar = new Composite(page, SWT.NONE);
        RowLayout row = new RowLayout(SWT.HORIZONTAL);
        row.center = true;
        bar.setLayout(row);
        button(bar, "Export...", this::export);
        button(bar, "Copy", this::copy);
        note = new Label(bar, SWT.NONE);
        note.setText("Nothing computed yet");
        viewer = new TableViewer(page, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER | SWT.H_SCROLL | SWT.V_SCROLL);
        GridDataFactory.fillDefaults().grab(true, true).applyTo(viewer.getTable());
        viewer.getTable().setHeaderVisible(true);
        viewer.getTable().setLinesVisible(true);
        viewer.setContentProvider(ArrayContentProvider.getInstance());
        defineColumns();
        for (Column column : columns) {
            addColumn(column);
        }
        Label caution = new Label(page, SWT.WRAP);
        caution.setText("For planning and screening. Numerical: bound of the computation's own error. Earth: difference between the two earth models. "
            + "Local codes and licensed practice decide which limit holds.");
        GridDataFactory.fillDefaults().grab(true, false).applyTo(caution);
        return page;
    }

    private void defineColumns() {
        columns.add(new Column(u -> "Station", r -> r.station().name(), Comparator.comparing(r -> r.station().name())));
        columns.add(new Column(u -> "Load case", r -> r.loadCase().name(), Comparator.comparing(r -> r.loadCase().name())));
        field("Left edge", EdgeRow::leftEdge);
        field("Right edge", EdgeRow::rightEdge);
        field("Greatest within", EdgeRow::greatestResultant);
        columns.add(new Column(u -> "at, " + u.length().code(), r -> Numbers.length(DisplayUnits.get().length().fromMetres(r.greatestResultant().offsetMetres())),
            Comparator.comparingDouble(r -> r.greatestResultant().offsetMetres())));
        columns.add(new Column(u -> "Numerical \u00b1, " + u.field().symbol(), r -> Numbers.bound(DisplayUnits.get().field().fromTesla(worst(r, false))),
            Comparator.comparingDouble(r -> worst(r, false))));
        columns.add(new Column(u -> "Earth \u00b1, " + u.field().symbol(), r -> Double.isNaN(worst(r, true)) ? Numbers.NONE
            : Numbers.bound(DisplayUnits.get().field().fromTesla(worst(r, true))), Comparator.comparingDouble(r -> worst(r, true))));
        columns.add(new Column(u -> "Tightest limit", EdgeTablePage::tightestText, Comparator.comparingDouble(EdgeTablePage::tightestShare)));
        columns.add(new Column(u -> "Margin, " + u.field().symbol(), EdgeTablePage::marginText, Comparator.comparingDouble(EdgeTablePage::tightestShare)));
        columns.add(new Column(u -> "Verdict", EdgeTablePage::verdictText, Comparator.comparingDouble(EdgeTablePage::tightestShare)));
    }

    private void field(String name, Function<EdgeRow, PlacedField> place) {
        columns.add(new Column(u -> name + ", " + u.field().symbol(),
            r -> Numbers.field(DisplayUnits.get().field().fromTesla(place.apply(r).field().resultantTesla())),
            Comparator.comparingDouble(r -> place.apply(r).field().resultantTesla())));
    }

    private static double worst(EdgeRow row, boolean model) {
        double greatest = Double.NaN;
        for (PlacedField place : List.of(row.leftEdge(), row.rightEdge(), row.greatestResultant())) {
            double error = model ? place.field().modelErrorTesla() : place.field().numericalErrorTesla();
            greatest = Double.isNaN(greatest) ? error : Math.max(greatest, error);
        }
        return greatest;
    }

    private static LimitComparison tightest(EdgeRow row) {
        return row.comparisons().stream().max(Comparator.comparingDouble(LimitComparison::fractionOfLevel)).orElse(null);
    }

    private static double tightestShare(EdgeRow row) {
        LimitComparison comparison = tightest(row);
        return comparison == null ? -1 : comparison.fractionOfLevel();
    }

    private static String tightestText(EdgeRow row) {
        LimitComparison comparison = tightest(row);
        return comparison == null ? Numbers.NONE : comparison.limit().name() + " (" + Numbers.significant(100 * comparison.fractionOfLevel(), 3) + " %)";
    }

    private static String marginText(EdgeRow row) {
        LimitComparison comparison = tightest(row);
        return comparison == null ? Numbers.NONE : Numbers.field(DisplayUnits.get().field().fromTesla(comparison.marginTesla()));
    }

    private static String verdictText(EdgeRow row) {
        LimitComparison comparison = tightest(row);
        if (comparison == null) {
            return "no limit";
        }
        Verdict verdict = comparison.verdict();
        return switch (verdict.name()) {
            case "BELOW" -> "\u2713 below";
            case "ABOVE" -> "\u2717 ABOVE";
            default -> "? " + verdict.name().toLowerCase(java.util.Locale.ROOT);
        };
    }

    private void addColumn(Column column) {
        boolean text = columns.indexOf(column) < 2 || columns.indexOf(column) == 8 || columns.indexOf(column) == 10;
        TableViewerColumn shown = new TableViewerColumn(viewer, text ? SWT.LEFT : SWT.RIGHT);
        shown.getColumn().setText(column.title().apply(DisplayUnits.get()));
        shown.getColumn().pack();
        shown.setLabelProvider(new ColumnLabelProvider() {
            @Override
            public String getText(Object element) {
                return column.text().apply((EdgeRow) element);
            }
        });
        shown.getColumn().addListener(SWT.Selection, event -> sortBy(shown, column));
    }

    private void sortBy(TableViewerColumn shown, Column column) {
        boolean down = viewer.getTable().getSortColumn() == shown.getColumn() && viewer.getTable().getSortDirection() == SWT.UP;
        viewer.getTable().setSortColumn(shown.getColumn());
        viewer.getTable().setSortDirection(down ? SWT.DOWN : SWT.UP);
        Comparator<EdgeRow> order = down ? column.order().reversed() : column.order();
        viewer.setComparator(new ViewerComparator() {
            @Override
            public int compare(Viewer owner, Object a, Object b) {
                return order.compare((EdgeRow) a, (EdgeRow) b);
            }
        });
    }

    private static void button(Composite parent, String text, Runnable action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(text);
        button.addListener(SWT.Selection, event -> action.run());
    }

    @Override
    public void computed(StudyComputation.Outcome outcome) {
        switch (outcome.state()) {
            case DONE -> {
                table = outcome.edges();
                for (int i = 0; i < columns.size(); i++) {
                    viewer.getTable().getColumn(i).setText(columns.get(i).title().apply(DisplayUnits.get()));
                }
                boolean first = viewer.getTable().getItemCount() == 0;
                viewer.setInput(table.rows());
                if (first) {
                    for (TableColumn column : viewer.getTable().getColumns()) {
                        column.pack();
                    }
                }
                note.setText("Up to date: " + table.rows().size() + " rows");
            }
            case COMPUTING -> note.setText("Being computed; the rows are those of the study before the last change");
            case INVALID, FAILED -> {
                table = null;
                viewer.setInput(List.of());
                note.setText(outcome.state() == StudyComputation.State.FAILED ? outcome.message() : "The study has errors: see Findings");
            }
            default -> note.setText("Nothing computed yet");
        }
        note.requestLayout();
    }

    private void copy() {
        if (table == null) {
            return;
        }
        StringBuilder text = new StringBuilder();
        columns.forEach(column -> text.append(column.title().apply(DisplayUnits.get())).append('\t'));
        text.append('\n');
        List<?> rows = viewer.getStructuredSelection().isEmpty() ? table.rows() : viewer.getStructuredSelection().toList();
        for (Object row : rows) {
            columns.forEach(column -> text.append(column.text().apply((EdgeRow) row)).append('\t'));
            text.append('\n');
        }
        Clipboard clipboard = new Clipboard(viewer.getControl().getDisplay());
        clipboard.setContents(new Object[] {text.toString()}, new Transfer[] {TextTransfer.getInstance()});
        clipboard.dispose();
    }

    private void export() {
        if (table == null) {
            MessageDialog.openInformation(viewer.getControl().getShell(), "Nothing to export", "There are no results yet. See Findings.");
            return;
        }
        FileDialog dialog = new FileDialog(viewer.getControl().getShell(), SWT.SAVE);
        dialog.setFilterExtensions(new String[] {"*.csv"});
        dialog.setFilterNames(new String[] {"Table (CSV)"});
        dialog.setFileName("edges.csv");
        dialog.setOverwrite(true);
        String chosen = dialog.open();
        if (chosen != null) {
            exportTo(Path.of(chosen));
        }
    }

    /** Writes the table as CSV; tells the user when that fails. */
    public void exportTo(Path file) {
        try {
            StringBuilder text = new StringBuilder();
            EdgeReport.csv(table, DisplayUnits.get(), text);
            Files.write(file, text.toString().getBytes(StandardCharsets.UTF_8));
        } catch (IOException failure) {
            MessageDialog.openError(viewer.getControl().getShell(), "The table was not exported", "'" + file + "' cannot be written: " + failure.getMessage());
        }
    }

    /** Rows as shown, for tests. */
    public int rowCount() {
        return viewer.getTable().getItemCount();
    }

    @Override
    public void setFocus() {
        viewer.getControl().setFocus();
    }
}
