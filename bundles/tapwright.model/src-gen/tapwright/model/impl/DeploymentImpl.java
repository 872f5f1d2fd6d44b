/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import tapwright.model.Deployment;
import tapwright.model.ModelPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Deployment</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.DeploymentImpl#getProcessor <em>Processor</em>}</li>
 *   <li>{@link tapwright.model.impl.DeploymentImpl#getChannels <em>Channels</em>}</li>
 *   <li>{@link tapwright.model.impl.DeploymentImpl#getCopies <em>Copies</em>}</li>
 *   <li>{@link tapwright.model.impl.DeploymentImpl#getInputRate <em>Input Rate</em>}</li>
 * </ul>
 *
 * @generated
 */
public class DeploymentImpl extends MinimalEObjectImpl.Container implements Deployment {
	/**
	 * The default value of the '{@link #getProcessor() <em>Processor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getProcessor()
	 * @generated
	 * @ordered
	 */
	protected static final String PROCESSOR_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getProcessor() <em>Processor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getProcessor()
	 * @generated
	 * @ordered
	 */
	protected String processor = PROCESSOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getChannels() <em>Channels</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getChannels()
	 * @generated
	 * @ordered
	 */
	protected static final String CHANNELS_EDEFAULT = "1";

	/**
	 * The cached value of the '{@link #getChannels() <em>Channels</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getChannels()
	 * @generated
	 * @ordered
	 */
	protected String channels = CHANNELS_EDEFAULT;

	/**
	 * The default value of the '{@link #getCopies() <em>Copies</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCopies()
	 * @generated
	 * @ordered
	 */
	protected static final String COPIES_EDEFAULT = "1";

	/**
	 * The cached value of the '{@link #getCopies() <em>Copies</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCopies()
	 * @generated
	 * @ordered
	 */
	protected String copies = COPIES_EDEFAULT;

	/**
	 * The default value of the '{@link #getInputRate() <em>Input Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInputRate()
	 * @generated
	 * @ordered
	 */
	protected static final String INPUT_RATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getInputRate() <em>Input Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInputRate()
	 * @generated
	 * @ordered
	 */
	protected String inputRate = INPUT_RATE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected DeploymentImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.DEPLOYMENT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getProcessor() {
		return processor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setProcessor(String newProcessor) {
		String oldProcessor = processor;
		processor = newProcessor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DEPLOYMENT__PROCESSOR, oldProcessor, processor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getChannels() {
		return channels;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setChannels(String newChannels) {
		String oldChannels = channels;
		channels = newChannels;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DEPLOYMENT__CHANNELS, oldChannels, channels));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getCopies() {
		return copies;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCopies(String newCopies) {
		String oldCopies = copies;
		copies = newCopies;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DEPLOYMENT__COPIES, oldCopies, copies));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getInputRate() {
		return inputRate;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInputRate(String newInputRate) {
		String oldInputRate = inputRate;
		inputRate = newInputRate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.DEPLOYMENT__INPUT_RATE, oldInputRate, inputRate));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.DEPLOYMENT__PROCESSOR:
				return getProcessor();
			case ModelPackage.DEPLOYMENT__CHANNELS:
				return getChannels();
			case ModelPackage.DEPLOYMENT__COPIES:
				return getCopies();
			case ModelPackage.DEPLOYMENT__INPUT_RATE:
				return getInputRate();
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
			case ModelPackage.DEPLOYMENT__PROCESSOR:
				setProcessor((String)newValue);
				return;
			case ModelPackage.DEPLOYMENT__CHANNELS:
				setChannels((String)newValue);
				return;
			case ModelPackage.DEPLOYMENT__COPIES:
				setCopies((String)newValue);
				return;
			case ModelPackage.DEPLOYMENT__INPUT_RATE:
				setInputRate((String)newValue);
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
			case ModelPackage.DEPLOYMENT__PROCESSOR:
				setProcessor(PROCESSOR_EDEFAULT);
				return;
			case ModelPackage.DEPLOYMENT__CHANNELS:
				setChannels(CHANNELS_EDEFAULT);
				return;
			case ModelPackage.DEPLOYMENT__COPIES:
				setCopies(COPIES_EDEFAULT);
				return;
			case ModelPackage.DEPLOYMENT__INPUT_RATE:
				setInputRate(INPUT_RATE_EDEFAULT);
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
			case ModelPackage.DEPLOYMENT__PROCESSOR:
				return PROCESSOR_EDEFAULT == null ? processor != null : !PROCESSOR_EDEFAULT.equals(processor);
			case ModelPackage.DEPLOYMENT__CHANNELS:
				return CHANNELS_EDEFAULT == null ? channels != null : !CHANNELS_EDEFAULT.equals(channels);
			case ModelPackage.DEPLOYMENT__COPIES:
				return COPIES_EDEFAULT == null ? copies != null : !COPIES_EDEFAULT.equals(copies);
			case ModelPackage.DEPLOYMENT__INPUT_RATE:
				return INPUT_RATE_EDEFAULT == null ? inputRate != null : !INPUT_RATE_EDEFAULT.equals(inputRate);
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
		result.append(" (processor: ");
		result.append(processor);
		result.append(", channels: ");
		result.append(channels);
		result.append(", copies: ");
		result.append(copies);
		result.append(", inputRate: ");
		result.append(inputRate);
		result.append(')');
		return result.toString();
	}

} //DeploymentImpl
