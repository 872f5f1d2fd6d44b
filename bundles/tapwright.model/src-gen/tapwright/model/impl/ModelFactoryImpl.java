/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.impl.EFactoryImpl;

import org.eclipse.emf.ecore.plugin.EcorePlugin;

import tapwright.model.*;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Factory</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class ModelFactoryImpl extends EFactoryImpl implements ModelFactory {
	/**
	 * Creates the default factory implementation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static ModelFactory init() {
		try {
			ModelFactory theModelFactory = (ModelFactory)EPackage.Registry.INSTANCE.getEFactory(ModelPackage.eNS_URI);
			if (theModelFactory != null) {
				return theModelFactory;
			}
		}
		catch (Exception exception) {
			EcorePlugin.INSTANCE.log(exception);
		}
		return new ModelFactoryImpl();
	}

	/**
	 * Creates an instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ModelFactoryImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EObject create(EClass eClass) {
		switch (eClass.getClassifierID()) {
			case ModelPackage.PORTFOLIO: return createPortfolio();
			case ModelPackage.PARAMETER: return createParameter();
			case ModelPackage.PROCESSOR: return createProcessor();
			case ModelPackage.SIGNAL_PATH: return createSignalPath();
			case ModelPackage.FILTER_STAGE: return createFilterStage();
			case ModelPackage.DECIMATION: return createDecimation();
			case ModelPackage.EXPANSION: return createExpansion();
			case ModelPackage.FILTER: return createFilter();
			case ModelPackage.DEPLOYMENT: return createDeployment();
			case ModelPackage.LIMIT_POINT: return createLimitPoint();
			case ModelPackage.GAIN_REQUIREMENT: return createGainRequirement();
			case ModelPackage.LINEAR_PHASE_REQUIREMENT: return createLinearPhaseRequirement();
			case ModelPackage.GROUP_DELAY_REQUIREMENT: return createGroupDelayRequirement();
			case ModelPackage.GROUP_DELAY_VARIATION_REQUIREMENT: return createGroupDelayVariationRequirement();
			case ModelPackage.BULK_DELAY_REQUIREMENT: return createBulkDelayRequirement();
			case ModelPackage.STEP_OVERSHOOT_REQUIREMENT: return createStepOvershootRequirement();
			case ModelPackage.STEP_UNDERSHOOT_REQUIREMENT: return createStepUndershootRequirement();
			case ModelPackage.STEP_SETTLING_REQUIREMENT: return createStepSettlingRequirement();
			case ModelPackage.IMPULSE_TAIL_REQUIREMENT: return createImpulseTailRequirement();
			case ModelPackage.NULL_REQUIREMENT: return createNullRequirement();
			case ModelPackage.EXACT_GAIN_REQUIREMENT: return createExactGainRequirement();
			case ModelPackage.NON_NEGATIVE_AMPLITUDE_REQUIREMENT: return createNonNegativeAmplitudeRequirement();
			case ModelPackage.NO_OVERFLOW_REQUIREMENT: return createNoOverflowRequirement();
			case ModelPackage.OUTPUT_NOISE_REQUIREMENT: return createOutputNoiseRequirement();
			case ModelPackage.COEFFICIENT_WORD_REQUIREMENT: return createCoefficientWordRequirement();
			case ModelPackage.TAPS_REQUIREMENT: return createTapsRequirement();
			case ModelPackage.MULTIPLIES_REQUIREMENT: return createMultipliesRequirement();
			case ModelPackage.ADDS_REQUIREMENT: return createAddsRequirement();
			case ModelPackage.MEMORY_REQUIREMENT: return createMemoryRequirement();
			case ModelPackage.MULTIPLY_RATE_REQUIREMENT: return createMultiplyRateRequirement();
			case ModelPackage.ALIAS_REJECTION_REQUIREMENT: return createAliasRejectionRequirement();
			case ModelPackage.POWER_COMPLEMENTARY_REQUIREMENT: return createPowerComplementaryRequirement();
			case ModelPackage.DESIGN_BAND: return createDesignBand();
			case ModelPackage.GIVEN_DESIGN: return createGivenDesign();
			case ModelPackage.WINDOW_DESIGN: return createWindowDesign();
			case ModelPackage.EQUIRIPPLE_DESIGN: return createEquirippleDesign();
			case ModelPackage.MOVING_AVERAGE_DESIGN: return createMovingAverageDesign();
			case ModelPackage.BINOMIAL_DESIGN: return createBinomialDesign();
			case ModelPackage.MAXIMALLY_FLAT_DESIGN: return createMaximallyFlatDesign();
			case ModelPackage.SAVITZKY_GOLAY_DESIGN: return createSavitzkyGolayDesign();
			case ModelPackage.LAGRANGE_DELAY_DESIGN: return createLagrangeDelayDesign();
			case ModelPackage.RAISED_COSINE_DESIGN: return createRaisedCosineDesign();
			case ModelPackage.LEAST_SQUARES_DESIGN: return createLeastSquaresDesign();
			case ModelPackage.CONSTRAINED_LEAST_SQUARES_DESIGN: return createConstrainedLeastSquaresDesign();
			case ModelPackage.LINEAR_PROGRAM_DESIGN: return createLinearProgramDesign();
			case ModelPackage.HALF_BAND_DESIGN: return createHalfBandDesign();
			case ModelPackage.CIC_COMPENSATOR_DESIGN: return createCicCompensatorDesign();
			case ModelPackage.COMB_DESIGN: return createCombDesign();
			case ModelPackage.MINIMUM_PHASE_DESIGN: return createMinimumPhaseDesign();
			case ModelPackage.COMPLEMENT_DESIGN: return createComplementDesign();
			case ModelPackage.REAL_COEFFICIENTS: return createRealCoefficients();
			case ModelPackage.INTEGER_COEFFICIENTS: return createIntegerCoefficients();
			case ModelPackage.ARITHMETIC: return createArithmetic();
			case ModelPackage.FORMAT: return createFormat();
			case ModelPackage.EVIDENCE: return createEvidence();
			case ModelPackage.RESULT: return createResult();
			case ModelPackage.REVISION: return createRevision();
			case ModelPackage.BASELINE: return createBaseline();
			case ModelPackage.BASELINE_ENTRY: return createBaselineEntry();
			case ModelPackage.SIGN_OFF: return createSignOff();
			default:
				throw new IllegalArgumentException("The class '" + eClass.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object createFromString(EDataType eDataType, String initialValue) {
		switch (eDataType.getClassifierID()) {
			case ModelPackage.SEVERITY:
				return createSeverityFromString(eDataType, initialValue);
			case ModelPackage.UNIT:
				return createUnitFromString(eDataType, initialValue);
			case ModelPackage.SIDE:
				return createSideFromString(eDataType, initialValue);
			case ModelPackage.INTERPOLATION:
				return createInterpolationFromString(eDataType, initialValue);
			case ModelPackage.PHASE_TYPE:
				return createPhaseTypeFromString(eDataType, initialValue);
			case ModelPackage.INPUT_CLASS:
				return createInputClassFromString(eDataType, initialValue);
			case ModelPackage.STRUCTURE:
				return createStructureFromString(eDataType, initialValue);
			case ModelPackage.ROUNDING:
				return createRoundingFromString(eDataType, initialValue);
			case ModelPackage.OVERFLOW:
				return createOverflowFromString(eDataType, initialValue);
			case ModelPackage.VERDICT:
				return createVerdictFromString(eDataType, initialValue);
			case ModelPackage.DECISION:
				return createDecisionFromString(eDataType, initialValue);
			case ModelPackage.WINDOW_KIND:
				return createWindowKindFromString(eDataType, initialValue);
			case ModelPackage.PULSE_GAIN:
				return createPulseGainFromString(eDataType, initialValue);
			case ModelPackage.QUANTITY:
				return createQuantityFromString(eDataType, initialValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String convertToString(EDataType eDataType, Object instanceValue) {
		switch (eDataType.getClassifierID()) {
			case ModelPackage.SEVERITY:
				return convertSeverityToString(eDataType, instanceValue);
			case ModelPackage.UNIT:
				return convertUnitToString(eDataType, instanceValue);
			case ModelPackage.SIDE:
				return convertSideToString(eDataType, instanceValue);
			case ModelPackage.INTERPOLATION:
				return convertInterpolationToString(eDataType, instanceValue);
			case ModelPackage.PHASE_TYPE:
				return convertPhaseTypeToString(eDataType, instanceValue);
			case ModelPackage.INPUT_CLASS:
				return convertInputClassToString(eDataType, instanceValue);
			case ModelPackage.STRUCTURE:
				return convertStructureToString(eDataType, instanceValue);
			case ModelPackage.ROUNDING:
				return convertRoundingToString(eDataType, instanceValue);
			case ModelPackage.OVERFLOW:
				return convertOverflowToString(eDataType, instanceValue);
			case ModelPackage.VERDICT:
				return convertVerdictToString(eDataType, instanceValue);
			case ModelPackage.DECISION:
				return convertDecisionToString(eDataType, instanceValue);
			case ModelPackage.WINDOW_KIND:
				return convertWindowKindToString(eDataType, instanceValue);
			case ModelPackage.PULSE_GAIN:
				return convertPulseGainToString(eDataType, instanceValue);
			case ModelPackage.QUANTITY:
				return convertQuantityToString(eDataType, instanceValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Portfolio createPortfolio() {
		PortfolioImpl portfolio = new PortfolioImpl();
		return portfolio;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Parameter createParameter() {
		ParameterImpl parameter = new ParameterImpl();
		return parameter;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Processor createProcessor() {
		ProcessorImpl processor = new ProcessorImpl();
		return processor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SignalPath createSignalPath() {
		SignalPathImpl signalPath = new SignalPathImpl();
		return signalPath;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FilterStage createFilterStage() {
		FilterStageImpl filterStage = new FilterStageImpl();
		return filterStage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Decimation createDecimation() {
		DecimationImpl decimation = new DecimationImpl();
		return decimation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Expansion createExpansion() {
		ExpansionImpl expansion = new ExpansionImpl();
		return expansion;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Filter createFilter() {
		FilterImpl filter = new FilterImpl();
		return filter;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Deployment createDeployment() {
		DeploymentImpl deployment = new DeploymentImpl();
		return deployment;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LimitPoint createLimitPoint() {
		LimitPointImpl limitPoint = new LimitPointImpl();
		return limitPoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GainRequirement createGainRequirement() {
		GainRequirementImpl gainRequirement = new GainRequirementImpl();
		return gainRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LinearPhaseRequirement createLinearPhaseRequirement() {
		LinearPhaseRequirementImpl linearPhaseRequirement = new LinearPhaseRequirementImpl();
		return linearPhaseRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GroupDelayRequirement createGroupDelayRequirement() {
		GroupDelayRequirementImpl groupDelayRequirement = new GroupDelayRequirementImpl();
		return groupDelayRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GroupDelayVariationRequirement createGroupDelayVariationRequirement() {
		GroupDelayVariationRequirementImpl groupDelayVariationRequirement = new GroupDelayVariationRequirementImpl();
		return groupDelayVariationRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public BulkDelayRequirement createBulkDelayRequirement() {
		BulkDelayRequirementImpl bulkDelayRequirement = new BulkDelayRequirementImpl();
		return bulkDelayRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StepOvershootRequirement createStepOvershootRequirement() {
		StepOvershootRequirementImpl stepOvershootRequirement = new StepOvershootRequirementImpl();
		return stepOvershootRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StepUndershootRequirement createStepUndershootRequirement() {
		StepUndershootRequirementImpl stepUndershootRequirement = new StepUndershootRequirementImpl();
		return stepUndershootRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StepSettlingRequirement createStepSettlingRequirement() {
		StepSettlingRequirementImpl stepSettlingRequirement = new StepSettlingRequirementImpl();
		return stepSettlingRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ImpulseTailRequirement createImpulseTailRequirement() {
		ImpulseTailRequirementImpl impulseTailRequirement = new ImpulseTailRequirementImpl();
		return impulseTailRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NullRequirement createNullRequirement() {
		NullRequirementImpl nullRequirement = new NullRequirementImpl();
		return nullRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ExactGainRequirement createExactGainRequirement() {
		ExactGainRequirementImpl exactGainRequirement = new ExactGainRequirementImpl();
		return exactGainRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NonNegativeAmplitudeRequirement createNonNegativeAmplitudeRequirement() {
		NonNegativeAmplitudeRequirementImpl nonNegativeAmplitudeRequirement = new NonNegativeAmplitudeRequirementImpl();
		return nonNegativeAmplitudeRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NoOverflowRequirement createNoOverflowRequirement() {
		NoOverflowRequirementImpl noOverflowRequirement = new NoOverflowRequirementImpl();
		return noOverflowRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public OutputNoiseRequirement createOutputNoiseRequirement() {
		OutputNoiseRequirementImpl outputNoiseRequirement = new OutputNoiseRequirementImpl();
		return outputNoiseRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CoefficientWordRequirement createCoefficientWordRequirement() {
		CoefficientWordRequirementImpl coefficientWordRequirement = new CoefficientWordRequirementImpl();
		return coefficientWordRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public TapsRequirement createTapsRequirement() {
		TapsRequirementImpl tapsRequirement = new TapsRequirementImpl();
		return tapsRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MultipliesRequirement createMultipliesRequirement() {
		MultipliesRequirementImpl multipliesRequirement = new MultipliesRequirementImpl();
		return multipliesRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AddsRequirement createAddsRequirement() {
		AddsRequirementImpl addsRequirement = new AddsRequirementImpl();
		return addsRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MemoryRequirement createMemoryRequirement() {
		MemoryRequirementImpl memoryRequirement = new MemoryRequirementImpl();
		return memoryRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MultiplyRateRequirement createMultiplyRateRequirement() {
		MultiplyRateRequirementImpl multiplyRateRequirement = new MultiplyRateRequirementImpl();
		return multiplyRateRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AliasRejectionRequirement createAliasRejectionRequirement() {
		AliasRejectionRequirementImpl aliasRejectionRequirement = new AliasRejectionRequirementImpl();
		return aliasRejectionRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public PowerComplementaryRequirement createPowerComplementaryRequirement() {
		PowerComplementaryRequirementImpl powerComplementaryRequirement = new PowerComplementaryRequirementImpl();
		return powerComplementaryRequirement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public DesignBand createDesignBand() {
		DesignBandImpl designBand = new DesignBandImpl();
		return designBand;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GivenDesign createGivenDesign() {
		GivenDesignImpl givenDesign = new GivenDesignImpl();
		return givenDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public WindowDesign createWindowDesign() {
		WindowDesignImpl windowDesign = new WindowDesignImpl();
		return windowDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EquirippleDesign createEquirippleDesign() {
		EquirippleDesignImpl equirippleDesign = new EquirippleDesignImpl();
		return equirippleDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MovingAverageDesign createMovingAverageDesign() {
		MovingAverageDesignImpl movingAverageDesign = new MovingAverageDesignImpl();
		return movingAverageDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public BinomialDesign createBinomialDesign() {
		BinomialDesignImpl binomialDesign = new BinomialDesignImpl();
		return binomialDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MaximallyFlatDesign createMaximallyFlatDesign() {
		MaximallyFlatDesignImpl maximallyFlatDesign = new MaximallyFlatDesignImpl();
		return maximallyFlatDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SavitzkyGolayDesign createSavitzkyGolayDesign() {
		SavitzkyGolayDesignImpl savitzkyGolayDesign = new SavitzkyGolayDesignImpl();
		return savitzkyGolayDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LagrangeDelayDesign createLagrangeDelayDesign() {
		LagrangeDelayDesignImpl lagrangeDelayDesign = new LagrangeDelayDesignImpl();
		return lagrangeDelayDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public RaisedCosineDesign createRaisedCosineDesign() {
		RaisedCosineDesignImpl raisedCosineDesign = new RaisedCosineDesignImpl();
		return raisedCosineDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LeastSquaresDesign createLeastSquaresDesign() {
		LeastSquaresDesignImpl leastSquaresDesign = new LeastSquaresDesignImpl();
		return leastSquaresDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ConstrainedLeastSquaresDesign createConstrainedLeastSquaresDesign() {
		ConstrainedLeastSquaresDesignImpl constrainedLeastSquaresDesign = new ConstrainedLeastSquaresDesignImpl();
		return constrainedLeastSquaresDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LinearProgramDesign createLinearProgramDesign() {
		LinearProgramDesignImpl linearProgramDesign = new LinearProgramDesignImpl();
		return linearProgramDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public HalfBandDesign createHalfBandDesign() {
		HalfBandDesignImpl halfBandDesign = new HalfBandDesignImpl();
		return halfBandDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CicCompensatorDesign createCicCompensatorDesign() {
		CicCompensatorDesignImpl cicCompensatorDesign = new CicCompensatorDesignImpl();
		return cicCompensatorDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CombDesign createCombDesign() {
		CombDesignImpl combDesign = new CombDesignImpl();
		return combDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MinimumPhaseDesign createMinimumPhaseDesign() {
		MinimumPhaseDesignImpl minimumPhaseDesign = new MinimumPhaseDesignImpl();
		return minimumPhaseDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ComplementDesign createComplementDesign() {
		ComplementDesignImpl complementDesign = new ComplementDesignImpl();
		return complementDesign;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public RealCoefficients createRealCoefficients() {
		RealCoefficientsImpl realCoefficients = new RealCoefficientsImpl();
		return realCoefficients;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public IntegerCoefficients createIntegerCoefficients() {
		IntegerCoefficientsImpl integerCoefficients = new IntegerCoefficientsImpl();
		return integerCoefficients;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Arithmetic createArithmetic() {
		ArithmeticImpl arithmetic = new ArithmeticImpl();
		return arithmetic;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Format createFormat() {
		FormatImpl format = new FormatImpl();
		return format;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Evidence createEvidence() {
		EvidenceImpl evidence = new EvidenceImpl();
		return evidence;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Result createResult() {
		ResultImpl result = new ResultImpl();
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Revision createRevision() {
		RevisionImpl revision = new RevisionImpl();
		return revision;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Baseline createBaseline() {
		BaselineImpl baseline = new BaselineImpl();
		return baseline;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public BaselineEntry createBaselineEntry() {
		BaselineEntryImpl baselineEntry = new BaselineEntryImpl();
		return baselineEntry;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SignOff createSignOff() {
		SignOffImpl signOff = new SignOffImpl();
		return signOff;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Severity createSeverityFromString(EDataType eDataType, String initialValue) {
		Severity result = Severity.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertSeverityToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Unit createUnitFromString(EDataType eDataType, String initialValue) {
		Unit result = Unit.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertUnitToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Side createSideFromString(EDataType eDataType, String initialValue) {
		Side result = Side.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertSideToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Interpolation createInterpolationFromString(EDataType eDataType, String initialValue) {
		Interpolation result = Interpolation.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertInterpolationToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public PhaseType createPhaseTypeFromString(EDataType eDataType, String initialValue) {
		PhaseType result = PhaseType.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertPhaseTypeToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public InputClass createInputClassFromString(EDataType eDataType, String initialValue) {
		InputClass result = InputClass.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertInputClassToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Structure createStructureFromString(EDataType eDataType, String initialValue) {
		Structure result = Structure.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertStructureToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Rounding createRoundingFromString(EDataType eDataType, String initialValue) {
		Rounding result = Rounding.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertRoundingToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Overflow createOverflowFromString(EDataType eDataType, String initialValue) {
		Overflow result = Overflow.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertOverflowToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Verdict createVerdictFromString(EDataType eDataType, String initialValue) {
		Verdict result = Verdict.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertVerdictToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Decision createDecisionFromString(EDataType eDataType, String initialValue) {
		Decision result = Decision.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDecisionToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public WindowKind createWindowKindFromString(EDataType eDataType, String initialValue) {
		WindowKind result = WindowKind.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertWindowKindToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public PulseGain createPulseGainFromString(EDataType eDataType, String initialValue) {
		PulseGain result = PulseGain.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertPulseGainToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String createQuantityFromString(EDataType eDataType, String initialValue) {
		return (String)super.createFromString(eDataType, initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertQuantityToString(EDataType eDataType, Object instanceValue) {
		return super.convertToString(eDataType, instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ModelPackage getModelPackage() {
		return (ModelPackage)getEPackage();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @deprecated
	 * @generated
	 */
	@Deprecated
	public static ModelPackage getPackage() {
		return ModelPackage.eINSTANCE;
	}

} //ModelFactoryImpl
