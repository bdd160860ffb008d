/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Line</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A line: structures in order, the wires strung on them, and how tightly.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Line#getStructures <em>Structures</em>}</li>
 *   <li>{@link spanfield.model.Line#getSections <em>Sections</em>}</li>
 *   <li>{@link spanfield.model.Line#getCircuits <em>Circuits</em>}</li>
 *   <li>{@link spanfield.model.Line#getShieldWires <em>Shield Wires</em>}</li>
 *   <li>{@link spanfield.model.Line#getStartEnd <em>Start End</em>}</li>
 *   <li>{@link spanfield.model.Line#getFinishEnd <em>Finish End</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getLine()
 * @model
 * @generated
 */
public interface Line extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Structures</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Structure}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Structures in the order of the line, at least two. The order sets the positive direction of current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Structures</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getLine_Structures()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<Structure> getStructures();

	/**
	 * Returns the value of the '<em><b>Sections</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.StringingSection}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stringing sections, which together cover every span once.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Sections</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getLine_Sections()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<StringingSection> getSections();

	/**
	 * Returns the value of the '<em><b>Circuits</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Circuit}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Circuits of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Circuits</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getLine_Circuits()
	 * @model containment="true"
	 * @generated
	 */
	EList<Circuit> getCircuits();

	/**
	 * Returns the value of the '<em><b>Shield Wires</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.ShieldWire}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shield wires of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shield Wires</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getLine_ShieldWires()
	 * @model containment="true"
	 * @generated
	 */
	EList<ShieldWire> getShieldWires();

	/**
	 * Returns the value of the '<em><b>Start End</b></em>' attribute.
	 * The default value is <code>"CONTINUES"</code>.
	 * The literals are from the enumeration {@link spanfield.model.LineEnd}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the wires do before the first structure.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Start End</em>' attribute.
	 * @see spanfield.model.LineEnd
	 * @see #setStartEnd(LineEnd)
	 * @see spanfield.model.SpanfieldPackage#getLine_StartEnd()
	 * @model default="CONTINUES"
	 * @generated
	 */
	LineEnd getStartEnd();

	/**
	 * Sets the value of the '{@link spanfield.model.Line#getStartEnd <em>Start End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Start End</em>' attribute.
	 * @see spanfield.model.LineEnd
	 * @see #getStartEnd()
	 * @generated
	 */
	void setStartEnd(LineEnd value);

	/**
	 * Returns the value of the '<em><b>Finish End</b></em>' attribute.
	 * The default value is <code>"CONTINUES"</code>.
	 * The literals are from the enumeration {@link spanfield.model.LineEnd}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the wires do after the last structure.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Finish End</em>' attribute.
	 * @see spanfield.model.LineEnd
	 * @see #setFinishEnd(LineEnd)
	 * @see spanfield.model.SpanfieldPackage#getLine_FinishEnd()
	 * @model default="CONTINUES"
	 * @generated
	 */
	LineEnd getFinishEnd();

	/**
	 * Sets the value of the '{@link spanfield.model.Line#getFinishEnd <em>Finish End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Finish End</em>' attribute.
	 * @see spanfield.model.LineEnd
	 * @see #getFinishEnd()
	 * @generated
	 */
	void setFinishEnd(LineEnd value);

} // Line
