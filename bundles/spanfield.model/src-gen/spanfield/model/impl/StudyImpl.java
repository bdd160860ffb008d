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

import spanfield.model.Conductor;
import spanfield.model.Corridor;
import spanfield.model.EarthModel;
import spanfield.model.FieldLimit;
import spanfield.model.ImpedanceFormula;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.ProfileStation;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.Survey;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Study</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.StudyImpl#getAuthor <em>Author</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getOrganisation <em>Organisation</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getDate <em>Date</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getFrequencyHertz <em>Frequency Hertz</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getEarthResistivityOhmMetres <em>Earth Resistivity Ohm Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getEarthModel <em>Earth Model</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getImpedanceFormula <em>Impedance Formula</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getReferenceHeightMetres <em>Reference Height Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getRelativeAccuracy <em>Relative Accuracy</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getCorridor <em>Corridor</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getConductors <em>Conductors</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getStructureTypes <em>Structure Types</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getLines <em>Lines</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getLoadCases <em>Load Cases</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getStations <em>Stations</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getLimits <em>Limits</em>}</li>
 *   <li>{@link spanfield.model.impl.StudyImpl#getSurveys <em>Surveys</em>}</li>
 * </ul>
 *
 * @generated
 */
public class StudyImpl extends NamedElementImpl implements Study {
	/**
	 * The default value of the '{@link #getAuthor() <em>Author</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAuthor()
	 * @generated
	 * @ordered
	 */
	protected static final String AUTHOR_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getAuthor() <em>Author</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAuthor()
	 * @generated
	 * @ordered
	 */
	protected String author = AUTHOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getOrganisation() <em>Organisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOrganisation()
	 * @generated
	 * @ordered
	 */
	protected static final String ORGANISATION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getOrganisation() <em>Organisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOrganisation()
	 * @generated
	 * @ordered
	 */
	protected String organisation = ORGANISATION_EDEFAULT;

	/**
	 * The default value of the '{@link #getDate() <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDate()
	 * @generated
	 * @ordered
	 */
	protected static final String DATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDate() <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDate()
	 * @generated
	 * @ordered
	 */
	protected String date = DATE_EDEFAULT;

	/**
	 * The default value of the '{@link #getFrequencyHertz() <em>Frequency Hertz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrequencyHertz()
	 * @generated
	 * @ordered
	 */
	protected static final double FREQUENCY_HERTZ_EDEFAULT = 50.0;

	/**
	 * The cached value of the '{@link #getFrequencyHertz() <em>Frequency Hertz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrequencyHertz()
	 * @generated
	 * @ordered
	 */
	protected double frequencyHertz = FREQUENCY_HERTZ_EDEFAULT;

	/**
	 * The default value of the '{@link #getEarthResistivityOhmMetres() <em>Earth Resistivity Ohm Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEarthResistivityOhmMetres()
	 * @generated
	 * @ordered
	 */
	protected static final Double EARTH_RESISTIVITY_OHM_METRES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getEarthResistivityOhmMetres() <em>Earth Resistivity Ohm Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEarthResistivityOhmMetres()
	 * @generated
	 * @ordered
	 */
	protected Double earthResistivityOhmMetres = EARTH_RESISTIVITY_OHM_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getEarthModel() <em>Earth Model</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEarthModel()
	 * @generated
	 * @ordered
	 */
	protected static final EarthModel EARTH_MODEL_EDEFAULT = EarthModel.EXACT_HALF_SPACE;

	/**
	 * The cached value of the '{@link #getEarthModel() <em>Earth Model</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEarthModel()
	 * @generated
	 * @ordered
	 */
	protected EarthModel earthModel = EARTH_MODEL_EDEFAULT;

	/**
	 * The default value of the '{@link #getImpedanceFormula() <em>Impedance Formula</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getImpedanceFormula()
	 * @generated
	 * @ordered
	 */
	protected static final ImpedanceFormula IMPEDANCE_FORMULA_EDEFAULT = ImpedanceFormula.COMPLEX_DEPTH;

	/**
	 * The cached value of the '{@link #getImpedanceFormula() <em>Impedance Formula</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getImpedanceFormula()
	 * @generated
	 * @ordered
	 */
	protected ImpedanceFormula impedanceFormula = IMPEDANCE_FORMULA_EDEFAULT;

	/**
	 * The default value of the '{@link #getReferenceHeightMetres() <em>Reference Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceHeightMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double REFERENCE_HEIGHT_METRES_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getReferenceHeightMetres() <em>Reference Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceHeightMetres()
	 * @generated
	 * @ordered
	 */
	protected double referenceHeightMetres = REFERENCE_HEIGHT_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getRelativeAccuracy() <em>Relative Accuracy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativeAccuracy()
	 * @generated
	 * @ordered
	 */
	protected static final double RELATIVE_ACCURACY_EDEFAULT = 1.0E-6;

	/**
	 * The cached value of the '{@link #getRelativeAccuracy() <em>Relative Accuracy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativeAccuracy()
	 * @generated
	 * @ordered
	 */
	protected double relativeAccuracy = RELATIVE_ACCURACY_EDEFAULT;

	/**
	 * The cached value of the '{@link #getCorridor() <em>Corridor</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCorridor()
	 * @generated
	 * @ordered
	 */
	protected Corridor corridor;

	/**
	 * The cached value of the '{@link #getConductors() <em>Conductors</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getConductors()
	 * @generated
	 * @ordered
	 */
	protected EList<Conductor> conductors;

	/**
	 * The cached value of the '{@link #getStructureTypes() <em>Structure Types</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStructureTypes()
	 * @generated
	 * @ordered
	 */
	protected EList<StructureType> structureTypes;

	/**
	 * The cached value of the '{@link #getLines() <em>Lines</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLines()
	 * @generated
	 * @ordered
	 */
	protected EList<Line> lines;

	/**
	 * The cached value of the '{@link #getLoadCases() <em>Load Cases</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoadCases()
	 * @generated
	 * @ordered
	 */
	protected EList<LoadCase> loadCases;

	/**
	 * The cached value of the '{@link #getStations() <em>Stations</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStations()
	 * @generated
	 * @ordered
	 */
	protected EList<ProfileStation> stations;

	/**
	 * The cached value of the '{@link #getLimits() <em>Limits</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLimits()
	 * @generated
	 * @ordered
	 */
	protected EList<FieldLimit> limits;

	/**
	 * The cached value of the '{@link #getSurveys() <em>Surveys</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSurveys()
	 * @generated
	 * @ordered
	 */
	protected EList<Survey> surveys;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StudyImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.STUDY;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getAuthor() {
		return author;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAuthor(String newAuthor) {
		String oldAuthor = author;
		author = newAuthor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__AUTHOR, oldAuthor, author));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getOrganisation() {
		return organisation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOrganisation(String newOrganisation) {
		String oldOrganisation = organisation;
		organisation = newOrganisation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__ORGANISATION, oldOrganisation, organisation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDate() {
		return date;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDate(String newDate) {
		String oldDate = date;
		date = newDate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__DATE, oldDate, date));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getFrequencyHertz() {
		return frequencyHertz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrequencyHertz(double newFrequencyHertz) {
		double oldFrequencyHertz = frequencyHertz;
		frequencyHertz = newFrequencyHertz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__FREQUENCY_HERTZ, oldFrequencyHertz, frequencyHertz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getEarthResistivityOhmMetres() {
		return earthResistivityOhmMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEarthResistivityOhmMetres(Double newEarthResistivityOhmMetres) {
		Double oldEarthResistivityOhmMetres = earthResistivityOhmMetres;
		earthResistivityOhmMetres = newEarthResistivityOhmMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES, oldEarthResistivityOhmMetres, earthResistivityOhmMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EarthModel getEarthModel() {
		return earthModel;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEarthModel(EarthModel newEarthModel) {
		EarthModel oldEarthModel = earthModel;
		earthModel = newEarthModel == null ? EARTH_MODEL_EDEFAULT : newEarthModel;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__EARTH_MODEL, oldEarthModel, earthModel));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ImpedanceFormula getImpedanceFormula() {
		return impedanceFormula;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setImpedanceFormula(ImpedanceFormula newImpedanceFormula) {
		ImpedanceFormula oldImpedanceFormula = impedanceFormula;
		impedanceFormula = newImpedanceFormula == null ? IMPEDANCE_FORMULA_EDEFAULT : newImpedanceFormula;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__IMPEDANCE_FORMULA, oldImpedanceFormula, impedanceFormula));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getReferenceHeightMetres() {
		return referenceHeightMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReferenceHeightMetres(double newReferenceHeightMetres) {
		double oldReferenceHeightMetres = referenceHeightMetres;
		referenceHeightMetres = newReferenceHeightMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES, oldReferenceHeightMetres, referenceHeightMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRelativeAccuracy() {
		return relativeAccuracy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRelativeAccuracy(double newRelativeAccuracy) {
		double oldRelativeAccuracy = relativeAccuracy;
		relativeAccuracy = newRelativeAccuracy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__RELATIVE_ACCURACY, oldRelativeAccuracy, relativeAccuracy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Corridor getCorridor() {
		return corridor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetCorridor(Corridor newCorridor, NotificationChain msgs) {
		Corridor oldCorridor = corridor;
		corridor = newCorridor;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__CORRIDOR, oldCorridor, newCorridor);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCorridor(Corridor newCorridor) {
		if (newCorridor != corridor) {
			NotificationChain msgs = null;
			if (corridor != null)
				msgs = ((InternalEObject)corridor).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STUDY__CORRIDOR, null, msgs);
			if (newCorridor != null)
				msgs = ((InternalEObject)newCorridor).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STUDY__CORRIDOR, null, msgs);
			msgs = basicSetCorridor(newCorridor, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STUDY__CORRIDOR, newCorridor, newCorridor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Conductor> getConductors() {
		if (conductors == null) {
			conductors = new EObjectContainmentEList<Conductor>(Conductor.class, this, SpanfieldPackage.STUDY__CONDUCTORS);
		}
		return conductors;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<StructureType> getStructureTypes() {
		if (structureTypes == null) {
			structureTypes = new EObjectContainmentEList<StructureType>(StructureType.class, this, SpanfieldPackage.STUDY__STRUCTURE_TYPES);
		}
		return structureTypes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Line> getLines() {
		if (lines == null) {
			lines = new EObjectContainmentEList<Line>(Line.class, this, SpanfieldPackage.STUDY__LINES);
		}
		return lines;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<LoadCase> getLoadCases() {
		if (loadCases == null) {
			loadCases = new EObjectContainmentEList<LoadCase>(LoadCase.class, this, SpanfieldPackage.STUDY__LOAD_CASES);
		}
		return loadCases;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<ProfileStation> getStations() {
		if (stations == null) {
			stations = new EObjectContainmentEList<ProfileStation>(ProfileStation.class, this, SpanfieldPackage.STUDY__STATIONS);
		}
		return stations;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<FieldLimit> getLimits() {
		if (limits == null) {
			limits = new EObjectContainmentEList<FieldLimit>(FieldLimit.class, this, SpanfieldPackage.STUDY__LIMITS);
		}
		return limits;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Survey> getSurveys() {
		if (surveys == null) {
			surveys = new EObjectContainmentEList<Survey>(Survey.class, this, SpanfieldPackage.STUDY__SURVEYS);
		}
		return surveys;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.STUDY__CORRIDOR:
				return basicSetCorridor(null, msgs);
			case SpanfieldPackage.STUDY__CONDUCTORS:
				return ((InternalEList<?>)getConductors()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
				return ((InternalEList<?>)getStructureTypes()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__LINES:
				return ((InternalEList<?>)getLines()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__LOAD_CASES:
				return ((InternalEList<?>)getLoadCases()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__STATIONS:
				return ((InternalEList<?>)getStations()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__LIMITS:
				return ((InternalEList<?>)getLimits()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.STUDY__SURVEYS:
				return ((InternalEList<?>)getSurveys()).basicRemove(otherEnd, msgs);
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
			case SpanfieldPackage.STUDY__AUTHOR:
				return getAuthor();
			case SpanfieldPackage.STUDY__ORGANISATION:
				return getOrganisation();
			case SpanfieldPackage.STUDY__DATE:
				return getDate();
			case SpanfieldPackage.STUDY__FREQUENCY_HERTZ:
				return getFrequencyHertz();
			case SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES:
				return getEarthResistivityOhmMetres();
			case SpanfieldPackage.STUDY__EARTH_MODEL:
				return getEarthModel();
			case SpanfieldPackage.STUDY__IMPEDANCE_FORMULA:
				return getImpedanceFormula();
			case SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES:
				return getReferenceHeightMetres();
			case SpanfieldPackage.STUDY__RELATIVE_ACCURACY:
				return getRelativeAccuracy();
			case SpanfieldPackage.STUDY__CORRIDOR:
				return getCorridor();
			case SpanfieldPackage.STUDY__CONDUCTORS:
				return getConductors();
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
				return getStructureTypes();
			case SpanfieldPackage.STUDY__LINES:
				return getLines();
			case SpanfieldPackage.STUDY__LOAD_CASES:
				return getLoadCases();
			case SpanfieldPackage.STUDY__STATIONS:
				return getStations();
			case SpanfieldPackage.STUDY__LIMITS:
				return getLimits();
			case SpanfieldPackage.STUDY__SURVEYS:
				return getSurveys();
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
			case SpanfieldPackage.STUDY__AUTHOR:
				setAuthor((String)newValue);
				return;
			case SpanfieldPackage.STUDY__ORGANISATION:
				setOrganisation((String)newValue);
				return;
			case SpanfieldPackage.STUDY__DATE:
				setDate((String)newValue);
				return;
			case SpanfieldPackage.STUDY__FREQUENCY_HERTZ:
				setFrequencyHertz((Double)newValue);
				return;
			case SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES:
				setEarthResistivityOhmMetres((Double)newValue);
				return;
			case SpanfieldPackage.STUDY__EARTH_MODEL:
				setEarthModel((EarthModel)newValue);
				return;
			case SpanfieldPackage.STUDY__IMPEDANCE_FORMULA:
				setImpedanceFormula((ImpedanceFormula)newValue);
				return;
			case SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES:
				setReferenceHeightMetres((Double)newValue);
				return;
			case SpanfieldPackage.STUDY__RELATIVE_ACCURACY:
				setRelativeAccuracy((Double)newValue);
				return;
			case SpanfieldPackage.STUDY__CORRIDOR:
				setCorridor((Corridor)newValue);
				return;
			case SpanfieldPackage.STUDY__CONDUCTORS:
				getConductors().clear();
				getConductors().addAll((Collection<? extends Conductor>)newValue);
				return;
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
				getStructureTypes().clear();
				getStructureTypes().addAll((Collection<? extends StructureType>)newValue);
				return;
			case SpanfieldPackage.STUDY__LINES:
				getLines().clear();
				getLines().addAll((Collection<? extends Line>)newValue);
				return;
			case SpanfieldPackage.STUDY__LOAD_CASES:
				getLoadCases().clear();
				getLoadCases().addAll((Collection<? extends LoadCase>)newValue);
				return;
			case SpanfieldPackage.STUDY__STATIONS:
				getStations().clear();
				getStations().addAll((Collection<? extends ProfileStation>)newValue);
				return;
			case SpanfieldPackage.STUDY__LIMITS:
				getLimits().clear();
				getLimits().addAll((Collection<? extends FieldLimit>)newValue);
				return;
			case SpanfieldPackage.STUDY__SURVEYS:
				getSurveys().clear();
				getSurveys().addAll((Collection<? extends Survey>)newValue);
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
			case SpanfieldPackage.STUDY__AUTHOR:
				setAuthor(AUTHOR_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__ORGANISATION:
				setOrganisation(ORGANISATION_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__DATE:
				setDate(DATE_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__FREQUENCY_HERTZ:
				setFrequencyHertz(FREQUENCY_HERTZ_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES:
				setEarthResistivityOhmMetres(EARTH_RESISTIVITY_OHM_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__EARTH_MODEL:
				setEarthModel(EARTH_MODEL_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__IMPEDANCE_FORMULA:
				setImpedanceFormula(IMPEDANCE_FORMULA_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES:
				setReferenceHeightMetres(REFERENCE_HEIGHT_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__RELATIVE_ACCURACY:
				setRelativeAccuracy(RELATIVE_ACCURACY_EDEFAULT);
				return;
			case SpanfieldPackage.STUDY__CORRIDOR:
				setCorridor((Corridor)null);
				return;
			case SpanfieldPackage.STUDY__CONDUCTORS:
				getConductors().clear();
				return;
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
				getStructureTypes().clear();
				return;
			case SpanfieldPackage.STUDY__LINES:
				getLines().clear();
				return;
			case SpanfieldPackage.STUDY__LOAD_CASES:
				getLoadCases().clear();
				return;
			case SpanfieldPackage.STUDY__STATIONS:
				getStations().clear();
				return;
			case SpanfieldPackage.STUDY__LIMITS:
				getLimits().clear();
				return;
			case SpanfieldPackage.STUDY__SURVEYS:
				getSurveys().clear();
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
			case SpanfieldPackage.STUDY__AUTHOR:
				return AUTHOR_EDEFAULT == null ? author != null : !AUTHOR_EDEFAULT.equals(author);
			case SpanfieldPackage.STUDY__ORGANISATION:
				return ORGANISATION_EDEFAULT == null ? organisation != null : !ORGANISATION_EDEFAULT.equals(organisation);
			case SpanfieldPackage.STUDY__DATE:
				return DATE_EDEFAULT == null ? date != null : !DATE_EDEFAULT.equals(date);
			case SpanfieldPackage.STUDY__FREQUENCY_HERTZ:
				return frequencyHertz != FREQUENCY_HERTZ_EDEFAULT;
			case SpanfieldPackage.STUDY__EARTH_RESISTIVITY_OHM_METRES:
				return EARTH_RESISTIVITY_OHM_METRES_EDEFAULT == null ? earthResistivityOhmMetres != null : !EARTH_RESISTIVITY_OHM_METRES_EDEFAULT.equals(earthResistivityOhmMetres);
			case SpanfieldPackage.STUDY__EARTH_MODEL:
				return earthModel != EARTH_MODEL_EDEFAULT;
			case SpanfieldPackage.STUDY__IMPEDANCE_FORMULA:
				return impedanceFormula != IMPEDANCE_FORMULA_EDEFAULT;
			case SpanfieldPackage.STUDY__REFERENCE_HEIGHT_METRES:
				return referenceHeightMetres != REFERENCE_HEIGHT_METRES_EDEFAULT;
			case SpanfieldPackage.STUDY__RELATIVE_ACCURACY:
				return relativeAccuracy != RELATIVE_ACCURACY_EDEFAULT;
			case SpanfieldPackage.STUDY__CORRIDOR:
				return corridor != null;
			case SpanfieldPackage.STUDY__CONDUCTORS:
				return conductors != null && !conductors.isEmpty();
			case SpanfieldPackage.STUDY__STRUCTURE_TYPES:
				return structureTypes != null && !structureTypes.isEmpty();
			case SpanfieldPackage.STUDY__LINES:
				return lines != null && !lines.isEmpty();
			case SpanfieldPackage.STUDY__LOAD_CASES:
				return loadCases != null && !loadCases.isEmpty();
			case SpanfieldPackage.STUDY__STATIONS:
				return stations != null && !stations.isEmpty();
			case SpanfieldPackage.STUDY__LIMITS:
				return limits != null && !limits.isEmpty();
			case SpanfieldPackage.STUDY__SURVEYS:
				return surveys != null && !surveys.isEmpty();
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
		result.append(" (author: ");
		result.append(author);
		result.append(", organisation: ");
		result.append(organisation);
		result.append(", date: ");
		result.append(date);
		result.append(", frequencyHertz: ");
		result.append(frequencyHertz);
		result.append(", earthResistivityOhmMetres: ");
		result.append(earthResistivityOhmMetres);
		result.append(", earthModel: ");
		result.append(earthModel);
		result.append(", impedanceFormula: ");
		result.append(impedanceFormula);
		result.append(", referenceHeightMetres: ");
		result.append(referenceHeightMetres);
		result.append(", relativeAccuracy: ");
		result.append(relativeAccuracy);
		result.append(')');
		return result.toString();
	}

} //StudyImpl
