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
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import tapwright.model.Arithmetic;
import tapwright.model.Coefficients;
import tapwright.model.Deployment;
import tapwright.model.Design;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;
import tapwright.model.Requirement;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Filter</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.FilterImpl#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getIdentity <em>Identity</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getPurpose <em>Purpose</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getSampleRate <em>Sample Rate</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getRequirements <em>Requirements</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getDesign <em>Design</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getCoefficients <em>Coefficients</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getArithmetic <em>Arithmetic</em>}</li>
 *   <li>{@link tapwright.model.impl.FilterImpl#getDeployments <em>Deployments</em>}</li>
 * </ul>
 *
 * @generated
 */
public class FilterImpl extends MinimalEObjectImpl.Container implements Filter {
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
	 * The default value of the '{@link #getIdentity() <em>Identity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIdentity()
	 * @generated
	 * @ordered
	 */
	protected static final String IDENTITY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getIdentity() <em>Identity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIdentity()
	 * @generated
	 * @ordered
	 */
	protected String identity = IDENTITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getPurpose() <em>Purpose</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPurpose()
	 * @generated
	 * @ordered
	 */
	protected static final String PURPOSE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPurpose() <em>Purpose</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPurpose()
	 * @generated
	 * @ordered
	 */
	protected String purpose = PURPOSE_EDEFAULT;

	/**
	 * The default value of the '{@link #getSampleRate() <em>Sample Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSampleRate()
	 * @generated
	 * @ordered
	 */
	protected static final String SAMPLE_RATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSampleRate() <em>Sample Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSampleRate()
	 * @generated
	 * @ordered
	 */
	protected String sampleRate = SAMPLE_RATE_EDEFAULT;

	/**
	 * The cached value of the '{@link #getRequirements() <em>Requirements</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRequirements()
	 * @generated
	 * @ordered
	 */
	protected EList<Requirement> requirements;

	/**
	 * The cached value of the '{@link #getDesign() <em>Design</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDesign()
	 * @generated
	 * @ordered
	 */
	protected Design design;

	/**
	 * The cached value of the '{@link #getCoefficients() <em>Coefficients</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficients()
	 * @generated
	 * @ordered
	 */
	protected Coefficients coefficients;

	/**
	 * The cached value of the '{@link #getArithmetic() <em>Arithmetic</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArithmetic()
	 * @generated
	 * @ordered
	 */
	protected Arithmetic arithmetic;

	/**
	 * The cached value of the '{@link #getDeployments() <em>Deployments</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDeployments()
	 * @generated
	 * @ordered
	 */
	protected EList<Deployment> deployments;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected FilterImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.FILTER;
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__NAME, oldName, name));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getIdentity() {
		return identity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setIdentity(String newIdentity) {
		String oldIdentity = identity;
		identity = newIdentity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__IDENTITY, oldIdentity, identity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getPurpose() {
		return purpose;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPurpose(String newPurpose) {
		String oldPurpose = purpose;
		purpose = newPurpose;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__PURPOSE, oldPurpose, purpose));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getSampleRate() {
		return sampleRate;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSampleRate(String newSampleRate) {
		String oldSampleRate = sampleRate;
		sampleRate = newSampleRate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__SAMPLE_RATE, oldSampleRate, sampleRate));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Requirement> getRequirements() {
		if (requirements == null) {
			requirements = new EObjectContainmentEList<Requirement>(Requirement.class, this, ModelPackage.FILTER__REQUIREMENTS);
		}
		return requirements;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Design getDesign() {
		return design;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetDesign(Design newDesign, NotificationChain msgs) {
		Design oldDesign = design;
		design = newDesign;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__DESIGN, oldDesign, newDesign);
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
	public void setDesign(Design newDesign) {
		if (newDesign != design) {
			NotificationChain msgs = null;
			if (design != null)
				msgs = ((InternalEObject)design).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__DESIGN, null, msgs);
			if (newDesign != null)
				msgs = ((InternalEObject)newDesign).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__DESIGN, null, msgs);
			msgs = basicSetDesign(newDesign, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__DESIGN, newDesign, newDesign));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Coefficients getCoefficients() {
		return coefficients;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetCoefficients(Coefficients newCoefficients, NotificationChain msgs) {
		Coefficients oldCoefficients = coefficients;
		coefficients = newCoefficients;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__COEFFICIENTS, oldCoefficients, newCoefficients);
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
	public void setCoefficients(Coefficients newCoefficients) {
		if (newCoefficients != coefficients) {
			NotificationChain msgs = null;
			if (coefficients != null)
				msgs = ((InternalEObject)coefficients).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__COEFFICIENTS, null, msgs);
			if (newCoefficients != null)
				msgs = ((InternalEObject)newCoefficients).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__COEFFICIENTS, null, msgs);
			msgs = basicSetCoefficients(newCoefficients, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__COEFFICIENTS, newCoefficients, newCoefficients));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Arithmetic getArithmetic() {
		return arithmetic;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetArithmetic(Arithmetic newArithmetic, NotificationChain msgs) {
		Arithmetic oldArithmetic = arithmetic;
		arithmetic = newArithmetic;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__ARITHMETIC, oldArithmetic, newArithmetic);
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
	public void setArithmetic(Arithmetic newArithmetic) {
		if (newArithmetic != arithmetic) {
			NotificationChain msgs = null;
			if (arithmetic != null)
				msgs = ((InternalEObject)arithmetic).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__ARITHMETIC, null, msgs);
			if (newArithmetic != null)
				msgs = ((InternalEObject)newArithmetic).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - ModelPackage.FILTER__ARITHMETIC, null, msgs);
			msgs = basicSetArithmetic(newArithmetic, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.FILTER__ARITHMETIC, newArithmetic, newArithmetic));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Deployment> getDeployments() {
		if (deployments == null) {
			deployments = new EObjectContainmentEList<Deployment>(Deployment.class, this, ModelPackage.FILTER__DEPLOYMENTS);
		}
		return deployments;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case ModelPackage.FILTER__REQUIREMENTS:
				return ((InternalEList<?>)getRequirements()).basicRemove(otherEnd, msgs);
			case ModelPackage.FILTER__DESIGN:
				return basicSetDesign(null, msgs);
			case ModelPackage.FILTER__COEFFICIENTS:
				return basicSetCoefficients(null, msgs);
			case ModelPackage.FILTER__ARITHMETIC:
				return basicSetArithmetic(null, msgs);
			case ModelPackage.FILTER__DEPLOYMENTS:
				return ((InternalEList<?>)getDeployments()).basicRemove(otherEnd, msgs);
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
			case ModelPackage.FILTER__NAME:
				return getName();
			case ModelPackage.FILTER__IDENTITY:
				return getIdentity();
			case ModelPackage.FILTER__PURPOSE:
				return getPurpose();
			case ModelPackage.FILTER__SAMPLE_RATE:
				return getSampleRate();
			case ModelPackage.FILTER__REQUIREMENTS:
				return getRequirements();
			case ModelPackage.FILTER__DESIGN:
				return getDesign();
			case ModelPackage.FILTER__COEFFICIENTS:
				return getCoefficients();
			case ModelPackage.FILTER__ARITHMETIC:
				return getArithmetic();
			case ModelPackage.FILTER__DEPLOYMENTS:
				return getDeployments();
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
			case ModelPackage.FILTER__NAME:
				setName((String)newValue);
				return;
			case ModelPackage.FILTER__IDENTITY:
				setIdentity((String)newValue);
				return;
			case ModelPackage.FILTER__PURPOSE:
				setPurpose((String)newValue);
				return;
			case ModelPackage.FILTER__SAMPLE_RATE:
				setSampleRate((String)newValue);
				return;
			case ModelPackage.FILTER__REQUIREMENTS:
				getRequirements().clear();
				getRequirements().addAll((Collection<? extends Requirement>)newValue);
				return;
			case ModelPackage.FILTER__DESIGN:
				setDesign((Design)newValue);
				return;
			case ModelPackage.FILTER__COEFFICIENTS:
				setCoefficients((Coefficients)newValue);
				return;
			case ModelPackage.FILTER__ARITHMETIC:
				setArithmetic((Arithmetic)newValue);
				return;
			case ModelPackage.FILTER__DEPLOYMENTS:
				getDeployments().clear();
				getDeployments().addAll((Collection<? extends Deployment>)newValue);
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
			case ModelPackage.FILTER__NAME:
				setName(NAME_EDEFAULT);
				return;
			case ModelPackage.FILTER__IDENTITY:
				setIdentity(IDENTITY_EDEFAULT);
				return;
			case ModelPackage.FILTER__PURPOSE:
				setPurpose(PURPOSE_EDEFAULT);
				return;
			case ModelPackage.FILTER__SAMPLE_RATE:
				setSampleRate(SAMPLE_RATE_EDEFAULT);
				return;
			case ModelPackage.FILTER__REQUIREMENTS:
				getRequirements().clear();
				return;
			case ModelPackage.FILTER__DESIGN:
				setDesign((Design)null);
				return;
			case ModelPackage.FILTER__COEFFICIENTS:
				setCoefficients((Coefficients)null);
				return;
			case ModelPackage.FILTER__ARITHMETIC:
				setArithmetic((Arithmetic)null);
				return;
			case ModelPackage.FILTER__DEPLOYMENTS:
				getDeployments().clear();
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
			case ModelPackage.FILTER__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case ModelPackage.FILTER__IDENTITY:
				return IDENTITY_EDEFAULT == null ? identity != null : !IDENTITY_EDEFAULT.equals(identity);
			case ModelPackage.FILTER__PURPOSE:
				return PURPOSE_EDEFAULT == null ? purpose != null : !PURPOSE_EDEFAULT.equals(purpose);
			case ModelPackage.FILTER__SAMPLE_RATE:
				return SAMPLE_RATE_EDEFAULT == null ? sampleRate != null : !SAMPLE_RATE_EDEFAULT.equals(sampleRate);
			case ModelPackage.FILTER__REQUIREMENTS:
				return requirements != null && !requirements.isEmpty();
			case ModelPackage.FILTER__DESIGN:
				return design != null;
			case ModelPackage.FILTER__COEFFICIENTS:
				return coefficients != null;
			case ModelPackage.FILTER__ARITHMETIC:
				return arithmetic != null;
			case ModelPackage.FILTER__DEPLOYMENTS:
				return deployments != null && !deployments.isEmpty();
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
		result.append(", identity: ");
		result.append(identity);
		result.append(", purpose: ");
		result.append(purpose);
		result.append(", sampleRate: ");
		result.append(sampleRate);
		result.append(')');
		return result.toString();
	}

} //FilterImpl
