/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Phase</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A phase (or pole) of a circuit.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Phase#getLabel <em>Label</em>}</li>
 *   <li>{@link spanfield.model.Phase#getAngleDegrees <em>Angle Degrees</em>}</li>
 *   <li>{@link spanfield.model.Phase#getAttachment <em>Attachment</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getPhase()
 * @model
 * @generated
 */
public interface Phase extends EObject {
	/**
	 * Returns the value of the '<em><b>Label</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Label of the phase, unique in the circuit: A, B, C for three phases.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Label</em>' attribute.
	 * @see #setLabel(String)
	 * @see spanfield.model.SpanfieldPackage#getPhase_Label()
	 * @model
	 * @generated
	 */
	String getLabel();

	/**
	 * Sets the value of the '{@link spanfield.model.Phase#getLabel <em>Label</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Label</em>' attribute.
	 * @see #getLabel()
	 * @generated
	 */
	void setLabel(String value);

	/**
	 * Returns the value of the '<em><b>Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle of the phase in degrees, added to the angle of the load: 0 for A, -120 for B, 120 for C.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Angle Degrees</em>' attribute.
	 * @see #setAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getPhase_AngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.Phase#getAngleDegrees <em>Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Angle Degrees</em>' attribute.
	 * @see #getAngleDegrees()
	 * @generated
	 */
	void setAngleDegrees(double value);

	/**
	 * Returns the value of the '<em><b>Attachment</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the attachment that carries the phase on every structure of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Attachment</em>' attribute.
	 * @see #setAttachment(String)
	 * @see spanfield.model.SpanfieldPackage#getPhase_Attachment()
	 * @model
	 * @generated
	 */
	String getAttachment();

	/**
	 * Sets the value of the '{@link spanfield.model.Phase#getAttachment <em>Attachment</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Attachment</em>' attribute.
	 * @see #getAttachment()
	 * @generated
	 */
	void setAttachment(String value);

} // Phase
