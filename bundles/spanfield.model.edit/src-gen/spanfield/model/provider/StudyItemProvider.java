/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Study;

/**
 * This is the item provider adapter for a {@link spanfield.model.Study} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class StudyItemProvider extends NamedElementItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StudyItemProvider(AdapterFactory adapterFactory) {
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

			addAuthorPropertyDescriptor(object);
			addOrganisationPropertyDescriptor(object);
			addDatePropertyDescriptor(object);
			addFrequencyHertzPropertyDescriptor(object);
			addEarthResistivityOhmMetresPropertyDescriptor(object);
			addEarthModelPropertyDescriptor(object);
			addImpedanceFormulaPropertyDescriptor(object);
			addReferenceHeightMetresPropertyDescriptor(object);
			addRelativeAccuracyPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Author feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAuthorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_author_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_author_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__AUTHOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Organisation feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addOrganisationPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_organisation_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_organisation_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__ORGANISATION,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Date feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addDatePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_date_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_date_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__DATE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Frequency Hertz feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addFrequencyHertzPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_frequencyHertz_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_frequencyHertz_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__FREQUENCY_HERTZ,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Earth Resistivity Ohm Metres feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEarthResistivityOhmMetresPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_earthResistivityOhmMetres_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_earthResistivityOhmMetres_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__EARTH_RESISTIVITY_OHM_METRES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Earth Model feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEarthModelPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_earthModel_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_earthModel_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__EARTH_MODEL,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Impedance Formula feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addImpedanceFormulaPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_impedanceFormula_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_impedanceFormula_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__IMPEDANCE_FORMULA,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Reference Height Metres feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addReferenceHeightMetresPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_referenceHeightMetres_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_referenceHeightMetres_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__REFERENCE_HEIGHT_METRES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Relative Accuracy feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRelativeAccuracyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Study_relativeAccuracy_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Study_relativeAccuracy_feature", "_UI_Study_type"),
				 SpanfieldPackage.Literals.STUDY__RELATIVE_ACCURACY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
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
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__CORRIDOR);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__CONDUCTORS);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__STRUCTURE_TYPES);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__LINES);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__LOAD_CASES);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__STATIONS);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__LIMITS);
			childrenFeatures.add(SpanfieldPackage.Literals.STUDY__SURVEYS);
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
		String label = ((Study)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Study_type") :
			getString("_UI_Study_type") + " " + label;
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

		switch (notification.getFeatureID(Study.class)) {
			case SpanfieldPackage.STUDY__AUTHOR:
			case SpanfieldPackage.STUDY__ORGANISATION:
			case SpanfieldPackage.STUDY__DATE:
			case SpanfieldPackage.STUDY__FREQUENCY_HERTZ:
			case SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES:
			case SpanfieldPackage.STUDY__EARTH_MODEL:
			case SpanfieldPackage.STUDY__IMPEDANCE_FORMULA:
			case SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES:
			case SpanfieldPackage.STUDY__RELATIVE_ACCURACY:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case SpanfieldPackage.STUDY__CORRIDOR:
			case SpanfieldPackage.STUDY__CONDUCTORS:
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
			case SpanfieldPackage.STUDY__LINES:
			case SpanfieldPackage.STUDY__LOAD_CASES:
			case SpanfieldPackage.STUDY__STATIONS:
			case SpanfieldPackage.STUDY__LIMITS:
			case SpanfieldPackage.STUDY__SURVEYS:
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
				(SpanfieldPackage.Literals.STUDY__CORRIDOR,
				 SpanfieldFactory.eINSTANCE.createCorridor()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__CONDUCTORS,
				 SpanfieldFactory.eINSTANCE.createConductor()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__STRUCTURE_TYPES,
				 SpanfieldFactory.eINSTANCE.createStructureType()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__LINES,
				 SpanfieldFactory.eINSTANCE.createLine()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__LOAD_CASES,
				 SpanfieldFactory.eINSTANCE.createLoadCase()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__STATIONS,
				 SpanfieldFactory.eINSTANCE.createProfileStation()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__LIMITS,
				 SpanfieldFactory.eINSTANCE.createFieldLimit()));

		newChildDescriptors.add
			(createChildParameter
				(SpanfieldPackage.Literals.STUDY__SURVEYS,
				 SpanfieldFactory.eINSTANCE.createSurvey()));
	}

}
