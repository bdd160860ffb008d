/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.io;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermission;
import java.util.HashMap;
import java.util.Iterator;
import java.util.Map;
import java.util.Set;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.InternalEObject;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.ecore.xmi.UnresolvedReferenceException;
import org.eclipse.emf.ecore.xmi.XMIResource;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceImpl;
import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Study;

/**
 * Reads and writes study files: XMI in UTF-8, line feeds, identifiers for references, defaults left out, so that versions differ by the
 * lines that changed. Works inside and outside OSGi.
 *
 * <p>Reading never follows a reference out of the file, and refuses document types. Writing goes to a file beside the target, which is
 * forced to the disk and renamed over it: after a crash either the old or the new study is there, whole.
 */
public final class StudyFiles {

    /** Extension of study files, without the dot. */
    public static final String EXTENSION = "spanfield";

    /** Greatest size of a study file in bytes: thousands of structures stay far below it. */
    public static final long GREATEST_SIZE = 64L << 20;

    private StudyFiles() {
    }

    /**
     * Reads a study.
     *
     * @throws StudyFileException when the file is missing, unreadable, not a study, damaged, or of another version
     */
    public static Study load(Path file) throws StudyFileException {
        return parse(read(file), file.getFileName() == null ? file.toString() : file.getFileName().toString());
    }

    /** The bytes of a study file, checked for existence and size. */
    private static byte[] read(Path file) throws StudyFileException {
        try {
            if (Files.isDirectory(file)) {
                throw new StudyFileException("'" + file + "' is a folder. Name a ." + EXTENSION + " file in it.");
            }
            if (Files.size(file) > GREATEST_SIZE) {
                throw new StudyFileException("The file '" + file + "' has " + Files.size(file) + " bytes, more than any study ("
                    + GREATEST_SIZE + "). Choose a file that Spanfield has saved.");
            }
            return Files.readAllBytes(file);
        } catch (NoSuchFileException missing) {
            throw new StudyFileException("There is no file '" + file + "'. Check the path.", missing);
        } catch (AccessDeniedException denied) {
            throw new StudyFileException("The file '" + file + "' may not be read. Check its permissions.", denied);
        } catch (IOException failure) {
            throw new StudyFileException("The file '" + file + "' cannot be read: " + failure.getMessage() + ".", failure);
        }
    }

    /**
     * Builds a study from the bytes of a file.
     *
     * @param name name of the file for messages
     */
    public static Study parse(byte[] content, String name) throws StudyFileException {
        StudyFormat.check(content, name);
        XMIResource resource = newResource();
        try {
            Map<Object, Object> options = new HashMap<>();
            options.put(XMIResource.OPTION_DEFER_IDREF_RESOLUTION, Boolean.TRUE);
            resource.load(new ByteArrayInputStream(content), options);
        } catch (IOException | RuntimeException failure) {
            throw new StudyFileException(describe(name, resource, failure), failure);
        }
        if (!resource.getErrors().isEmpty()) {
            throw new StudyFileException(describe(name, resource, null));
        }
        if (resource.getContents().size() != 1 || !(resource.getContents().get(0) instanceof Study study)) {
            throw new StudyFileException("The file '" + name + "' does not hold one study. Choose a file that Spanfield has saved.");
        }
        refuseOutsideReferences(study, name);
        String duplicate = StudyIds.duplicate(study);
        if (duplicate != null) {
            throw new StudyFileException("In the file '" + name + "' two elements have the identifier '" + duplicate
                + "', so that references to it are ambiguous. Give one of them another identifier.");
        }
        return study;
    }

    private static String describe(String name, Resource resource, Exception failure) {
        Resource.Diagnostic first = resource.getErrors().isEmpty() ? null : resource.getErrors().get(0);
        String where = first == null ? "" : " (line " + first.getLine() + ", column " + first.getColumn() + ")";
        if (first instanceof UnresolvedReferenceException unresolved) {
            return "In the file '" + name + "' the reference to '" + unresolved.getReference() + "' leads nowhere" + where
                + ". Restore the missing element, or remove the reference.";
        }
        String reason = first != null ? plain(first.getMessage()) : failure == null ? "" : plain(failure.getMessage());
        return "The file '" + name + "' is not a readable study: " + reason + where + ". Restore it from a copy, or repair the line.";
    }

    /** Messages of the XMI reader without class names and paths. */
    private static String plain(String message) {
        if (message == null) {
            return "its content does not fit a study";
        }
        String text = message.replaceAll("\\(?file:[^)]*\\)", "").replaceAll("org\\.eclipse\\.[A-Za-z.]*\\.", "")
            .replaceAll("spanfield\\.model\\.impl\\.([A-Za-z]*)Impl@[0-9a-f]*( \\([^)]*\\))?", "$1").strip();
        if (text.startsWith("Feature '") && text.contains("' not found")) {
            String feature = text.substring(9, text.indexOf('\'', 9));
            return "it has a part '" + feature + "' which this version does not know";
        }
        if (text.startsWith("Value '")) {
            return "the value '" + text.substring(7, text.indexOf('\'', 7)) + "' is not legal there";
        }
        return text.endsWith(".") ? text.substring(0, text.length() - 1) : text;
    }

