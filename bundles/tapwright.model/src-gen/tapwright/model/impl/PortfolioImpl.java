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

import tapwright.model.ModelPackage;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.Processor;
import tapwright.model.SignalPath;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Portfolio</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getDescription <em>Description</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getErosion <em>Erosion</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getActiveBaseline <em>Active Baseline</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getParameters <em>Parameters</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getProcessors <em>Processors</em>}</li>
 *   <li>{@link tapwright.model.impl.PortfolioImpl#getPaths <em>Paths</em>}</li>
 * </ul>
 *
 * @generated
 */
public class PortfolioImpl extends MinimalEObjectImpl.Container implements Portfolio {
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
	 * The default value of the '{@link #getErosion() <em>Erosion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getErosion()
	 * @generated
	 * @ordered
	 */
	protected static final String EROSION_EDEFAULT = "0.5";

	/**
	 * The cached value of the '{@link #getErosion() <em>Erosion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getErosion()
	 * @generated
	 * @ordered
	 */
	protected String erosion = EROSION_EDEFAULT;

	/**
	 * The default value of the '{@link #getActiveBaseline() <em>Active Baseline</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getActiveBaseline()
	 * @generated
	 * @ordered
	 */
	protected static final String ACTIVE_BASELINE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getActiveBaseline() <em>Active Baseline</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getActiveBaseline()
	 * @generated
	 * @ordered
	 */
	protected String activeBaseline = ACTIVE_BASELINE_EDEFAULT;

	/**
	 * The cached value of the '{@link #getParameters() <em>Parameters</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getParameters()
	 * @generated
	 * @ordered
	 */
	protected EList<Parameter> parameters;

	/**
	 * The cached value of the '{@link #getProcessors() <em>Processors</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getProcessors()
	 * @generated
	 * @ordered
	 */
	protected EList<Processor> processors;

	/**
	 * The cached value of the '{@link #getPaths() <em>Paths</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPaths()
	 * @generated
	 * @ordered
	 */
	protected EList<SignalPath> paths;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected PortfolioImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.PORTFOLIO;
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PORTFOLIO__NAME, oldName, name));
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
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PORTFOLIO__DESCRIPTION, oldDescription, description));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getErosion() {
		return erosion;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setErosion(String newErosion) {
		String oldErosion = erosion;
		erosion = newErosion;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PORTFOLIO__EROSION, oldErosion, erosion));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getActiveBaseline() {
		return activeBaseline;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setActiveBaseline(String newActiveBaseline) {
		String oldActiveBaseline = activeBaseline;
		activeBaseline = newActiveBaseline;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.PORTFOLIO__ACTIVE_BASELINE, oldActiveBaseline, activeBaseline));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Parameter> getParameters() {
		if (parameters == null) {
			parameters = new EObjectContainmentEList<Parameter>(Parameter.class, this, ModelPackage.PORTFOLIO__PARAMETERS);
		}
		return parameters;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Processor> getProcessors() {
		if (processors == null) {
			processors = new EObjectContainmentEList<Processor>(Processor.class, this, ModelPackage.PORTFOLIO__PROCESSORS);
		}
		return processors;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<SignalPath> getPaths() {
		if (paths == null) {
			paths = new EObjectContainmentEList<SignalPath>(SignalPath.class, this, ModelPackage.PORTFOLIO__PATHS);
		}
		return paths;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case ModelPackage.PORTFOLIO__PARAMETERS:
				return ((InternalEList<?>)getParameters()).basicRemove(otherEnd, msgs);
			case ModelPackage.PORTFOLIO__PROCESSORS:
				return ((InternalEList<?>)getProcessors()).basicRemove(otherEnd, msgs);
			case ModelPackage.PORTFOLIO__PATHS:
				return ((InternalEList<?>)getPaths()).basicRemove(otherEnd, msgs);
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
			case ModelPackage.PORTFOLIO__NAME:
				return getName();
			case ModelPackage.PORTFOLIO__DESCRIPTION:
				return getDescription();
			case ModelPackage.PORTFOLIO__EROSION:
				return getErosion();
			case ModelPackage.PORTFOLIO__ACTIVE_BASELINE:
				return getActiveBaseline();
			case ModelPackage.PORTFOLIO__PARAMETERS:
				return getParameters();
			case ModelPackage.PORTFOLIO__PROCESSORS:
				return getProcessors();
			case ModelPackage.PORTFOLIO__PATHS:
				return getPaths();
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
			case ModelPackage.PORTFOLIO__NAME:
				setName((String)newValue);
				return;
			case ModelPackage.PORTFOLIO__DESCRIPTION:
				setDescription((String)newValue);
				return;
			case ModelPackage.PORTFOLIO__EROSION:
				setErosion((String)newValue);
				return;
			case ModelPackage.PORTFOLIO__ACTIVE_BASELINE:
				setActiveBaseline((String)newValue);
				return;
			case ModelPackage.PORTFOLIO__PARAMETERS:
				getParameters().clear();
				getParameters().addAll((Collection<? extends Parameter>)newValue);
				return;
			case ModelPackage.PORTFOLIO__PROCESSORS:
				getProcessors().clear();
				getProcessors().addAll((Collection<? extends Processor>)newValue);
				return;
			case ModelPackage.PORTFOLIO__PATHS:
				getPaths().clear();
				getPaths().addAll((Collection<? extends SignalPath>)newValue);
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
			case ModelPackage.PORTFOLIO__NAME:
				setName(NAME_EDEFAULT);
				return;
			case ModelPackage.PORTFOLIO__DESCRIPTION:
				setDescription(DESCRIPTION_EDEFAULT);
				return;
			case ModelPackage.PORTFOLIO__EROSION:
				setErosion(EROSION_EDEFAULT);
				return;
			case ModelPackage.PORTFOLIO__ACTIVE_BASELINE:
				setActiveBaseline(ACTIVE_BASELINE_EDEFAULT);
				return;
			case ModelPackage.PORTFOLIO__PARAMETERS:
				getParameters().clear();
				return;
			case ModelPackage.PORTFOLIO__PROCESSORS:
				getProcessors().clear();
				return;
			case ModelPackage.PORTFOLIO__PATHS:
				getPaths().clear();
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
			case ModelPackage.PORTFOLIO__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case ModelPackage.PORTFOLIO__DESCRIPTION:
				return DESCRIPTION_EDEFAULT == null ? description != null : !DESCRIPTION_EDEFAULT.equals(description);
			case ModelPackage.PORTFOLIO__EROSION:
				return EROSION_EDEFAULT == null ? erosion != null : !EROSION_EDEFAULT.equals(erosion);
			case ModelPackage.PORTFOLIO__ACTIVE_BASELINE:
				return ACTIVE_BASELINE_EDEFAULT == null ? activeBaseline != null : !ACTIVE_BASELINE_EDEFAULT.equals(activeBaseline);
			case ModelPackage.PORTFOLIO__PARAMETERS:
				return parameters != null && !parameters.isEmpty();
			case ModelPackage.PORTFOLIO__PROCESSORS:
				return processors != null && !processors.isEmpty();
			case ModelPackage.PORTFOLIO__PATHS:
				return paths != null && !paths.isEmpty();
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
		result.append(", erosion: ");
		result.append(erosion);
		result.append(", activeBaseline: ");
		result.append(activeBaseline);
		result.append(')');
		return result.toString();
	}

} //PortfolioImpl
