/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.ModelPackage;
import tapwright.model.PulseGain;
import tapwright.model.RaisedCosineDesign;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Raised Cosine Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.RaisedCosineDesignImpl#getRollOff <em>Roll Off</em>}</li>
 *   <li>{@link tapwright.model.impl.RaisedCosineDesignImpl#getSamplesPerSymbol <em>Samples Per Symbol</em>}</li>
 *   <li>{@link tapwright.model.impl.RaisedCosineDesignImpl#getSymbols <em>Symbols</em>}</li>
 *   <li>{@link tapwright.model.impl.RaisedCosineDesignImpl#isRoot <em>Root</em>}</li>
 *   <li>{@link tapwright.model.impl.RaisedCosineDesignImpl#getGain <em>Gain</em>}</li>
 * </ul>
 *
 * @generated
 */
public class RaisedCosineDesignImpl extends DesignImpl implements RaisedCosineDesign {
	/**
	 * The default value of the '{@link #getRollOff() <em>Roll Off</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRollOff()
	 * @generated
	 * @ordered
	 */
	protected static final String ROLL_OFF_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getRollOff() <em>Roll Off</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRollOff()
	 * @generated
	 * @ordered
	 */
	protected String rollOff = ROLL_OFF_EDEFAULT;

	/**
	 * The default value of the '{@link #getSamplesPerSymbol() <em>Samples Per Symbol</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSamplesPerSymbol()
	 * @generated
	 * @ordered
	 */
	protected static final String SAMPLES_PER_SYMBOL_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSamplesPerSymbol() <em>Samples Per Symbol</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSamplesPerSymbol()
	 * @generated
	 * @ordered
	 */
	protected String samplesPerSymbol = SAMPLES_PER_SYMBOL_EDEFAULT;

	/**
	 * The default value of the '{@link #getSymbols() <em>Symbols</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSymbols()
	 * @generated
	 * @ordered
	 */
	protected static final String SYMBOLS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSymbols() <em>Symbols</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSymbols()
	 * @generated
	 * @ordered
	 */
	protected String symbols = SYMBOLS_EDEFAULT;

	/**
	 * The default value of the '{@link #isRoot() <em>Root</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRoot()
	 * @generated
	 * @ordered
	 */
	protected static final boolean ROOT_EDEFAULT = true;

	/**
	 * The cached value of the '{@link #isRoot() <em>Root</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRoot()
	 * @generated
	 * @ordered
	 */
	protected boolean root = ROOT_EDEFAULT;

	/**
	 * The default value of the '{@link #getGain() <em>Gain</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGain()
	 * @generated
	 * @ordered
	 */
	protected static final PulseGain GAIN_EDEFAULT = PulseGain.UNITY_AT_ZERO;

	/**
	 * The cached value of the '{@link #getGain() <em>Gain</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGain()
	 * @generated
	 * @ordered
	 */
	protected PulseGain gain = GAIN_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected RaisedCosineDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.RAISED_COSINE_DESIGN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getRollOff() {
		return rollOff;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRollOff(String newRollOff) {
		String oldRollOff = rollOff;
		rollOff = newRollOff;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RAISED_COSINE_DESIGN__ROLL_OFF, oldRollOff, rollOff));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getSamplesPerSymbol() {
		return samplesPerSymbol;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSamplesPerSymbol(String newSamplesPerSymbol) {
		String oldSamplesPerSymbol = samplesPerSymbol;
		samplesPerSymbol = newSamplesPerSymbol;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL, oldSamplesPerSymbol, samplesPerSymbol));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getSymbols() {
		return symbols;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSymbols(String newSymbols) {
		String oldSymbols = symbols;
		symbols = newSymbols;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RAISED_COSINE_DESIGN__SYMBOLS, oldSymbols, symbols));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isRoot() {
		return root;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRoot(boolean newRoot) {
		boolean oldRoot = root;
		root = newRoot;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RAISED_COSINE_DESIGN__ROOT, oldRoot, root));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public PulseGain getGain() {
		return gain;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setGain(PulseGain newGain) {
		PulseGain oldGain = gain;
		gain = newGain == null ? GAIN_EDEFAULT : newGain;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.RAISED_COSINE_DESIGN__GAIN, oldGain, gain));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.RAISED_COSINE_DESIGN__ROLL_OFF:
				return getRollOff();
			case ModelPackage.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL:
				return getSamplesPerSymbol();
			case ModelPackage.RAISED_COSINE_DESIGN__SYMBOLS:
				return getSymbols();
			case ModelPackage.RAISED_COSINE_DESIGN__ROOT:
				return isRoot();
			case ModelPackage.RAISED_COSINE_DESIGN__GAIN:
				return getGain();
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
			case ModelPackage.RAISED_COSINE_DESIGN__ROLL_OFF:
				setRollOff((String)newValue);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL:
				setSamplesPerSymbol((String)newValue);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__SYMBOLS:
				setSymbols((String)newValue);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__ROOT:
				setRoot((Boolean)newValue);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__GAIN:
				setGain((PulseGain)newValue);
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
			case ModelPackage.RAISED_COSINE_DESIGN__ROLL_OFF:
				setRollOff(ROLL_OFF_EDEFAULT);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL:
				setSamplesPerSymbol(SAMPLES_PER_SYMBOL_EDEFAULT);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__SYMBOLS:
				setSymbols(SYMBOLS_EDEFAULT);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__ROOT:
				setRoot(ROOT_EDEFAULT);
				return;
			case ModelPackage.RAISED_COSINE_DESIGN__GAIN:
				setGain(GAIN_EDEFAULT);
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
			case ModelPackage.RAISED_COSINE_DESIGN__ROLL_OFF:
				return ROLL_OFF_EDEFAULT == null ? rollOff != null : !ROLL_OFF_EDEFAULT.equals(rollOff);
			case ModelPackage.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL:
				return SAMPLES_PER_SYMBOL_EDEFAULT == null ? samplesPerSymbol != null : !SAMPLES_PER_SYMBOL_EDEFAULT.equals(samplesPerSymbol);
			case ModelPackage.RAISED_COSINE_DESIGN__SYMBOLS:
				return SYMBOLS_EDEFAULT == null ? symbols != null : !SYMBOLS_EDEFAULT.equals(symbols);
			case ModelPackage.RAISED_COSINE_DESIGN__ROOT:
				return root != ROOT_EDEFAULT;
			case ModelPackage.RAISED_COSINE_DESIGN__GAIN:
				return gain != GAIN_EDEFAULT;
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
		result.append(" (rollOff: ");
		result.append(rollOff);
		result.append(", samplesPerSymbol: ");
		result.append(samplesPerSymbol);
		result.append(", symbols: ");
		result.append(symbols);
		result.append(", root: ");
		result.append(root);
		result.append(", gain: ");
		result.append(gain);
		result.append(')');
		return result.toString();
	}

} //RaisedCosineDesignImpl
