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
 * A representation of the literals of the enumeration '<em><b>Earth Model</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * How the return of current in the earth is taken into account.
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldPackage#getEarthModel()
 * @model
 * @generated
 */
public enum EarthModel implements Enumerator {
	/**
	 * The '<em><b>NONE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * No earth effect: the field of the wires in free space.
	 * <!-- end-model-doc -->
	 * @see #NONE_VALUE
	 * @generated
	 * @ordered
	 */
	NONE(0, "NONE", "NONE"),

	/**
	 * The '<em><b>COMPLEX IMAGES</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Image of every wire in a complex depth (Deri, Tevan, Semlyen, Castanheira 1981).
	 * <!-- end-model-doc -->
	 * @see #COMPLEX_IMAGES_VALUE
	 * @generated
	 * @ordered
	 */
	COMPLEX_IMAGES(1, "COMPLEX_IMAGES", "COMPLEX_IMAGES"),

	/**
	 * The '<em><b>EXACT HALF SPACE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Exact integral of a homogeneous conducting half-space (Carson 1926, Wait 1961).
	 * <!-- end-model-doc -->
	 * @see #EXACT_HALF_SPACE_VALUE
	 * @generated
	 * @ordered
	 */
	EXACT_HALF_SPACE(2, "EXACT_HALF_SPACE", "EXACT_HALF_SPACE");

	/**
	 * The '<em><b>NONE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * No earth effect: the field of the wires in free space.
	 * <!-- end-model-doc -->
	 * @see #NONE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int NONE_VALUE = 0;

	/**
	 * The '<em><b>COMPLEX IMAGES</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Image of every wire in a complex depth (Deri, Tevan, Semlyen, Castanheira 1981).
	 * <!-- end-model-doc -->
	 * @see #COMPLEX_IMAGES
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int COMPLEX_IMAGES_VALUE = 1;

	/**
	 * The '<em><b>EXACT HALF SPACE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Exact integral of a homogeneous conducting half-space (Carson 1926, Wait 1961).
	 * <!-- end-model-doc -->
	 * @see #EXACT_HALF_SPACE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int EXACT_HALF_SPACE_VALUE = 2;

	/**
	 * An array of all the '<em><b>Earth Model</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final EarthModel[] VALUES_ARRAY =
		new EarthModel[] {
			NONE,
			COMPLEX_IMAGES,
			EXACT_HALF_SPACE,
		};

	/**
	 * A public read-only list of all the '<em><b>Earth Model</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<EarthModel> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Earth Model</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static EarthModel get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			EarthModel result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Earth Model</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static EarthModel getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			EarthModel result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Earth Model</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static EarthModel get(int value) {
		switch (value) {
			case NONE_VALUE: return NONE;
			case COMPLEX_IMAGES_VALUE: return COMPLEX_IMAGES;
			case EXACT_HALF_SPACE_VALUE: return EXACT_HALF_SPACE;
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
	private EarthModel(int value, String name, String literal) {
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
	
} //EarthModel
