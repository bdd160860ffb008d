/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Outline Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A point of the drawing of a structure.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.OutlinePoint#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.OutlinePoint#getHeightMetres <em>Height Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getOutlinePoint()
 * @model
 * @generated
 */
public interface OutlinePoint extends EObject {
	/**
	 * Returns the value of the '<em><b>Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset from the axis of the structure in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset Metres</em>' attribute.
	 * @see #setOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getOutlinePoint_OffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.OutlinePoint#getOffsetMetres <em>Offset Metres</em>}' attribute.
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
	 * @see spanfield.model.SpanfieldPackage#getOutlinePoint_HeightMetres()
	 * @model default="0"
	 * @generated
	 */
	double getHeightMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.OutlinePoint#getHeightMetres <em>Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Height Metres</em>' attribute.
	 * @see #getHeightMetres()
	 * @generated
	 */
	void setHeightMetres(double value);

} // OutlinePoint
