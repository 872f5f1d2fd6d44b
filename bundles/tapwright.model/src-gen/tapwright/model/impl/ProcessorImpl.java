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
import tapwright.model.Processor;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Processor</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getDescription <em>Description</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getMacRate <em>Mac Rate</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getWord <em>Word</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getAccumulator <em>Accumulator</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getCoefficientMemory <em>Coefficient Memory</em>}</li>
 *   <li>{@link tapwright.model.impl.ProcessorImpl#getDelayMemory <em>Delay Memory</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ProcessorImpl extends MinimalEObjectImpl.Container implements Processor {
	/**
	 * The default value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected static final String NAME_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected String name = NAME_EDEFAULT;

	/**
	 * The default value of the '{@link #getDescription() <em>Description</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDescription()
	 * @generated
	 * @ordered
	 */
	protected static final String DESCRIPTION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDescription() <em>Description</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDescription()
	 * @generated
	 * @ordered
	 */
	protected String description = DESCRIPTION_EDEFAULT;

	/**
	 * The default value of the '{@link #getMacRate() <em>Mac Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMacRate()
	 * @generated
	 * @ordered
	 */
	protected static final String MAC_RATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMacRate() <em>Mac Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMacRate()
	 * @generated
	 * @ordered
	 */
	protected String macRate = MAC_RATE_EDEFAULT;

	/**
	 * The default value of the '{@link #getWord() <em>Word</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWord()
	 * @generated
	 * @ordered
	 */
	protected static final String WORD_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getWord() <em>Word</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWord()
	 * @generated
	 * @ordered
	 */
	protected String word = WORD_EDEFAULT;

	/**
	 * The default value of the '{@link #getAccumulator() <em>Accumulator</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAccumulator()
	 * @generated
	 * @ordered
	 */
	protected static final String ACCUMULATOR_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getAccumulator() <em>Accumulator</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAccumulator()
	 * @generated
	 * @ordered
	 */
	protected String accumulator = ACCUMULATOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getCoefficientMemory() <em>Coefficient Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficientMemory()
	 * @generated
	 * @ordered
	 */
	protected static final String COEFFICIENT_MEMORY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getCoefficientMemory() <em>Coefficient Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficientMemory()
	 * @generated
	 * @ordered
	 */
	protected String coefficientMemory = COEFFICIENT_MEMORY_EDEFAULT;

	/**
	 * The default value of the '{@link #getDelayMemory() <em>Delay Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDelayMemory()
	 * @generated
	 * @ordered
	 */
	protected static final String DELAY_MEMORY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDelayMemory() <em>Delay Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDelayMemory()
	 * @generated
	 * @ordered
	 */
	protected String delayMemory = DELAY_MEMORY_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ProcessorImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.PROCESSOR;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
		return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setName(String newName) {
		String oldName = name;
		name = newName;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__NAME, oldName, name));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDescription() {
		return description;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDescription(String newDescription) {
		String oldDescription = description;
		description = newDescription;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__DESCRIPTION, oldDescription, description));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getMacRate() {
		return macRate;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMacRate(String newMacRate) {
		String oldMacRate = macRate;
		macRate = newMacRate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__MAC_RATE, oldMacRate, macRate));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getWord() {
		return word;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWord(String newWord) {
		String oldWord = word;
		word = newWord;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__WORD, oldWord, word));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getAccumulator() {
		return accumulator;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAccumulator(String newAccumulator) {
		String oldAccumulator = accumulator;
		accumulator = newAccumulator;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__ACCUMULATOR, oldAccumulator, accumulator));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getCoefficientMemory() {
		return coefficientMemory;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCoefficientMemory(String newCoefficientMemory) {
		String oldCoefficientMemory = coefficientMemory;
		coefficientMemory = newCoefficientMemory;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__COEFFICIENT_MEMORY, oldCoefficientMemory, coefficientMemory));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDelayMemory() {
		return delayMemory;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDelayMemory(String newDelayMemory) {
		String oldDelayMemory = delayMemory;
		delayMemory = newDelayMemory;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PROCESSOR__DELAY_MEMORY, oldDelayMemory, delayMemory));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.PROCESSOR__NAME:
				return getName();
			case ModelPackage.PROCESSOR__DESCRIPTION:
				return getDescription();
			case ModelPackage.PROCESSOR__MAC_RATE:
				return getMacRate();
			case ModelPackage.PROCESSOR__WORD:
				return getWord();
			case ModelPackage.PROCESSOR__ACCUMULATOR:
				return getAccumulator();
			case ModelPackage.PROCESSOR__COEFFICIENT_MEMORY:
				return getCoefficientMemory();
			case ModelPackage.PROCESSOR__DELAY_MEMORY:
				return getDelayMemory();
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
			case ModelPackage.PROCESSOR__NAME:
				setName((String)newValue);
				return;
			case ModelPackage.PROCESSOR__DESCRIPTION:
				setDescription((String)newValue);
				return;
			case ModelPackage.PROCESSOR__MAC_RATE:
				setMacRate((String)newValue);
				return;
			case ModelPackage.PROCESSOR__WORD:
				setWord((String)newValue);
				return;
			case ModelPackage.PROCESSOR__ACCUMULATOR:
				setAccumulator((String)newValue);
				return;
			case ModelPackage.PROCESSOR__COEFFICIENT_MEMORY:
				setCoefficientMemory((String)newValue);
				return;
			case ModelPackage.PROCESSOR__DELAY_MEMORY:
				setDelayMemory((String)newValue);
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
			case ModelPackage.PROCESSOR__NAME:
				setName(NAME_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__DESCRIPTION:
				setDescription(DESCRIPTION_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__MAC_RATE:
				setMacRate(MAC_RATE_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__WORD:
				setWord(WORD_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__ACCUMULATOR:
				setAccumulator(ACCUMULATOR_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__COEFFICIENT_MEMORY:
				setCoefficientMemory(COEFFICIENT_MEMORY_EDEFAULT);
				return;
			case ModelPackage.PROCESSOR__DELAY_MEMORY:
				setDelayMemory(DELAY_MEMORY_EDEFAULT);
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
			case ModelPackage.PROCESSOR__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case ModelPackage.PROCESSOR__DESCRIPTION:
				return DESCRIPTION_EDEFAULT == null ? description != null : !DESCRIPTION_EDEFAULT.equals(description);
			case ModelPackage.PROCESSOR__MAC_RATE:
				return MAC_RATE_EDEFAULT == null ? macRate != null : !MAC_RATE_EDEFAULT.equals(macRate);
			case ModelPackage.PROCESSOR__WORD:
				return WORD_EDEFAULT == null ? word != null : !WORD_EDEFAULT.equals(word);
			case ModelPackage.PROCESSOR__ACCUMULATOR:
				return ACCUMULATOR_EDEFAULT == null ? accumulator != null : !ACCUMULATOR_EDEFAULT.equals(accumulator);
			case ModelPackage.PROCESSOR__COEFFICIENT_MEMORY:
				return COEFFICIENT_MEMORY_EDEFAULT == null ? coefficientMemory != null : !COEFFICIENT_MEMORY_EDEFAULT.equals(coefficientMemory);
			case ModelPackage.PROCESSOR__DELAY_MEMORY:
				return DELAY_MEMORY_EDEFAULT == null ? delayMemory != null : !DELAY_MEMORY_EDEFAULT.equals(delayMemory);
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
		result.append(" (name: ");
		result.append(name);
		result.append(", description: ");
		result.append(description);
		result.append(", macRate: ");
		result.append(macRate);
		result.append(", word: ");
		result.append(word);
		result.append(", accumulator: ");
		result.append(accumulator);
		result.append(", coefficientMemory: ");
		result.append(coefficientMemory);
		result.append(", delayMemory: ");
		result.append(delayMemory);
		result.append(')');
		return result.toString();
	}

} //ProcessorImpl
