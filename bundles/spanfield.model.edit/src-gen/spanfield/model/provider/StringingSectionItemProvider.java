/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.common.util.ResourceLocator;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IEditingDomainItemProvider;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.IStructuredItemContentProvider;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;
import org.eclipse.emf.edit.provider.ViewerNotification;

import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StringingSection;

/**
 * This is the item provider adapter for a {@link spanfield.model.StringingSection} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class StringingSectionItemProvider 
	extends ItemProviderAdapter
	implements
		IEditingDomainItemProvider,
		IStructuredItemContentProvider,
		ITreeItemContentProvider,
		IItemLabelProvider,
		IItemPropertySource {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StringingSectionItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

			addFromPropertyDescriptor(object);
			addToPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the From feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addFromPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StringingSection_from_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_StringingSection_from_feature", "_UI_StringingSection_type"),
				 SpanfieldPackage.Literals.STRINGING_SECTION__FROM,
				 true,
				 false,
				 true,
				 null,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the To feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addToPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StringingSection_to_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_StringingSection_to_feature", "_UI_StringingSection_type"),
				 SpanfieldPackage.Literals.STRINGING_SECTION__TO,
				 true,
				 false,
				 true,
				 null,
				 null,
				 null));
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING);
			childrenFeatures.add(SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING);
			childrenFeatures.add(SpanfieldPackage.Literals.STRINGING_SECTION__EXCEPTIONS);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		return getString("_UI_StringingSection_type");
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(StringingSection.class)) {
			case SpanfieldPackage.STRINGING_SECTION__FROM:
			case SpanfieldPackage.STRINGING_SECTION__TO:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING,
				 SpanfieldFactory.eINSTANCE.createCatenaryStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING,
				 SpanfieldFactory.eINSTANCE.createSagStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING,
				 SpanfieldFactory.eINSTANCE.createTensionStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING,
				 SpanfieldFactory.eINSTANCE.createClearanceStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING,
				 SpanfieldFactory.eINSTANCE.createCatenaryStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING,
				 SpanfieldFactory.eINSTANCE.createSagStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING,
				 SpanfieldFactory.eINSTANCE.createTensionStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING,
				 SpanfieldFactory.eINSTANCE.createClearanceStringing()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STRINGING_SECTION__EXCEPTIONS,
				 SpanfieldFactory.eINSTANCE.createWireStringing()));
	}

	/**
	 * This returns the label text for {@link org.eclipse.emf.edit.command.CreateChildCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getCreateChildText(Object owner, Object feature, Object child, Collection<?> selection) {
		Object childFeature = feature;
		Object childObject = child;

		boolean qualify =
			childFeature == SpanfieldPackage.Literals.STRINGING_SECTION__PHASE_STRINGING ||
			childFeature == SpanfieldPackage.Literals.STRINGING_SECTION__SHIELD_STRINGING;

		if (qualify) {
			return getString
				("_UI_CreateChild_text2",
				 new Object[] { getTypeText(childObject), getFeatureText(childFeature), getTypeText(owner) });
		}
		return super.getCreateChildText(owner, feature, child, selection);
	}

	/**
	 * Return the resource locator for this item provider's resources.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ResourceLocator getResourceLocator() {
		return SpanfieldEditPlugin.INSTANCE;
	}

}
