/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Sequence Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Unbalanced load of a three-phase circuit by symmetrical components.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.SequenceLoad#getPositiveAmperes <em>Positive Amperes</em>}</li>
 *   <li>{@link spanfield.model.SequenceLoad#getPositiveAngleDegrees <em>Positive Angle Degrees</em>}</li>
 *   <li>{@link spanfield.model.SequenceLoad#getNegativeAmperes <em>Negative Amperes</em>}</li>
 *   <li>{@link spanfield.model.SequenceLoad#getNegativeAngleDegrees <em>Negative Angle Degrees</em>}</li>
 *   <li>{@link spanfield.model.SequenceLoad#getZeroAmperes <em>Zero Amperes</em>}</li>
 *   <li>{@link spanfield.model.SequenceLoad#getZeroAngleDegrees <em>Zero Angle Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getSequenceLoad()
 * @model
 * @generated
 */
public interface SequenceLoad extends CircuitLoad {
	/**
	 * Returns the value of the '<em><b>Positive Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Positive-sequence current in amperes RMS.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Positive Amperes</em>' attribute.
	 * @see #setPositiveAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_PositiveAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getPositiveAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getPositiveAmperes <em>Positive Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Positive Amperes</em>' attribute.
	 * @see #getPositiveAmperes()
	 * @generated
	 */
	void setPositiveAmperes(double value);

	/**
	 * Returns the value of the '<em><b>Positive Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle of the positive-sequence current of phase A in degrees.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Positive Angle Degrees</em>' attribute.
	 * @see #setPositiveAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_PositiveAngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getPositiveAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getPositiveAngleDegrees <em>Positive Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Positive Angle Degrees</em>' attribute.
	 * @see #getPositiveAngleDegrees()
	 * @generated
	 */
	void setPositiveAngleDegrees(double value);

	/**
	 * Returns the value of the '<em><b>Negative Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Negative-sequence current in amperes RMS.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Negative Amperes</em>' attribute.
	 * @see #setNegativeAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_NegativeAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getNegativeAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getNegativeAmperes <em>Negative Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Negative Amperes</em>' attribute.
	 * @see #getNegativeAmperes()
	 * @generated
	 */
	void setNegativeAmperes(double value);

	/**
	 * Returns the value of the '<em><b>Negative Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle of the negative-sequence current of phase A in degrees.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Negative Angle Degrees</em>' attribute.
	 * @see #setNegativeAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_NegativeAngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getNegativeAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getNegativeAngleDegrees <em>Negative Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Negative Angle Degrees</em>' attribute.
	 * @see #getNegativeAngleDegrees()
	 * @generated
	 */
	void setNegativeAngleDegrees(double value);

	/**
	 * Returns the value of the '<em><b>Zero Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Zero-sequence current of each phase in amperes RMS; a third of the residual current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Zero Amperes</em>' attribute.
	 * @see #setZeroAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_ZeroAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getZeroAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getZeroAmperes <em>Zero Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Zero Amperes</em>' attribute.
	 * @see #getZeroAmperes()
	 * @generated
	 */
	void setZeroAmperes(double value);

	/**
	 * Returns the value of the '<em><b>Zero Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle of the zero-sequence current in degrees.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Zero Angle Degrees</em>' attribute.
	 * @see #setZeroAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getSequenceLoad_ZeroAngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getZeroAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.SequenceLoad#getZeroAngleDegrees <em>Zero Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Zero Angle Degrees</em>' attribute.
	 * @see #getZeroAngleDegrees()
	 * @generated
	 */
	void setZeroAngleDegrees(double value);

} // SequenceLoad
