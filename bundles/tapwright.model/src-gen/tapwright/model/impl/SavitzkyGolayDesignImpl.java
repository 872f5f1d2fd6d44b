/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import tapwright.model.ModelPackage;
import tapwright.model.SavitzkyGolayDesign;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Savitzky Golay Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.impl.SavitzkyGolayDesignImpl#getPoints <em>Points</em>}</li>
 *   <li>{@link tapwright.model.impl.SavitzkyGolayDesignImpl#getDegree <em>Degree</em>}</li>
 *   <li>{@link tapwright.model.impl.SavitzkyGolayDesignImpl#getDerivative <em>Derivative</em>}</li>
 *   <li>{@link tapwright.model.impl.SavitzkyGolayDesignImpl#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SavitzkyGolayDesignImpl extends DesignImpl implements SavitzkyGolayDesign {
	/**
	 * The default value of the '{@link #getPoints() <em>Points</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPoints()
	 * @generated
	 * @ordered
	 */
	protected static final String POINTS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPoints() <em>Points</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPoints()
	 * @generated
	 * @ordered
	 */
	protected String points = POINTS_EDEFAULT;

	/**
	 * The default value of the '{@link #getDegree() <em>Degree</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDegree()
	 * @generated
	 * @ordered
	 */
	protected static final String DEGREE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDegree() <em>Degree</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDegree()
	 * @generated
	 * @ordered
	 */
	protected String degree = DEGREE_EDEFAULT;

	/**
	 * The default value of the '{@link #getDerivative() <em>Derivative</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDerivative()
	 * @generated
	 * @ordered
	 */
	protected static final String DERIVATIVE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDerivative() <em>Derivative</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDerivative()
	 * @generated
	 * @ordered
	 */
	protected String derivative = DERIVATIVE_EDEFAULT;

	/**
	 * The default value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected static final String POSITION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected String position = POSITION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SavitzkyGolayDesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.SAVITZKY_GOLAY_DESIGN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getPoints() {
		return points;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPoints(String newPoints) {
		String oldPoints = points;
		points = newPoints;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.SAVITZKY_GOLAY_DESIGN__POINTS, oldPoints, points));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDegree() {
		return degree;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDegree(String newDegree) {
		String oldDegree = degree;
		degree = newDegree;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.SAVITZKY_GOLAY_DESIGN__DEGREE, oldDegree, degree));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDerivative() {
		return derivative;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDerivative(String newDerivative) {
		String oldDerivative = derivative;
		derivative = newDerivative;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.SAVITZKY_GOLAY_DESIGN__DERIVATIVE, oldDerivative, derivative));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getPosition() {
		return position;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPosition(String newPosition) {
		String oldPosition = position;
		position = newPosition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, ModelPackage.SAVITZKY_GOLAY_DESIGN__POSITION, oldPosition, position));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POINTS:
				return getPoints();
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DEGREE:
				return getDegree();
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DERIVATIVE:
				return getDerivative();
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POSITION:
				return getPosition();
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
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POINTS:
				setPoints((String)newValue);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DEGREE:
				setDegree((String)newValue);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DERIVATIVE:
				setDerivative((String)newValue);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POSITION:
				setPosition((String)newValue);
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
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POINTS:
				setPoints(POINTS_EDEFAULT);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DEGREE:
				setDegree(DEGREE_EDEFAULT);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DERIVATIVE:
				setDerivative(DERIVATIVE_EDEFAULT);
				return;
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POSITION:
				setPosition(POSITION_EDEFAULT);
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
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POINTS:
				return POINTS_EDEFAULT == null ? points != null : !POINTS_EDEFAULT.equals(points);
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DEGREE:
				return DEGREE_EDEFAULT == null ? degree != null : !DEGREE_EDEFAULT.equals(degree);
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__DERIVATIVE:
				return DERIVATIVE_EDEFAULT == null ? derivative != null : !DERIVATIVE_EDEFAULT.equals(derivative);
			case ModelPackage.SAVITZKY_GOLAY_DESIGN__POSITION:
				return POSITION_EDEFAULT == null ? position != null : !POSITION_EDEFAULT.equals(position);
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
		result.append(" (points: ");
		result.append(points);
		result.append(", degree: ");
		result.append(degree);
		result.append(", derivative: ");
		result.append(derivative);
		result.append(", position: ");
		result.append(position);
		result.append(')');
		return result.toString();
	}

} //SavitzkyGolayDesignImpl
