/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import tapwright.model.GainRequirement;
import tapwright.model.Interpolation;
import tapwright.model.LimitPoint;
import tapwright.model.ModelPackage;
import tapwright.model.Side;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Gain Requirement</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getFrom <em>From</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getTo <em>To</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getMin <em>Min</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getMax <em>Max</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getPoints <em>Points</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getSide <em>Side</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getInterpolate <em>Interpolate</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getReferenceAt <em>Reference At</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getReferenceFrom <em>Reference From</em>}</li>
 *   <li>{@link tapwright.model.impl.GainRequirementImpl#getReferenceTo <em>Reference To</em>}</li>
 * </ul>
 *
 * @generated
 */
public class GainRequirementImpl extends RequirementImpl implements GainRequirement {
	/**
	 * The default value of the '{@link #getFrom() <em>From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrom()
	 * @generated
	 * @ordered
	 */
	protected static final String FROM_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFrom() <em>From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrom()
	 * @generated
	 * @ordered
	 */
	protected String from = FROM_EDEFAULT;

	/**
	 * The default value of the '{@link #getTo() <em>To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected static final String TO_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getTo() <em>To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected String to = TO_EDEFAULT;

	/**
	 * The default value of the '{@link #getMin() <em>Min</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMin()
	 * @generated
	 * @ordered
	 */
	protected static final String MIN_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMin() <em>Min</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMin()
	 * @generated
	 * @ordered
	 */
	protected String min = MIN_EDEFAULT;

	/**
	 * The default value of the '{@link #getMax() <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMax()
	 * @generated
	 * @ordered
	 */
	protected static final String MAX_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMax() <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMax()
	 * @generated
	 * @ordered
	 */
	protected String max = MAX_EDEFAULT;

	/**
	 * The cached value of the '{@link #getPoints() <em>Points</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPoints()
	 * @generated
	 * @ordered
	 */
	protected EList<LimitPoint> points;

	/**
	 * The default value of the '{@link #getSide() <em>Side</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSide()
	 * @generated
	 * @ordered
	 */
	protected static final Side SIDE_EDEFAULT = Side.MAX;

	/**
	 * The cached value of the '{@link #getSide() <em>Side</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSide()
	 * @generated
	 * @ordered
	 */
	protected Side side = SIDE_EDEFAULT;

	/**
	 * The default value of the '{@link #getInterpolate() <em>Interpolate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInterpolate()
	 * @generated
	 * @ordered
	 */
	protected static final Interpolation INTERPOLATE_EDEFAULT = Interpolation.LINEAR;

	/**
	 * The cached value of the '{@link #getInterpolate() <em>Interpolate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInterpolate()
	 * @generated
	 * @ordered
	 */
	protected Interpolation interpolate = INTERPOLATE_EDEFAULT;

	/**
	 * The default value of the '{@link #getReferenceAt() <em>Reference At</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceAt()
	 * @generated
	 * @ordered
	 */
	protected static final String REFERENCE_AT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getReferenceAt() <em>Reference At</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceAt()
	 * @generated
	 * @ordered
	 */
	protected String referenceAt = REFERENCE_AT_EDEFAULT;

	/**
	 * The default value of the '{@link #getReferenceFrom() <em>Reference From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceFrom()
	 * @generated
	 * @ordered
	 */
	protected static final String REFERENCE_FROM_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getReferenceFrom() <em>Reference From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceFrom()
	 * @generated
	 * @ordered
	 */
	protected String referenceFrom = REFERENCE_FROM_EDEFAULT;

	/**
	 * The default value of the '{@link #getReferenceTo() <em>Reference To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceTo()
	 * @generated
	 * @ordered
	 */
	protected static final String REFERENCE_TO_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getReferenceTo() <em>Reference To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReferenceTo()
	 * @generated
	 * @ordered
	 */
	protected String referenceTo = REFERENCE_TO_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected GainRequirementImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.GAIN_REQUIREMENT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getFrom() {
		return from;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrom(String newFrom) {
		String oldFrom = from;
		from = newFrom;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__FROM, oldFrom, from));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getTo() {
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTo(String newTo) {
		String oldTo = to;
		to = newTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getMin() {
		return min;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMin(String newMin) {
		String oldMin = min;
		min = newMin;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__MIN, oldMin, min));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getMax() {
		return max;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMax(String newMax) {
		String oldMax = max;
		max = newMax;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__MAX, oldMax, max));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<LimitPoint> getPoints() {
		if (points == null) {
			points = new EObjectContainmentEList<LimitPoint>(LimitPoint.class, this, ModelPackage.GAIN_REQUIREMENT__POINTS);
		}
		return points;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Side getSide() {
		return side;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSide(Side newSide) {
		Side oldSide = side;
		side = newSide == null ? SIDE_EDEFAULT : newSide;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__SIDE, oldSide, side));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Interpolation getInterpolate() {
		return interpolate;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInterpolate(Interpolation newInterpolate) {
		Interpolation oldInterpolate = interpolate;
		interpolate = newInterpolate == null ? INTERPOLATE_EDEFAULT : newInterpolate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__INTERPOLATE, oldInterpolate, interpolate));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getReferenceAt() {
		return referenceAt;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReferenceAt(String newReferenceAt) {
		String oldReferenceAt = referenceAt;
		referenceAt = newReferenceAt;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__REFERENCE_AT, oldReferenceAt, referenceAt));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getReferenceFrom() {
		return referenceFrom;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReferenceFrom(String newReferenceFrom) {
		String oldReferenceFrom = referenceFrom;
		referenceFrom = newReferenceFrom;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__REFERENCE_FROM, oldReferenceFrom, referenceFrom));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getReferenceTo() {
		return referenceTo;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReferenceTo(String newReferenceTo) {
		String oldReferenceTo = referenceTo;
		referenceTo = newReferenceTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.GAIN_REQUIREMENT__REFERENCE_TO, oldReferenceTo, referenceTo));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case ModelPackage.GAIN_REQUIREMENT__POINTS:
				return ((InternalEList<?>)getPoints()).basicRemove(otherEnd, msgs);
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
			case ModelPackage.GAIN_REQUIREMENT__FROM:
				return getFrom();
			case ModelPackage.GAIN_REQUIREMENT__TO:
				return getTo();
			case ModelPackage.GAIN_REQUIREMENT__MIN:
				return getMin();
			case ModelPackage.GAIN_REQUIREMENT__MAX:
				return getMax();
			case ModelPackage.GAIN_REQUIREMENT__POINTS:
				return getPoints();
			case ModelPackage.GAIN_REQUIREMENT__SIDE:
				return getSide();
			case ModelPackage.GAIN_REQUIREMENT__INTERPOLATE:
				return getInterpolate();
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_AT:
				return getReferenceAt();
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_FROM:
				return getReferenceFrom();
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_TO:
				return getReferenceTo();
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
			case ModelPackage.GAIN_REQUIREMENT__FROM:
				setFrom((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__TO:
				setTo((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__MIN:
				setMin((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__MAX:
				setMax((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__POINTS:
				getPoints().clear();
				getPoints().addAll((Collection<? extends LimitPoint>)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__SIDE:
				setSide((Side)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__INTERPOLATE:
				setInterpolate((Interpolation)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_AT:
				setReferenceAt((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_FROM:
				setReferenceFrom((String)newValue);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_TO:
				setReferenceTo((String)newValue);
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
			case ModelPackage.GAIN_REQUIREMENT__FROM:
				setFrom(FROM_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__TO:
				setTo(TO_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__MIN:
				setMin(MIN_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__MAX:
				setMax(MAX_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__POINTS:
				getPoints().clear();
				return;
			case ModelPackage.GAIN_REQUIREMENT__SIDE:
				setSide(SIDE_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__INTERPOLATE:
				setInterpolate(INTERPOLATE_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_AT:
				setReferenceAt(REFERENCE_AT_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_FROM:
				setReferenceFrom(REFERENCE_FROM_EDEFAULT);
				return;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_TO:
				setReferenceTo(REFERENCE_TO_EDEFAULT);
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
			case ModelPackage.GAIN_REQUIREMENT__FROM:
				return FROM_EDEFAULT == null ? from != null : !FROM_EDEFAULT.equals(from);
			case ModelPackage.GAIN_REQUIREMENT__TO:
				return TO_EDEFAULT == null ? to != null : !TO_EDEFAULT.equals(to);
			case ModelPackage.GAIN_REQUIREMENT__MIN:
				return MIN_EDEFAULT == null ? min != null : !MIN_EDEFAULT.equals(min);
			case ModelPackage.GAIN_REQUIREMENT__MAX:
				return MAX_EDEFAULT == null ? max != null : !MAX_EDEFAULT.equals(max);
			case ModelPackage.GAIN_REQUIREMENT__POINTS:
				return points != null && !points.isEmpty();
			case ModelPackage.GAIN_REQUIREMENT__SIDE:
				return side != SIDE_EDEFAULT;
			case ModelPackage.GAIN_REQUIREMENT__INTERPOLATE:
				return interpolate != INTERPOLATE_EDEFAULT;
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_AT:
				return REFERENCE_AT_EDEFAULT == null ? referenceAt != null : !REFERENCE_AT_EDEFAULT.equals(referenceAt);
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_FROM:
				return REFERENCE_FROM_EDEFAULT == null ? referenceFrom != null : !REFERENCE_FROM_EDEFAULT.equals(referenceFrom);
			case ModelPackage.GAIN_REQUIREMENT__REFERENCE_TO:
				return REFERENCE_TO_EDEFAULT == null ? referenceTo != null : !REFERENCE_TO_EDEFAULT.equals(referenceTo);
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
		result.append(" (from: ");
		result.append(from);
		result.append(", to: ");
		result.append(to);
		result.append(", min: ");
		result.append(min);
		result.append(", max: ");
		result.append(max);
		result.append(", side: ");
		result.append(side);
		result.append(", interpolate: ");
		result.append(interpolate);
		result.append(", referenceAt: ");
		result.append(referenceAt);
		result.append(", referenceFrom: ");
		result.append(referenceFrom);
		result.append(", referenceTo: ");
		result.append(referenceTo);
		result.append(')');
		return result.toString();
	}

} //GainRequirementImpl
