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
 * A representation of the literals of the enumeration '<em><b>Line End</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * What a line does beyond its first or last modelled structure.
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getLineEnd()
 * @model
 * @generated
 */
public enum LineEnd implements Enumerator {
	/**
	 * The '<em><b>CONTINUES</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The wires go on straight and level without end, along the direction of the outermost span.
	 * <!-- end-model-doc -->
	 * @see #CONTINUES_VALUE
	 * @generated
	 * @ordered
	 */
	CONTINUES(0, "CONTINUES", "CONTINUES"),

	/**
	 * The '<em><b>DEAD END</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The wires end at the structure. The current path is open there; results carry a warning.
	 * <!-- end-model-doc -->
	 * @see #DEAD_END_VALUE
	 * @generated
	 * @ordered
	 */
	DEAD_END(1, "DEAD_END", "DEAD_END");

	/**
	 * The '<em><b>CONTINUES</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The wires go on straight and level without end, along the direction of the outermost span.
	 * <!-- end-model-doc -->
	 * @see #CONTINUES
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int CONTINUES_VALUE = 0;

	/**
	 * The '<em><b>DEAD END</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The wires end at the structure. The current path is open there; results carry a warning.
	 * <!-- end-model-doc -->
	 * @see #DEAD_END
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int DEAD_END_VALUE = 1;

	/**
	 * An array of all the '<em><b>Line End</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final LineEnd[] VALUES_ARRAY =
		new LineEnd[] {
			CONTINUES,
			DEAD_END,
		};

	/**
	 * A public read-only list of all the '<em><b>Line End</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<LineEnd> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Line End</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LineEnd get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			LineEnd result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Line End</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LineEnd getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			LineEnd result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Line End</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static LineEnd get(int value) {
		switch (value) {
			case CONTINUES_VALUE: return CONTINUES;
			case DEAD_END_VALUE: return DEAD_END;
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
	private LineEnd(int value, String name, String literal) {
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
	
} //LineEnd
