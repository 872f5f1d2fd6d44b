/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.MaximallyFlatDesign;
import tapwright.model.ModelPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Maximally Flat Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.MaximallyFlatDesignImpl#getFlatness <em>Flatness</em>}</li>
 *   <li>{@link tapwright.model.impl.MaximallyFlatDesignImpl#getZeros <em>Zeros</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MaximallyFlatDesignImpl extends DesignImpl implements MaximallyFlatDesign {
	/**
	 * The default value of the '{@link #getFlatness() <em>Flatness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFlatness()
	 * @generated
	 * @ordered
	 */
	protected static final String FLATNESS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFlatness() <em>Flatness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFlatness()
	 * @generated
	 * @ordered
	 */
	protected String flatness = FLATNESS_EDEFAULT;

	/**
	 * The default value of the '{@link #getZeros() <em>Zeros</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeros()
	 * @generated
	 * @ordered
	 */
	protected static final String ZEROS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getZeros() <em>Zeros</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeros()
	 * @generated
	 * @ordered
	 */
	protected String zeros = ZEROS_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MaximallyFlatDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.MAXIMALLY_FLAT_DESIGN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getFlatness() {
		return flatness;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFlatness(String newFlatness) {
		String oldFlatness = flatness;
		flatness = newFlatness;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.MAXIMALLY_FLAT_DESIGN__FLATNESS, oldFlatness, flatness));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getZeros() {
		return zeros;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setZeros(String newZeros) {
		String oldZeros = zeros;
		zeros = newZeros;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.MAXIMALLY_FLAT_DESIGN__ZEROS, oldZeros, zeros));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__FLATNESS:
				return getFlatness();
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__ZEROS:
				return getZeros();
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
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__FLATNESS:
				setFlatness((String)newValue);
				return;
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__ZEROS:
				setZeros((String)newValue);
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
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__FLATNESS:
				setFlatness(FLATNESS_EDEFAULT);
				return;
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__ZEROS:
				setZeros(ZEROS_EDEFAULT);
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
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__FLATNESS:
				return FLATNESS_EDEFAULT == null ? flatness != null : !FLATNESS_EDEFAULT.equals(flatness);
			case ModelPackage.MAXIMALLY_FLAT_DESIGN__ZEROS:
				return ZEROS_EDEFAULT == null ? zeros != null : !ZEROS_EDEFAULT.equals(zeros);
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
		result.append(" (flatness: ");
		result.append(flatness);
		result.append(", zeros: ");
		result.append(zeros);
		result.append(')');
		return result.toString();
	}

} //MaximallyFlatDesignImpl
