/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.SpanfieldPackage;
import spanfield.model.Stringing;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * @generated
 */
public abstract class StringingImpl extends MinimalEObjectImpl.Container implements Stringing {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StringingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.STRINGING;
	}

} //StringingImpl
