/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import tapwright.model.ComplementDesign;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;

/**
 * This is the item provider adapter for a {@link tapwright.model.ComplementDesign} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class ComplementDesignItemProvider extends DesignItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ComplementDesignItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

		}
		return itemPropertyDescriptors;
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		return getString("_UI_ComplementDesign_type");
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(ComplementDesign.class)) {
			case ModelPackage.COMPLEMENT_DESIGN__PROTOTYPE:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createGivenDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createWindowDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createEquirippleDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createMovingAverageDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createBinomialDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createMaximallyFlatDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createSavitzkyGolayDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createLagrangeDelayDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createRaisedCosineDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createLeastSquaresDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createConstrainedLeastSquaresDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createLinearProgramDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createHalfBandDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createCicCompensatorDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createCombDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createMinimumPhaseDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.COMPLEMENT_DESIGN__PROTOTYPE,
				 ModelFactory.eINSTANCE.createComplementDesign()));
	}

}
