/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Attachment</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A point of a structure where an insulator or a wire is fixed.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Attachment#getName <em>Name</em>}</li>
 *   <li>{@link spanfield.model.Attachment#getRole <em>Role</em>}</li>
 *   <li>{@link spanfield.model.Attachment#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.Attachment#getHeightMetres <em>Height Metres</em>}</li>
 *   <li>{@link spanfield.model.Attachment#getInsulatorLengthMetres <em>Insulator Length Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getAttachment()
 * @model
 * @generated
 */
public interface Attachment extends EObject {
	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name, unique in the structure type. Wires of a line name the attachment that they use.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see spanfield.model.SpanfieldPackage#getAttachment_Name()
	 * @model
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link spanfield.model.Attachment#getName <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Name</em>' attribute.
	 * @see #getName()
	 * @generated
	 */
	void setName(String value);

	/**
	 * Returns the value of the '<em><b>Role</b></em>' attribute.
	 * The default value is <code>"PHASE"</code>.
	 * The literals are from the enumeration {@link spanfield.model.AttachmentRole}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the attachment is meant to carry.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Role</em>' attribute.
	 * @see spanfield.model.AttachmentRole
	 * @see #setRole(AttachmentRole)
	 * @see spanfield.model.SpanfieldPackage#getAttachment_Role()
	 * @model default="PHASE"
	 * @generated
	 */
	AttachmentRole getRole();

	/**
	 * Sets the value of the '{@link spanfield.model.Attachment#getRole <em>Role</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Role</em>' attribute.
	 * @see spanfield.model.AttachmentRole
	 * @see #getRole()
	 * @generated
	 */
	void setRole(AttachmentRole value);

	/**
	 * Returns the value of the '<em><b>Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset from the axis of the structure in metres, positive to the right.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset Metres</em>' attribute.
	 * @see #setOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getAttachment_OffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Attachment#getOffsetMetres <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Offset Metres</em>' attribute.
	 * @see #getOffsetMetres()
	 * @generated
	 */
	void setOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Height Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Height above the base of the structure in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Height Metres</em>' attribute.
	 * @see #setHeightMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getAttachment_HeightMetres()
	 * @model default="0"
	 * @generated
	 */
	double getHeightMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Attachment#getHeightMetres <em>Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Height Metres</em>' attribute.
	 * @see #getHeightMetres()
	 * @generated
	 */
	void setHeightMetres(double value);

	/**
	 * Returns the value of the '<em><b>Insulator Length Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length in metres by which the wire hangs below the attachment; 0 for a wire fixed at the point.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Insulator Length Metres</em>' attribute.
	 * @see #setInsulatorLengthMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getAttachment_InsulatorLengthMetres()
	 * @model default="0"
	 * @generated
	 */
	double getInsulatorLengthMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Attachment#getInsulatorLengthMetres <em>Insulator Length Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Insulator Length Metres</em>' attribute.
	 * @see #getInsulatorLengthMetres()
	 * @generated
	 */
	void setInsulatorLengthMetres(double value);

} // Attachment
