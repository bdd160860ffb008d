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
 * A representation of the literals of the enumeration '<em><b>Limit Place</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * Where a limit applies.
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getLimitPlace()
 * @model
 * @generated
 */
public enum LimitPlace implements Enumerator {
	/**
	 * The '<em><b>EDGE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * At the edges of the right-of-way.
	 * <!-- end-model-doc -->
	 * @see #EDGE_VALUE
	 * @generated
	 * @ordered
	 */
	EDGE(0, "EDGE", "EDGE"),

	/**
	 * The '<em><b>WITHIN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Anywhere within the right-of-way.
	 * <!-- end-model-doc -->
	 * @see #WITHIN_VALUE
	 * @generated
	 * @ordered
	 */
	WITHIN(1, "WITHIN", "WITHIN"),

	/**
	 * The '<em><b>EVERYWHERE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * At every computed point.
	 * <!-- end-model-doc -->
	 * @see #EVERYWHERE_VALUE
	 * @generated
	 * @ordered
	 */
	EVERYWHERE(2, "EVERYWHERE", "EVERYWHERE");

	/**
	 * The '<em><b>EDGE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * At the edges of the right-of-way.
	 * <!-- end-model-doc -->
	 * @see #EDGE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int EDGE_VALUE = 0;

	/**
	 * The '<em><b>WITHIN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Anywhere within the right-of-way.
	 * <!-- end-model-doc -->
	 * @see #WITHIN
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int WITHIN_VALUE = 1;

	/**
	 * The '<em><b>EVERYWHERE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * At every computed point.
	 * <!-- end-model-doc -->
	 * @see #EVERYWHERE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int EVERYWHERE_VALUE = 2;

	/**
	 * An array of all the '<em><b>Limit Place</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final LimitPlace[] VALUES_ARRAY =
		new LimitPlace[] {
			EDGE,
			WITHIN,
			EVERYWHERE,
		};

	/**
	 * A public read-only list of all the '<em><b>Limit Place</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<LimitPlace> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Limit Place</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LimitPlace get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			LimitPlace result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Limit Place</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LimitPlace getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			LimitPlace result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Limit Place</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LimitPlace get(int value) {
		switch (value) {
			case EDGE_VALUE: return EDGE;
			case WITHIN_VALUE: return WITHIN;
			case EVERYWHERE_VALUE: return EVERYWHERE;
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
	private LimitPlace(int value, String name, String literal) {
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
	
} //LimitPlace
