/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.ModelPackage;
import tapwright.model.MovingAverageDesign;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Moving Average Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.MovingAverageDesignImpl#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.impl.MovingAverageDesignImpl#getSections <em>Sections</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MovingAverageDesignImpl extends DesignImpl implements MovingAverageDesign {
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
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MovingAverageDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.MOVING_AVERAGE_DESIGN;
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.MOVING_AVERAGE_DESIGN__TAPS, oldTaps, taps));
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.MOVING_AVERAGE_DESIGN__SECTIONS, oldSections, sections));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.MOVING_AVERAGE_DESIGN__TAPS:
				return getTaps();
			case ModelPackage.MOVING_AVERAGE_DESIGN__SECTIONS:
				return getSections();
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
			case ModelPackage.MOVING_AVERAGE_DESIGN__TAPS:
				setTaps((String)newValue);
				return;
			case ModelPackage.MOVING_AVERAGE_DESIGN__SECTIONS:
				setSections((String)newValue);
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
			case ModelPackage.MOVING_AVERAGE_DESIGN__TAPS:
				setTaps(TAPS_EDEFAULT);
				return;
			case ModelPackage.MOVING_AVERAGE_DESIGN__SECTIONS:
				setSections(SECTIONS_EDEFAULT);
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
			case ModelPackage.MOVING_AVERAGE_DESIGN__TAPS:
				return TAPS_EDEFAULT == null ? taps != null : !TAPS_EDEFAULT.equals(taps);
			case ModelPackage.MOVING_AVERAGE_DESIGN__SECTIONS:
				return SECTIONS_EDEFAULT == null ? sections != null : !SECTIONS_EDEFAULT.equals(sections);
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
		result.append(')');
		return result.toString();
	}

} //MovingAverageDesignImpl
