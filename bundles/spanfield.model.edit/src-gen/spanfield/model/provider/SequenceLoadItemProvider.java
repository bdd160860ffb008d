/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import spanfield.model.FlowDirection;
import spanfield.model.SequenceLoad;
import spanfield.model.SpanfieldPackage;

/**
 * This is the item provider adapter for a {@link spanfield.model.SequenceLoad} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class SequenceLoadItemProvider extends CircuitLoadItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SequenceLoadItemProvider(AdapterFactory adapterFactory) {
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

			addPositiveAmperesPropertyDescriptor(object);
			addPositiveAngleDegreesPropertyDescriptor(object);
			addNegativeAmperesPropertyDescriptor(object);
			addNegativeAngleDegreesPropertyDescriptor(object);
			addZeroAmperesPropertyDescriptor(object);
			addZeroAngleDegreesPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Positive Amperes feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addPositiveAmperesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_positiveAmperes_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_positiveAmperes_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__POSITIVE_AMPERES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Positive Angle Degrees feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addPositiveAngleDegreesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_positiveAngleDegrees_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_positiveAngleDegrees_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Negative Amperes feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNegativeAmperesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_negativeAmperes_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_negativeAmperes_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__NEGATIVE_AMPERES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Negative Angle Degrees feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNegativeAngleDegreesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_negativeAngleDegrees_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_negativeAngleDegrees_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Zero Amperes feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addZeroAmperesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_zeroAmperes_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_zeroAmperes_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__ZERO_AMPERES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Zero Angle Degrees feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addZeroAngleDegreesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_SequenceLoad_zeroAngleDegrees_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_SequenceLoad_zeroAngleDegrees_feature", "_UI_SequenceLoad_type"),
				 SpanfieldPackage.Literals.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
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
		FlowDirection labelValue = ((SequenceLoad)object).getDirection();
		String label = labelValue == null ? null : labelValue.toString();
		return label == null || label.length() == 0 ?
			getString("_UI_SequenceLoad_type") :
			getString("_UI_SequenceLoad_type") + " " + label;
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

		switch (notification.getFeatureID(SequenceLoad.class)) {
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES:
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES:
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES:
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES:
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES:
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
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
	}

}
