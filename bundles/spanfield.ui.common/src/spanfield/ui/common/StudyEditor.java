/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EventObject;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.Platform;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.viewers.ISelectionProvider;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.IPartListener;
import org.eclipse.ui.IPathEditorInput;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.MultiPageEditorPart;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;
import org.eclipse.ui.views.properties.IPropertySheetPage;
import org.eclipse.ui.views.properties.PropertySheetPage;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;
import spanfield.ui.common.internal.ModelPropertySources;
import spanfield.ui.common.internal.RecoveryStore;
import spanfield.ui.common.internal.SimpleSelectionProvider;
import spanfield.ui.common.internal.StudyOutlinePage;

/**
 * The editor of a study: pages over one model and one command stack, with undo and redo across pages. Works on plain files
 * ({@link StudyInput}) and on anything with a path, such as files of a workspace.
 */
public final class StudyEditor extends MultiPageEditorPart {

    /** Identifier of the editor. */
    public static final String ID = "spanfield.ui.common.studyEditor";

    private final List<StudyPage> studyPages = new ArrayList<>();
    private final CommandStackListener changes = this::commandExecuted;
    private final Consumer<StudyComputation.Outcome> results = this::computed;
    private final SimpleSelectionProvider selection = new SimpleSelectionProvider();
    private final IPartListener activation = new ActivationListener();
    private StudyDocument document;
    private StudyComputation computation;
    private RecoveryStore recovery;
    private boolean wasDirty;
    private boolean asking;

    @Override
    public void init(IEditorSite site, IEditorInput input) throws PartInitException {
        super.init(site, input);
        site.setSelectionProvider(selection);
        try {
            document = open(input);
        } catch (StudyFileException broken) {
            throw new PartInitException(broken.getMessage(), broken);
        }
        setPartName(document.path().getFileName().toString());
        computation = new StudyComputation(document, site.getShell().getDisplay());
        recovery = RecoveryStore.forFile(document.path());
        document.addListener(changes);
        computation.addListener(results);
        wasDirty = document.dirty();
        site.getPage().addPartListener(activation);
    }

    private static StudyDocument open(IEditorInput input) throws StudyFileException {
        if (input instanceof StudyInput study) {
            return study.fresh() == null ? StudyDocument.open(study.path()) : StudyDocument.untitled(study.fresh(), study.path());
        }
        if (input instanceof IPathEditorInput file) {
            return StudyDocument.open(file.getPath().toPath());
        }
        throw new StudyFileException("This kind of input cannot be opened as a study. Open a ." + StudyFiles.EXTENSION + " file.");
    }

    /** The document. */
    public StudyDocument document() {
        return document;
    }

    /** The computation of the document. */
    public StudyComputation computation() {
        return computation;
    }

    @Override
    protected void createPages() {
        List<IConfigurationElement> elements = new ArrayList<>(List.of(
            Platform.getExtensionRegistry().getConfigurationElementsFor("spanfield.ui.common.pages")));
        elements.sort(Comparator.comparingInt(element -> Integer.parseInt(element.getAttribute("order"))));
        for (IConfigurationElement element : elements) {
            try {
                StudyPage page = (StudyPage) element.createExecutableExtension("class");
                page.attach(this);
                int index = addPage(page.createControl(getContainer()));
                setPageText(index, element.getAttribute("name"));
                studyPages.add(page);
            } catch (CoreException broken) {
                Platform.getLog(StudyEditor.class).error("A page of the study editor cannot be made: " + element.getAttribute("name"), broken);
            }
        }
        offerRecovery();
        computation.request();
    }

    private void offerRecovery() {
        recovery.read().ifPresent(study -> getSite().getShell().getDisplay().asyncExec(() -> {
            boolean wanted = MessageDialog.open(MessageDialog.QUESTION, getSite().getShell(), "Unsaved changes were found",
                "Spanfield ended before the last changes of '" + getPartName() + "' were saved. Bring them back?", SWT.SHEET);
            if (wanted) {
                document.recover(study);
                afterChange();
            } else {
                recovery.discard();
            }
        }));
    }

    private void commandExecuted(EventObject event) {
        getSite().getShell().getDisplay().asyncExec(() -> {
            if (!getContainer().isDisposed()) {
                afterChange();
            }
        });
    }

