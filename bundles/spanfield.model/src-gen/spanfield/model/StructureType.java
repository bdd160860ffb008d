/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Structure Type</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A kind of tower or pole: where wires attach and what it looks like.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.StructureType#getAttachments <em>Attachments</em>}</li>
 *   <li>{@link spanfield.model.StructureType#getOutline <em>Outline</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getStructureType()
 * @model
 * @generated
 */
public interface StructureType extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Attachments</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Attachment}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Attachments, each with a name that is unique in the structure type.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Attachments</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStructureType_Attachments()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<Attachment> getAttachments();

	/**
	 * Returns the value of the '<em><b>Outline</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.OutlineStroke}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Strokes for drawing; no influence on any result.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Outline</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStructureType_Outline()
	 * @model containment="true"
	 * @generated
	 */
	EList<OutlineStroke> getOutline();

} // StructureType
