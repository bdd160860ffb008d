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
 * A representation of the literals of the enumeration '<em><b>Field Measure</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * Scalar that is taken from the three field phasors (IEEE Std 644, IEC 61786).
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getFieldMeasure()
 * @model
 * @generated
 */
public enum FieldMeasure implements Enumerator {
	/**
	 * The '<em><b>RESULTANT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Root of the sum of the squares of the RMS components.
	 * <!-- end-model-doc -->
	 * @see #RESULTANT_VALUE
	 * @generated
	 * @ordered
	 */
	RESULTANT(0, "RESULTANT", "RESULTANT"),

	/**
	 * The '<em><b>MAJOR AXIS</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Major semi-axis of the field ellipse, RMS.
	 * <!-- end-model-doc -->
	 * @see #MAJOR_AXIS_VALUE
	 * @generated
	 * @ordered
	 */
	MAJOR_AXIS(1, "MAJOR_AXIS", "MAJOR_AXIS");

	/**
	 * The '<em><b>RESULTANT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Root of the sum of the squares of the RMS components.
	 * <!-- end-model-doc -->
	 * @see #RESULTANT
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int RESULTANT_VALUE = 0;

	/**
	 * The '<em><b>MAJOR AXIS</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Major semi-axis of the field ellipse, RMS.
	 * <!-- end-model-doc -->
	 * @see #MAJOR_AXIS
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int MAJOR_AXIS_VALUE = 1;

	/**
	 * An array of all the '<em><b>Field Measure</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final FieldMeasure[] VALUES_ARRAY =
		new FieldMeasure[] {
			RESULTANT,
			MAJOR_AXIS,
		};

	/**
	 * A public read-only list of all the '<em><b>Field Measure</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<FieldMeasure> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Field Measure</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static FieldMeasure get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			FieldMeasure result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Field Measure</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static FieldMeasure getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			FieldMeasure result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Field Measure</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static FieldMeasure get(int value) {
		switch (value) {
			case RESULTANT_VALUE: return RESULTANT;
			case MAJOR_AXIS_VALUE: return MAJOR_AXIS;
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
	private FieldMeasure(int value, String name, String literal) {
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
	
} //FieldMeasure
