/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.HalfBandDesign;
import tapwright.model.ModelPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Half Band Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.HalfBandDesignImpl#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.impl.HalfBandDesignImpl#getPassEdge <em>Pass Edge</em>}</li>
 *   <li>{@link tapwright.model.impl.HalfBandDesignImpl#isHilbert <em>Hilbert</em>}</li>
 * </ul>
 *
 * @generated
 */
public class HalfBandDesignImpl extends DesignImpl implements HalfBandDesign {
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
	 * The default value of the '{@link #isHilbert() <em>Hilbert</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isHilbert()
	 * @generated
	 * @ordered
	 */
	protected static final boolean HILBERT_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isHilbert() <em>Hilbert</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isHilbert()
	 * @generated
	 * @ordered
	 */
	protected boolean hilbert = HILBERT_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected HalfBandDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.HALF_BAND_DESIGN;
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.HALF_BAND_DESIGN__TAPS, oldTaps, taps));
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.HALF_BAND_DESIGN__PASS_EDGE, oldPassEdge, passEdge));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isHilbert() {
		return hilbert;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHilbert(boolean newHilbert) {
		boolean oldHilbert = hilbert;
		hilbert = newHilbert;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.HALF_BAND_DESIGN__HILBERT, oldHilbert, hilbert));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.HALF_BAND_DESIGN__TAPS:
				return getTaps();
			case ModelPackage.HALF_BAND_DESIGN__PASS_EDGE:
				return getPassEdge();
			case ModelPackage.HALF_BAND_DESIGN__HILBERT:
				return isHilbert();
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
			case ModelPackage.HALF_BAND_DESIGN__TAPS:
				setTaps((String)newValue);
				return;
			case ModelPackage.HALF_BAND_DESIGN__PASS_EDGE:
				setPassEdge((String)newValue);
				return;
			case ModelPackage.HALF_BAND_DESIGN__HILBERT:
				setHilbert((Boolean)newValue);
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
			case ModelPackage.HALF_BAND_DESIGN__TAPS:
				setTaps(TAPS_EDEFAULT);
				return;
			case ModelPackage.HALF_BAND_DESIGN__PASS_EDGE:
				setPassEdge(PASS_EDGE_EDEFAULT);
				return;
			case ModelPackage.HALF_BAND_DESIGN__HILBERT:
				setHilbert(HILBERT_EDEFAULT);
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
			case ModelPackage.HALF_BAND_DESIGN__TAPS:
				return TAPS_EDEFAULT == null ? taps != null : !TAPS_EDEFAULT.equals(taps);
			case ModelPackage.HALF_BAND_DESIGN__PASS_EDGE:
				return PASS_EDGE_EDEFAULT == null ? passEdge != null : !PASS_EDGE_EDEFAULT.equals(passEdge);
			case ModelPackage.HALF_BAND_DESIGN__HILBERT:
				return hilbert != HILBERT_EDEFAULT;
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
		result.append(", passEdge: ");
		result.append(passEdge);
		result.append(", hilbert: ");
		result.append(hilbert);
		result.append(')');
		return result.toString();
	}

} //HalfBandDesignImpl
