/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Conductor</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A bare stranded or solid conductor of the catalogue.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Conductor#getDiameterMetres <em>Diameter Metres</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getGeometricMeanRadiusMetres <em>Geometric Mean Radius Metres</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getLowTemperatureCelsius <em>Low Temperature Celsius</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getLowResistanceOhmsPerMetre <em>Low Resistance Ohms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getHighTemperatureCelsius <em>High Temperature Celsius</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getHighResistanceOhmsPerMetre <em>High Resistance Ohms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getMassKilogramsPerMetre <em>Mass Kilograms Per Metre</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getAreaSquareMetres <em>Area Square Metres</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getElasticModulusPascals <em>Elastic Modulus Pascals</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getThermalExpansionPerKelvin <em>Thermal Expansion Per Kelvin</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getRatedStrengthNewtons <em>Rated Strength Newtons</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getEmissivity <em>Emissivity</em>}</li>
 *   <li>{@link spanfield.model.Conductor#getAbsorptivity <em>Absorptivity</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getConductor()
 * @model
 * @generated
 */
public interface Conductor extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Diameter Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Outer diameter in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Diameter Metres</em>' attribute.
	 * @see #setDiameterMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_DiameterMetres()
	 * @model default="0"
	 * @generated
	 */
	double getDiameterMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getDiameterMetres <em>Diameter Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Diameter Metres</em>' attribute.
	 * @see #getDiameterMetres()
	 * @generated
	 */
	void setDiameterMetres(double value);

	/**
	 * Returns the value of the '<em><b>Geometric Mean Radius Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Geometric mean radius in metres. Absent: radius times exp(-1/4), a solid non-magnetic round wire.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Geometric Mean Radius Metres</em>' attribute.
	 * @see #setGeometricMeanRadiusMetres(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_GeometricMeanRadiusMetres()
	 * @model
	 * @generated
	 */
	Double getGeometricMeanRadiusMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getGeometricMeanRadiusMetres <em>Geometric Mean Radius Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Geometric Mean Radius Metres</em>' attribute.
	 * @see #getGeometricMeanRadiusMetres()
	 * @generated
	 */
	void setGeometricMeanRadiusMetres(Double value);

	/**
	 * Returns the value of the '<em><b>Low Temperature Celsius</b></em>' attribute.
	 * The default value is <code>"20"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Temperature of the low resistance value in degrees Celsius.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Low Temperature Celsius</em>' attribute.
	 * @see #setLowTemperatureCelsius(double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_LowTemperatureCelsius()
	 * @model default="20"
	 * @generated
	 */
	double getLowTemperatureCelsius();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getLowTemperatureCelsius <em>Low Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Low Temperature Celsius</em>' attribute.
	 * @see #getLowTemperatureCelsius()
	 * @generated
	 */
	void setLowTemperatureCelsius(double value);

	/**
	 * Returns the value of the '<em><b>Low Resistance Ohms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Alternating-current resistance at the low temperature in ohm per metre.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Low Resistance Ohms Per Metre</em>' attribute.
	 * @see #setLowResistanceOhmsPerMetre(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_LowResistanceOhmsPerMetre()
	 * @model
	 * @generated
	 */
	Double getLowResistanceOhmsPerMetre();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getLowResistanceOhmsPerMetre <em>Low Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Low Resistance Ohms Per Metre</em>' attribute.
	 * @see #getLowResistanceOhmsPerMetre()
	 * @generated
	 */
	void setLowResistanceOhmsPerMetre(Double value);

	/**
	 * Returns the value of the '<em><b>High Temperature Celsius</b></em>' attribute.
	 * The default value is <code>"75"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Temperature of the high resistance value in degrees Celsius.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>High Temperature Celsius</em>' attribute.
	 * @see #setHighTemperatureCelsius(double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_HighTemperatureCelsius()
	 * @model default="75"
	 * @generated
	 */
	double getHighTemperatureCelsius();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getHighTemperatureCelsius <em>High Temperature Celsius</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>High Temperature Celsius</em>' attribute.
	 * @see #getHighTemperatureCelsius()
	 * @generated
	 */
	void setHighTemperatureCelsius(double value);

	/**
	 * Returns the value of the '<em><b>High Resistance Ohms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Alternating-current resistance at the high temperature in ohm per metre.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>High Resistance Ohms Per Metre</em>' attribute.
	 * @see #setHighResistanceOhmsPerMetre(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_HighResistanceOhmsPerMetre()
	 * @model
	 * @generated
	 */
	Double getHighResistanceOhmsPerMetre();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getHighResistanceOhmsPerMetre <em>High Resistance Ohms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>High Resistance Ohms Per Metre</em>' attribute.
	 * @see #getHighResistanceOhmsPerMetre()
	 * @generated
	 */
	void setHighResistanceOhmsPerMetre(Double value);

	/**
	 * Returns the value of the '<em><b>Mass Kilograms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mass per length in kilograms per metre.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mass Kilograms Per Metre</em>' attribute.
	 * @see #setMassKilogramsPerMetre(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_MassKilogramsPerMetre()
	 * @model
	 * @generated
	 */
	Double getMassKilogramsPerMetre();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getMassKilogramsPerMetre <em>Mass Kilograms Per Metre</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mass Kilograms Per Metre</em>' attribute.
	 * @see #getMassKilogramsPerMetre()
	 * @generated
	 */
	void setMassKilogramsPerMetre(Double value);

	/**
	 * Returns the value of the '<em><b>Area Square Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Cross-section of the metal in square metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Area Square Metres</em>' attribute.
	 * @see #setAreaSquareMetres(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_AreaSquareMetres()
	 * @model
	 * @generated
	 */
	Double getAreaSquareMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getAreaSquareMetres <em>Area Square Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Area Square Metres</em>' attribute.
	 * @see #getAreaSquareMetres()
	 * @generated
	 */
	void setAreaSquareMetres(Double value);

	/**
	 * Returns the value of the '<em><b>Elastic Modulus Pascals</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Final elastic modulus in pascals.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Modulus Pascals</em>' attribute.
	 * @see #setElasticModulusPascals(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_ElasticModulusPascals()
	 * @model
	 * @generated
	 */
	Double getElasticModulusPascals();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getElasticModulusPascals <em>Elastic Modulus Pascals</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Modulus Pascals</em>' attribute.
	 * @see #getElasticModulusPascals()
	 * @generated
	 */
	void setElasticModulusPascals(Double value);

	/**
	 * Returns the value of the '<em><b>Thermal Expansion Per Kelvin</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Coefficient of thermal expansion per kelvin.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Thermal Expansion Per Kelvin</em>' attribute.
	 * @see #setThermalExpansionPerKelvin(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_ThermalExpansionPerKelvin()
	 * @model
	 * @generated
	 */
	Double getThermalExpansionPerKelvin();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getThermalExpansionPerKelvin <em>Thermal Expansion Per Kelvin</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Thermal Expansion Per Kelvin</em>' attribute.
	 * @see #getThermalExpansionPerKelvin()
	 * @generated
	 */
	void setThermalExpansionPerKelvin(Double value);

	/**
	 * Returns the value of the '<em><b>Rated Strength Newtons</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Rated tensile strength in newtons.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rated Strength Newtons</em>' attribute.
	 * @see #setRatedStrengthNewtons(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_RatedStrengthNewtons()
	 * @model
	 * @generated
	 */
	Double getRatedStrengthNewtons();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getRatedStrengthNewtons <em>Rated Strength Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rated Strength Newtons</em>' attribute.
	 * @see #getRatedStrengthNewtons()
	 * @generated
	 */
	void setRatedStrengthNewtons(Double value);

	/**
	 * Returns the value of the '<em><b>Emissivity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Emissivity of the surface, 0 to 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Emissivity</em>' attribute.
	 * @see #setEmissivity(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_Emissivity()
	 * @model
	 * @generated
	 */
	Double getEmissivity();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getEmissivity <em>Emissivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Emissivity</em>' attribute.
	 * @see #getEmissivity()
	 * @generated
	 */
	void setEmissivity(Double value);

	/**
	 * Returns the value of the '<em><b>Absorptivity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Solar absorptivity of the surface, 0 to 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Absorptivity</em>' attribute.
	 * @see #setAbsorptivity(Double)
	 * @see spanfield.model.SpanfieldPackage#getConductor_Absorptivity()
	 * @model
	 * @generated
	 */
	Double getAbsorptivity();

	/**
	 * Sets the value of the '{@link spanfield.model.Conductor#getAbsorptivity <em>Absorptivity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Absorptivity</em>' attribute.
	 * @see #getAbsorptivity()
	 * @generated
	 */
	void setAbsorptivity(Double value);

} // Conductor
