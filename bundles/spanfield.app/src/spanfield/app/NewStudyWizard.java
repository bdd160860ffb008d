/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.IWorkbenchWindow;

/** Makes a new study from a template. */
final class NewStudyWizard extends Wizard {

    private final IWorkbenchWindow window;
    private final Page page = new Page();

    NewStudyWizard(IWorkbenchWindow window) {
        this.window = window;
        setWindowTitle("New study");
    }

    @Override
    public void addPages() {
        addPage(page);
    }

    @Override
    public boolean performFinish() {
        String name = page.name.getText().strip();
        Studies.openFresh(window, page.template().create(name, page.number(page.frequency), 1000 * page.number(page.kilovolts), page.number(page.amperes)),
            name.replaceAll("[^\\p{L}\\p{N}]+", "-"));
        return true;
    }

    /** The only page. */
    private static final class Page extends WizardPage {

        private Text name;
        private Combo template;
        private Label description;
        private Text frequency;
        private Text kilovolts;
        private Text amperes;

        Page() {
            super("study", "A new corridor study", null);
            setDescription("Choose what is nearest to your line. Everything can be changed afterwards.");
        }

        @Override
        public void createControl(Composite parent) {
            Composite area = new Composite(parent, SWT.NONE);
            GridLayoutFactory.swtDefaults().numColumns(2).applyTo(area);
            name = text(area, "Name", "New corridor");
            new Label(area, SWT.NONE).setText("Start from");
            template = new Combo(area, SWT.READ_ONLY);
            for (StudyTemplate choice : StudyTemplate.values()) {
                template.add(choice.title());
            }
            template.select(0);
            template.addListener(SWT.Selection, event -> check());
            GridDataFactory.fillDefaults().grab(true, false).applyTo(template);
            new Label(area, SWT.NONE);
            description = new Label(area, SWT.WRAP);
            GridDataFactory.fillDefaults().grab(true, false).applyTo(description);
            frequency = text(area, "Frequency, Hz", "50");
            kilovolts = text(area, "Nominal voltage, kV", "220");
            amperes = text(area, "Current of each circuit, A", "800");
            setControl(area);
            check();
        }

        private Text text(Composite area, String label, String value) {
            new Label(area, SWT.NONE).setText(label);
            Text text = new Text(area, SWT.BORDER);
            text.setText(value);
            text.addModifyListener(event -> check());
            GridDataFactory.fillDefaults().grab(true, false).applyTo(text);
            return text;
        }

        private StudyTemplate template() {
            return StudyTemplate.values()[template.getSelectionIndex()];
        }

        private double number(Text text) {
            try {
                return Double.parseDouble(text.getText().strip().replace(',', '.'));
            } catch (NumberFormatException notANumber) {
                return Double.NaN;
            }
        }

        private void check() {
            if (getControl() == null && amperes == null) {
                return;
            }
            description.setText(template().description());
            String problem = name.getText().isBlank() ? "Give the study a name."
                : !(number(frequency) >= 0 && number(frequency) <= 1000) ? "The frequency must be a number from 0 to 1000 Hz."
                : !(number(kilovolts) > 0 && number(kilovolts) <= 2000) ? "The voltage must be a number up to 2000 kV."
                : !(number(amperes) >= 0 && number(amperes) <= 1e5) ? "The current must be a number up to 100000 A." : null;
            setErrorMessage(problem);
            setPageComplete(problem == null);
        }
    }
}
