/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.emfgen;

import java.io.File;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import org.eclipse.emf.codegen.ecore.generator.Generator;
import org.eclipse.emf.codegen.ecore.genmodel.GenModel;
import org.eclipse.emf.codegen.ecore.genmodel.GenModelPackage;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenBaseGeneratorAdapter;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenModelGeneratorAdapterFactory;
import org.eclipse.emf.common.util.BasicMonitor;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.plugin.EcorePlugin;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceFactoryImpl;

/**
 * Generates the model and item-provider code from {@code spanfield.genmodel}, without a workspace. The only argument is the folder of
 * the bundles. The generator's scaffolding files (plugin.xml and the like) are removed by the calling script; manifests are ours.
 */
public final class GenerateModel {

    private GenerateModel() {
    }

    public static void main(String[] arguments) throws IOException {
        File bundles = new File(arguments[0]).getCanonicalFile();
        for (String project : new String[] {"spanfield.model", "spanfield.model.edit"}) {
            EcorePlugin.getPlatformResourceMap().put(project, URI.createFileURI(new File(bundles, project).getPath() + "/"));
        }
        GenModel model = load();
        report("genmodel", model.diagnose());
        model.setCanGenerate(true);
        Generator generator = new Generator();
        generator.getAdapterFactoryDescriptorRegistry().addDescriptor(GenModelPackage.eNS_URI, GenModelGeneratorAdapterFactory.DESCRIPTOR);
        generator.setInput(model);
        BasicMonitor quiet = new BasicMonitor.Printing(new PrintStream(OutputStream.nullOutputStream()));
        report("model", generator.generate(model, GenBaseGeneratorAdapter.MODEL_PROJECT_TYPE, quiet));
        report("item providers", generator.generate(model, GenBaseGeneratorAdapter.EDIT_PROJECT_TYPE, quiet));
    }

    private static GenModel load() {
        ResourceSet resources = new ResourceSetImpl();
        resources.getResourceFactoryRegistry().getExtensionToFactoryMap().put("*", new XMIResourceFactoryImpl());
        GenModelPackage.eINSTANCE.eClass();
        resources.getURIConverter().getURIMap().putAll(EcorePlugin.computePlatformURIMap(false));
        URI uri = URI.createPlatformResourceURI("spanfield.model/model/spanfield.genmodel", false);
        GenModel model = (GenModel) resources.getResource(uri, true).getContents().get(0);
        model.reconcile();
        return model;
    }

    private static void report(String step, Diagnostic diagnostic) {
        if (diagnostic.getSeverity() > Diagnostic.INFO) {
            throw new IllegalStateException("Generating the " + step + " failed: " + diagnostic);
        }
        System.out.println("Generated: " + step);
    }
}