    private static void refuseOutsideReferences(Study study, String name) throws StudyFileException {
        for (Iterator<EObject> all = EcoreUtil.getAllContents(study, false); all.hasNext();) {
            EObject object = all.next();
            for (EReference reference : object.eClass().getEAllReferences()) {
                Object value = object.eGet(reference, false);
                Iterable<?> targets = value instanceof Iterable<?> many ? many : java.util.Collections.singleton(value);
                for (Object target : targets) {
                    if (target instanceof InternalEObject other && other.eIsProxy()) {
                        throw new StudyFileException("In the file '" + name + "' the reference '" + reference.getName()
                            + "' leads out of the file or nowhere. A study holds everything it refers to: remove the reference.");
                    }
                }
            }
        }
    }

    /**
     * Writes a study; elements without identifiers get them first. The old file stays untouched unless the new one is complete.
     *
     * @throws StudyFileException when the file cannot be written
     */
    public static void save(Study study, Path file) throws StudyFileException {
        StudyIds.assignMissing(study);
        byte[] content = serialize(study);
        Path target = file.toAbsolutePath();
        Path beside = null;
        try {
            if (Files.isSymbolicLink(target)) {
                target = target.toRealPath();
            }
            beside = Files.createTempFile(target.getParent(), "." + target.getFileName(), ".part");
            try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
                ByteBuffer buffer = ByteBuffer.wrap(content);
                while (buffer.hasRemaining()) {
                    channel.write(buffer);
                }
                channel.force(true);
            }
            keepPermissions(target, beside);
            move(beside, target);
        } catch (IOException failure) {
            discard(beside);
            String why = failure instanceof AccessDeniedException ? "writing there is not permitted"
                : failure instanceof NoSuchFileException ? "the folder does not exist" : String.valueOf(failure.getMessage());
            throw new StudyFileException("The study cannot be saved to '" + file + "': " + why
                + ". The file on the disk is unchanged; choose another place.", failure);
        }
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException unsupported) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void keepPermissions(Path old, Path fresh) throws IOException {
        PosixFileAttributeView view = Files.getFileAttributeView(fresh, PosixFileAttributeView.class);
        if (view == null) {
            return;
        }
        Set<PosixFilePermission> permissions = Files.exists(old) ? Files.getPosixFilePermissions(old)
            : java.nio.file.attribute.PosixFilePermissions.fromString("rw-r--r--");
        view.setPermissions(permissions);
    }

    private static void discard(Path beside) {
        try {
            if (beside != null) {
                Files.deleteIfExists(beside);
            }
        } catch (IOException ignored) {
            // a leftover part file harms nothing, and the first failure is the one to report
        }
    }

    /** The content of the file that {@link #save} would write: the canonical form, also the basis of digests. */
    public static byte[] serialize(Study study) {
        Study copy = copy(study);
        StudyIds.assignMissing(copy);
        XMIResource resource = newResource();
        resource.getContents().add(copy);
        Map<Object, Object> options = new HashMap<>();
        options.put(XMIResource.OPTION_ENCODING, "UTF-8");
        options.put(Resource.OPTION_LINE_DELIMITER, "\n");
        options.put(XMIResource.OPTION_SCHEMA_LOCATION, Boolean.FALSE);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            resource.save(bytes, options);
        } catch (IOException impossible) {
            throw new IllegalStateException("Writing to memory failed", impossible);
        }
        return bytes.toByteArray();
    }

    /** A deep copy of a study. */
    public static Study copy(Study study) {
        return EcoreUtil.copy(study);
    }

    /** An empty study with a corridor. */
    public static Study newStudy() {
        Study study = SpanfieldFactory.eINSTANCE.createStudy();
        study.setCorridor(SpanfieldFactory.eINSTANCE.createCorridor());
        return study;
    }

    private static XMIResource newResource() {
        SpanfieldPackage.eINSTANCE.eClass();
        ResourceSet resources = new ResourceSetImpl();
        resources.getPackageRegistry().put(SpanfieldPackage.eNS_URI, SpanfieldPackage.eINSTANCE);
        // No factory is registered and the name is relative: a reference to another file can never be loaded.
        XMIResource resource = new XMIResourceImpl(URI.createURI("study." + EXTENSION));
        resources.getResources().add(resource);
        resources.setURIConverter(new ClosedConverter());
        return resource;
    }

    /** Opens nothing: studies stand alone. */
    private static final class ClosedConverter extends org.eclipse.emf.ecore.resource.impl.ExtensibleURIConverterImpl {

        @Override
        public java.io.InputStream createInputStream(URI uri, Map<?, ?> options) throws IOException {
            throw new IOException("A study does not refer to other files");
        }
    }
}
