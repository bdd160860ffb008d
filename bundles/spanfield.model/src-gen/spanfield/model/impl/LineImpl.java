/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import spanfield.model.Circuit;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StringingSection;
import spanfield.model.Structure;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Line</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.LineImpl#getStructures <em>Structures</em>}</li>
 *   <li>{@link spanfield.model.impl.LineImpl#getSections <em>Sections</em>}</li>
 *   <li>{@link spanfield.model.impl.LineImpl#getCircuits <em>Circuits</em>}</li>
 *   <li>{@link spanfield.model.impl.LineImpl#getShieldWires <em>Shield Wires</em>}</li>
 *   <li>{@link spanfield.model.impl.LineImpl#getStartEnd <em>Start End</em>}</li>
 *   <li>{@link spanfield.model.impl.LineImpl#getFinishEnd <em>Finish End</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LineImpl extends NamedElementImpl implements Line {
	/**
	 * The cached value of the '{@link #getStructures() <em>Structures</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStructures()
	 * @generated
	 * @ordered
	 */
	protected EList<Structure> structures;

	/**
	 * The cached value of the '{@link #getSections() <em>Sections</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSections()
	 * @generated
	 * @ordered
	 */
	protected EList<StringingSection> sections;

	/**
	 * The cached value of the '{@link #getCircuits() <em>Circuits</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCircuits()
	 * @generated
	 * @ordered
	 */
	protected EList<Circuit> circuits;

	/**
	 * The cached value of the '{@link #getShieldWires() <em>Shield Wires</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShieldWires()
	 * @generated
	 * @ordered
	 */
	protected EList<ShieldWire> shieldWires;

	/**
	 * The default value of the '{@link #getStartEnd() <em>Start End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartEnd()
	 * @generated
	 * @ordered
	 */
	protected static final LineEnd START_END_EDEFAULT = LineEnd.CONTINUES;

	/**
	 * The cached value of the '{@link #getStartEnd() <em>Start End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartEnd()
	 * @generated
	 * @ordered
	 */
	protected LineEnd startEnd = START_END_EDEFAULT;

	/**
	 * The default value of the '{@link #getFinishEnd() <em>Finish End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFinishEnd()
	 * @generated
	 * @ordered
	 */
	protected static final LineEnd FINISH_END_EDEFAULT = LineEnd.CONTINUES;

	/**
	 * The cached value of the '{@link #getFinishEnd() <em>Finish End</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFinishEnd()
	 * @generated
	 * @ordered
	 */
	protected LineEnd finishEnd = FINISH_END_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LineImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.LINE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Structure> getStructures() {
		if (structures == null) {
			structures = new EObjectContainmentEList<Structure>(Structure.class, this, SpanfieldPackage.LINE__STRUCTURES);
		}
		return structures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<StringingSection> getSections() {
		if (sections == null) {
			sections = new EObjectContainmentEList<StringingSection>(StringingSection.class, this, SpanfieldPackage.LINE__SECTIONS);
		}
		return sections;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Circuit> getCircuits() {
		if (circuits == null) {
			circuits = new EObjectContainmentEList<Circuit>(Circuit.class, this, SpanfieldPackage.LINE__CIRCUITS);
		}
		return circuits;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<ShieldWire> getShieldWires() {
		if (shieldWires == null) {
			shieldWires = new EObjectContainmentEList<ShieldWire>(ShieldWire.class, this, SpanfieldPackage.LINE__SHIELD_WIRES);
		}
		return shieldWires;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LineEnd getStartEnd() {
		return startEnd;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStartEnd(LineEnd newStartEnd) {
		LineEnd oldStartEnd = startEnd;
		startEnd = newStartEnd == null ? START_END_EDEFAULT : newStartEnd;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.LINE__START_END, oldStartEnd, startEnd));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LineEnd getFinishEnd() {
		return finishEnd;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFinishEnd(LineEnd newFinishEnd) {
		LineEnd oldFinishEnd = finishEnd;
		finishEnd = newFinishEnd == null ? FINISH_END_EDEFAULT : newFinishEnd;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.LINE__FINISH_END, oldFinishEnd, finishEnd));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.LINE__STRUCTURES:
				return ((InternalEList<?>)getStructures()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.LINE__SECTIONS:
				return ((InternalEList<?>)getSections()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.LINE__CIRCUITS:
				return ((InternalEList<?>)getCircuits()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.LINE__SHIELD_WIRES:
				return ((InternalEList<?>)getShieldWires()).basicRemove(otherEnd, msgs);
		}
		return super.eInverseRemove(otherEnd, featureID, msgs);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.LINE__STRUCTURES:
				return getStructures();
			case SpanfieldPackage.LINE__SECTIONS:
				return getSections();
			case SpanfieldPackage.LINE__CIRCUITS:
				return getCircuits();
			case SpanfieldPackage.LINE__SHIELD_WIRES:
				return getShieldWires();
			case SpanfieldPackage.LINE__START_END:
				return getStartEnd();
			case SpanfieldPackage.LINE__FINISH_END:
				return getFinishEnd();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case SpanfieldPackage.LINE__STRUCTURES:
				getStructures().clear();
				getStructures().addAll((Collection<? extends Structure>)newValue);
				return;
			case SpanfieldPackage.LINE__SECTIONS:
				getSections().clear();
				getSections().addAll((Collection<? extends StringingSection>)newValue);
				return;
			case SpanfieldPackage.LINE__CIRCUITS:
				getCircuits().clear();
				getCircuits().addAll((Collection<? extends Circuit>)newValue);
				return;
			case SpanfieldPackage.LINE__SHIELD_WIRES:
				getShieldWires().clear();
				getShieldWires().addAll((Collection<? extends ShieldWire>)newValue);
				return;
			case SpanfieldPackage.LINE__START_END:
				setStartEnd((LineEnd)newValue);
				return;
			case SpanfieldPackage.LINE__FINISH_END:
				setFinishEnd((LineEnd)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.LINE__STRUCTURES:
				getStructures().clear();
				return;
			case SpanfieldPackage.LINE__SECTIONS:
				getSections().clear();
				return;
			case SpanfieldPackage.LINE__CIRCUITS:
				getCircuits().clear();
				return;
			case SpanfieldPackage.LINE__SHIELD_WIRES:
				getShieldWires().clear();
				return;
			case SpanfieldPackage.LINE__START_END:
				setStartEnd(START_END_EDEFAULT);
				return;
			case SpanfieldPackage.LINE__FINISH_END:
				setFinishEnd(FINISH_END_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.LINE__STRUCTURES:
				return structures != null && !structures.isEmpty();
			case SpanfieldPackage.LINE__SECTIONS:
				return sections != null && !sections.isEmpty();
			case SpanfieldPackage.LINE__CIRCUITS:
				return circuits != null && !circuits.isEmpty();
			case SpanfieldPackage.LINE__SHIELD_WIRES:
				return shieldWires != null && !shieldWires.isEmpty();
			case SpanfieldPackage.LINE__START_END:
				return startEnd != START_END_EDEFAULT;
			case SpanfieldPackage.LINE__FINISH_END:
				return finishEnd != FINISH_END_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (startEnd: ");
		result.append(startEnd);
		result.append(", finishEnd: ");
		result.append(finishEnd);
		result.append(')');
		return result.toString();
	}

} //LineImpl
