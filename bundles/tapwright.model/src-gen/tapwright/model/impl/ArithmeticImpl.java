/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import tapwright.model.Arithmetic;
import tapwright.model.Format;
import tapwright.model.ModelPackage;
import tapwright.model.Overflow;
import tapwright.model.Rounding;
import tapwright.model.Structure;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Arithmetic</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getStructure <em>Structure</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getFactor <em>Factor</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getCoefficient <em>Coefficient</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getInput <em>Input</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getProduct <em>Product</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getAccumulator <em>Accumulator</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getOutput <em>Output</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getRounding <em>Rounding</em>}</li>
 *   <li>{@link tapwright.model.impl.ArithmeticImpl#getOverflow <em>Overflow</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ArithmeticImpl extends MinimalEObjectImpl.Container implements Arithmetic {
	/**
	 * The default value of the '{@link #getStructure() <em>Structure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStructure()
	 * @generated
	 * @ordered
	 */
	protected static final Structure STRUCTURE_EDEFAULT = Structure.DIRECT;

	/**
	 * The cached value of the '{@link #getStructure() <em>Structure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStructure()
	 * @generated
	 * @ordered
	 */
	protected Structure structure = STRUCTURE_EDEFAULT;

	/**
	 * The default value of the '{@link #getFactor() <em>Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFactor()
	 * @generated
	 * @ordered
	 */
	protected static final String FACTOR_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFactor() <em>Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFactor()
	 * @generated
	 * @ordered
	 */
	protected String factor = FACTOR_EDEFAULT;

	/**
	 * The cached value of the '{@link #getCoefficient() <em>Coefficient</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficient()
	 * @generated
	 * @ordered
	 */
	protected Format coefficient;

	/**
	 * The cached value of the '{@link #getInput() <em>Input</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInput()
	 * @generated
	 * @ordered
	 */
	protected Format input;

	/**
	 * The cached value of the '{@link #getProduct() <em>Product</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getProduct()
	 * @generated
	 * @ordered
	 */
	protected Format product;

	/**
	 * The cached value of the '{@link #getAccumulator() <em>Accumulator</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAccumulator()
	 * @generated
	 * @ordered
	 */
	protected Format accumulator;

	/**
	 * The cached value of the '{@link #getOutput() <em>Output</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOutput()
	 * @generated
	 * @ordered
	 */
	protected Format output;

	/**
	 * The default value of the '{@link #getRounding() <em>Rounding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRounding()
	 * @generated
	 * @ordered
	 */
	protected static final Rounding ROUNDING_EDEFAULT = Rounding.HALF_EVEN;

	/**
	 * The cached value of the '{@link #getRounding() <em>Rounding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRounding()
	 * @generated
	 * @ordered
	 */
	protected Rounding rounding = ROUNDING_EDEFAULT;

	/**
	 * The default value of the '{@link #getOverflow() <em>Overflow</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOverflow()
	 * @generated
	 * @ordered
	 */
	protected static final Overflow OVERFLOW_EDEFAULT = Overflow.SATURATE;

	/**
	 * The cached value of the '{@link #getOverflow() <em>Overflow</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOverflow()
	 * @generated
	 * @ordered
	 */
	protected Overflow overflow = OVERFLOW_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ArithmeticImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.ARITHMETIC;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Structure getStructure() {
		return structure;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStructure(Structure newStructure) {
		Structure oldStructure = structure;
		structure = newStructure == null ? STRUCTURE_EDEFAULT : newStructure;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__STRUCTURE, oldStructure, structure));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getFactor() {
		return factor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFactor(String newFactor) {
		String oldFactor = factor;
		factor = newFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__FACTOR, oldFactor, factor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format getCoefficient() {
		return coefficient;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetCoefficient(Format newCoefficient, NotificationChain msgs) {
		Format oldCoefficient = coefficient;
		coefficient = newCoefficient;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__COEFFICIENT, oldCoefficient, newCoefficient);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCoefficient(Format newCoefficient) {
		if (newCoefficient != coefficient) {
			NotificationChain msgs = null;
			if (coefficient != null)
				msgs = ((InternalEObject)coefficient).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__COEFFICIENT, null, msgs);
			if (newCoefficient != null)
				msgs = ((InternalEObject)newCoefficient).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__COEFFICIENT, null, msgs);
			msgs = basicSetCoefficient(newCoefficient, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__COEFFICIENT, newCoefficient, newCoefficient));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format getInput() {
		return input;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetInput(Format newInput, NotificationChain msgs) {
		Format oldInput = input;
		input = newInput;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__INPUT, oldInput, newInput);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInput(Format newInput) {
		if (newInput != input) {
			NotificationChain msgs = null;
			if (input != null)
				msgs = ((InternalEObject)input).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__INPUT, null, msgs);
			if (newInput != null)
				msgs = ((InternalEObject)newInput).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__INPUT, null, msgs);
			msgs = basicSetInput(newInput, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__INPUT, newInput, newInput));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format getProduct() {
		return product;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetProduct(Format newProduct, NotificationChain msgs) {
		Format oldProduct = product;
		product = newProduct;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__PRODUCT, oldProduct, newProduct);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setProduct(Format newProduct) {
		if (newProduct != product) {
			NotificationChain msgs = null;
			if (product != null)
				msgs = ((InternalEObject)product).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__PRODUCT, null, msgs);
			if (newProduct != null)
				msgs = ((InternalEObject)newProduct).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__PRODUCT, null, msgs);
			msgs = basicSetProduct(newProduct, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__PRODUCT, newProduct, newProduct));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format getAccumulator() {
		return accumulator;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetAccumulator(Format newAccumulator, NotificationChain msgs) {
		Format oldAccumulator = accumulator;
		accumulator = newAccumulator;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__ACCUMULATOR, oldAccumulator, newAccumulator);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAccumulator(Format newAccumulator) {
		if (newAccumulator != accumulator) {
			NotificationChain msgs = null;
			if (accumulator != null)
				msgs = ((InternalEObject)accumulator).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__ACCUMULATOR, null, msgs);
			if (newAccumulator != null)
				msgs = ((InternalEObject)newAccumulator).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__ACCUMULATOR, null, msgs);
			msgs = basicSetAccumulator(newAccumulator, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__ACCUMULATOR, newAccumulator, newAccumulator));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format getOutput() {
		return output;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetOutput(Format newOutput, NotificationChain msgs) {
		Format oldOutput = output;
		output = newOutput;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__OUTPUT, oldOutput, newOutput);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOutput(Format newOutput) {
		if (newOutput != output) {
			NotificationChain msgs = null;
			if (output != null)
				msgs = ((InternalEObject)output).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__OUTPUT, null, msgs);
			if (newOutput != null)
				msgs = ((InternalEObject)newOutput).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.ARITHMETIC__OUTPUT, null, msgs);
			msgs = basicSetOutput(newOutput, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__OUTPUT, newOutput, newOutput));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Rounding getRounding() {
		return rounding;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRounding(Rounding newRounding) {
		Rounding oldRounding = rounding;
		rounding = newRounding == null ? ROUNDING_EDEFAULT : newRounding;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__ROUNDING, oldRounding, rounding));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Overflow getOverflow() {
		return overflow;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOverflow(Overflow newOverflow) {
		Overflow oldOverflow = overflow;
		overflow = newOverflow == null ? OVERFLOW_EDEFAULT : newOverflow;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.ARITHMETIC__OVERFLOW, oldOverflow, overflow));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case ModelPackage.ARITHMETIC__COEFFICIENT:
				return basicSetCoefficient(null, msgs);
			case ModelPackage.ARITHMETIC__INPUT:
				return basicSetInput(null, msgs);
			case ModelPackage.ARITHMETIC__PRODUCT:
				return basicSetProduct(null, msgs);
			case ModelPackage.ARITHMETIC__ACCUMULATOR:
				return basicSetAccumulator(null, msgs);
			case ModelPackage.ARITHMETIC__OUTPUT:
				return basicSetOutput(null, msgs);
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
			case ModelPackage.ARITHMETIC__STRUCTURE:
				return getStructure();
			case ModelPackage.ARITHMETIC__FACTOR:
				return getFactor();
			case ModelPackage.ARITHMETIC__COEFFICIENT:
				return getCoefficient();
			case ModelPackage.ARITHMETIC__INPUT:
				return getInput();
			case ModelPackage.ARITHMETIC__PRODUCT:
				return getProduct();
			case ModelPackage.ARITHMETIC__ACCUMULATOR:
				return getAccumulator();
			case ModelPackage.ARITHMETIC__OUTPUT:
				return getOutput();
			case ModelPackage.ARITHMETIC__ROUNDING:
				return getRounding();
			case ModelPackage.ARITHMETIC__OVERFLOW:
				return getOverflow();
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
			case ModelPackage.ARITHMETIC__STRUCTURE:
				setStructure((Structure)newValue);
				return;
			case ModelPackage.ARITHMETIC__FACTOR:
				setFactor((String)newValue);
				return;
			case ModelPackage.ARITHMETIC__COEFFICIENT:
				setCoefficient((Format)newValue);
				return;
			case ModelPackage.ARITHMETIC__INPUT:
				setInput((Format)newValue);
				return;
			case ModelPackage.ARITHMETIC__PRODUCT:
				setProduct((Format)newValue);
				return;
			case ModelPackage.ARITHMETIC__ACCUMULATOR:
				setAccumulator((Format)newValue);
				return;
			case ModelPackage.ARITHMETIC__OUTPUT:
				setOutput((Format)newValue);
				return;
			case ModelPackage.ARITHMETIC__ROUNDING:
				setRounding((Rounding)newValue);
				return;
			case ModelPackage.ARITHMETIC__OVERFLOW:
				setOverflow((Overflow)newValue);
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
			case ModelPackage.ARITHMETIC__STRUCTURE:
				setStructure(STRUCTURE_EDEFAULT);
				return;
			case ModelPackage.ARITHMETIC__FACTOR:
				setFactor(FACTOR_EDEFAULT);
				return;
			case ModelPackage.ARITHMETIC__COEFFICIENT:
				setCoefficient((Format)null);
				return;
			case ModelPackage.ARITHMETIC__INPUT:
				setInput((Format)null);
				return;
			case ModelPackage.ARITHMETIC__PRODUCT:
				setProduct((Format)null);
				return;
			case ModelPackage.ARITHMETIC__ACCUMULATOR:
				setAccumulator((Format)null);
				return;
			case ModelPackage.ARITHMETIC__OUTPUT:
				setOutput((Format)null);
				return;
			case ModelPackage.ARITHMETIC__ROUNDING:
				setRounding(ROUNDING_EDEFAULT);
				return;
			case ModelPackage.ARITHMETIC__OVERFLOW:
				setOverflow(OVERFLOW_EDEFAULT);
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
			case ModelPackage.ARITHMETIC__STRUCTURE:
				return structure != STRUCTURE_EDEFAULT;
			case ModelPackage.ARITHMETIC__FACTOR:
				return FACTOR_EDEFAULT == null ? factor != null : !FACTOR_EDEFAULT.equals(factor);
			case ModelPackage.ARITHMETIC__COEFFICIENT:
				return coefficient != null;
			case ModelPackage.ARITHMETIC__INPUT:
				return input != null;
			case ModelPackage.ARITHMETIC__PRODUCT:
				return product != null;
			case ModelPackage.ARITHMETIC__ACCUMULATOR:
				return accumulator != null;
			case ModelPackage.ARITHMETIC__OUTPUT:
				return output != null;
			case ModelPackage.ARITHMETIC__ROUNDING:
				return rounding != ROUNDING_EDEFAULT;
			case ModelPackage.ARITHMETIC__OVERFLOW:
				return overflow != OVERFLOW_EDEFAULT;
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
		result.append(" (structure: ");
		result.append(structure);
		result.append(", factor: ");
		result.append(factor);
		result.append(", rounding: ");
		result.append(rounding);
		result.append(", overflow: ");
		result.append(overflow);
		result.append(')');
		return result.toString();
	}

} //ArithmeticImpl