    private void afterChange() {
        if (wasDirty != document.dirty()) {
            wasDirty = document.dirty();
            firePropertyChange(PROP_DIRTY);
        }
        if (document.dirty()) {
            recovery.schedule(StudyFiles.copy(document.study()));
        } else {
            recovery.discard();
        }
        updateUndoActions();
        studyPages.forEach(StudyPage::modelChanged);
        selection.refire();
        computation.request();
    }

    private void computed(StudyComputation.Outcome outcome) {
        studyPages.forEach(page -> page.computed(outcome));
        String text = switch (outcome.state()) {
            case IDLE -> "";
            case COMPUTING -> "Computing the field...";
            case DONE -> "Results are up to date";
            case INVALID -> outcome.errors() == 1 ? "The study has an error: see Findings" : "The study has " + outcome.errors() + " errors: see Findings";
            case FAILED -> "The computation failed: " + outcome.message();
        };
        getEditorSite().getActionBars().getStatusLineManager().setMessage(text);
    }

    // undo and redo

    private final Action undo = new Action("Undo") {
        @Override
        public void run() {
            if (document.commands().canUndo()) {
                document.commands().undo();
            }
        }
    };

    private final Action redo = new Action("Redo") {
        @Override
        public void run() {
            if (document.commands().canRedo()) {
                document.commands().redo();
            }
        }
    };

    /** Installs undo and redo of the document in the menus and keys; called whenever the editor becomes active. */
    public void installActions(IActionBars bars) {
        bars.setGlobalActionHandler(ActionFactory.UNDO.getId(), undo);
        bars.setGlobalActionHandler(ActionFactory.REDO.getId(), redo);
        updateUndoActions();
        bars.updateActionBars();
    }

    private void updateUndoActions() {
        undo.setEnabled(document.commands().canUndo());
        undo.setText(document.commands().canUndo() ? "Undo " + document.commands().getUndoCommand().getLabel() : "Undo");
        redo.setEnabled(document.commands().canRedo());
        redo.setText(document.commands().canRedo() ? "Redo " + document.commands().getRedoCommand().getLabel() : "Redo");
    }

    // selection

    /** Selects objects of the model for the Outline, Properties and the pages. */
    public void select(Object... objects) {
        selection.setSelection(new StructuredSelection(objects));
    }

    /** The editor's selection, shared by its pages. */
    public ISelectionProvider selectionProvider() {
        return selection;
    }

    /** Shows an object on the first page that can, the active page before others, and selects it. */
    public void reveal(EObject object) {
        select(object);
        int active = getActivePage();
        if (active >= 0 && studyPages.get(active).reveal(object)) {
            return;
        }
        for (int i = 0; i < studyPages.size(); i++) {
            if (studyPages.get(i).reveal(object)) {
                setActivePage(i);
                return;
            }
        }
    }

    /** The pages, in the order of the tabs. */
    public List<StudyPage> pages() {
        return List.copyOf(studyPages);
    }

    /** Name on the tab of the page in front, or empty. */
    public String activePageName() {
        return getActivePage() < 0 ? "" : getPageText(getActivePage());
    }

    /** Brings a page to the front by its position. */
    public void showPage(int index) {
        setActivePage(index);
    }

    @Override
    protected void pageChange(int index) {
        // The base class would take the selection provider of a nested editor; the pages share one.
        if (index >= 0 && index < studyPages.size()) {
            studyPages.get(index).setFocus();
        }
    }

    @Override
    public void setFocus() {
        int active = getActivePage();
        if (active >= 0 && active < studyPages.size()) {
            studyPages.get(active).setFocus();
        }
    }

    // file

    @Override
    public boolean isDirty() {
        return document.dirty();
    }

    @Override
    public void doSave(IProgressMonitor monitor) {
        if (!document.hasFile()) {
            doSaveAs();
            return;
        }
        if (document.changedOnDisk() && !MessageDialog.openQuestion(getSite().getShell(), "The file has changed",
            "Another program has changed '" + document.path() + "'. Write your study over it?")) {
            return;
        }
        saveTo(document.path());
    }

