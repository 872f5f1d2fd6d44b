/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.CicCompensatorDesign;
import tapwright.model.ModelPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Cic Compensator Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getSections <em>Sections</em>}</li>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getRate <em>Rate</em>}</li>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getPassEdge <em>Pass Edge</em>}</li>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getStopEdge <em>Stop Edge</em>}</li>
 *   <li>{@link tapwright.model.impl.CicCompensatorDesignImpl#getStopWeight <em>Stop Weight</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CicCompensatorDesignImpl extends DesignImpl implements CicCompensatorDesign {
	/**
	 * The default value of the '{@link #getTaps() <em>Taps</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTaps()
	 * @generated
	 * @ordered
	 */
	protected static final String TAPS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getTaps() <em>Taps</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTaps()
	 * @generated
	 * @ordered
	 */
	protected String taps = TAPS_EDEFAULT;

	/**
	 * The default value of the '{@link #getSections() <em>Sections</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSections()
	 * @generated
	 * @ordered
	 */
	protected static final String SECTIONS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSections() <em>Sections</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSections()
	 * @generated
	 * @ordered
	 */
	protected String sections = SECTIONS_EDEFAULT;

	/**
	 * The default value of the '{@link #getRate() <em>Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRate()
	 * @generated
	 * @ordered
	 */
	protected static final String RATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getRate() <em>Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRate()
	 * @generated
	 * @ordered
	 */
	protected String rate = RATE_EDEFAULT;

	/**
	 * The default value of the '{@link #getPassEdge() <em>Pass Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPassEdge()
	 * @generated
	 * @ordered
	 */
	protected static final String PASS_EDGE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPassEdge() <em>Pass Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPassEdge()
	 * @generated
	 * @ordered
	 */
	protected String passEdge = PASS_EDGE_EDEFAULT;

	/**
	 * The default value of the '{@link #getStopEdge() <em>Stop Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStopEdge()
	 * @generated
	 * @ordered
	 */
	protected static final String STOP_EDGE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getStopEdge() <em>Stop Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStopEdge()
	 * @generated
	 * @ordered
	 */
	protected String stopEdge = STOP_EDGE_EDEFAULT;

	/**
	 * The default value of the '{@link #getStopWeight() <em>Stop Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStopWeight()
	 * @generated
	 * @ordered
	 */
	protected static final String STOP_WEIGHT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getStopWeight() <em>Stop Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStopWeight()
	 * @generated
	 * @ordered
	 */
	protected String stopWeight = STOP_WEIGHT_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CicCompensatorDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.CIC_COMPENSATOR_DESIGN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getTaps() {
		return taps;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTaps(String newTaps) {
		String oldTaps = taps;
		taps = newTaps;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__TAPS, oldTaps, taps));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getSections() {
		return sections;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSections(String newSections) {
		String oldSections = sections;
		sections = newSections;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__SECTIONS, oldSections, sections));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getRate() {
		return rate;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRate(String newRate) {
		String oldRate = rate;
		rate = newRate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__RATE, oldRate, rate));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getPassEdge() {
		return passEdge;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPassEdge(String newPassEdge) {
		String oldPassEdge = passEdge;
		passEdge = newPassEdge;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__PASS_EDGE, oldPassEdge, passEdge));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getStopEdge() {
		return stopEdge;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStopEdge(String newStopEdge) {
		String oldStopEdge = stopEdge;
		stopEdge = newStopEdge;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_EDGE, oldStopEdge, stopEdge));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getStopWeight() {
		return stopWeight;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStopWeight(String newStopWeight) {
		String oldStopWeight = stopWeight;
		stopWeight = newStopWeight;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT, oldStopWeight, stopWeight));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.CIC_COMPENSATOR_DESIGN__TAPS:
				return getTaps();
			case ModelPackage.CIC_COMPENSATOR_DESIGN__SECTIONS:
				return getSections();
			case ModelPackage.CIC_COMPENSATOR_DESIGN__RATE:
				return getRate();
			case ModelPackage.CIC_COMPENSATOR_DESIGN__PASS_EDGE:
				return getPassEdge();
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_EDGE:
				return getStopEdge();
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT:
				return getStopWeight();
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
			case ModelPackage.CIC_COMPENSATOR_DESIGN__TAPS:
				setTaps((String)newValue);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__SECTIONS:
				setSections((String)newValue);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__RATE:
				setRate((String)newValue);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__PASS_EDGE:
				setPassEdge((String)newValue);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_EDGE:
				setStopEdge((String)newValue);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT:
				setStopWeight((String)newValue);
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
			case ModelPackage.CIC_COMPENSATOR_DESIGN__TAPS:
				setTaps(TAPS_EDEFAULT);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__SECTIONS:
				setSections(SECTIONS_EDEFAULT);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__RATE:
				setRate(RATE_EDEFAULT);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__PASS_EDGE:
				setPassEdge(PASS_EDGE_EDEFAULT);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_EDGE:
				setStopEdge(STOP_EDGE_EDEFAULT);
				return;
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT:
				setStopWeight(STOP_WEIGHT_EDEFAULT);
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
			case ModelPackage.CIC_COMPENSATOR_DESIGN__TAPS:
				return TAPS_EDEFAULT == null ? taps != null : !TAPS_EDEFAULT.equals(taps);
			case ModelPackage.CIC_COMPENSATOR_DESIGN__SECTIONS:
				return SECTIONS_EDEFAULT == null ? sections != null : !SECTIONS_EDEFAULT.equals(sections);
			case ModelPackage.CIC_COMPENSATOR_DESIGN__RATE:
				return RATE_EDEFAULT == null ? rate != null : !RATE_EDEFAULT.equals(rate);
			case ModelPackage.CIC_COMPENSATOR_DESIGN__PASS_EDGE:
				return PASS_EDGE_EDEFAULT == null ? passEdge != null : !PASS_EDGE_EDEFAULT.equals(passEdge);
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_EDGE:
				return STOP_EDGE_EDEFAULT == null ? stopEdge != null : !STOP_EDGE_EDEFAULT.equals(stopEdge);
			case ModelPackage.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT:
				return STOP_WEIGHT_EDEFAULT == null ? stopWeight != null : !STOP_WEIGHT_EDEFAULT.equals(stopWeight);
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
		result.append(" (taps: ");
		result.append(taps);
		result.append(", sections: ");
		result.append(sections);
		result.append(", rate: ");
		result.append(rate);
		result.append(", passEdge: ");
		result.append(passEdge);
		result.append(", stopEdge: ");
		result.append(stopEdge);
		result.append(", stopWeight: ");
		result.append(stopWeight);
		result.append(')');
		return result.toString();
	}

} //CicCompensatorDesignImpl
