/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.resource.impl.ResourceImpl;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import spanfield.model.Study;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;
import spanfield.model.provider.SpanfieldItemProviderAdapterFactory;

/**
 * One open study: the model, its command stack, its file. Every change of the model goes through the command stack, so that undo, the dirty
 * mark and the computation see it.
 */
public final class StudyDocument {

    private final BasicCommandStack commands = new BasicCommandStack();
    private final SpanfieldItemProviderAdapterFactory adapters = new SpanfieldItemProviderAdapterFactory();
    private final AdapterFactoryEditingDomain domain = new AdapterFactoryEditingDomain(adapters, commands);
    private final Resource resource = new ResourceImpl(URI.createURI("study." + StudyFiles.EXTENSION));
    private Study study;
    private Path path;
    private byte[] onDisk;
    private boolean recovered;

    private StudyDocument(Study study, Path path, byte[] onDisk) {
        domain.getResourceSet().getResources().add(resource);
        this.path = path;
        this.onDisk = onDisk;
        adopt(study);
    }

    private void adopt(Study fresh) {
        resource.getContents().clear();
        study = fresh;
        resource.getContents().add(study);
    }

    /**
     * Opens a study file.
     *
     * @throws StudyFileException when it cannot be read
     */
    public static StudyDocument open(Path path) throws StudyFileException {
        Study study = StudyFiles.load(path);
        return new StudyDocument(study, path, content(path));
    }

    /** A document without a file yet; it is dirty from the start. */
    public static StudyDocument untitled(Study study, Path suggestion) {
        return new StudyDocument(study, suggestion, null);
    }

    private static byte[] content(Path path) {
        try {
            return Files.readAllBytes(path);
        } catch (IOException unreadable) {
            return null;
        }
    }

    /** The model. Read it on the user-interface thread only; change it through {@link #execute} only. */
    public Study study() {
        return study;
    }

    /** The file, or the suggested one of a document that was never saved. */
    public Path path() {
        return path;
    }

    /** Whether the file has ever been written or read. */
    public boolean hasFile() {
        return onDisk != null;
    }

    /** Editing domain for commands of EMF.Edit. */
    public AdapterFactoryEditingDomain domain() {
        return domain;
    }

    /** Adapter factory for labels, children and properties. */
    public AdapterFactory adapters() {
        return adapters;
    }

    /** The one command stack. */
    public BasicCommandStack commands() {
        return commands;
    }

    /** Executes a command; a null or unexecutable command is ignored. */
    public void execute(Command command) {
        if (command != null && command.canExecute()) {
            commands.execute(command);
        }
    }

    /**
     * Sets a feature by an undoable command, unless it has that value already.
     *
     * @param label name of the change in the Edit menu
     */
    public void set(String label, EObject object, EAttribute feature, Object value) {
        Object before = object.eGet(feature);
        if (before == null ? value == null : before.equals(value)) {
            return;
        }
        SetCommand command = (SetCommand) SetCommand.create(domain, object, feature, value);
        command.setLabel(label);
        execute(command);
    }

    /** Whether there are changes that the file does not have. */
    public boolean dirty() {
        return onDisk == null || recovered || commands.isSaveNeeded();
    }

    /**
     * Writes the study to its file.
     *
     * @throws StudyFileException when it cannot be written; nothing is lost
     */
    public void save() throws StudyFileException {
        saveAs(path);
    }

    /** Writes the study to another file, which becomes its file. */
    public void saveAs(Path target) throws StudyFileException {
        StudyFiles.save(study, target);
        path = target;
        onDisk = content(target);
        recovered = false;
        commands.saveIsDone();
    }

    /** Whether another program has changed or removed the file since it was read or written here. */
    public boolean changedOnDisk() {
        return onDisk != null && !Arrays.equals(onDisk, content(path));
    }

    /** Takes the file's present state as known, so that {@link #changedOnDisk} asks no more until it changes again. */
    public void acknowledgeDisk() {
        byte[] now = content(path);
        onDisk = now == null ? new byte[0] : now;
    }

    /**
     * Reads the file again and forgets all changes.
     *
     * @throws StudyFileException when it cannot be read; the document stays as it is
     */
    public void reload() throws StudyFileException {
        Study fresh = StudyFiles.load(path);
        adopt(fresh);
        onDisk = content(path);
        recovered = false;
        commands.flush();
        commands.saveIsDone();
    }

    /** Replaces the content by unsaved changes of an earlier session; the document is dirty until it is saved to its file. */
    public void recover(Study unsaved) {
        adopt(unsaved);
        recovered = true;
        commands.flush();
    }

    public void addListener(CommandStackListener listener) {
        commands.addCommandStackListener(listener);
    }

    public void removeListener(CommandStackListener listener) {
        commands.removeCommandStackListener(listener);
    }

    /** Frees the adapters. */
    public void dispose() {
        adapters.dispose();
    }
}
