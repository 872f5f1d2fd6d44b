/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.common.util.ResourceLocator;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IEditingDomainItemProvider;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.IStructuredItemContentProvider;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;
import org.eclipse.emf.edit.provider.ViewerNotification;

import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;

/**
 * This is the item provider adapter for a {@link tapwright.model.Filter} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class FilterItemProvider 
	extends ItemProviderAdapter
	implements
		IEditingDomainItemProvider,
		IStructuredItemContentProvider,
		ITreeItemContentProvider,
		IItemLabelProvider,
		IItemPropertySource {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public FilterItemProvider(AdapterFactory adapterFactory) {
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

			addNamePropertyDescriptor(object);
			addIdentityPropertyDescriptor(object);
			addPurposePropertyDescriptor(object);
			addSampleRatePropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Name feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNamePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Filter_name_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Filter_name_feature", "_UI_Filter_type"),
				 ModelPackage.Literals.FILTER__NAME,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Identity feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addIdentityPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Filter_identity_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Filter_identity_feature", "_UI_Filter_type"),
				 ModelPackage.Literals.FILTER__IDENTITY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Purpose feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addPurposePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Filter_purpose_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Filter_purpose_feature", "_UI_Filter_type"),
				 ModelPackage.Literals.FILTER__PURPOSE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Sample Rate feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addSampleRatePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Filter_sampleRate_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Filter_sampleRate_feature", "_UI_Filter_type"),
				 ModelPackage.Literals.FILTER__SAMPLE_RATE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
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
			childrenFeatures.add(ModelPackage.Literals.FILTER__REQUIREMENTS);
			childrenFeatures.add(ModelPackage.Literals.FILTER__DESIGN);
			childrenFeatures.add(ModelPackage.Literals.FILTER__COEFFICIENTS);
			childrenFeatures.add(ModelPackage.Literals.FILTER__ARITHMETIC);
			childrenFeatures.add(ModelPackage.Literals.FILTER__DEPLOYMENTS);
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
		String label = ((Filter)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Filter_type") :
			getString("_UI_Filter_type") + " " + label;
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

		switch (notification.getFeatureID(Filter.class)) {
			case ModelPackage.FILTER__NAME:
			case ModelPackage.FILTER__IDENTITY:
			case ModelPackage.FILTER__PURPOSE:
			case ModelPackage.FILTER__SAMPLE_RATE:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case ModelPackage.FILTER__REQUIREMENTS:
			case ModelPackage.FILTER__DESIGN:
			case ModelPackage.FILTER__COEFFICIENTS:
			case ModelPackage.FILTER__ARITHMETIC:
			case ModelPackage.FILTER__DEPLOYMENTS:
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
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createGainRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createLinearPhaseRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createGroupDelayRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createGroupDelayVariationRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createBulkDelayRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createStepOvershootRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createStepUndershootRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createStepSettlingRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createImpulseTailRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createNullRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createExactGainRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createNonNegativeAmplitudeRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createNoOverflowRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createOutputNoiseRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createCoefficientWordRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createTapsRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createMultipliesRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createAddsRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createMemoryRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createMultiplyRateRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createAliasRejectionRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__REQUIREMENTS,
				 ModelFactory.eINSTANCE.createPowerComplementaryRequirement()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createGivenDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createWindowDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createEquirippleDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createMovingAverageDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createBinomialDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createMaximallyFlatDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createSavitzkyGolayDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createLagrangeDelayDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createRaisedCosineDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createLeastSquaresDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createConstrainedLeastSquaresDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createLinearProgramDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createHalfBandDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createCicCompensatorDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createCombDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createMinimumPhaseDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DESIGN,
				 ModelFactory.eINSTANCE.createComplementDesign()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__COEFFICIENTS,
				 ModelFactory.eINSTANCE.createRealCoefficients()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__COEFFICIENTS,
				 ModelFactory.eINSTANCE.createIntegerCoefficients()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__ARITHMETIC,
				 ModelFactory.eINSTANCE.createArithmetic()));

		newChildDescriptors.add
			(createChildParameter
				(ModelPackage.Literals.FILTER__DEPLOYMENTS,
				 ModelFactory.eINSTANCE.createDeployment()));
	}

	/**
	 * Return the resource locator for this item provider's resources.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ResourceLocator getResourceLocator() {
		return ModelEditPlugin.INSTANCE;
	}

}
