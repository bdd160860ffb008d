/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.Conductor;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Conductor</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getDiameterMetres <em>Diameter Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getGeometricMeanRadiusMetres <em>Geometric Mean Radius Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getLowTemperatureCelsius <em>Low Temperature Celsius</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getLowResistanceOhmsPerMetre <em>Low Resistance Ohms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getHighTemperatureCelsius <em>High Temperature Celsius</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getHighResistanceOhmsPerMetre <em>High Resistance Ohms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getMassKilogramsPerMetre <em>Mass Kilograms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getAreaSquareMetres <em>Area Square Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getElasticModulusPascals <em>Elastic Modulus Pascals</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getThermalExpansionPerKelvin <em>Thermal Expansion Per Kelvin</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getRatedStrengthNewtons <em>Rated Strength Newtons</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getEmissivity <em>Emissivity</em>}</li>
 *   <li>{@link spanfield.model.impl.ConductorImpl#getAbsorptivity <em>Absorptivity</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ConductorImpl extends NamedElementImpl implements Conductor {
	/**
	 * The default value of the '{@link #getDiameterMetres() <em>Diameter Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDiameterMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double DIAMETER_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getDiameterMetres() <em>Diameter Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDiameterMetres()
	 * @generated
	 * @ordered
	 */
	protected double diameterMetres = DIAMETER_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getGeometricMeanRadiusMetres() <em>Geometric Mean Radius Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGeometricMeanRadiusMetres()
	 * @generated
	 * @ordered
	 */
	protected static final Double GEOMETRIC_MEAN_RADIUS_METRES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getGeometricMeanRadiusMetres() <em>Geometric Mean Radius Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGeometricMeanRadiusMetres()
	 * @generated
	 * @ordered
	 */
	protected Double geometricMeanRadiusMetres = GEOMETRIC_MEAN_RADIUS_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getLowTemperatureCelsius() <em>Low Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLowTemperatureCelsius()
	 * @generated
	 * @ordered
	 */
	protected static final double LOW_TEMPERATURE_CELSIUS_EDEFAULT = 20.0;

	/**
	 * The cached value of the '{@link #getLowTemperatureCelsius() <em>Low Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLowTemperatureCelsius()
	 * @generated
	 * @ordered
	 */
	protected double lowTemperatureCelsius = LOW_TEMPERATURE_CELSIUS_EDEFAULT;

	/**
	 * The default value of the '{@link #getLowResistanceOhmsPerMetre() <em>Low Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLowResistanceOhmsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected static final Double LOW_RESISTANCE_OHMS_PER_METRE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getLowResistanceOhmsPerMetre() <em>Low Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLowResistanceOhmsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected Double lowResistanceOhmsPerMetre = LOW_RESISTANCE_OHMS_PER_METRE_EDEFAULT;

	/**
	 * The default value of the '{@link #getHighTemperatureCelsius() <em>High Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHighTemperatureCelsius()
	 * @generated
	 * @ordered
	 */
	protected static final double HIGH_TEMPERATURE_CELSIUS_EDEFAULT = 75.0;

	/**
	 * The cached value of the '{@link #getHighTemperatureCelsius() <em>High Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHighTemperatureCelsius()
	 * @generated
	 * @ordered
	 */
	protected double highTemperatureCelsius = HIGH_TEMPERATURE_CELSIUS_EDEFAULT;

	/**
	 * The default value of the '{@link #getHighResistanceOhmsPerMetre() <em>High Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHighResistanceOhmsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected static final Double HIGH_RESISTANCE_OHMS_PER_METRE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getHighResistanceOhmsPerMetre() <em>High Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHighResistanceOhmsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected Double highResistanceOhmsPerMetre = HIGH_RESISTANCE_OHMS_PER_METRE_EDEFAULT;

	/**
	 * The default value of the '{@link #getMassKilogramsPerMetre() <em>Mass Kilograms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassKilogramsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected static final Double MASS_KILOGRAMS_PER_METRE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMassKilogramsPerMetre() <em>Mass Kilograms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassKilogramsPerMetre()
	 * @generated
	 * @ordered
	 */
	protected Double massKilogramsPerMetre = MASS_KILOGRAMS_PER_METRE_EDEFAULT;

	/**
	 * The default value of the '{@link #getAreaSquareMetres() <em>Area Square Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAreaSquareMetres()
	 * @generated
	 * @ordered
	 */
	protected static final Double AREA_SQUARE_METRES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getAreaSquareMetres() <em>Area Square Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAreaSquareMetres()
	 * @generated
	 * @ordered
	 */
	protected Double areaSquareMetres = AREA_SQUARE_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticModulusPascals() <em>Elastic Modulus Pascals</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticModulusPascals()
	 * @generated
	 * @ordered
	 */
	protected static final Double ELASTIC_MODULUS_PASCALS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getElasticModulusPascals() <em>Elastic Modulus Pascals</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticModulusPascals()
	 * @generated
	 * @ordered
	 */
	protected Double elasticModulusPascals = ELASTIC_MODULUS_PASCALS_EDEFAULT;

	/**
	 * The default value of the '{@link #getThermalExpansionPerKelvin() <em>Thermal Expansion Per Kelvin</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getThermalExpansionPerKelvin()
	 * @generated
	 * @ordered
	 */
	protected static final Double THERMAL_EXPANSION_PER_KELVIN_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getThermalExpansionPerKelvin() <em>Thermal Expansion Per Kelvin</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getThermalExpansionPerKelvin()
	 * @generated
	 * @ordered
	 */
	protected Double thermalExpansionPerKelvin = THERMAL_EXPANSION_PER_KELVIN_EDEFAULT;

	/**
	 * The default value of the '{@link #getRatedStrengthNewtons() <em>Rated Strength Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRatedStrengthNewtons()
	 * @generated
	 * @ordered
	 */
	protected static final Double RATED_STRENGTH_NEWTONS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getRatedStrengthNewtons() <em>Rated Strength Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRatedStrengthNewtons()
	 * @generated
	 * @ordered
	 */
	protected Double ratedStrengthNewtons = RATED_STRENGTH_NEWTONS_EDEFAULT;

	/**
	 * The default value of the '{@link #getEmissivity() <em>Emissivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEmissivity()
	 * @generated
	 * @ordered
	 */
	protected static final Double EMISSIVITY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getEmissivity() <em>Emissivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEmissivity()
	 * @generated
	 * @ordered
	 */
	protected Double emissivity = EMISSIVITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getAbsorptivity() <em>Absorptivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAbsorptivity()
	 * @generated
	 * @ordered
	 */
	protected static final Double ABSORPTIVITY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getAbsorptivity() <em>Absorptivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAbsorptivity()
	 * @generated
	 * @ordered
	 */
	protected Double absorptivity = ABSORPTIVITY_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ConductorImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.CONDUCTOR;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getDiameterMetres() {
		return diameterMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDiameterMetres(double newDiameterMetres) {
		double oldDiameterMetres = diameterMetres;
		diameterMetres = newDiameterMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__DIAMETER_METRES, oldDiameterMetres, diameterMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getGeometricMeanRadiusMetres() {
		return geometricMeanRadiusMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setGeometricMeanRadiusMetres(Double newGeometricMeanRadiusMetres) {
		Double oldGeometricMeanRadiusMetres = geometricMeanRadiusMetres;
		geometricMeanRadiusMetres = newGeometricMeanRadiusMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES, oldGeometricMeanRadiusMetres, geometricMeanRadiusMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getLowTemperatureCelsius() {
		return lowTemperatureCelsius;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLowTemperatureCelsius(double newLowTemperatureCelsius) {
		double oldLowTemperatureCelsius = lowTemperatureCelsius;
		lowTemperatureCelsius = newLowTemperatureCelsius;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS, oldLowTemperatureCelsius, lowTemperatureCelsius));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getLowResistanceOhmsPerMetre() {
		return lowResistanceOhmsPerMetre;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLowResistanceOhmsPerMetre(Double newLowResistanceOhmsPerMetre) {
		Double oldLowResistanceOhmsPerMetre = lowResistanceOhmsPerMetre;
		lowResistanceOhmsPerMetre = newLowResistanceOhmsPerMetre;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE, oldLowResistanceOhmsPerMetre, lowResistanceOhmsPerMetre));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getHighTemperatureCelsius() {
		return highTemperatureCelsius;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHighTemperatureCelsius(double newHighTemperatureCelsius) {
		double oldHighTemperatureCelsius = highTemperatureCelsius;
		highTemperatureCelsius = newHighTemperatureCelsius;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS, oldHighTemperatureCelsius, highTemperatureCelsius));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getHighResistanceOhmsPerMetre() {
		return highResistanceOhmsPerMetre;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHighResistanceOhmsPerMetre(Double newHighResistanceOhmsPerMetre) {
		Double oldHighResistanceOhmsPerMetre = highResistanceOhmsPerMetre;
		highResistanceOhmsPerMetre = newHighResistanceOhmsPerMetre;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE, oldHighResistanceOhmsPerMetre, highResistanceOhmsPerMetre));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getMassKilogramsPerMetre() {
		return massKilogramsPerMetre;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMassKilogramsPerMetre(Double newMassKilogramsPerMetre) {
		Double oldMassKilogramsPerMetre = massKilogramsPerMetre;
		massKilogramsPerMetre = newMassKilogramsPerMetre;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE, oldMassKilogramsPerMetre, massKilogramsPerMetre));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getAreaSquareMetres() {
		return areaSquareMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAreaSquareMetres(Double newAreaSquareMetres) {
		Double oldAreaSquareMetres = areaSquareMetres;
		areaSquareMetres = newAreaSquareMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES, oldAreaSquareMetres, areaSquareMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getElasticModulusPascals() {
		return elasticModulusPascals;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticModulusPascals(Double newElasticModulusPascals) {
		Double oldElasticModulusPascals = elasticModulusPascals;
		elasticModulusPascals = newElasticModulusPascals;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS, oldElasticModulusPascals, elasticModulusPascals));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getThermalExpansionPerKelvin() {
		return thermalExpansionPerKelvin;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setThermalExpansionPerKelvin(Double newThermalExpansionPerKelvin) {
		Double oldThermalExpansionPerKelvin = thermalExpansionPerKelvin;
		thermalExpansionPerKelvin = newThermalExpansionPerKelvin;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN, oldThermalExpansionPerKelvin, thermalExpansionPerKelvin));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getRatedStrengthNewtons() {
		return ratedStrengthNewtons;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRatedStrengthNewtons(Double newRatedStrengthNewtons) {
		Double oldRatedStrengthNewtons = ratedStrengthNewtons;
		ratedStrengthNewtons = newRatedStrengthNewtons;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS, oldRatedStrengthNewtons, ratedStrengthNewtons));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getEmissivity() {
		return emissivity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEmissivity(Double newEmissivity) {
		Double oldEmissivity = emissivity;
		emissivity = newEmissivity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__EMISSIVITY, oldEmissivity, emissivity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getAbsorptivity() {
		return absorptivity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAbsorptivity(Double newAbsorptivity) {
		Double oldAbsorptivity = absorptivity;
		absorptivity = newAbsorptivity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CONDUCTOR__ABSORPTIVITY, oldAbsorptivity, absorptivity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.CONDUCTOR__DIAMETER_METRES:
				return getDiameterMetres();
			case SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES:
				return getGeometricMeanRadiusMetres();
			case SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS:
				return getLowTemperatureCelsius();
			case SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE:
				return getLowResistanceOhmsPerMetre();
			case SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS:
				return getHighTemperatureCelsius();
			case SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE:
				return getHighResistanceOhmsPerMetre();
			case SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE:
				return getMassKilogramsPerMetre();
			case SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES:
				return getAreaSquareMetres();
			case SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS:
				return getElasticModulusPascals();
			case SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN:
				return getThermalExpansionPerKelvin();
			case SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS:
				return getRatedStrengthNewtons();
			case SpanfieldPackage.CONDUCTOR__EMISSIVITY:
				return getEmissivity();
			case SpanfieldPackage.CONDUCTOR__ABSORPTIVITY:
				return getAbsorptivity();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case SpanfieldPackage.CONDUCTOR__DIAMETER_METRES:
				setDiameterMetres((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES:
				setGeometricMeanRadiusMetres((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS:
				setLowTemperatureCelsius((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE:
				setLowResistanceOhmsPerMetre((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS:
				setHighTemperatureCelsius((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE:
				setHighResistanceOhmsPerMetre((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE:
				setMassKilogramsPerMetre((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES:
				setAreaSquareMetres((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS:
				setElasticModulusPascals((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN:
				setThermalExpansionPerKelvin((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS:
				setRatedStrengthNewtons((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__EMISSIVITY:
				setEmissivity((Double)newValue);
				return;
			case SpanfieldPackage.CONDUCTOR__ABSORPTIVITY:
				setAbsorptivity((Double)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.CONDUCTOR__DIAMETER_METRES:
				setDiameterMetres(DIAMETER_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES:
				setGeometricMeanRadiusMetres(GEOMETRIC_MEAN_RADIUS_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS:
				setLowTemperatureCelsius(LOW_TEMPERATURE_CELSIUS_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE:
				setLowResistanceOhmsPerMetre(LOW_RESISTANCE_OHMS_PER_METRE_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS:
				setHighTemperatureCelsius(HIGH_TEMPERATURE_CELSIUS_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE:
				setHighResistanceOhmsPerMetre(HIGH_RESISTANCE_OHMS_PER_METRE_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE:
				setMassKilogramsPerMetre(MASS_KILOGRAMS_PER_METRE_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES:
				setAreaSquareMetres(AREA_SQUARE_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS:
				setElasticModulusPascals(ELASTIC_MODULUS_PASCALS_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN:
				setThermalExpansionPerKelvin(THERMAL_EXPANSION_PER_KELVIN_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS:
				setRatedStrengthNewtons(RATED_STRENGTH_NEWTONS_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__EMISSIVITY:
				setEmissivity(EMISSIVITY_EDEFAULT);
				return;
			case SpanfieldPackage.CONDUCTOR__ABSORPTIVITY:
				setAbsorptivity(ABSORPTIVITY_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.CONDUCTOR__DIAMETER_METRES:
				return diameterMetres != DIAMETER_METRES_EDEFAULT;
			case SpanfieldPackage.CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES:
				return GEOMETRIC_MEAN_RADIUS_METRES_EDEFAULT == null ? geometricMeanRadiusMetres != null : !GEOMETRIC_MEAN_RADIUS_METRES_EDEFAULT.equals(geometricMeanRadiusMetres);
			case SpanfieldPackage.CONDUCTOR__LOW_TEMPERATURE_CELSIUS:
				return lowTemperatureCelsius != LOW_TEMPERATURE_CELSIUS_EDEFAULT;
			case SpanfieldPackage.CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE:
				return LOW_RESISTANCE_OHMS_PER_METRE_EDEFAULT == null ? lowResistanceOhmsPerMetre != null : !LOW_RESISTANCE_OHMS_PER_METRE_EDEFAULT.equals(lowResistanceOhmsPerMetre);
			case SpanfieldPackage.CONDUCTOR__HIGH_TEMPERATURE_CELSIUS:
				return highTemperatureCelsius != HIGH_TEMPERATURE_CELSIUS_EDEFAULT;
			case SpanfieldPackage.CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE:
				return HIGH_RESISTANCE_OHMS_PER_METRE_EDEFAULT == null ? highResistanceOhmsPerMetre != null : !HIGH_RESISTANCE_OHMS_PER_METRE_EDEFAULT.equals(highResistanceOhmsPerMetre);
			case SpanfieldPackage.CONDUCTOR__MASS_KILOGRAMS_PER_METRE:
				return MASS_KILOGRAMS_PER_METRE_EDEFAULT == null ? massKilogramsPerMetre != null : !MASS_KILOGRAMS_PER_METRE_EDEFAULT.equals(massKilogramsPerMetre);
			case SpanfieldPackage.CONDUCTOR__AREA_SQUARE_METRES:
				return AREA_SQUARE_METRES_EDEFAULT == null ? areaSquareMetres != null : !AREA_SQUARE_METRES_EDEFAULT.equals(areaSquareMetres);
			case SpanfieldPackage.CONDUCTOR__ELASTIC_MODULUS_PASCALS:
				return ELASTIC_MODULUS_PASCALS_EDEFAULT == null ? elasticModulusPascals != null : !ELASTIC_MODULUS_PASCALS_EDEFAULT.equals(elasticModulusPascals);
			case SpanfieldPackage.CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN:
				return THERMAL_EXPANSION_PER_KELVIN_EDEFAULT == null ? thermalExpansionPerKelvin != null : !THERMAL_EXPANSION_PER_KELVIN_EDEFAULT.equals(thermalExpansionPerKelvin);
			case SpanfieldPackage.CONDUCTOR__RATED_STRENGTH_NEWTONS:
				return RATED_STRENGTH_NEWTONS_EDEFAULT == null ? ratedStrengthNewtons != null : !RATED_STRENGTH_NEWTONS_EDEFAULT.equals(ratedStrengthNewtons);
			case SpanfieldPackage.CONDUCTOR__EMISSIVITY:
				return EMISSIVITY_EDEFAULT == null ? emissivity != null : !EMISSIVITY_EDEFAULT.equals(emissivity);
			case SpanfieldPackage.CONDUCTOR__ABSORPTIVITY:
				return ABSORPTIVITY_EDEFAULT == null ? absorptivity != null : !ABSORPTIVITY_EDEFAULT.equals(absorptivity);
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (diameterMetres: ");
		result.append(diameterMetres);
		result.append(", geometricMeanRadiusMetres: ");
		result.append(geometricMeanRadiusMetres);
		result.append(", lowTemperatureCelsius: ");
		result.append(lowTemperatureCelsius);
		result.append(", lowResistanceOhmsPerMetre: ");
		result.append(lowResistanceOhmsPerMetre);
		result.append(", highTemperatureCelsius: ");
		result.append(highTemperatureCelsius);
		result.append(", highResistanceOhmsPerMetre: ");
		result.append(highResistanceOhmsPerMetre);
		result.append(", massKilogramsPerMetre: ");
		result.append(massKilogramsPerMetre);
		result.append(", areaSquareMetres: ");
		result.append(areaSquareMetres);
		result.append(", elasticModulusPascals: ");
		result.append(elasticModulusPascals);
		result.append(", thermalExpansionPerKelvin: ");
		result.append(thermalExpansionPerKelvin);
		result.append(", ratedStrengthNewtons: ");
		result.append(ratedStrengthNewtons);
		result.append(", emissivity: ");
		result.append(emissivity);
		result.append(", absorptivity: ");
		result.append(absorptivity);
		result.append(')');
		return result.toString();
	}

} //ConductorImpl
