/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Impedance Formula</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * Earth-return formula of the series impedances from which shield-wire currents follow.
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getImpedanceFormula()
 * @model
 * @generated
 */
public enum ImpedanceFormula implements Enumerator {
	/**
	 * The '<em><b>COMPLEX DEPTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Logarithms with complex depth (Deri et al. 1981).
	 * <!-- end-model-doc -->
	 * @see #COMPLEX_DEPTH_VALUE
	 * @generated
	 * @ordered
	 */
	COMPLEX_DEPTH(0, "COMPLEX_DEPTH", "COMPLEX_DEPTH"),

	/**
	 * The '<em><b>CARSON</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Integral of Carson (1926).
	 * <!-- end-model-doc -->
	 * @see #CARSON_VALUE
	 * @generated
	 * @ordered
	 */
	CARSON(1, "CARSON", "CARSON");

	/**
	 * The '<em><b>COMPLEX DEPTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Logarithms with complex depth (Deri et al. 1981).
	 * <!-- end-model-doc -->
	 * @see #COMPLEX_DEPTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int COMPLEX_DEPTH_VALUE = 0;

	/**
	 * The '<em><b>CARSON</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Integral of Carson (1926).
	 * <!-- end-model-doc -->
	 * @see #CARSON
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int CARSON_VALUE = 1;

	/**
	 * An array of all the '<em><b>Impedance Formula</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final ImpedanceFormula[] VALUES_ARRAY =
		new ImpedanceFormula[] {
			COMPLEX_DEPTH,
			CARSON,
		};

	/**
	 * A public read-only list of all the '<em><b>Impedance Formula</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<ImpedanceFormula> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Impedance Formula</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static ImpedanceFormula get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			ImpedanceFormula result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Impedance Formula</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static ImpedanceFormula getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			ImpedanceFormula result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Impedance Formula</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static ImpedanceFormula get(int value) {
		switch (value) {
			case COMPLEX_DEPTH_VALUE: return COMPLEX_DEPTH;
			case CARSON_VALUE: return CARSON;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private ImpedanceFormula(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //ImpedanceFormula
