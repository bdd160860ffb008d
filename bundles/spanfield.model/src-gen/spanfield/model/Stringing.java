/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * How tightly wires hang in a section.
 * <!-- end-model-doc -->
 *
 *
 * @see spanfield.model.SpanfieldPackage#getStringing()
 * @model abstract="true"
 * @generated
 */
public interface Stringing extends EObject {
} // Stringing
