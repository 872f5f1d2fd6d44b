/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Stage</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * One step of a signal path.
 * <!-- end-model-doc -->
 *
 *
 * @see tapwright.model.ModelPackage#getStage()
 * @model abstract="true"
 * @generated
 */
public interface Stage extends EObject {
} // Stage
