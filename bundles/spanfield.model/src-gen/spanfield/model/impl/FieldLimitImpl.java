/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.FieldLimit;
import spanfield.model.FieldMeasure;
import spanfield.model.FieldQuantity;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Field Limit</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getQuantity <em>Quantity</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getMeasure <em>Measure</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getLevel <em>Level</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getPlace <em>Place</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getBody <em>Body</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getEdition <em>Edition</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getLoadCondition <em>Load Condition</em>}</li>
 *   <li>{@link spanfield.model.impl.FieldLimitImpl#getBasis <em>Basis</em>}</li>
 * </ul>
 *
 * @generated
 */
public class FieldLimitImpl extends NamedElementImpl implements FieldLimit {
	/**
	 * The default value of the '{@link #getQuantity() <em>Quantity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getQuantity()
	 * @generated
	 * @ordered
	 */
	protected static final FieldQuantity QUANTITY_EDEFAULT = FieldQuantity.MAGNETIC;

	/**
	 * The cached value of the '{@link #getQuantity() <em>Quantity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getQuantity()
	 * @generated
	 * @ordered
	 */
	protected FieldQuantity quantity = QUANTITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getMeasure() <em>Measure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMeasure()
	 * @generated
	 * @ordered
	 */
	protected static final FieldMeasure MEASURE_EDEFAULT = FieldMeasure.RESULTANT;

	/**
	 * The cached value of the '{@link #getMeasure() <em>Measure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMeasure()
	 * @generated
	 * @ordered
	 */
	protected FieldMeasure measure = MEASURE_EDEFAULT;

	/**
	 * The default value of the '{@link #getLevel() <em>Level</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLevel()
	 * @generated
	 * @ordered
	 */
	protected static final double LEVEL_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getLevel() <em>Level</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLevel()
	 * @generated
	 * @ordered
	 */
	protected double level = LEVEL_EDEFAULT;

	/**
	 * The default value of the '{@link #getPlace() <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPlace()
	 * @generated
	 * @ordered
	 */
	protected static final LimitPlace PLACE_EDEFAULT = LimitPlace.EDGE;

	/**
	 * The cached value of the '{@link #getPlace() <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPlace()
	 * @generated
	 * @ordered
	 */
	protected LimitPlace place = PLACE_EDEFAULT;

	/**
	 * The default value of the '{@link #getBody() <em>Body</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBody()
	 * @generated
	 * @ordered
	 */
	protected static final String BODY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getBody() <em>Body</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBody()
	 * @generated
	 * @ordered
	 */
	protected String body = BODY_EDEFAULT;

	/**
	 * The default value of the '{@link #getEdition() <em>Edition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEdition()
	 * @generated
	 * @ordered
	 */
	protected static final String EDITION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getEdition() <em>Edition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEdition()
	 * @generated
	 * @ordered
	 */
	protected String edition = EDITION_EDEFAULT;

	/**
	 * The default value of the '{@link #getLoadCondition() <em>Load Condition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoadCondition()
	 * @generated
	 * @ordered
	 */
	protected static final String LOAD_CONDITION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getLoadCondition() <em>Load Condition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoadCondition()
	 * @generated
	 * @ordered
	 */
	protected String loadCondition = LOAD_CONDITION_EDEFAULT;

	/**
	 * The default value of the '{@link #getBasis() <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBasis()
	 * @generated
	 * @ordered
	 */
	protected static final LimitBasis BASIS_EDEFAULT = LimitBasis.USER;

	/**
	 * The cached value of the '{@link #getBasis() <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBasis()
	 * @generated
	 * @ordered
	 */
	protected LimitBasis basis = BASIS_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected FieldLimitImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.FIELD_LIMIT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FieldQuantity getQuantity() {
		return quantity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setQuantity(FieldQuantity newQuantity) {
		FieldQuantity oldQuantity = quantity;
		quantity = newQuantity == null ? QUANTITY_EDEFAULT : newQuantity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__QUANTITY, oldQuantity, quantity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FieldMeasure getMeasure() {
		return measure;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMeasure(FieldMeasure newMeasure) {
		FieldMeasure oldMeasure = measure;
		measure = newMeasure == null ? MEASURE_EDEFAULT : newMeasure;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__MEASURE, oldMeasure, measure));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getLevel() {
		return level;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLevel(double newLevel) {
		double oldLevel = level;
		level = newLevel;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__LEVEL, oldLevel, level));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LimitPlace getPlace() {
		return place;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPlace(LimitPlace newPlace) {
		LimitPlace oldPlace = place;
		place = newPlace == null ? PLACE_EDEFAULT : newPlace;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__PLACE, oldPlace, place));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getBody() {
		return body;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBody(String newBody) {
		String oldBody = body;
		body = newBody;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__BODY, oldBody, body));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getEdition() {
		return edition;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEdition(String newEdition) {
		String oldEdition = edition;
		edition = newEdition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__EDITION, oldEdition, edition));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLoadCondition() {
		return loadCondition;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLoadCondition(String newLoadCondition) {
		String oldLoadCondition = loadCondition;
		loadCondition = newLoadCondition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__LOAD_CONDITION, oldLoadCondition, loadCondition));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LimitBasis getBasis() {
		return basis;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBasis(LimitBasis newBasis) {
		LimitBasis oldBasis = basis;
		basis = newBasis == null ? BASIS_EDEFAULT : newBasis;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.FIELD_LIMIT__BASIS, oldBasis, basis));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.FIELD_LIMIT__QUANTITY:
				return getQuantity();
			case SpanfieldPackage.FIELD_LIMIT__MEASURE:
				return getMeasure();
			case SpanfieldPackage.FIELD_LIMIT__LEVEL:
				return getLevel();
			case SpanfieldPackage.FIELD_LIMIT__PLACE:
				return getPlace();
			case SpanfieldPackage.FIELD_LIMIT__BODY:
				return getBody();
			case SpanfieldPackage.FIELD_LIMIT__EDITION:
				return getEdition();
			case SpanfieldPackage.FIELD_LIMIT__LOAD_CONDITION:
				return getLoadCondition();
			case SpanfieldPackage.FIELD_LIMIT__BASIS:
				return getBasis();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case SpanfieldPackage.FIELD_LIMIT__QUANTITY:
				setQuantity((FieldQuantity)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__MEASURE:
				setMeasure((FieldMeasure)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__LEVEL:
				setLevel((Double)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__PLACE:
				setPlace((LimitPlace)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__BODY:
				setBody((String)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__EDITION:
				setEdition((String)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__LOAD_CONDITION:
				setLoadCondition((String)newValue);
				return;
			case SpanfieldPackage.FIELD_LIMIT__BASIS:
				setBasis((LimitBasis)newValue);
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
			case SpanfieldPackage.FIELD_LIMIT__QUANTITY:
				setQuantity(QUANTITY_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__MEASURE:
				setMeasure(MEASURE_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__LEVEL:
				setLevel(LEVEL_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__PLACE:
				setPlace(PLACE_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__BODY:
				setBody(BODY_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__EDITION:
				setEdition(EDITION_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__LOAD_CONDITION:
				setLoadCondition(LOAD_CONDITION_EDEFAULT);
				return;
			case SpanfieldPackage.FIELD_LIMIT__BASIS:
				setBasis(BASIS_EDEFAULT);
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
			case SpanfieldPackage.FIELD_LIMIT__QUANTITY:
				return quantity != QUANTITY_EDEFAULT;
			case SpanfieldPackage.FIELD_LIMIT__MEASURE:
				return measure != MEASURE_EDEFAULT;
			case SpanfieldPackage.FIELD_LIMIT__LEVEL:
				return level != LEVEL_EDEFAULT;
			case SpanfieldPackage.FIELD_LIMIT__PLACE:
				return place != PLACE_EDEFAULT;
			case SpanfieldPackage.FIELD_LIMIT__BODY:
				return BODY_EDEFAULT == null ? body != null : !BODY_EDEFAULT.equals(body);
			case SpanfieldPackage.FIELD_LIMIT__EDITION:
				return EDITION_EDEFAULT == null ? edition != null : !EDITION_EDEFAULT.equals(edition);
			case SpanfieldPackage.FIELD_LIMIT__LOAD_CONDITION:
				return LOAD_CONDITION_EDEFAULT == null ? loadCondition != null : !LOAD_CONDITION_EDEFAULT.equals(loadCondition);
			case SpanfieldPackage.FIELD_LIMIT__BASIS:
				return basis != BASIS_EDEFAULT;
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
		result.append(" (quantity: ");
		result.append(quantity);
		result.append(", measure: ");
		result.append(measure);
		result.append(", level: ");
		result.append(level);
		result.append(", place: ");
		result.append(place);
		result.append(", body: ");
		result.append(body);
		result.append(", edition: ");
		result.append(edition);
		result.append(", loadCondition: ");
		result.append(loadCondition);
		result.append(", basis: ");
		result.append(basis);
		result.append(')');
		return result.toString();
	}

} //FieldLimitImpl
