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
 * A representation of the literals of the enumeration '<em><b>Bonding</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * How a shield wire is connected.
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getBonding()
 * @model
 * @generated
 */
public enum Bonding implements Enumerator {
	/**
	 * The '<em><b>BONDED</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Earthed at every structure of a long line: carries the current that the phases induce.
	 * <!-- end-model-doc -->
	 * @see #BONDED_VALUE
	 * @generated
	 * @ordered
	 */
	BONDED(0, "BONDED", "BONDED"),

	/**
	 * The '<em><b>INSULATED</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Insulated or segmented: carries no current.
	 * <!-- end-model-doc -->
	 * @see #INSULATED_VALUE
	 * @generated
	 * @ordered
	 */
	INSULATED(1, "INSULATED", "INSULATED"),

	/**
	 * The '<em><b>GIVEN CURRENT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Carries the current that the study states.
	 * <!-- end-model-doc -->
	 * @see #GIVEN_CURRENT_VALUE
	 * @generated
	 * @ordered
	 */
	GIVEN_CURRENT(2, "GIVEN_CURRENT", "GIVEN_CURRENT");

	/**
	 * The '<em><b>BONDED</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Earthed at every structure of a long line: carries the current that the phases induce.
	 * <!-- end-model-doc -->
	 * @see #BONDED
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int BONDED_VALUE = 0;

	/**
	 * The '<em><b>INSULATED</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Insulated or segmented: carries no current.
	 * <!-- end-model-doc -->
	 * @see #INSULATED
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int INSULATED_VALUE = 1;

	/**
	 * The '<em><b>GIVEN CURRENT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Carries the current that the study states.
	 * <!-- end-model-doc -->
	 * @see #GIVEN_CURRENT
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int GIVEN_CURRENT_VALUE = 2;

	/**
	 * An array of all the '<em><b>Bonding</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final Bonding[] VALUES_ARRAY =
		new Bonding[] {
			BONDED,
			INSULATED,
			GIVEN_CURRENT,
		};

	/**
	 * A public read-only list of all the '<em><b>Bonding</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<Bonding> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Bonding</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Bonding get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Bonding result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Bonding</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Bonding getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Bonding result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Bonding</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Bonding get(int value) {
		switch (value) {
			case BONDED_VALUE: return BONDED;
			case INSULATED_VALUE: return INSULATED;
			case GIVEN_CURRENT_VALUE: return GIVEN_CURRENT;
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
	private Bonding(int value, String name, String literal) {
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
	
} //Bonding
