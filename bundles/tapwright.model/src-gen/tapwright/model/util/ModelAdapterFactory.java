/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.util;

import org.eclipse.emf.common.notify.Adapter;
import org.eclipse.emf.common.notify.Notifier;

import org.eclipse.emf.common.notify.impl.AdapterFactoryImpl;

import org.eclipse.emf.ecore.EObject;

import tapwright.model.*;

/**
 * <!-- begin-user-doc -->
 * The <b>Adapter Factory</b> for the model.
 * It provides an adapter <code>createXXX</code> method for each class of the model.
 * <!-- end-user-doc -->
 * @see tapwright.model.ModelPackage
 * @generated
 */
public class ModelAdapterFactory extends AdapterFactoryImpl {
	/**
	 * The cached model package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static ModelPackage modelPackage;

	/**
	 * Creates an instance of the adapter factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ModelAdapterFactory() {
		if (modelPackage == null) {
			modelPackage = ModelPackage.eINSTANCE;
		}
	}

	/**
	 * Returns whether this factory is applicable for the type of the object.
	 * <!-- begin-user-doc -->
	 * This implementation returns <code>true</code> if the object is either the model's package or is an instance object of the model.
	 * <!-- end-user-doc -->
	 * @return whether this factory is applicable for the type of the object.
	 * @generated
	 */
	@Override
	public boolean isFactoryForType(Object object) {
		if (object == modelPackage) {
			return true;
		}
		if (object instanceof EObject) {
			return ((EObject)object).eClass().getEPackage() == modelPackage;
		}
		return false;
	}

