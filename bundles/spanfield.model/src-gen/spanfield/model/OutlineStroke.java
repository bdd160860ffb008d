/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Outline Stroke</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A polyline of the drawing of a structure.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.OutlineStroke#getPoints <em>Points</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getOutlineStroke()
 * @model
 * @generated
 */
public interface OutlineStroke extends EObject {
	/**
	 * Returns the value of the '<em><b>Points</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.OutlinePoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Points in drawing order.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Points</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getOutlineStroke_Points()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<OutlinePoint> getPoints();

} // OutlineStroke