    @Override
    public void doSaveAs() {
        FileDialog dialog = new FileDialog(getSite().getShell(), SWT.SAVE);
        dialog.setFilterExtensions(new String[] {"*." + StudyFiles.EXTENSION});
        dialog.setFilterNames(new String[] {"Spanfield studies"});
        dialog.setOverwrite(true);
        if (document.path().getParent() != null) {
            dialog.setFilterPath(document.path().getParent().toString());
        }
        dialog.setFileName(document.path().getFileName().toString());
        String chosen = dialog.open();
        if (chosen != null) {
            saveTo(Path.of(chosen.endsWith("." + StudyFiles.EXTENSION) ? chosen : chosen + "." + StudyFiles.EXTENSION));
        }
    }

    /** Writes the study to a file and tells the user when that fails. */
    public boolean saveTo(Path target) {
        try {
            RecoveryStore old = recovery;
            document.saveAs(target);
            old.discard();
            recovery = RecoveryStore.forFile(target);
            setInputWithNotify(StudyInput.of(target));
            setPartName(target.getFileName().toString());
            RecentStudies.add(target);
            wasDirty = false;
            firePropertyChange(PROP_DIRTY);
            return true;
        } catch (StudyFileException failure) {
            MessageDialog.openError(getSite().getShell(), "The study was not saved", failure.getMessage());
            return false;
        }
    }

    @Override
    public boolean isSaveAsAllowed() {
        return true;
    }

    private void checkDisk() {
        if (asking || !document.hasFile() || !document.changedOnDisk()) {
            return;
        }
        asking = true;
        try {
            boolean gone = !Files.exists(document.path());
            String question = gone ? "Another program has removed '" + document.path() + "'. Your study is still here; save it to write the file again."
                : "Another program has changed '" + document.path() + "'. Read it again" + (document.dirty() ? " and lose your unsaved changes?" : "?");
            if (gone) {
                MessageDialog.openInformation(getSite().getShell(), "The file is gone", question);
                document.acknowledgeDisk();
            } else if (MessageDialog.openQuestion(getSite().getShell(), "The file has changed", question)) {
                document.reload();
                afterChange();
            } else {
                document.acknowledgeDisk();
            }
        } catch (StudyFileException broken) {
            document.acknowledgeDisk();
            MessageDialog.openError(getSite().getShell(), "The file was not read", broken.getMessage());
        } finally {
            asking = false;
        }
    }

    /** Looks at the file whenever the editor becomes active. */
    private final class ActivationListener implements IPartListener {

        @Override
        public void partActivated(IWorkbenchPart part) {
            if (part == StudyEditor.this) {
                installActions(getEditorSite().getActionBars());
                checkDisk();
            }
        }

        @Override
        public void partBroughtToTop(IWorkbenchPart part) {
            // activation follows
        }

        @Override
        public void partClosed(IWorkbenchPart part) {
            // dispose follows
        }

        @Override
        public void partDeactivated(IWorkbenchPart part) {
            // nothing held
        }

        @Override
        public void partOpened(IWorkbenchPart part) {
            // activation follows
        }
    }

    @Override
    public <T> T getAdapter(Class<T> adapter) {
        if (adapter == IContentOutlinePage.class) {
            return adapter.cast(new StudyOutlinePage(this));
        }
        if (adapter == IPropertySheetPage.class) {
            PropertySheetPage page = new PropertySheetPage();
            page.setPropertySourceProvider(new ModelPropertySources(document));
            return adapter.cast(page);
        }
        return super.getAdapter(adapter);
    }

    @Override
    public void dispose() {
        getSite().getPage().removePartListener(activation);
        document.removeListener(changes);
        computation.removeListener(results);
        computation.dispose();
        studyPages.forEach(StudyPage::dispose);
        // The user has decided about unsaved changes when the editor closes in order.
        recovery.discard();
        document.dispose();
        super.dispose();
    }

    /** Identifier of each page's class, for tests and links: simple class name to position. */
    public Map<String, Integer> pagePositions() {
        Map<String, Integer> positions = new java.util.LinkedHashMap<>();
        for (int i = 0; i < studyPages.size(); i++) {
            positions.put(studyPages.get(i).getClass().getSimpleName(), i);
        }
        return positions;
    }
}
