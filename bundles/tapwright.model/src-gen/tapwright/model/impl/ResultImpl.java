/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import tapwright.model.ModelPackage;
import tapwright.model.Result;
import tapwright.model.Verdict;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Result</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.ResultImpl#getRequirement <em>Requirement</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getKind <em>Kind</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getVerdict <em>Verdict</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getWorst <em>Worst</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getValueLow <em>Value Low</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getValueHigh <em>Value High</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getLimit <em>Limit</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getMarginLow <em>Margin Low</em>}</li>
 *   <li>{@link tapwright.model.impl.ResultImpl#getMarginHigh <em>Margin High</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ResultImpl extends MinimalEObjectImpl.Container implements Result {
	/**
	 * The default value of the '{@link #getRequirement() <em>Requirement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRequirement()
	 * @generated
	 * @ordered
	 */
	protected static final String REQUIREMENT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getRequirement() <em>Requirement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRequirement()
	 * @generated
	 * @ordered
	 */
	protected String requirement = REQUIREMENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getKind() <em>Kind</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getKind()
	 * @generated
	 * @ordered
	 */
	protected static final String KIND_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getKind() <em>Kind</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getKind()
	 * @generated
	 * @ordered
	 */
	protected String kind = KIND_EDEFAULT;

	/**
	 * The default value of the '{@link #getVerdict() <em>Verdict</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVerdict()
	 * @generated
	 * @ordered
	 */
	protected static final Verdict VERDICT_EDEFAULT = Verdict.MET;

	/**
	 * The cached value of the '{@link #getVerdict() <em>Verdict</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVerdict()
	 * @generated
	 * @ordered
	 */
	protected Verdict verdict = VERDICT_EDEFAULT;

	/**
	 * The default value of the '{@link #getWorst() <em>Worst</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWorst()
	 * @generated
	 * @ordered
	 */
	protected static final double WORST_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getWorst() <em>Worst</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWorst()
	 * @generated
	 * @ordered
	 */
	protected double worst = WORST_EDEFAULT;

	/**
	 * The default value of the '{@link #getValueLow() <em>Value Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getValueLow()
	 * @generated
	 * @ordered
	 */
	protected static final double VALUE_LOW_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getValueLow() <em>Value Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getValueLow()
	 * @generated
	 * @ordered
	 */
	protected double valueLow = VALUE_LOW_EDEFAULT;

	/**
	 * The default value of the '{@link #getValueHigh() <em>Value High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getValueHigh()
	 * @generated
	 * @ordered
	 */
	protected static final double VALUE_HIGH_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getValueHigh() <em>Value High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getValueHigh()
	 * @generated
	 * @ordered
	 */
	protected double valueHigh = VALUE_HIGH_EDEFAULT;

	/**
	 * The default value of the '{@link #getLimit() <em>Limit</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLimit()
	 * @generated
	 * @ordered
	 */
	protected static final double LIMIT_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getLimit() <em>Limit</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLimit()
	 * @generated
	 * @ordered
	 */
	protected double limit = LIMIT_EDEFAULT;

	/**
	 * The default value of the '{@link #getMarginLow() <em>Margin Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMarginLow()
	 * @generated
	 * @ordered
	 */
	protected static final double MARGIN_LOW_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getMarginLow() <em>Margin Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMarginLow()
	 * @generated
	 * @ordered
	 */
	protected double marginLow = MARGIN_LOW_EDEFAULT;

	/**
	 * The default value of the '{@link #getMarginHigh() <em>Margin High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMarginHigh()
	 * @generated
	 * @ordered
	 */
	protected static final double MARGIN_HIGH_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getMarginHigh() <em>Margin High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMarginHigh()
	 * @generated
	 * @ordered
	 */
	protected double marginHigh = MARGIN_HIGH_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ResultImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.RESULT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getRequirement() {
		return requirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRequirement(String newRequirement) {
		String oldRequirement = requirement;
		requirement = newRequirement;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__REQUIREMENT, oldRequirement, requirement));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getKind() {
		return kind;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setKind(String newKind) {
		String oldKind = kind;
		kind = newKind;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__KIND, oldKind, kind));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Verdict getVerdict() {
		return verdict;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setVerdict(Verdict newVerdict) {
		Verdict oldVerdict = verdict;
		verdict = newVerdict == null ? VERDICT_EDEFAULT : newVerdict;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__VERDICT, oldVerdict, verdict));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getWorst() {
		return worst;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWorst(double newWorst) {
		double oldWorst = worst;
		worst = newWorst;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__WORST, oldWorst, worst));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getValueLow() {
		return valueLow;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setValueLow(double newValueLow) {
		double oldValueLow = valueLow;
		valueLow = newValueLow;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__VALUE_LOW, oldValueLow, valueLow));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getValueHigh() {
		return valueHigh;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setValueHigh(double newValueHigh) {
		double oldValueHigh = valueHigh;
		valueHigh = newValueHigh;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__VALUE_HIGH, oldValueHigh, valueHigh));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getLimit() {
		return limit;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLimit(double newLimit) {
		double oldLimit = limit;
		limit = newLimit;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__LIMIT, oldLimit, limit));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getMarginLow() {
		return marginLow;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMarginLow(double newMarginLow) {
		double oldMarginLow = marginLow;
		marginLow = newMarginLow;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__MARGIN_LOW, oldMarginLow, marginLow));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getMarginHigh() {
		return marginHigh;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMarginHigh(double newMarginHigh) {
		double oldMarginHigh = marginHigh;
		marginHigh = newMarginHigh;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RESULT__MARGIN_HIGH, oldMarginHigh, marginHigh));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.RESULT__REQUIREMENT:
				return getRequirement();
			case ModelPackage.RESULT__KIND:
				return getKind();
			case ModelPackage.RESULT__VERDICT:
				return getVerdict();
			case ModelPackage.RESULT__WORST:
				return getWorst();
			case ModelPackage.RESULT__VALUE_LOW:
				return getValueLow();
			case ModelPackage.RESULT__VALUE_HIGH:
				return getValueHigh();
			case ModelPackage.RESULT__LIMIT:
				return getLimit();
			case ModelPackage.RESULT__MARGIN_LOW:
				return getMarginLow();
			case ModelPackage.RESULT__MARGIN_HIGH:
				return getMarginHigh();
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
			case ModelPackage.RESULT__REQUIREMENT:
				setRequirement((String)newValue);
				return;
			case ModelPackage.RESULT__KIND:
				setKind((String)newValue);
				return;
			case ModelPackage.RESULT__VERDICT:
				setVerdict((Verdict)newValue);
				return;
			case ModelPackage.RESULT__WORST:
				setWorst((Double)newValue);
				return;
			case ModelPackage.RESULT__VALUE_LOW:
				setValueLow((Double)newValue);
				return;
			case ModelPackage.RESULT__VALUE_HIGH:
				setValueHigh((Double)newValue);
				return;
			case ModelPackage.RESULT__LIMIT:
				setLimit((Double)newValue);
				return;
			case ModelPackage.RESULT__MARGIN_LOW:
				setMarginLow((Double)newValue);
				return;
			case ModelPackage.RESULT__MARGIN_HIGH:
				setMarginHigh((Double)newValue);
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
			case ModelPackage.RESULT__REQUIREMENT:
				setRequirement(REQUIREMENT_EDEFAULT);
				return;
			case ModelPackage.RESULT__KIND:
				setKind(KIND_EDEFAULT);
				return;
			case ModelPackage.RESULT__VERDICT:
				setVerdict(VERDICT_EDEFAULT);
				return;
			case ModelPackage.RESULT__WORST:
				setWorst(WORST_EDEFAULT);
				return;
			case ModelPackage.RESULT__VALUE_LOW:
				setValueLow(VALUE_LOW_EDEFAULT);
				return;
			case ModelPackage.RESULT__VALUE_HIGH:
				setValueHigh(VALUE_HIGH_EDEFAULT);
				return;
			case ModelPackage.RESULT__LIMIT:
				setLimit(LIMIT_EDEFAULT);
				return;
			case ModelPackage.RESULT__MARGIN_LOW:
				setMarginLow(MARGIN_LOW_EDEFAULT);
				return;
			case ModelPackage.RESULT__MARGIN_HIGH:
				setMarginHigh(MARGIN_HIGH_EDEFAULT);
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
			case ModelPackage.RESULT__REQUIREMENT:
				return REQUIREMENT_EDEFAULT == null ? requirement != null : !REQUIREMENT_EDEFAULT.equals(requirement);
			case ModelPackage.RESULT__KIND:
				return KIND_EDEFAULT == null ? kind != null : !KIND_EDEFAULT.equals(kind);
			case ModelPackage.RESULT__VERDICT:
				return verdict != VERDICT_EDEFAULT;
			case ModelPackage.RESULT__WORST:
				return worst != WORST_EDEFAULT;
			case ModelPackage.RESULT__VALUE_LOW:
				return valueLow != VALUE_LOW_EDEFAULT;
			case ModelPackage.RESULT__VALUE_HIGH:
				return valueHigh != VALUE_HIGH_EDEFAULT;
			case ModelPackage.RESULT__LIMIT:
				return limit != LIMIT_EDEFAULT;
			case ModelPackage.RESULT__MARGIN_LOW:
				return marginLow != MARGIN_LOW_EDEFAULT;
			case ModelPackage.RESULT__MARGIN_HIGH:
				return marginHigh != MARGIN_HIGH_EDEFAULT;
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
		result.append(" (requirement: ");
		result.append(requirement);
		result.append(", kind: ");
		result.append(kind);
		result.append(", verdict: ");
		result.append(verdict);
		result.append(", worst: ");
		result.append(worst);
		result.append(", valueLow: ");
		result.append(valueLow);
		result.append(", valueHigh: ");
		result.append(valueHigh);
		result.append(", limit: ");
		result.append(limit);
		result.append(", marginLow: ");
		result.append(marginLow);
		result.append(", marginHigh: ");
		result.append(marginHigh);
		result.append(')');
		return result.toString();
	}

} //ResultImpl