	/**
	 * The switch that delegates to the <code>createXXX</code> methods.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ModelSwitch<Adapter> modelSwitch =
		new ModelSwitch<Adapter>() {
			@Override
			public Adapter casePortfolio(Portfolio object) {
				return createPortfolioAdapter();
			}
			@Override
			public Adapter caseParameter(Parameter object) {
				return createParameterAdapter();
			}
			@Override
			public Adapter caseProcessor(Processor object) {
				return createProcessorAdapter();
			}
			@Override
			public Adapter caseSignalPath(SignalPath object) {
				return createSignalPathAdapter();
			}
			@Override
			public Adapter caseStage(Stage object) {
				return createStageAdapter();
			}
			@Override
			public Adapter caseFilterStage(FilterStage object) {
				return createFilterStageAdapter();
			}
			@Override
			public Adapter caseDecimation(Decimation object) {
				return createDecimationAdapter();
			}
			@Override
			public Adapter caseExpansion(Expansion object) {
				return createExpansionAdapter();
			}
			@Override
			public Adapter caseFilter(Filter object) {
				return createFilterAdapter();
			}
			@Override
			public Adapter caseDeployment(Deployment object) {
				return createDeploymentAdapter();
			}
			@Override
			public Adapter caseRequirement(Requirement object) {
				return createRequirementAdapter();
			}
			@Override
			public Adapter caseLimitPoint(LimitPoint object) {
				return createLimitPointAdapter();
			}
			@Override
			public Adapter caseGainRequirement(GainRequirement object) {
				return createGainRequirementAdapter();
			}
			@Override
			public Adapter caseLinearPhaseRequirement(LinearPhaseRequirement object) {
				return createLinearPhaseRequirementAdapter();
			}
			@Override
			public Adapter caseGroupDelayRequirement(GroupDelayRequirement object) {
				return createGroupDelayRequirementAdapter();
			}
			@Override
			public Adapter caseGroupDelayVariationRequirement(GroupDelayVariationRequirement object) {
				return createGroupDelayVariationRequirementAdapter();
			}
			@Override
			public Adapter caseBulkDelayRequirement(BulkDelayRequirement object) {
				return createBulkDelayRequirementAdapter();
			}
			@Override
			public Adapter caseStepOvershootRequirement(StepOvershootRequirement object) {
				return createStepOvershootRequirementAdapter();
			}
			@Override
			public Adapter caseStepUndershootRequirement(StepUndershootRequirement object) {
				return createStepUndershootRequirementAdapter();
			}
			@Override
			public Adapter caseStepSettlingRequirement(StepSettlingRequirement object) {
				return createStepSettlingRequirementAdapter();
			}
			@Override
			public Adapter caseImpulseTailRequirement(ImpulseTailRequirement object) {
				return createImpulseTailRequirementAdapter();
			}
			@Override
			public Adapter caseNullRequirement(NullRequirement object) {
				return createNullRequirementAdapter();
			}
			@Override
			public Adapter caseExactGainRequirement(ExactGainRequirement object) {
				return createExactGainRequirementAdapter();
			}
			@Override
			public Adapter caseNonNegativeAmplitudeRequirement(NonNegativeAmplitudeRequirement object) {
				return createNonNegativeAmplitudeRequirementAdapter();
			}
			@Override
			public Adapter caseNoOverflowRequirement(NoOverflowRequirement object) {
				return createNoOverflowRequirementAdapter();
			}
			@Override
			public Adapter caseOutputNoiseRequirement(OutputNoiseRequirement object) {
				return createOutputNoiseRequirementAdapter();
			}
			@Override
			public Adapter caseCoefficientWordRequirement(CoefficientWordRequirement object) {
				return createCoefficientWordRequirementAdapter();
			}
			@Override
			public Adapter caseTapsRequirement(TapsRequirement object) {
				return createTapsRequirementAdapter();
			}
			@Override
			public Adapter caseMultipliesRequirement(MultipliesRequirement object) {
				return createMultipliesRequirementAdapter();
			}
			@Override
			public Adapter caseAddsRequirement(AddsRequirement object) {
				return createAddsRequirementAdapter();
			}
			@Override
			public Adapter caseMemoryRequirement(MemoryRequirement object) {
				return createMemoryRequirementAdapter();
			}
			@Override
			public Adapter caseMultiplyRateRequirement(MultiplyRateRequirement object) {
				return createMultiplyRateRequirementAdapter();
			}
			@Override
			public Adapter caseAliasRejectionRequirement(AliasRejectionRequirement object) {
				return createAliasRejectionRequirementAdapter();
			}
			@Override
			public Adapter casePowerComplementaryRequirement(PowerComplementaryRequirement object) {
				return createPowerComplementaryRequirementAdapter();
			}
			@Override
			public Adapter caseDesign(Design object) {
				return createDesignAdapter();
			}
			@Override
			public Adapter caseBandDesign(BandDesign object) {
				return createBandDesignAdapter();
			}
			@Override
			public Adapter caseDesignBand(DesignBand object) {
				return createDesignBandAdapter();
			}
			@Override
			public Adapter caseGivenDesign(GivenDesign object) {
				return createGivenDesignAdapter();
			}
			@Override
			public Adapter caseWindowDesign(WindowDesign object) {
				return createWindowDesignAdapter();
			}
			@Override
			public Adapter caseEquirippleDesign(EquirippleDesign object) {
				return createEquirippleDesignAdapter();
			}
			@Override
			public Adapter caseMovingAverageDesign(MovingAverageDesign object) {
				return createMovingAverageDesignAdapter();
			}
			@Override
			public Adapter caseBinomialDesign(BinomialDesign object) {
				return createBinomialDesignAdapter();
			}
			@Override
			public Adapter caseMaximallyFlatDesign(MaximallyFlatDesign object) {
				return createMaximallyFlatDesignAdapter();
			}
			@Override
			public Adapter caseSavitzkyGolayDesign(SavitzkyGolayDesign object) {
				return createSavitzkyGolayDesignAdapter();
			}
			@Override
			public Adapter caseLagrangeDelayDesign(LagrangeDelayDesign object) {
				return createLagrangeDelayDesignAdapter();
			}
			@Override
			public Adapter caseRaisedCosineDesign(RaisedCosineDesign object) {
				return createRaisedCosineDesignAdapter();
			}
			@Override
			public Adapter caseLeastSquaresDesign(LeastSquaresDesign object) {
				return createLeastSquaresDesignAdapter();
			}
			@Override
			public Adapter caseConstrainedLeastSquaresDesign(ConstrainedLeastSquaresDesign object) {
				return createConstrainedLeastSquaresDesignAdapter();
			}
			@Override
			public Adapter caseLinearProgramDesign(LinearProgramDesign object) {
				return createLinearProgramDesignAdapter();
			}
			@Override
			public Adapter caseHalfBandDesign(HalfBandDesign object) {
				return createHalfBandDesignAdapter();
			}
			@Override
			public Adapter caseCicCompensatorDesign(CicCompensatorDesign object) {
				return createCicCompensatorDesignAdapter();
			}
			@Override
			public Adapter caseCombDesign(CombDesign object) {
				return createCombDesignAdapter();
			}
			@Override
			public Adapter caseMinimumPhaseDesign(MinimumPhaseDesign object) {
				return createMinimumPhaseDesignAdapter();
			}
			@Override
			public Adapter caseComplementDesign(ComplementDesign object) {
				return createComplementDesignAdapter();
			}
			@Override
			public Adapter caseCoefficients(Coefficients object) {
				return createCoefficientsAdapter();
			}
			@Override
			public Adapter caseRealCoefficients(RealCoefficients object) {
				return createRealCoefficientsAdapter();
			}
			@Override
			public Adapter caseIntegerCoefficients(IntegerCoefficients object) {
				return createIntegerCoefficientsAdapter();
			}
			@Override
			public Adapter caseArithmetic(Arithmetic object) {
				return createArithmeticAdapter();
			}
			@Override
			public Adapter caseFormat(Format object) {
				return createFormatAdapter();
			}
			@Override
			public Adapter caseEvidence(Evidence object) {
				return createEvidenceAdapter();
			}
			@Override
			public Adapter caseResult(Result object) {
				return createResultAdapter();
			}
			@Override
			public Adapter caseRevision(Revision object) {
				return createRevisionAdapter();
			}
			@Override
			public Adapter caseBaseline(Baseline object) {
				return createBaselineAdapter();
			}
			@Override
			public Adapter caseBaselineEntry(BaselineEntry object) {
				return createBaselineEntryAdapter();
			}
			@Override
			public Adapter caseSignOff(SignOff object) {
				return createSignOffAdapter();
			}
			@Override
			public Adapter defaultCase(EObject object) {
				return createEObjectAdapter();
			}
		};

	/**
	 * Creates an adapter for the <code>target</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param target the object to adapt.
	 * @return the adapter for the <code>target</code>.
	 * @generated
	 */
	@Override
	public Adapter createAdapter(Notifier target) {
		return modelSwitch.doSwitch((EObject)target);
	}


	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Portfolio <em>Portfolio</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Portfolio
	 * @generated
	 */
	public Adapter createPortfolioAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Parameter <em>Parameter</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Parameter
	 * @generated
	 */
	public Adapter createParameterAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Processor <em>Processor</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Processor
	 * @generated
	 */
	public Adapter createProcessorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.SignalPath <em>Signal Path</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.SignalPath
	 * @generated
	 */
	public Adapter createSignalPathAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Stage <em>Stage</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Stage
	 * @generated
	 */
	public Adapter createStageAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.FilterStage <em>Filter Stage</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.FilterStage
	 * @generated
	 */
	public Adapter createFilterStageAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Decimation <em>Decimation</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Decimation
	 * @generated
	 */
	public Adapter createDecimationAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Expansion <em>Expansion</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Expansion
	 * @generated
	 */
	public Adapter createExpansionAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Filter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Filter
	 * @generated
	 */
	public Adapter createFilterAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Deployment <em>Deployment</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Deployment
	 * @generated
	 */
	public Adapter createDeploymentAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Requirement <em>Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Requirement
	 * @generated
	 */
	public Adapter createRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.LimitPoint <em>Limit Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.LimitPoint
	 * @generated
	 */
	public Adapter createLimitPointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.GainRequirement <em>Gain Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.GainRequirement
	 * @generated
	 */
	public Adapter createGainRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.LinearPhaseRequirement <em>Linear Phase Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.LinearPhaseRequirement
	 * @generated
	 */
	public Adapter createLinearPhaseRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.GroupDelayRequirement <em>Group Delay Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.GroupDelayRequirement
	 * @generated
	 */
	public Adapter createGroupDelayRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.GroupDelayVariationRequirement <em>Group Delay Variation Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.GroupDelayVariationRequirement
	 * @generated
	 */
	public Adapter createGroupDelayVariationRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.BulkDelayRequirement <em>Bulk Delay Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.BulkDelayRequirement
	 * @generated
	 */
	public Adapter createBulkDelayRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.StepOvershootRequirement <em>Step Overshoot Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.StepOvershootRequirement
	 * @generated
	 */
	public Adapter createStepOvershootRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.StepUndershootRequirement <em>Step Undershoot Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.StepUndershootRequirement
	 * @generated
	 */
	public Adapter createStepUndershootRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.StepSettlingRequirement <em>Step Settling Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.StepSettlingRequirement
	 * @generated
	 */
	public Adapter createStepSettlingRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.ImpulseTailRequirement <em>Impulse Tail Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.ImpulseTailRequirement
	 * @generated
	 */
	public Adapter createImpulseTailRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.NullRequirement <em>Null Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.NullRequirement
	 * @generated
	 */
	public Adapter createNullRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.ExactGainRequirement <em>Exact Gain Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.ExactGainRequirement
	 * @generated
	 */
	public Adapter createExactGainRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.NonNegativeAmplitudeRequirement <em>Non Negative Amplitude Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.NonNegativeAmplitudeRequirement
	 * @generated
	 */
	public Adapter createNonNegativeAmplitudeRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.NoOverflowRequirement <em>No Overflow Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.NoOverflowRequirement
	 * @generated
	 */
	public Adapter createNoOverflowRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.OutputNoiseRequirement <em>Output Noise Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.OutputNoiseRequirement
	 * @generated
	 */
	public Adapter createOutputNoiseRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.CoefficientWordRequirement <em>Coefficient Word Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.CoefficientWordRequirement
	 * @generated
	 */
	public Adapter createCoefficientWordRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.TapsRequirement <em>Taps Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.TapsRequirement
	 * @generated
	 */
	public Adapter createTapsRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MultipliesRequirement <em>Multiplies Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MultipliesRequirement
	 * @generated
	 */
	public Adapter createMultipliesRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.AddsRequirement <em>Adds Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.AddsRequirement
	 * @generated
	 */
	public Adapter createAddsRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MemoryRequirement <em>Memory Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MemoryRequirement
	 * @generated
	 */
	public Adapter createMemoryRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MultiplyRateRequirement <em>Multiply Rate Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MultiplyRateRequirement
	 * @generated
	 */
	public Adapter createMultiplyRateRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.AliasRejectionRequirement <em>Alias Rejection Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.AliasRejectionRequirement
	 * @generated
	 */
	public Adapter createAliasRejectionRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.PowerComplementaryRequirement <em>Power Complementary Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.PowerComplementaryRequirement
	 * @generated
	 */
	public Adapter createPowerComplementaryRequirementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Design <em>Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Design
	 * @generated
	 */
	public Adapter createDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.BandDesign <em>Band Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.BandDesign
	 * @generated
	 */
	public Adapter createBandDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.DesignBand <em>Design Band</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.DesignBand
	 * @generated
	 */
	public Adapter createDesignBandAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.GivenDesign <em>Given Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.GivenDesign
	 * @generated
	 */
	public Adapter createGivenDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.WindowDesign <em>Window Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.WindowDesign
	 * @generated
	 */
	public Adapter createWindowDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.EquirippleDesign <em>Equiripple Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.EquirippleDesign
	 * @generated
	 */
	public Adapter createEquirippleDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MovingAverageDesign <em>Moving Average Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MovingAverageDesign
	 * @generated
	 */
	public Adapter createMovingAverageDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.BinomialDesign <em>Binomial Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.BinomialDesign
	 * @generated
	 */
	public Adapter createBinomialDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MaximallyFlatDesign <em>Maximally Flat Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MaximallyFlatDesign
	 * @generated
	 */
	public Adapter createMaximallyFlatDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.SavitzkyGolayDesign <em>Savitzky Golay Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.SavitzkyGolayDesign
	 * @generated
	 */
	public Adapter createSavitzkyGolayDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.LagrangeDelayDesign <em>Lagrange Delay Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.LagrangeDelayDesign
	 * @generated
	 */
	public Adapter createLagrangeDelayDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.RaisedCosineDesign <em>Raised Cosine Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.RaisedCosineDesign
	 * @generated
	 */
	public Adapter createRaisedCosineDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.LeastSquaresDesign <em>Least Squares Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.LeastSquaresDesign
	 * @generated
	 */
	public Adapter createLeastSquaresDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.ConstrainedLeastSquaresDesign <em>Constrained Least Squares Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.ConstrainedLeastSquaresDesign
	 * @generated
	 */
	public Adapter createConstrainedLeastSquaresDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.LinearProgramDesign <em>Linear Program Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.LinearProgramDesign
	 * @generated
	 */
	public Adapter createLinearProgramDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.HalfBandDesign <em>Half Band Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.HalfBandDesign
	 * @generated
	 */
	public Adapter createHalfBandDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.CicCompensatorDesign <em>Cic Compensator Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.CicCompensatorDesign
	 * @generated
	 */
	public Adapter createCicCompensatorDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.CombDesign <em>Comb Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.CombDesign
	 * @generated
	 */
	public Adapter createCombDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.MinimumPhaseDesign <em>Minimum Phase Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.MinimumPhaseDesign
	 * @generated
	 */
	public Adapter createMinimumPhaseDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.ComplementDesign <em>Complement Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.ComplementDesign
	 * @generated
	 */
	public Adapter createComplementDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Coefficients <em>Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Coefficients
	 * @generated
	 */
	public Adapter createCoefficientsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.RealCoefficients <em>Real Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.RealCoefficients
	 * @generated
	 */
	public Adapter createRealCoefficientsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.IntegerCoefficients <em>Integer Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.IntegerCoefficients
	 * @generated
	 */
	public Adapter createIntegerCoefficientsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Arithmetic <em>Arithmetic</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Arithmetic
	 * @generated
	 */
	public Adapter createArithmeticAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Format <em>Format</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Format
	 * @generated
	 */
	public Adapter createFormatAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Evidence <em>Evidence</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Evidence
	 * @generated
	 */
	public Adapter createEvidenceAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Result <em>Result</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Result
	 * @generated
	 */
	public Adapter createResultAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Revision <em>Revision</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Revision
	 * @generated
	 */
	public Adapter createRevisionAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.Baseline <em>Baseline</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.Baseline
	 * @generated
	 */
	public Adapter createBaselineAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.BaselineEntry <em>Baseline Entry</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.BaselineEntry
	 * @generated
	 */
	public Adapter createBaselineEntryAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link tapwright.model.SignOff <em>Sign Off</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see tapwright.model.SignOff
	 * @generated
	 */
	public Adapter createSignOffAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for the default case.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @generated
	 */
	public Adapter createEObjectAdapter() {
		return null;
	}

} //ModelAdapterFactory
