/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Where coefficients come from: a method with its parameters.
 * <!-- end-model-doc -->
 *
 *
 * @see tapwright.model.ModelPackage#getDesign()
 * @model abstract="true"
 * @generated
 */
public interface Design extends EObject {
} // Design
