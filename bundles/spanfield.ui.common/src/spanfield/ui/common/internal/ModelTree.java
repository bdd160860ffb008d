/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.util.Collection;
import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.jface.viewers.ITreeContentProvider;

/** The children of model objects as EMF.Edit's item providers give them. */
final class ModelTree implements ITreeContentProvider {

    private final AdapterFactory adapters;

    ModelTree(AdapterFactory adapters) {
        this.adapters = adapters;
    }

    private ITreeItemContentProvider provider(Object element) {
        return (ITreeItemContentProvider) adapters.adapt(element, ITreeItemContentProvider.class);
    }

    @Override
    public Object[] getElements(Object input) {
        return input instanceof Object[] array ? array : getChildren(input);
    }

    @Override
    public Object[] getChildren(Object element) {
        ITreeItemContentProvider provider = provider(element);
        if (provider == null) {
            return new Object[0];
        }
        Collection<?> children = provider.getChildren(element);
        return children.toArray();
    }

    @Override
    public Object getParent(Object element) {
        ITreeItemContentProvider provider = provider(element);
        return provider == null ? null : provider.getParent(element);
    }

    @Override
    public boolean hasChildren(Object element) {
        ITreeItemContentProvider provider = provider(element);
        return provider != null && provider.hasChildren(element);
    }
}
