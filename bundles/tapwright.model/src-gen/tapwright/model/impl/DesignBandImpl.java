/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import tapwright.model.DesignBand;
import tapwright.model.ModelPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Design Band</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getFrom <em>From</em>}</li>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getTo <em>To</em>}</li>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getDesired <em>Desired</em>}</li>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getDesiredTo <em>Desired To</em>}</li>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getWeight <em>Weight</em>}</li>
 *   <li>{@link tapwright.model.impl.DesignBandImpl#getWeightTo <em>Weight To</em>}</li>
 * </ul>
 *
 * @generated
 */
public class DesignBandImpl extends MinimalEObjectImpl.Container implements DesignBand {
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
	 * The default value of the '{@link #getDesired() <em>Desired</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDesired()
	 * @generated
	 * @ordered
	 */
	protected static final String DESIRED_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDesired() <em>Desired</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDesired()
	 * @generated
	 * @ordered
	 */
	protected String desired = DESIRED_EDEFAULT;

	/**
	 * The default value of the '{@link #getDesiredTo() <em>Desired To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDesiredTo()
	 * @generated
	 * @ordered
	 */
	protected static final String DESIRED_TO_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDesiredTo() <em>Desired To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDesiredTo()
	 * @generated
	 * @ordered
	 */
	protected String desiredTo = DESIRED_TO_EDEFAULT;

	/**
	 * The default value of the '{@link #getWeight() <em>Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWeight()
	 * @generated
	 * @ordered
	 */
	protected static final String WEIGHT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getWeight() <em>Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWeight()
	 * @generated
	 * @ordered
	 */
	protected String weight = WEIGHT_EDEFAULT;

	/**
	 * The default value of the '{@link #getWeightTo() <em>Weight To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWeightTo()
	 * @generated
	 * @ordered
	 */
	protected static final String WEIGHT_TO_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getWeightTo() <em>Weight To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWeightTo()
	 * @generated
	 * @ordered
	 */
	protected String weightTo = WEIGHT_TO_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected DesignBandImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.DESIGN_BAND;
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__FROM, oldFrom, from));
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDesired() {
		return desired;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDesired(String newDesired) {
		String oldDesired = desired;
		desired = newDesired;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__DESIRED, oldDesired, desired));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDesiredTo() {
		return desiredTo;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDesiredTo(String newDesiredTo) {
		String oldDesiredTo = desiredTo;
		desiredTo = newDesiredTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__DESIRED_TO, oldDesiredTo, desiredTo));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getWeight() {
		return weight;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWeight(String newWeight) {
		String oldWeight = weight;
		weight = newWeight;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__WEIGHT, oldWeight, weight));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getWeightTo() {
		return weightTo;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWeightTo(String newWeightTo) {
		String oldWeightTo = weightTo;
		weightTo = newWeightTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DESIGN_BAND__WEIGHT_TO, oldWeightTo, weightTo));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.DESIGN_BAND__FROM:
				return getFrom();
			case ModelPackage.DESIGN_BAND__TO:
				return getTo();
			case ModelPackage.DESIGN_BAND__DESIRED:
				return getDesired();
			case ModelPackage.DESIGN_BAND__DESIRED_TO:
				return getDesiredTo();
			case ModelPackage.DESIGN_BAND__WEIGHT:
				return getWeight();
			case ModelPackage.DESIGN_BAND__WEIGHT_TO:
				return getWeightTo();
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
			case ModelPackage.DESIGN_BAND__FROM:
				setFrom((String)newValue);
				return;
			case ModelPackage.DESIGN_BAND__TO:
				setTo((String)newValue);
				return;
			case ModelPackage.DESIGN_BAND__DESIRED:
				setDesired((String)newValue);
				return;
			case ModelPackage.DESIGN_BAND__DESIRED_TO:
				setDesiredTo((String)newValue);
				return;
			case ModelPackage.DESIGN_BAND__WEIGHT:
				setWeight((String)newValue);
				return;
			case ModelPackage.DESIGN_BAND__WEIGHT_TO:
				setWeightTo((String)newValue);
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
			case ModelPackage.DESIGN_BAND__FROM:
				setFrom(FROM_EDEFAULT);
				return;
			case ModelPackage.DESIGN_BAND__TO:
				setTo(TO_EDEFAULT);
				return;
			case ModelPackage.DESIGN_BAND__DESIRED:
				setDesired(DESIRED_EDEFAULT);
				return;
			case ModelPackage.DESIGN_BAND__DESIRED_TO:
				setDesiredTo(DESIRED_TO_EDEFAULT);
				return;
			case ModelPackage.DESIGN_BAND__WEIGHT:
				setWeight(WEIGHT_EDEFAULT);
				return;
			case ModelPackage.DESIGN_BAND__WEIGHT_TO:
				setWeightTo(WEIGHT_TO_EDEFAULT);
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
			case ModelPackage.DESIGN_BAND__FROM:
				return FROM_EDEFAULT == null ? from != null : !FROM_EDEFAULT.equals(from);
			case ModelPackage.DESIGN_BAND__TO:
				return TO_EDEFAULT == null ? to != null : !TO_EDEFAULT.equals(to);
			case ModelPackage.DESIGN_BAND__DESIRED:
				return DESIRED_EDEFAULT == null ? desired != null : !DESIRED_EDEFAULT.equals(desired);
			case ModelPackage.DESIGN_BAND__DESIRED_TO:
				return DESIRED_TO_EDEFAULT == null ? desiredTo != null : !DESIRED_TO_EDEFAULT.equals(desiredTo);
			case ModelPackage.DESIGN_BAND__WEIGHT:
				return WEIGHT_EDEFAULT == null ? weight != null : !WEIGHT_EDEFAULT.equals(weight);
			case ModelPackage.DESIGN_BAND__WEIGHT_TO:
				return WEIGHT_TO_EDEFAULT == null ? weightTo != null : !WEIGHT_TO_EDEFAULT.equals(weightTo);
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
		result.append(", desired: ");
		result.append(desired);
		result.append(", desiredTo: ");
		result.append(desiredTo);
		result.append(", weight: ");
		result.append(weight);
		result.append(", weightTo: ");
		result.append(weightTo);
		result.append(')');
		return result.toString();
	}

} //DesignBandImpl
