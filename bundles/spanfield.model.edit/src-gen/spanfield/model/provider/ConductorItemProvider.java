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

import spanfield.model.Conductor;
import spanfield.model.SpanfieldPackage;

/**
 * This is the item provider adapter for a {@link spanfield.model.Conductor} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class ConductorItemProvider extends NamedElementItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ConductorItemProvider(AdapterFactory adapterFactory) {
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

			addDiameterMetresPropertyDescriptor(object);
			addGeometricMeanRadiusMetresPropertyDescriptor(object);
			addLowTemperatureCelsiusPropertyDescriptor(object);
			addLowResistanceOhmsPerMetrePropertyDescriptor(object);
			addHighTemperatureCelsiusPropertyDescriptor(object);
			addHighResistanceOhmsPerMetrePropertyDescriptor(object);
			addMassKilogramsPerMetrePropertyDescriptor(object);
			addAreaSquareMetresPropertyDescriptor(object);
			addElasticModulusPascalsPropertyDescriptor(object);
			addThermalExpansionPerKelvinPropertyDescriptor(object);
			addRatedStrengthNewtonsPropertyDescriptor(object);
			addEmissivityPropertyDescriptor(object);
			addAbsorptivityPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Diameter Metres feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addDiameterMetresPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_diameterMetres_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_diameterMetres_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__DIAMETER_METRES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Geometric Mean Radius Metres feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addGeometricMeanRadiusMetresPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_geometricMeanRadiusMetres_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_geometricMeanRadiusMetres_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Low Temperature Celsius feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addLowTemperatureCelsiusPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_lowTemperatureCelsius_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_lowTemperatureCelsius_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__LOW_TEMPERATURE_CELSIUS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Low Resistance Ohms Per Metre feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addLowResistanceOhmsPerMetrePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_lowResistanceOhmsPerMetre_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_lowResistanceOhmsPerMetre_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the High Temperature Celsius feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addHighTemperatureCelsiusPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_highTemperatureCelsius_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_highTemperatureCelsius_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the High Resistance Ohms Per Metre feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addHighResistanceOhmsPerMetrePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_highResistanceOhmsPerMetre_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_highResistanceOhmsPerMetre_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Mass Kilograms Per Metre feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addMassKilogramsPerMetrePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_massKilogramsPerMetre_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_massKilogramsPerMetre_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__MASS_KILOGRAMS_PER_METRE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Area Square Metres feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAreaSquareMetresPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_areaSquareMetres_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_areaSquareMetres_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__AREA_SQUARE_METRES,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Modulus Pascals feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticModulusPascalsPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_elasticModulusPascals_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_elasticModulusPascals_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__ELASTIC_MODULUS_PASCALS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Thermal Expansion Per Kelvin feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addThermalExpansionPerKelvinPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_thermalExpansionPerKelvin_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_thermalExpansionPerKelvin_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Rated Strength Newtons feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRatedStrengthNewtonsPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_ratedStrengthNewtons_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_ratedStrengthNewtons_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__RATED_STRENGTH_NEWTONS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Emissivity feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEmissivityPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_emissivity_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_emissivity_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__EMISSIVITY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Absorptivity feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAbsorptivityPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Conductor_absorptivity_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Conductor_absorptivity_feature", "_UI_Conductor_type"),
				 SpanfieldPackage.Literals.CONDUCTOR__ABSORPTIVITY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
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
		String label = ((Conductor)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Conductor_type") :
			getString("_UI_Conductor_type") + " " + label;
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

		switch (notification.getFeatureID(Conductor.class)) {
			case SpanfieldPackage.CONDUCTOR__DIAMETER_METRES:
			case SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES:
			case SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS:
			case SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE:
			case SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS:
			case SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE:
			case SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE:
			case SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES:
			case SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS:
			case SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN:
			case SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS:
			case SpanfieldPackage.CONDUCTOR__EMISSIVITY:
			case SpanfieldPackage.CONDUCTOR__ABSORPTIVITY:
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
