/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

import org.eclipse.emf.ecore.impl.EPackageImpl;

import tapwright.model.AddsRequirement;
import tapwright.model.AliasRejectionRequirement;
import tapwright.model.Arithmetic;
import tapwright.model.BandDesign;
import tapwright.model.Baseline;
import tapwright.model.BaselineEntry;
import tapwright.model.BinomialDesign;
import tapwright.model.BulkDelayRequirement;
import tapwright.model.CicCompensatorDesign;
import tapwright.model.CoefficientWordRequirement;
import tapwright.model.Coefficients;
import tapwright.model.CombDesign;
import tapwright.model.ComplementDesign;
import tapwright.model.ConstrainedLeastSquaresDesign;
import tapwright.model.Decimation;
import tapwright.model.Decision;
import tapwright.model.Deployment;
import tapwright.model.Design;
import tapwright.model.DesignBand;
import tapwright.model.EquirippleDesign;
import tapwright.model.Evidence;
import tapwright.model.ExactGainRequirement;
import tapwright.model.Expansion;
import tapwright.model.Filter;
import tapwright.model.FilterStage;
import tapwright.model.Format;
import tapwright.model.GainRequirement;
import tapwright.model.GivenDesign;
import tapwright.model.GroupDelayRequirement;
import tapwright.model.GroupDelayVariationRequirement;
import tapwright.model.HalfBandDesign;
import tapwright.model.ImpulseTailRequirement;
import tapwright.model.InputClass;
import tapwright.model.IntegerCoefficients;
import tapwright.model.Interpolation;
import tapwright.model.LagrangeDelayDesign;
import tapwright.model.LeastSquaresDesign;
import tapwright.model.LimitPoint;
import tapwright.model.LinearPhaseRequirement;
import tapwright.model.LinearProgramDesign;
import tapwright.model.MaximallyFlatDesign;
import tapwright.model.MemoryRequirement;
import tapwright.model.MinimumPhaseDesign;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;
import tapwright.model.MovingAverageDesign;
import tapwright.model.MultipliesRequirement;
import tapwright.model.MultiplyRateRequirement;
import tapwright.model.NoOverflowRequirement;
import tapwright.model.NonNegativeAmplitudeRequirement;
import tapwright.model.NullRequirement;
import tapwright.model.OutputNoiseRequirement;
import tapwright.model.Overflow;
import tapwright.model.Parameter;
import tapwright.model.PhaseType;
import tapwright.model.Portfolio;
import tapwright.model.PowerComplementaryRequirement;
import tapwright.model.Processor;
import tapwright.model.PulseGain;
import tapwright.model.RaisedCosineDesign;
import tapwright.model.RealCoefficients;
import tapwright.model.Requirement;
import tapwright.model.Result;
import tapwright.model.Revision;
import tapwright.model.Rounding;
import tapwright.model.SavitzkyGolayDesign;
import tapwright.model.Severity;
import tapwright.model.Side;
import tapwright.model.SignOff;
import tapwright.model.SignalPath;
import tapwright.model.Stage;
import tapwright.model.StepOvershootRequirement;
import tapwright.model.StepSettlingRequirement;
import tapwright.model.StepUndershootRequirement;
import tapwright.model.Structure;
import tapwright.model.TapsRequirement;
import tapwright.model.Unit;
import tapwright.model.Verdict;
import tapwright.model.WindowDesign;
import tapwright.model.WindowKind;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Package</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class ModelPackageImpl extends EPackageImpl implements ModelPackage {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass portfolioEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass parameterEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass processorEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass signalPathEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stageEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass filterStageEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass decimationEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass expansionEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass filterEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass deploymentEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass requirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass limitPointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass gainRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass linearPhaseRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass groupDelayRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass groupDelayVariationRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass bulkDelayRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stepOvershootRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stepUndershootRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stepSettlingRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass impulseTailRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass nullRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass exactGainRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass nonNegativeAmplitudeRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass noOverflowRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass outputNoiseRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass coefficientWordRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass tapsRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass multipliesRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass addsRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass memoryRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass multiplyRateRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass aliasRejectionRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass powerComplementaryRequirementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass designEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass bandDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass designBandEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass givenDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass windowDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass equirippleDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass movingAverageDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass binomialDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass maximallyFlatDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass savitzkyGolayDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass lagrangeDelayDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass raisedCosineDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass leastSquaresDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass constrainedLeastSquaresDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass linearProgramDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass halfBandDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass cicCompensatorDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass combDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass minimumPhaseDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass complementDesignEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass coefficientsEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass realCoefficientsEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass integerCoefficientsEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass arithmeticEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass formatEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass evidenceEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass resultEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass revisionEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass baselineEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass baselineEntryEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass signOffEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum severityEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum unitEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum sideEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum interpolationEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum phaseTypeEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum inputClassEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum structureEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum roundingEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum overflowEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum verdictEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum decisionEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum windowKindEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum pulseGainEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType quantityEDataType = null;

	/**
	 * Creates an instance of the model <b>Package</b>, registered with
	 * {@link org.eclipse.emf.ecore.EPackage.Registry EPackage.Registry} by the package
	 * package URI value.
	 * <p>Note: the correct way to create the package is via the static
	 * factory method {@link #init init()}, which also performs
	 * initialization of the package, or returns the registered package,
	 * if one already exists.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.eclipse.emf.ecore.EPackage.Registry
	 * @see tapwright.model.ModelPackage#eNS_URI
	 * @see #init()
	 * @generated
	 */
	private ModelPackageImpl() {
		super(eNS_URI, ModelFactory.eINSTANCE);
	}
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static boolean isInited = false;

	/**
	 * Creates, registers, and initializes the <b>Package</b> for this model, and for any others upon which it depends.
	 *
	 * <p>This method is used to initialize {@link ModelPackage#eINSTANCE} when that field is accessed.
	 * Clients should not invoke it directly. Instead, they should simply access that field to obtain the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #eNS_URI
	 * @see #createPackageContents()
	 * @see #initializePackageContents()
	 * @generated
	 */
	public static ModelPackage init() {
		if (isInited) return (ModelPackage)EPackage.Registry.INSTANCE.getEPackage(ModelPackage.eNS_URI);

		// Obtain or create and register package
		Object registeredModelPackage = EPackage.Registry.INSTANCE.get(eNS_URI);
		ModelPackageImpl theModelPackage = registeredModelPackage instanceof ModelPackageImpl ? (ModelPackageImpl)registeredModelPackage : new ModelPackageImpl();

		isInited = true;

		// Create package meta-data objects
		theModelPackage.createPackageContents();

		// Initialize created meta-data
		theModelPackage.initializePackageContents();

		// Mark meta-data to indicate it can't be changed
		theModelPackage.freeze();

		// Update the registry and return the package
		EPackage.Registry.INSTANCE.put(ModelPackage.eNS_URI, theModelPackage);
		return theModelPackage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPortfolio() {
		return portfolioEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPortfolio_Name() {
		return (EAttribute)portfolioEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPortfolio_Description() {
		return (EAttribute)portfolioEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPortfolio_Erosion() {
		return (EAttribute)portfolioEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPortfolio_ActiveBaseline() {
		return (EAttribute)portfolioEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getPortfolio_Parameters() {
		return (EReference)portfolioEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getPortfolio_Processors() {
		return (EReference)portfolioEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getPortfolio_Paths() {
		return (EReference)portfolioEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getParameter() {
		return parameterEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getParameter_Name() {
		return (EAttribute)parameterEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getParameter_Value() {
		return (EAttribute)parameterEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getParameter_Unit() {
		return (EAttribute)parameterEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getParameter_Description() {
		return (EAttribute)parameterEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getProcessor() {
		return processorEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_Name() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_Description() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_MacRate() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_Word() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_Accumulator() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_CoefficientMemory() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProcessor_DelayMemory() {
		return (EAttribute)processorEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSignalPath() {
		return signalPathEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignalPath_Name() {
		return (EAttribute)signalPathEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignalPath_Description() {
		return (EAttribute)signalPathEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignalPath_SampleRate() {
		return (EAttribute)signalPathEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getSignalPath_Stages() {
		return (EReference)signalPathEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getSignalPath_Requirements() {
		return (EReference)signalPathEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStage() {
		return stageEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getFilterStage() {
		return filterStageEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFilterStage_Filter() {
		return (EAttribute)filterStageEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDecimation() {
		return decimationEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDecimation_Factor() {
		return (EAttribute)decimationEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getExpansion() {
		return expansionEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getExpansion_Factor() {
		return (EAttribute)expansionEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getFilter() {
		return filterEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFilter_Name() {
		return (EAttribute)filterEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFilter_Identity() {
		return (EAttribute)filterEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFilter_Purpose() {
		return (EAttribute)filterEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFilter_SampleRate() {
		return (EAttribute)filterEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getFilter_Requirements() {
		return (EReference)filterEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getFilter_Design() {
		return (EReference)filterEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getFilter_Coefficients() {
		return (EReference)filterEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getFilter_Arithmetic() {
		return (EReference)filterEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getFilter_Deployments() {
		return (EReference)filterEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDeployment() {
		return deploymentEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDeployment_Processor() {
		return (EAttribute)deploymentEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDeployment_Channels() {
		return (EAttribute)deploymentEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDeployment_Copies() {
		return (EAttribute)deploymentEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDeployment_InputRate() {
		return (EAttribute)deploymentEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getRequirement() {
		return requirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRequirement_Id() {
		return (EAttribute)requirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRequirement_Severity() {
		return (EAttribute)requirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRequirement_Note() {
		return (EAttribute)requirementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRequirement_ClockTolerance() {
		return (EAttribute)requirementEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLimitPoint() {
		return limitPointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLimitPoint_Frequency() {
		return (EAttribute)limitPointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLimitPoint_Level() {
		return (EAttribute)limitPointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGainRequirement() {
		return gainRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_From() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_To() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_Min() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_Max() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getGainRequirement_Points() {
		return (EReference)gainRequirementEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_Side() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_Interpolate() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_ReferenceAt() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_ReferenceFrom() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGainRequirement_ReferenceTo() {
		return (EAttribute)gainRequirementEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLinearPhaseRequirement() {
		return linearPhaseRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLinearPhaseRequirement_Type() {
		return (EAttribute)linearPhaseRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGroupDelayRequirement() {
		return groupDelayRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayRequirement_From() {
		return (EAttribute)groupDelayRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayRequirement_To() {
		return (EAttribute)groupDelayRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayRequirement_Min() {
		return (EAttribute)groupDelayRequirementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayRequirement_Max() {
		return (EAttribute)groupDelayRequirementEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGroupDelayVariationRequirement() {
		return groupDelayVariationRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayVariationRequirement_From() {
		return (EAttribute)groupDelayVariationRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayVariationRequirement_To() {
		return (EAttribute)groupDelayVariationRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroupDelayVariationRequirement_Max() {
		return (EAttribute)groupDelayVariationRequirementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getBulkDelayRequirement() {
		return bulkDelayRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBulkDelayRequirement_Min() {
		return (EAttribute)bulkDelayRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBulkDelayRequirement_Max() {
		return (EAttribute)bulkDelayRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStepOvershootRequirement() {
		return stepOvershootRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStepOvershootRequirement_Max() {
		return (EAttribute)stepOvershootRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStepUndershootRequirement() {
		return stepUndershootRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStepUndershootRequirement_Max() {
		return (EAttribute)stepUndershootRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStepSettlingRequirement() {
		return stepSettlingRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStepSettlingRequirement_Within() {
		return (EAttribute)stepSettlingRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStepSettlingRequirement_Max() {
		return (EAttribute)stepSettlingRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getImpulseTailRequirement() {
		return impulseTailRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getImpulseTailRequirement_After() {
		return (EAttribute)impulseTailRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getImpulseTailRequirement_Max() {
		return (EAttribute)impulseTailRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getNullRequirement() {
		return nullRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getNullRequirement_At() {
		return (EAttribute)nullRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getExactGainRequirement() {
		return exactGainRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getExactGainRequirement_At() {
		return (EAttribute)exactGainRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getExactGainRequirement_Value() {
		return (EAttribute)exactGainRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getNonNegativeAmplitudeRequirement() {
		return nonNegativeAmplitudeRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getNoOverflowRequirement() {
		return noOverflowRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getNoOverflowRequirement_Input() {
		return (EAttribute)noOverflowRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getOutputNoiseRequirement() {
		return outputNoiseRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getOutputNoiseRequirement_Max() {
		return (EAttribute)outputNoiseRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCoefficientWordRequirement() {
		return coefficientWordRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCoefficientWordRequirement_Max() {
		return (EAttribute)coefficientWordRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getTapsRequirement() {
		return tapsRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getTapsRequirement_Max() {
		return (EAttribute)tapsRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMultipliesRequirement() {
		return multipliesRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMultipliesRequirement_Max() {
		return (EAttribute)multipliesRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getAddsRequirement() {
		return addsRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAddsRequirement_Max() {
		return (EAttribute)addsRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMemoryRequirement() {
		return memoryRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMemoryRequirement_Max() {
		return (EAttribute)memoryRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMultiplyRateRequirement() {
		return multiplyRateRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMultiplyRateRequirement_Max() {
		return (EAttribute)multiplyRateRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getAliasRejectionRequirement() {
		return aliasRejectionRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAliasRejectionRequirement_Factor() {
		return (EAttribute)aliasRejectionRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAliasRejectionRequirement_To() {
		return (EAttribute)aliasRejectionRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAliasRejectionRequirement_Min() {
		return (EAttribute)aliasRejectionRequirementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPowerComplementaryRequirement() {
		return powerComplementaryRequirementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPowerComplementaryRequirement_Partner() {
		return (EAttribute)powerComplementaryRequirementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPowerComplementaryRequirement_Max() {
		return (EAttribute)powerComplementaryRequirementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDesign() {
		return designEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getBandDesign() {
		return bandDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBandDesign_Taps() {
		return (EAttribute)bandDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getBandDesign_Bands() {
		return (EReference)bandDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDesignBand() {
		return designBandEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_From() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_To() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_Desired() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_DesiredTo() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_Weight() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesignBand_WeightTo() {
		return (EAttribute)designBandEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGivenDesign() {
		return givenDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGivenDesign_Source() {
		return (EAttribute)givenDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getWindowDesign() {
		return windowDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindowDesign_Window() {
		return (EAttribute)windowDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindowDesign_Parameter() {
		return (EAttribute)windowDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getEquirippleDesign() {
		return equirippleDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEquirippleDesign_Type() {
		return (EAttribute)equirippleDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEquirippleDesign_Tolerance() {
		return (EAttribute)equirippleDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMovingAverageDesign() {
		return movingAverageDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMovingAverageDesign_Taps() {
		return (EAttribute)movingAverageDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMovingAverageDesign_Sections() {
		return (EAttribute)movingAverageDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getBinomialDesign() {
		return binomialDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBinomialDesign_Order() {
		return (EAttribute)binomialDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMaximallyFlatDesign() {
		return maximallyFlatDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaximallyFlatDesign_Flatness() {
		return (EAttribute)maximallyFlatDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaximallyFlatDesign_Zeros() {
		return (EAttribute)maximallyFlatDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSavitzkyGolayDesign() {
		return savitzkyGolayDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSavitzkyGolayDesign_Points() {
		return (EAttribute)savitzkyGolayDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSavitzkyGolayDesign_Degree() {
		return (EAttribute)savitzkyGolayDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSavitzkyGolayDesign_Derivative() {
		return (EAttribute)savitzkyGolayDesignEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSavitzkyGolayDesign_Position() {
		return (EAttribute)savitzkyGolayDesignEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLagrangeDelayDesign() {
		return lagrangeDelayDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLagrangeDelayDesign_Order() {
		return (EAttribute)lagrangeDelayDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLagrangeDelayDesign_Delay() {
		return (EAttribute)lagrangeDelayDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getRaisedCosineDesign() {
		return raisedCosineDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRaisedCosineDesign_RollOff() {
		return (EAttribute)raisedCosineDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRaisedCosineDesign_SamplesPerSymbol() {
		return (EAttribute)raisedCosineDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRaisedCosineDesign_Symbols() {
		return (EAttribute)raisedCosineDesignEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRaisedCosineDesign_Root() {
		return (EAttribute)raisedCosineDesignEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRaisedCosineDesign_Gain() {
		return (EAttribute)raisedCosineDesignEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLeastSquaresDesign() {
		return leastSquaresDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeastSquaresDesign_Type() {
		return (EAttribute)leastSquaresDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getConstrainedLeastSquaresDesign() {
		return constrainedLeastSquaresDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConstrainedLeastSquaresDesign_Type() {
		return (EAttribute)constrainedLeastSquaresDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLinearProgramDesign() {
		return linearProgramDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLinearProgramDesign_Monotone() {
		return (EAttribute)linearProgramDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getHalfBandDesign() {
		return halfBandDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getHalfBandDesign_Taps() {
		return (EAttribute)halfBandDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getHalfBandDesign_PassEdge() {
		return (EAttribute)halfBandDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getHalfBandDesign_Hilbert() {
		return (EAttribute)halfBandDesignEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCicCompensatorDesign() {
		return cicCompensatorDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_Taps() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_Sections() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_Rate() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_PassEdge() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_StopEdge() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCicCompensatorDesign_StopWeight() {
		return (EAttribute)cicCompensatorDesignEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCombDesign() {
		return combDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCombDesign_Period() {
		return (EAttribute)combDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCombDesign_Difference() {
		return (EAttribute)combDesignEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMinimumPhaseDesign() {
		return minimumPhaseDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMinimumPhaseDesign_Prototype() {
		return (EReference)minimumPhaseDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getComplementDesign() {
		return complementDesignEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getComplementDesign_Prototype() {
		return (EReference)complementDesignEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCoefficients() {
		return coefficientsEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCoefficients_DesignHash() {
		return (EAttribute)coefficientsEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getRealCoefficients() {
		return realCoefficientsEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRealCoefficients_Values() {
		return (EAttribute)realCoefficientsEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getIntegerCoefficients() {
		return integerCoefficientsEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getIntegerCoefficients_Integers() {
		return (EAttribute)integerCoefficientsEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getIntegerCoefficients_Scale() {
		return (EAttribute)integerCoefficientsEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getArithmetic() {
		return arithmeticEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArithmetic_Structure() {
		return (EAttribute)arithmeticEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArithmetic_Factor() {
		return (EAttribute)arithmeticEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getArithmetic_Coefficient() {
		return (EReference)arithmeticEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getArithmetic_Input() {
		return (EReference)arithmeticEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getArithmetic_Product() {
		return (EReference)arithmeticEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getArithmetic_Accumulator() {
		return (EReference)arithmeticEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getArithmetic_Output() {
		return (EReference)arithmeticEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArithmetic_Rounding() {
		return (EAttribute)arithmeticEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArithmetic_Overflow() {
		return (EAttribute)arithmeticEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getFormat() {
		return formatEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFormat_Word() {
		return (EAttribute)formatEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFormat_Fraction() {
		return (EAttribute)formatEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFormat_Signed() {
		return (EAttribute)formatEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getEvidence() {
		return evidenceEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEvidence_Tool() {
		return (EAttribute)evidenceEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEvidence_Verdict() {
		return (EAttribute)evidenceEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getEvidence_Results() {
		return (EReference)evidenceEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getResult() {
		return resultEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_Requirement() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_Kind() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_Verdict() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_Worst() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_ValueLow() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_ValueHigh() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_Limit() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_MarginLow() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getResult_MarginHigh() {
		return (EAttribute)resultEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getRevision() {
		return revisionEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRevision_Parents() {
		return (EAttribute)revisionEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRevision_Author() {
		return (EAttribute)revisionEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRevision_Email() {
		return (EAttribute)revisionEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRevision_Time() {
		return (EAttribute)revisionEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRevision_Message() {
		return (EAttribute)revisionEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getRevision_Parameters() {
		return (EReference)revisionEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getRevision_Filter() {
		return (EReference)revisionEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getRevision_Evidence() {
		return (EReference)revisionEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getBaseline() {
		return baselineEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaseline_Name() {
		return (EAttribute)baselineEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaseline_Author() {
		return (EAttribute)baselineEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaseline_Email() {
		return (EAttribute)baselineEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaseline_Time() {
		return (EAttribute)baselineEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaseline_Message() {
		return (EAttribute)baselineEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getBaseline_Entries() {
		return (EReference)baselineEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getBaselineEntry() {
		return baselineEntryEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaselineEntry_Filter() {
		return (EAttribute)baselineEntryEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaselineEntry_Identity() {
		return (EAttribute)baselineEntryEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getBaselineEntry_Revision() {
		return (EAttribute)baselineEntryEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSignOff() {
		return signOffEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Filter() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Revision() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Reviewer() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Email() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Time() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Decision() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSignOff_Comment() {
		return (EAttribute)signOffEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getSeverity() {
		return severityEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getUnit() {
		return unitEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getSide() {
		return sideEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getInterpolation() {
		return interpolationEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getPhaseType() {
		return phaseTypeEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getInputClass() {
		return inputClassEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getStructure() {
		return structureEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getRounding() {
		return roundingEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getOverflow() {
		return overflowEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getVerdict() {
		return verdictEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getDecision() {
		return decisionEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getWindowKind() {
		return windowKindEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getPulseGain() {
		return pulseGainEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getQuantity() {
		return quantityEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ModelFactory getModelFactory() {
		return (ModelFactory)getEFactoryInstance();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isCreated = false;

	/**
	 * Creates the meta-model objects for the package.  This method is
	 * guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void createPackageContents() {
		if (isCreated) return;
		isCreated = true;

		// Create classes and their features
		portfolioEClass = createEClass(PORTFOLIO);
		createEAttribute(portfolioEClass, PORTFOLIO__NAME);
		createEAttribute(portfolioEClass, PORTFOLIO__DESCRIPTION);
		createEAttribute(portfolioEClass, PORTFOLIO__EROSION);
		createEAttribute(portfolioEClass, PORTFOLIO__ACTIVE_BASELINE);
		createEReference(portfolioEClass, PORTFOLIO__PARAMETERS);
		createEReference(portfolioEClass, PORTFOLIO__PROCESSORS);
		createEReference(portfolioEClass, PORTFOLIO__PATHS);

		parameterEClass = createEClass(PARAMETER);
		createEAttribute(parameterEClass, PARAMETER__NAME);
		createEAttribute(parameterEClass, PARAMETER__VALUE);
		createEAttribute(parameterEClass, PARAMETER__UNIT);
		createEAttribute(parameterEClass, PARAMETER__DESCRIPTION);

		processorEClass = createEClass(PROCESSOR);
		createEAttribute(processorEClass, PROCESSOR__NAME);
		createEAttribute(processorEClass, PROCESSOR__DESCRIPTION);
		createEAttribute(processorEClass, PROCESSOR__MAC_RATE);
		createEAttribute(processorEClass, PROCESSOR__WORD);
		createEAttribute(processorEClass, PROCESSOR__ACCUMULATOR);
		createEAttribute(processorEClass, PROCESSOR__COEFFICIENT_MEMORY);
		createEAttribute(processorEClass, PROCESSOR__DELAY_MEMORY);

		signalPathEClass = createEClass(SIGNAL_PATH);
		createEAttribute(signalPathEClass, SIGNAL_PATH__NAME);
		createEAttribute(signalPathEClass, SIGNAL_PATH__DESCRIPTION);
		createEAttribute(signalPathEClass, SIGNAL_PATH__SAMPLE_RATE);
		createEReference(signalPathEClass, SIGNAL_PATH__STAGES);
		createEReference(signalPathEClass, SIGNAL_PATH__REQUIREMENTS);

		stageEClass = createEClass(STAGE);

		filterStageEClass = createEClass(FILTER_STAGE);
		createEAttribute(filterStageEClass, FILTER_STAGE__FILTER);

		decimationEClass = createEClass(DECIMATION);
		createEAttribute(decimationEClass, DECIMATION__FACTOR);

		expansionEClass = createEClass(EXPANSION);
		createEAttribute(expansionEClass, EXPANSION__FACTOR);

		filterEClass = createEClass(FILTER);
		createEAttribute(filterEClass, FILTER__NAME);
		createEAttribute(filterEClass, FILTER__IDENTITY);
		createEAttribute(filterEClass, FILTER__PURPOSE);
		createEAttribute(filterEClass, FILTER__SAMPLE_RATE);
		createEReference(filterEClass, FILTER__REQUIREMENTS);
		createEReference(filterEClass, FILTER__DESIGN);
		createEReference(filterEClass, FILTER__COEFFICIENTS);
		createEReference(filterEClass, FILTER__ARITHMETIC);
		createEReference(filterEClass, FILTER__DEPLOYMENTS);

		deploymentEClass = createEClass(DEPLOYMENT);
		createEAttribute(deploymentEClass, DEPLOYMENT__PROCESSOR);
		createEAttribute(deploymentEClass, DEPLOYMENT__CHANNELS);
		createEAttribute(deploymentEClass, DEPLOYMENT__COPIES);
		createEAttribute(deploymentEClass, DEPLOYMENT__INPUT_RATE);

		requirementEClass = createEClass(REQUIREMENT);
		createEAttribute(requirementEClass, REQUIREMENT__ID);
		createEAttribute(requirementEClass, REQUIREMENT__SEVERITY);
		createEAttribute(requirementEClass, REQUIREMENT__NOTE);
		createEAttribute(requirementEClass, REQUIREMENT__CLOCK_TOLERANCE);

		limitPointEClass = createEClass(LIMIT_POINT);
		createEAttribute(limitPointEClass, LIMIT_POINT__FREQUENCY);
		createEAttribute(limitPointEClass, LIMIT_POINT__LEVEL);

		gainRequirementEClass = createEClass(GAIN_REQUIREMENT);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__FROM);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__TO);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__MIN);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__MAX);
		createEReference(gainRequirementEClass, GAIN_REQUIREMENT__POINTS);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__SIDE);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__INTERPOLATE);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__REFERENCE_AT);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__REFERENCE_FROM);
		createEAttribute(gainRequirementEClass, GAIN_REQUIREMENT__REFERENCE_TO);

		linearPhaseRequirementEClass = createEClass(LINEAR_PHASE_REQUIREMENT);
		createEAttribute(linearPhaseRequirementEClass, LINEAR_PHASE_REQUIREMENT__TYPE);

		groupDelayRequirementEClass = createEClass(GROUP_DELAY_REQUIREMENT);
		createEAttribute(groupDelayRequirementEClass, GROUP_DELAY_REQUIREMENT__FROM);
		createEAttribute(groupDelayRequirementEClass, GROUP_DELAY_REQUIREMENT__TO);
		createEAttribute(groupDelayRequirementEClass, GROUP_DELAY_REQUIREMENT__MIN);
		createEAttribute(groupDelayRequirementEClass, GROUP_DELAY_REQUIREMENT__MAX);

		groupDelayVariationRequirementEClass = createEClass(GROUP_DELAY_VARIATION_REQUIREMENT);
		createEAttribute(groupDelayVariationRequirementEClass, GROUP_DELAY_VARIATION_REQUIREMENT__FROM);
		createEAttribute(groupDelayVariationRequirementEClass, GROUP_DELAY_VARIATION_REQUIREMENT__TO);
		createEAttribute(groupDelayVariationRequirementEClass, GROUP_DELAY_VARIATION_REQUIREMENT__MAX);

		bulkDelayRequirementEClass = createEClass(BULK_DELAY_REQUIREMENT);
		createEAttribute(bulkDelayRequirementEClass, BULK_DELAY_REQUIREMENT__MIN);
		createEAttribute(bulkDelayRequirementEClass, BULK_DELAY_REQUIREMENT__MAX);

		stepOvershootRequirementEClass = createEClass(STEP_OVERSHOOT_REQUIREMENT);
		createEAttribute(stepOvershootRequirementEClass, STEP_OVERSHOOT_REQUIREMENT__MAX);

		stepUndershootRequirementEClass = createEClass(STEP_UNDERSHOOT_REQUIREMENT);
		createEAttribute(stepUndershootRequirementEClass, STEP_UNDERSHOOT_REQUIREMENT__MAX);

		stepSettlingRequirementEClass = createEClass(STEP_SETTLING_REQUIREMENT);
		createEAttribute(stepSettlingRequirementEClass, STEP_SETTLING_REQUIREMENT__WITHIN);
		createEAttribute(stepSettlingRequirementEClass, STEP_SETTLING_REQUIREMENT__MAX);

		impulseTailRequirementEClass = createEClass(IMPULSE_TAIL_REQUIREMENT);
		createEAttribute(impulseTailRequirementEClass, IMPULSE_TAIL_REQUIREMENT__AFTER);
		createEAttribute(impulseTailRequirementEClass, IMPULSE_TAIL_REQUIREMENT__MAX);

		nullRequirementEClass = createEClass(NULL_REQUIREMENT);
		createEAttribute(nullRequirementEClass, NULL_REQUIREMENT__AT);

		exactGainRequirementEClass = createEClass(EXACT_GAIN_REQUIREMENT);
		createEAttribute(exactGainRequirementEClass, EXACT_GAIN_REQUIREMENT__AT);
		createEAttribute(exactGainRequirementEClass, EXACT_GAIN_REQUIREMENT__VALUE);

		nonNegativeAmplitudeRequirementEClass = createEClass(NON_NEGATIVE_AMPLITUDE_REQUIREMENT);

		noOverflowRequirementEClass = createEClass(NO_OVERFLOW_REQUIREMENT);
		createEAttribute(noOverflowRequirementEClass, NO_OVERFLOW_REQUIREMENT__INPUT);

		outputNoiseRequirementEClass = createEClass(OUTPUT_NOISE_REQUIREMENT);
		createEAttribute(outputNoiseRequirementEClass, OUTPUT_NOISE_REQUIREMENT__MAX);

		coefficientWordRequirementEClass = createEClass(COEFFICIENT_WORD_REQUIREMENT);
		createEAttribute(coefficientWordRequirementEClass, COEFFICIENT_WORD_REQUIREMENT__MAX);

		tapsRequirementEClass = createEClass(TAPS_REQUIREMENT);
		createEAttribute(tapsRequirementEClass, TAPS_REQUIREMENT__MAX);

		multipliesRequirementEClass = createEClass(MULTIPLIES_REQUIREMENT);
		createEAttribute(multipliesRequirementEClass, MULTIPLIES_REQUIREMENT__MAX);

		addsRequirementEClass = createEClass(ADDS_REQUIREMENT);
		createEAttribute(addsRequirementEClass, ADDS_REQUIREMENT__MAX);

		memoryRequirementEClass = createEClass(MEMORY_REQUIREMENT);
		createEAttribute(memoryRequirementEClass, MEMORY_REQUIREMENT__MAX);

		multiplyRateRequirementEClass = createEClass(MULTIPLY_RATE_REQUIREMENT);
		createEAttribute(multiplyRateRequirementEClass, MULTIPLY_RATE_REQUIREMENT__MAX);

		aliasRejectionRequirementEClass = createEClass(ALIAS_REJECTION_REQUIREMENT);
		createEAttribute(aliasRejectionRequirementEClass, ALIAS_REJECTION_REQUIREMENT__FACTOR);
		createEAttribute(aliasRejectionRequirementEClass, ALIAS_REJECTION_REQUIREMENT__TO);
		createEAttribute(aliasRejectionRequirementEClass, ALIAS_REJECTION_REQUIREMENT__MIN);

		powerComplementaryRequirementEClass = createEClass(POWER_COMPLEMENTARY_REQUIREMENT);
		createEAttribute(powerComplementaryRequirementEClass, POWER_COMPLEMENTARY_REQUIREMENT__PARTNER);
		createEAttribute(powerComplementaryRequirementEClass, POWER_COMPLEMENTARY_REQUIREMENT__MAX);

		designEClass = createEClass(DESIGN);

		bandDesignEClass = createEClass(BAND_DESIGN);
		createEAttribute(bandDesignEClass, BAND_DESIGN__TAPS);
		createEReference(bandDesignEClass, BAND_DESIGN__BANDS);

		designBandEClass = createEClass(DESIGN_BAND);
		createEAttribute(designBandEClass, DESIGN_BAND__FROM);
		createEAttribute(designBandEClass, DESIGN_BAND__TO);
		createEAttribute(designBandEClass, DESIGN_BAND__DESIRED);
		createEAttribute(designBandEClass, DESIGN_BAND__DESIRED_TO);
		createEAttribute(designBandEClass, DESIGN_BAND__WEIGHT);
		createEAttribute(designBandEClass, DESIGN_BAND__WEIGHT_TO);

		givenDesignEClass = createEClass(GIVEN_DESIGN);
		createEAttribute(givenDesignEClass, GIVEN_DESIGN__SOURCE);

		windowDesignEClass = createEClass(WINDOW_DESIGN);
		createEAttribute(windowDesignEClass, WINDOW_DESIGN__WINDOW);
		createEAttribute(windowDesignEClass, WINDOW_DESIGN__PARAMETER);

		equirippleDesignEClass = createEClass(EQUIRIPPLE_DESIGN);
		createEAttribute(equirippleDesignEClass, EQUIRIPPLE_DESIGN__TYPE);
		createEAttribute(equirippleDesignEClass, EQUIRIPPLE_DESIGN__TOLERANCE);

		movingAverageDesignEClass = createEClass(MOVING_AVERAGE_DESIGN);
		createEAttribute(movingAverageDesignEClass, MOVING_AVERAGE_DESIGN__TAPS);
		createEAttribute(movingAverageDesignEClass, MOVING_AVERAGE_DESIGN__SECTIONS);

		binomialDesignEClass = createEClass(BINOMIAL_DESIGN);
		createEAttribute(binomialDesignEClass, BINOMIAL_DESIGN__ORDER);

		maximallyFlatDesignEClass = createEClass(MAXIMALLY_FLAT_DESIGN);
		createEAttribute(maximallyFlatDesignEClass, MAXIMALLY_FLAT_DESIGN__FLATNESS);
		createEAttribute(maximallyFlatDesignEClass, MAXIMALLY_FLAT_DESIGN__ZEROS);

		savitzkyGolayDesignEClass = createEClass(SAVITZKY_GOLAY_DESIGN);
		createEAttribute(savitzkyGolayDesignEClass, SAVITZKY_GOLAY_DESIGN__POINTS);
		createEAttribute(savitzkyGolayDesignEClass, SAVITZKY_GOLAY_DESIGN__DEGREE);
		createEAttribute(savitzkyGolayDesignEClass, SAVITZKY_GOLAY_DESIGN__DERIVATIVE);
		createEAttribute(savitzkyGolayDesignEClass, SAVITZKY_GOLAY_DESIGN__POSITION);

		lagrangeDelayDesignEClass = createEClass(LAGRANGE_DELAY_DESIGN);
		createEAttribute(lagrangeDelayDesignEClass, LAGRANGE_DELAY_DESIGN__ORDER);
		createEAttribute(lagrangeDelayDesignEClass, LAGRANGE_DELAY_DESIGN__DELAY);

		raisedCosineDesignEClass = createEClass(RAISED_COSINE_DESIGN);
		createEAttribute(raisedCosineDesignEClass, RAISED_COSINE_DESIGN__ROLL_OFF);
		createEAttribute(raisedCosineDesignEClass, RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL);
		createEAttribute(raisedCosineDesignEClass, RAISED_COSINE_DESIGN__SYMBOLS);
		createEAttribute(raisedCosineDesignEClass, RAISED_COSINE_DESIGN__ROOT);
		createEAttribute(raisedCosineDesignEClass, RAISED_COSINE_DESIGN__GAIN);

		leastSquaresDesignEClass = createEClass(LEAST_SQUARES_DESIGN);
		createEAttribute(leastSquaresDesignEClass, LEAST_SQUARES_DESIGN__TYPE);

		constrainedLeastSquaresDesignEClass = createEClass(CONSTRAINED_LEAST_SQUARES_DESIGN);
		createEAttribute(constrainedLeastSquaresDesignEClass, CONSTRAINED_LEAST_SQUARES_DESIGN__TYPE);

		linearProgramDesignEClass = createEClass(LINEAR_PROGRAM_DESIGN);
		createEAttribute(linearProgramDesignEClass, LINEAR_PROGRAM_DESIGN__MONOTONE);

		halfBandDesignEClass = createEClass(HALF_BAND_DESIGN);
		createEAttribute(halfBandDesignEClass, HALF_BAND_DESIGN__TAPS);
		createEAttribute(halfBandDesignEClass, HALF_BAND_DESIGN__PASS_EDGE);
		createEAttribute(halfBandDesignEClass, HALF_BAND_DESIGN__HILBERT);

		cicCompensatorDesignEClass = createEClass(CIC_COMPENSATOR_DESIGN);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__TAPS);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__SECTIONS);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__RATE);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__PASS_EDGE);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__STOP_EDGE);
		createEAttribute(cicCompensatorDesignEClass, CIC_COMPENSATOR_DESIGN__STOP_WEIGHT);

		combDesignEClass = createEClass(COMB_DESIGN);
		createEAttribute(combDesignEClass, COMB_DESIGN__PERIOD);
		createEAttribute(combDesignEClass, COMB_DESIGN__DIFFERENCE);

		minimumPhaseDesignEClass = createEClass(MINIMUM_PHASE_DESIGN);
		createEReference(minimumPhaseDesignEClass, MINIMUM_PHASE_DESIGN__PROTOTYPE);

		complementDesignEClass = createEClass(COMPLEMENT_DESIGN);
		createEReference(complementDesignEClass, COMPLEMENT_DESIGN__PROTOTYPE);

		coefficientsEClass = createEClass(COEFFICIENTS);
		createEAttribute(coefficientsEClass, COEFFICIENTS__DESIGN_HASH);

		realCoefficientsEClass = createEClass(REAL_COEFFICIENTS);
		createEAttribute(realCoefficientsEClass, REAL_COEFFICIENTS__VALUES);

		integerCoefficientsEClass = createEClass(INTEGER_COEFFICIENTS);
		createEAttribute(integerCoefficientsEClass, INTEGER_COEFFICIENTS__INTEGERS);
		createEAttribute(integerCoefficientsEClass, INTEGER_COEFFICIENTS__SCALE);

		arithmeticEClass = createEClass(ARITHMETIC);
		createEAttribute(arithmeticEClass, ARITHMETIC__STRUCTURE);
		createEAttribute(arithmeticEClass, ARITHMETIC__FACTOR);
		createEReference(arithmeticEClass, ARITHMETIC__COEFFICIENT);
		createEReference(arithmeticEClass, ARITHMETIC__INPUT);
		createEReference(arithmeticEClass, ARITHMETIC__PRODUCT);
		createEReference(arithmeticEClass, ARITHMETIC__ACCUMULATOR);
		createEReference(arithmeticEClass, ARITHMETIC__OUTPUT);
		createEAttribute(arithmeticEClass, ARITHMETIC__ROUNDING);
		createEAttribute(arithmeticEClass, ARITHMETIC__OVERFLOW);

		formatEClass = createEClass(FORMAT);
		createEAttribute(formatEClass, FORMAT__WORD);
		createEAttribute(formatEClass, FORMAT__FRACTION);
		createEAttribute(formatEClass, FORMAT__SIGNED);

		evidenceEClass = createEClass(EVIDENCE);
		createEAttribute(evidenceEClass, EVIDENCE__TOOL);
		createEAttribute(evidenceEClass, EVIDENCE__VERDICT);
		createEReference(evidenceEClass, EVIDENCE__RESULTS);

		resultEClass = createEClass(RESULT);
		createEAttribute(resultEClass, RESULT__REQUIREMENT);
		createEAttribute(resultEClass, RESULT__KIND);
		createEAttribute(resultEClass, RESULT__VERDICT);
		createEAttribute(resultEClass, RESULT__WORST);
		createEAttribute(resultEClass, RESULT__VALUE_LOW);
		createEAttribute(resultEClass, RESULT__VALUE_HIGH);
		createEAttribute(resultEClass, RESULT__LIMIT);
		createEAttribute(resultEClass, RESULT__MARGIN_LOW);
		createEAttribute(resultEClass, RESULT__MARGIN_HIGH);

		revisionEClass = createEClass(REVISION);
		createEAttribute(revisionEClass, REVISION__PARENTS);
		createEAttribute(revisionEClass, REVISION__AUTHOR);
		createEAttribute(revisionEClass, REVISION__EMAIL);
		createEAttribute(revisionEClass, REVISION__TIME);
		createEAttribute(revisionEClass, REVISION__MESSAGE);
		createEReference(revisionEClass, REVISION__PARAMETERS);
		createEReference(revisionEClass, REVISION__FILTER);
		createEReference(revisionEClass, REVISION__EVIDENCE);

		baselineEClass = createEClass(BASELINE);
		createEAttribute(baselineEClass, BASELINE__NAME);
		createEAttribute(baselineEClass, BASELINE__AUTHOR);
		createEAttribute(baselineEClass, BASELINE__EMAIL);
		createEAttribute(baselineEClass, BASELINE__TIME);
		createEAttribute(baselineEClass, BASELINE__MESSAGE);
		createEReference(baselineEClass, BASELINE__ENTRIES);

		baselineEntryEClass = createEClass(BASELINE_ENTRY);
		createEAttribute(baselineEntryEClass, BASELINE_ENTRY__FILTER);
		createEAttribute(baselineEntryEClass, BASELINE_ENTRY__IDENTITY);
		createEAttribute(baselineEntryEClass, BASELINE_ENTRY__REVISION);

		signOffEClass = createEClass(SIGN_OFF);
		createEAttribute(signOffEClass, SIGN_OFF__FILTER);
		createEAttribute(signOffEClass, SIGN_OFF__REVISION);
		createEAttribute(signOffEClass, SIGN_OFF__REVIEWER);
		createEAttribute(signOffEClass, SIGN_OFF__EMAIL);
		createEAttribute(signOffEClass, SIGN_OFF__TIME);
		createEAttribute(signOffEClass, SIGN_OFF__DECISION);
		createEAttribute(signOffEClass, SIGN_OFF__COMMENT);

		// Create enums
		severityEEnum = createEEnum(SEVERITY);
		unitEEnum = createEEnum(UNIT);
		sideEEnum = createEEnum(SIDE);
		interpolationEEnum = createEEnum(INTERPOLATION);
		phaseTypeEEnum = createEEnum(PHASE_TYPE);
		inputClassEEnum = createEEnum(INPUT_CLASS);
		structureEEnum = createEEnum(STRUCTURE);
		roundingEEnum = createEEnum(ROUNDING);
		overflowEEnum = createEEnum(OVERFLOW);
		verdictEEnum = createEEnum(VERDICT);
		decisionEEnum = createEEnum(DECISION);
		windowKindEEnum = createEEnum(WINDOW_KIND);
		pulseGainEEnum = createEEnum(PULSE_GAIN);

		// Create data types
		quantityEDataType = createEDataType(QUANTITY);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isInitialized = false;

	/**
	 * Complete the initialization of the package and its meta-model.  This
	 * method is guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void initializePackageContents() {
		if (isInitialized) return;
		isInitialized = true;

		// Initialize package
		setName(eNAME);
		setNsPrefix(eNS_PREFIX);
		setNsURI(eNS_URI);

		// Create type parameters

		// Set bounds for type parameters

		// Add supertypes to classes
		filterStageEClass.getESuperTypes().add(this.getStage());
		decimationEClass.getESuperTypes().add(this.getStage());
		expansionEClass.getESuperTypes().add(this.getStage());
		gainRequirementEClass.getESuperTypes().add(this.getRequirement());
		linearPhaseRequirementEClass.getESuperTypes().add(this.getRequirement());
		groupDelayRequirementEClass.getESuperTypes().add(this.getRequirement());
		groupDelayVariationRequirementEClass.getESuperTypes().add(this.getRequirement());
		bulkDelayRequirementEClass.getESuperTypes().add(this.getRequirement());
		stepOvershootRequirementEClass.getESuperTypes().add(this.getRequirement());
		stepUndershootRequirementEClass.getESuperTypes().add(this.getRequirement());
		stepSettlingRequirementEClass.getESuperTypes().add(this.getRequirement());
		impulseTailRequirementEClass.getESuperTypes().add(this.getRequirement());
		nullRequirementEClass.getESuperTypes().add(this.getRequirement());
		exactGainRequirementEClass.getESuperTypes().add(this.getRequirement());
		nonNegativeAmplitudeRequirementEClass.getESuperTypes().add(this.getRequirement());
		noOverflowRequirementEClass.getESuperTypes().add(this.getRequirement());
		outputNoiseRequirementEClass.getESuperTypes().add(this.getRequirement());
		coefficientWordRequirementEClass.getESuperTypes().add(this.getRequirement());
		tapsRequirementEClass.getESuperTypes().add(this.getRequirement());
		multipliesRequirementEClass.getESuperTypes().add(this.getRequirement());
		addsRequirementEClass.getESuperTypes().add(this.getRequirement());
		memoryRequirementEClass.getESuperTypes().add(this.getRequirement());
		multiplyRateRequirementEClass.getESuperTypes().add(this.getRequirement());
		aliasRejectionRequirementEClass.getESuperTypes().add(this.getRequirement());
		powerComplementaryRequirementEClass.getESuperTypes().add(this.getRequirement());
		bandDesignEClass.getESuperTypes().add(this.getDesign());
		givenDesignEClass.getESuperTypes().add(this.getDesign());
		windowDesignEClass.getESuperTypes().add(this.getBandDesign());
		equirippleDesignEClass.getESuperTypes().add(this.getBandDesign());
		movingAverageDesignEClass.getESuperTypes().add(this.getDesign());
		binomialDesignEClass.getESuperTypes().add(this.getDesign());
		maximallyFlatDesignEClass.getESuperTypes().add(this.getDesign());
		savitzkyGolayDesignEClass.getESuperTypes().add(this.getDesign());
		lagrangeDelayDesignEClass.getESuperTypes().add(this.getDesign());
		raisedCosineDesignEClass.getESuperTypes().add(this.getDesign());
		leastSquaresDesignEClass.getESuperTypes().add(this.getBandDesign());
		constrainedLeastSquaresDesignEClass.getESuperTypes().add(this.getBandDesign());
		linearProgramDesignEClass.getESuperTypes().add(this.getBandDesign());
		halfBandDesignEClass.getESuperTypes().add(this.getDesign());
		cicCompensatorDesignEClass.getESuperTypes().add(this.getDesign());
		combDesignEClass.getESuperTypes().add(this.getDesign());
		minimumPhaseDesignEClass.getESuperTypes().add(this.getDesign());
		complementDesignEClass.getESuperTypes().add(this.getDesign());
		realCoefficientsEClass.getESuperTypes().add(this.getCoefficients());
		integerCoefficientsEClass.getESuperTypes().add(this.getCoefficients());

		// Initialize classes and features; add operations and parameters
		initEClass(portfolioEClass, Portfolio.class, "Portfolio", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getPortfolio_Name(), ecorePackage.getEString(), "name", null, 0, 1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPortfolio_Description(), ecorePackage.getEString(), "description", null, 0, 1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPortfolio_Erosion(), this.getQuantity(), "erosion", "0.5", 0, 1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPortfolio_ActiveBaseline(), ecorePackage.getEString(), "activeBaseline", null, 0, 1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getPortfolio_Parameters(), this.getParameter(), null, "parameters", null, 0, -1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getPortfolio_Processors(), this.getProcessor(), null, "processors", null, 0, -1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getPortfolio_Paths(), this.getSignalPath(), null, "paths", null, 0, -1, Portfolio.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(parameterEClass, Parameter.class, "Parameter", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getParameter_Name(), ecorePackage.getEString(), "name", null, 0, 1, Parameter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getParameter_Value(), this.getQuantity(), "value", null, 0, 1, Parameter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getParameter_Unit(), this.getUnit(), "unit", null, 0, 1, Parameter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getParameter_Description(), ecorePackage.getEString(), "description", null, 0, 1, Parameter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(processorEClass, Processor.class, "Processor", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getProcessor_Name(), ecorePackage.getEString(), "name", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_Description(), ecorePackage.getEString(), "description", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_MacRate(), this.getQuantity(), "macRate", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_Word(), this.getQuantity(), "word", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_Accumulator(), this.getQuantity(), "accumulator", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_CoefficientMemory(), this.getQuantity(), "coefficientMemory", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProcessor_DelayMemory(), this.getQuantity(), "delayMemory", null, 0, 1, Processor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(signalPathEClass, SignalPath.class, "SignalPath", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSignalPath_Name(), ecorePackage.getEString(), "name", null, 0, 1, SignalPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignalPath_Description(), ecorePackage.getEString(), "description", null, 0, 1, SignalPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignalPath_SampleRate(), this.getQuantity(), "sampleRate", null, 0, 1, SignalPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getSignalPath_Stages(), this.getStage(), null, "stages", null, 0, -1, SignalPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getSignalPath_Requirements(), this.getRequirement(), null, "requirements", null, 0, -1, SignalPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stageEClass, Stage.class, "Stage", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);

		initEClass(filterStageEClass, FilterStage.class, "FilterStage", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getFilterStage_Filter(), ecorePackage.getEString(), "filter", null, 0, 1, FilterStage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(decimationEClass, Decimation.class, "Decimation", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getDecimation_Factor(), this.getQuantity(), "factor", null, 0, 1, Decimation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(expansionEClass, Expansion.class, "Expansion", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getExpansion_Factor(), this.getQuantity(), "factor", null, 0, 1, Expansion.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(filterEClass, Filter.class, "Filter", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getFilter_Name(), ecorePackage.getEString(), "name", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFilter_Identity(), ecorePackage.getEString(), "identity", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFilter_Purpose(), ecorePackage.getEString(), "purpose", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFilter_SampleRate(), this.getQuantity(), "sampleRate", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getFilter_Requirements(), this.getRequirement(), null, "requirements", null, 0, -1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getFilter_Design(), this.getDesign(), null, "design", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getFilter_Coefficients(), this.getCoefficients(), null, "coefficients", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getFilter_Arithmetic(), this.getArithmetic(), null, "arithmetic", null, 0, 1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getFilter_Deployments(), this.getDeployment(), null, "deployments", null, 0, -1, Filter.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(deploymentEClass, Deployment.class, "Deployment", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getDeployment_Processor(), ecorePackage.getEString(), "processor", null, 0, 1, Deployment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDeployment_Channels(), this.getQuantity(), "channels", "1", 0, 1, Deployment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDeployment_Copies(), this.getQuantity(), "copies", "1", 0, 1, Deployment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDeployment_InputRate(), this.getQuantity(), "inputRate", null, 0, 1, Deployment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(requirementEClass, Requirement.class, "Requirement", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getRequirement_Id(), ecorePackage.getEString(), "id", null, 0, 1, Requirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRequirement_Severity(), this.getSeverity(), "severity", null, 0, 1, Requirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRequirement_Note(), ecorePackage.getEString(), "note", null, 0, 1, Requirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRequirement_ClockTolerance(), this.getQuantity(), "clockTolerance", null, 0, 1, Requirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(limitPointEClass, LimitPoint.class, "LimitPoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLimitPoint_Frequency(), this.getQuantity(), "frequency", null, 0, 1, LimitPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLimitPoint_Level(), this.getQuantity(), "level", null, 0, 1, LimitPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(gainRequirementEClass, GainRequirement.class, "GainRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGainRequirement_From(), this.getQuantity(), "from", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_To(), this.getQuantity(), "to", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_Min(), this.getQuantity(), "min", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_Max(), this.getQuantity(), "max", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getGainRequirement_Points(), this.getLimitPoint(), null, "points", null, 0, -1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_Side(), this.getSide(), "side", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_Interpolate(), this.getInterpolation(), "interpolate", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_ReferenceAt(), this.getQuantity(), "referenceAt", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_ReferenceFrom(), this.getQuantity(), "referenceFrom", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGainRequirement_ReferenceTo(), this.getQuantity(), "referenceTo", null, 0, 1, GainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(linearPhaseRequirementEClass, LinearPhaseRequirement.class, "LinearPhaseRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLinearPhaseRequirement_Type(), this.getPhaseType(), "type", null, 0, 1, LinearPhaseRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(groupDelayRequirementEClass, GroupDelayRequirement.class, "GroupDelayRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGroupDelayRequirement_From(), this.getQuantity(), "from", null, 0, 1, GroupDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroupDelayRequirement_To(), this.getQuantity(), "to", null, 0, 1, GroupDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroupDelayRequirement_Min(), this.getQuantity(), "min", null, 0, 1, GroupDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroupDelayRequirement_Max(), this.getQuantity(), "max", null, 0, 1, GroupDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(groupDelayVariationRequirementEClass, GroupDelayVariationRequirement.class, "GroupDelayVariationRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGroupDelayVariationRequirement_From(), this.getQuantity(), "from", null, 0, 1, GroupDelayVariationRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroupDelayVariationRequirement_To(), this.getQuantity(), "to", null, 0, 1, GroupDelayVariationRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroupDelayVariationRequirement_Max(), this.getQuantity(), "max", null, 0, 1, GroupDelayVariationRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(bulkDelayRequirementEClass, BulkDelayRequirement.class, "BulkDelayRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getBulkDelayRequirement_Min(), this.getQuantity(), "min", null, 0, 1, BulkDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBulkDelayRequirement_Max(), this.getQuantity(), "max", null, 0, 1, BulkDelayRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stepOvershootRequirementEClass, StepOvershootRequirement.class, "StepOvershootRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getStepOvershootRequirement_Max(), this.getQuantity(), "max", null, 0, 1, StepOvershootRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stepUndershootRequirementEClass, StepUndershootRequirement.class, "StepUndershootRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getStepUndershootRequirement_Max(), this.getQuantity(), "max", null, 0, 1, StepUndershootRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stepSettlingRequirementEClass, StepSettlingRequirement.class, "StepSettlingRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getStepSettlingRequirement_Within(), this.getQuantity(), "within", null, 0, 1, StepSettlingRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStepSettlingRequirement_Max(), this.getQuantity(), "max", null, 0, 1, StepSettlingRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(impulseTailRequirementEClass, ImpulseTailRequirement.class, "ImpulseTailRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getImpulseTailRequirement_After(), this.getQuantity(), "after", null, 0, 1, ImpulseTailRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getImpulseTailRequirement_Max(), this.getQuantity(), "max", null, 0, 1, ImpulseTailRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(nullRequirementEClass, NullRequirement.class, "NullRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getNullRequirement_At(), this.getQuantity(), "at", null, 0, 1, NullRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(exactGainRequirementEClass, ExactGainRequirement.class, "ExactGainRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getExactGainRequirement_At(), this.getQuantity(), "at", null, 0, 1, ExactGainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getExactGainRequirement_Value(), this.getQuantity(), "value", null, 0, 1, ExactGainRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(nonNegativeAmplitudeRequirementEClass, NonNegativeAmplitudeRequirement.class, "NonNegativeAmplitudeRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);

		initEClass(noOverflowRequirementEClass, NoOverflowRequirement.class, "NoOverflowRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getNoOverflowRequirement_Input(), this.getInputClass(), "input", null, 0, 1, NoOverflowRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(outputNoiseRequirementEClass, OutputNoiseRequirement.class, "OutputNoiseRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getOutputNoiseRequirement_Max(), this.getQuantity(), "max", null, 0, 1, OutputNoiseRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(coefficientWordRequirementEClass, CoefficientWordRequirement.class, "CoefficientWordRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCoefficientWordRequirement_Max(), this.getQuantity(), "max", null, 0, 1, CoefficientWordRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(tapsRequirementEClass, TapsRequirement.class, "TapsRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getTapsRequirement_Max(), this.getQuantity(), "max", null, 0, 1, TapsRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(multipliesRequirementEClass, MultipliesRequirement.class, "MultipliesRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMultipliesRequirement_Max(), this.getQuantity(), "max", null, 0, 1, MultipliesRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(addsRequirementEClass, AddsRequirement.class, "AddsRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getAddsRequirement_Max(), this.getQuantity(), "max", null, 0, 1, AddsRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(memoryRequirementEClass, MemoryRequirement.class, "MemoryRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMemoryRequirement_Max(), this.getQuantity(), "max", null, 0, 1, MemoryRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(multiplyRateRequirementEClass, MultiplyRateRequirement.class, "MultiplyRateRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMultiplyRateRequirement_Max(), this.getQuantity(), "max", null, 0, 1, MultiplyRateRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(aliasRejectionRequirementEClass, AliasRejectionRequirement.class, "AliasRejectionRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getAliasRejectionRequirement_Factor(), this.getQuantity(), "factor", null, 0, 1, AliasRejectionRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAliasRejectionRequirement_To(), this.getQuantity(), "to", null, 0, 1, AliasRejectionRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAliasRejectionRequirement_Min(), this.getQuantity(), "min", null, 0, 1, AliasRejectionRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(powerComplementaryRequirementEClass, PowerComplementaryRequirement.class, "PowerComplementaryRequirement", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getPowerComplementaryRequirement_Partner(), ecorePackage.getEString(), "partner", null, 0, 1, PowerComplementaryRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPowerComplementaryRequirement_Max(), this.getQuantity(), "max", null, 0, 1, PowerComplementaryRequirement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(designEClass, Design.class, "Design", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);

		initEClass(bandDesignEClass, BandDesign.class, "BandDesign", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getBandDesign_Taps(), this.getQuantity(), "taps", null, 0, 1, BandDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getBandDesign_Bands(), this.getDesignBand(), null, "bands", null, 0, -1, BandDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(designBandEClass, DesignBand.class, "DesignBand", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getDesignBand_From(), this.getQuantity(), "from", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesignBand_To(), this.getQuantity(), "to", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesignBand_Desired(), this.getQuantity(), "desired", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesignBand_DesiredTo(), this.getQuantity(), "desiredTo", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesignBand_Weight(), this.getQuantity(), "weight", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesignBand_WeightTo(), this.getQuantity(), "weightTo", null, 0, 1, DesignBand.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(givenDesignEClass, GivenDesign.class, "GivenDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGivenDesign_Source(), ecorePackage.getEString(), "source", null, 0, 1, GivenDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(windowDesignEClass, WindowDesign.class, "WindowDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getWindowDesign_Window(), this.getWindowKind(), "window", "kaiser", 0, 1, WindowDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindowDesign_Parameter(), this.getQuantity(), "parameter", null, 0, 1, WindowDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(equirippleDesignEClass, EquirippleDesign.class, "EquirippleDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getEquirippleDesign_Type(), this.getPhaseType(), "type", null, 0, 1, EquirippleDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getEquirippleDesign_Tolerance(), this.getQuantity(), "tolerance", null, 0, 1, EquirippleDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(movingAverageDesignEClass, MovingAverageDesign.class, "MovingAverageDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMovingAverageDesign_Taps(), this.getQuantity(), "taps", null, 0, 1, MovingAverageDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMovingAverageDesign_Sections(), this.getQuantity(), "sections", null, 0, 1, MovingAverageDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(binomialDesignEClass, BinomialDesign.class, "BinomialDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getBinomialDesign_Order(), this.getQuantity(), "order", null, 0, 1, BinomialDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(maximallyFlatDesignEClass, MaximallyFlatDesign.class, "MaximallyFlatDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMaximallyFlatDesign_Flatness(), this.getQuantity(), "flatness", null, 0, 1, MaximallyFlatDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaximallyFlatDesign_Zeros(), this.getQuantity(), "zeros", null, 0, 1, MaximallyFlatDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(savitzkyGolayDesignEClass, SavitzkyGolayDesign.class, "SavitzkyGolayDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSavitzkyGolayDesign_Points(), this.getQuantity(), "points", null, 0, 1, SavitzkyGolayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSavitzkyGolayDesign_Degree(), this.getQuantity(), "degree", null, 0, 1, SavitzkyGolayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSavitzkyGolayDesign_Derivative(), this.getQuantity(), "derivative", null, 0, 1, SavitzkyGolayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSavitzkyGolayDesign_Position(), this.getQuantity(), "position", null, 0, 1, SavitzkyGolayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(lagrangeDelayDesignEClass, LagrangeDelayDesign.class, "LagrangeDelayDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLagrangeDelayDesign_Order(), this.getQuantity(), "order", null, 0, 1, LagrangeDelayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLagrangeDelayDesign_Delay(), this.getQuantity(), "delay", null, 0, 1, LagrangeDelayDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(raisedCosineDesignEClass, RaisedCosineDesign.class, "RaisedCosineDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getRaisedCosineDesign_RollOff(), this.getQuantity(), "rollOff", null, 0, 1, RaisedCosineDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRaisedCosineDesign_SamplesPerSymbol(), this.getQuantity(), "samplesPerSymbol", null, 0, 1, RaisedCosineDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRaisedCosineDesign_Symbols(), this.getQuantity(), "symbols", null, 0, 1, RaisedCosineDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRaisedCosineDesign_Root(), ecorePackage.getEBoolean(), "root", "true", 0, 1, RaisedCosineDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRaisedCosineDesign_Gain(), this.getPulseGain(), "gain", null, 0, 1, RaisedCosineDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(leastSquaresDesignEClass, LeastSquaresDesign.class, "LeastSquaresDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLeastSquaresDesign_Type(), this.getPhaseType(), "type", null, 0, 1, LeastSquaresDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(constrainedLeastSquaresDesignEClass, ConstrainedLeastSquaresDesign.class, "ConstrainedLeastSquaresDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getConstrainedLeastSquaresDesign_Type(), this.getPhaseType(), "type", null, 0, 1, ConstrainedLeastSquaresDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(linearProgramDesignEClass, LinearProgramDesign.class, "LinearProgramDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLinearProgramDesign_Monotone(), ecorePackage.getEBoolean(), "monotone", null, 0, 1, LinearProgramDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(halfBandDesignEClass, HalfBandDesign.class, "HalfBandDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getHalfBandDesign_Taps(), this.getQuantity(), "taps", null, 0, 1, HalfBandDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getHalfBandDesign_PassEdge(), this.getQuantity(), "passEdge", null, 0, 1, HalfBandDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getHalfBandDesign_Hilbert(), ecorePackage.getEBoolean(), "hilbert", null, 0, 1, HalfBandDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(cicCompensatorDesignEClass, CicCompensatorDesign.class, "CicCompensatorDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCicCompensatorDesign_Taps(), this.getQuantity(), "taps", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCicCompensatorDesign_Sections(), this.getQuantity(), "sections", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCicCompensatorDesign_Rate(), this.getQuantity(), "rate", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCicCompensatorDesign_PassEdge(), this.getQuantity(), "passEdge", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCicCompensatorDesign_StopEdge(), this.getQuantity(), "stopEdge", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCicCompensatorDesign_StopWeight(), this.getQuantity(), "stopWeight", null, 0, 1, CicCompensatorDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(combDesignEClass, CombDesign.class, "CombDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCombDesign_Period(), this.getQuantity(), "period", null, 0, 1, CombDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCombDesign_Difference(), ecorePackage.getEBoolean(), "difference", null, 0, 1, CombDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(minimumPhaseDesignEClass, MinimumPhaseDesign.class, "MinimumPhaseDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getMinimumPhaseDesign_Prototype(), this.getDesign(), null, "prototype", null, 0, 1, MinimumPhaseDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(complementDesignEClass, ComplementDesign.class, "ComplementDesign", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getComplementDesign_Prototype(), this.getDesign(), null, "prototype", null, 0, 1, ComplementDesign.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(coefficientsEClass, Coefficients.class, "Coefficients", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCoefficients_DesignHash(), ecorePackage.getEString(), "designHash", null, 0, 1, Coefficients.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(realCoefficientsEClass, RealCoefficients.class, "RealCoefficients", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getRealCoefficients_Values(), ecorePackage.getEDouble(), "values", null, 0, -1, RealCoefficients.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, !IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(integerCoefficientsEClass, IntegerCoefficients.class, "IntegerCoefficients", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getIntegerCoefficients_Integers(), ecorePackage.getEBigInteger(), "integers", null, 0, -1, IntegerCoefficients.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, !IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getIntegerCoefficients_Scale(), ecorePackage.getEString(), "scale", "1", 0, 1, IntegerCoefficients.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(arithmeticEClass, Arithmetic.class, "Arithmetic", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getArithmetic_Structure(), this.getStructure(), "structure", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getArithmetic_Factor(), this.getQuantity(), "factor", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getArithmetic_Coefficient(), this.getFormat(), null, "coefficient", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getArithmetic_Input(), this.getFormat(), null, "input", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getArithmetic_Product(), this.getFormat(), null, "product", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getArithmetic_Accumulator(), this.getFormat(), null, "accumulator", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getArithmetic_Output(), this.getFormat(), null, "output", null, 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getArithmetic_Rounding(), this.getRounding(), "rounding", "half-even", 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getArithmetic_Overflow(), this.getOverflow(), "overflow", "saturate", 0, 1, Arithmetic.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(formatEClass, Format.class, "Format", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getFormat_Word(), this.getQuantity(), "word", null, 0, 1, Format.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFormat_Fraction(), this.getQuantity(), "fraction", null, 0, 1, Format.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFormat_Signed(), ecorePackage.getEBoolean(), "signed", "true", 0, 1, Format.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(evidenceEClass, Evidence.class, "Evidence", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getEvidence_Tool(), ecorePackage.getEString(), "tool", null, 0, 1, Evidence.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getEvidence_Verdict(), this.getVerdict(), "verdict", null, 0, 1, Evidence.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getEvidence_Results(), this.getResult(), null, "results", null, 0, -1, Evidence.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(resultEClass, Result.class, "Result", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getResult_Requirement(), ecorePackage.getEString(), "requirement", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_Kind(), ecorePackage.getEString(), "kind", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_Verdict(), this.getVerdict(), "verdict", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_Worst(), ecorePackage.getEDouble(), "worst", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_ValueLow(), ecorePackage.getEDouble(), "valueLow", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_ValueHigh(), ecorePackage.getEDouble(), "valueHigh", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_Limit(), ecorePackage.getEDouble(), "limit", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_MarginLow(), ecorePackage.getEDouble(), "marginLow", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getResult_MarginHigh(), ecorePackage.getEDouble(), "marginHigh", null, 0, 1, Result.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(revisionEClass, Revision.class, "Revision", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getRevision_Parents(), ecorePackage.getEString(), "parents", null, 0, -1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, !IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRevision_Author(), ecorePackage.getEString(), "author", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRevision_Email(), ecorePackage.getEString(), "email", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRevision_Time(), ecorePackage.getEString(), "time", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRevision_Message(), ecorePackage.getEString(), "message", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getRevision_Parameters(), this.getParameter(), null, "parameters", null, 0, -1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getRevision_Filter(), this.getFilter(), null, "filter", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getRevision_Evidence(), this.getEvidence(), null, "evidence", null, 0, 1, Revision.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(baselineEClass, Baseline.class, "Baseline", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getBaseline_Name(), ecorePackage.getEString(), "name", null, 0, 1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaseline_Author(), ecorePackage.getEString(), "author", null, 0, 1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaseline_Email(), ecorePackage.getEString(), "email", null, 0, 1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaseline_Time(), ecorePackage.getEString(), "time", null, 0, 1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaseline_Message(), ecorePackage.getEString(), "message", null, 0, 1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getBaseline_Entries(), this.getBaselineEntry(), null, "entries", null, 0, -1, Baseline.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(baselineEntryEClass, BaselineEntry.class, "BaselineEntry", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getBaselineEntry_Filter(), ecorePackage.getEString(), "filter", null, 0, 1, BaselineEntry.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaselineEntry_Identity(), ecorePackage.getEString(), "identity", null, 0, 1, BaselineEntry.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getBaselineEntry_Revision(), ecorePackage.getEString(), "revision", null, 0, 1, BaselineEntry.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(signOffEClass, SignOff.class, "SignOff", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSignOff_Filter(), ecorePackage.getEString(), "filter", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Revision(), ecorePackage.getEString(), "revision", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Reviewer(), ecorePackage.getEString(), "reviewer", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Email(), ecorePackage.getEString(), "email", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Time(), ecorePackage.getEString(), "time", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Decision(), this.getDecision(), "decision", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSignOff_Comment(), ecorePackage.getEString(), "comment", null, 0, 1, SignOff.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		// Initialize enums and add enum literals
		initEEnum(severityEEnum, Severity.class, "Severity");
		addEEnumLiteral(severityEEnum, Severity.MUST);
		addEEnumLiteral(severityEEnum, Severity.SHOULD);

		initEEnum(unitEEnum, Unit.class, "Unit");
		addEEnumLiteral(unitEEnum, Unit.PLAIN);
		addEEnumLiteral(unitEEnum, Unit.HZ);
		addEEnumLiteral(unitEEnum, Unit.S);
		addEEnumLiteral(unitEEnum, Unit.DB);
		addEEnumLiteral(unitEEnum, Unit.PERCENT);
		addEEnumLiteral(unitEEnum, Unit.BIT);
		addEEnumLiteral(unitEEnum, Unit.PPM);

		initEEnum(sideEEnum, Side.class, "Side");
		addEEnumLiteral(sideEEnum, Side.MAX);
		addEEnumLiteral(sideEEnum, Side.MIN);

		initEEnum(interpolationEEnum, Interpolation.class, "Interpolation");
		addEEnumLiteral(interpolationEEnum, Interpolation.LINEAR);
		addEEnumLiteral(interpolationEEnum, Interpolation.LOG);

		initEEnum(phaseTypeEEnum, PhaseType.class, "PhaseType");
		addEEnumLiteral(phaseTypeEEnum, PhaseType.ANY);
		addEEnumLiteral(phaseTypeEEnum, PhaseType.I);
		addEEnumLiteral(phaseTypeEEnum, PhaseType.II);
		addEEnumLiteral(phaseTypeEEnum, PhaseType.III);
		addEEnumLiteral(phaseTypeEEnum, PhaseType.IV);

		initEEnum(inputClassEEnum, InputClass.class, "InputClass");
		addEEnumLiteral(inputClassEEnum, InputClass.FULL_SCALE);
		addEEnumLiteral(inputClassEEnum, InputClass.SINUSOID);

		initEEnum(structureEEnum, Structure.class, "Structure");
		addEEnumLiteral(structureEEnum, Structure.DIRECT);
		addEEnumLiteral(structureEEnum, Structure.FOLDED);
		addEEnumLiteral(structureEEnum, Structure.TRANSPOSED);
		addEEnumLiteral(structureEEnum, Structure.HALF_BAND);
		addEEnumLiteral(structureEEnum, Structure.POLYPHASE_DECIMATOR);
		addEEnumLiteral(structureEEnum, Structure.POLYPHASE_INTERPOLATOR);

		initEEnum(roundingEEnum, Rounding.class, "Rounding");
		addEEnumLiteral(roundingEEnum, Rounding.TOWARD_ZERO);
		addEEnumLiteral(roundingEEnum, Rounding.FLOOR);
		addEEnumLiteral(roundingEEnum, Rounding.HALF_UP);
		addEEnumLiteral(roundingEEnum, Rounding.HALF_EVEN);
		addEEnumLiteral(roundingEEnum, Rounding.HALF_AWAY);

		initEEnum(overflowEEnum, Overflow.class, "Overflow");
		addEEnumLiteral(overflowEEnum, Overflow.WRAP);
		addEEnumLiteral(overflowEEnum, Overflow.SATURATE);

		initEEnum(verdictEEnum, Verdict.class, "Verdict");
		addEEnumLiteral(verdictEEnum, Verdict.MET);
		addEEnumLiteral(verdictEEnum, Verdict.MISSED);
		addEEnumLiteral(verdictEEnum, Verdict.UNPROVEN);

		initEEnum(decisionEEnum, Decision.class, "Decision");
		addEEnumLiteral(decisionEEnum, Decision.ACCEPTED);
		addEEnumLiteral(decisionEEnum, Decision.REJECTED);
		addEEnumLiteral(decisionEEnum, Decision.ACCEPTED_WITH_CONDITIONS);

		initEEnum(windowKindEEnum, WindowKind.class, "WindowKind");
		addEEnumLiteral(windowKindEEnum, WindowKind.RECTANGULAR);
		addEEnumLiteral(windowKindEEnum, WindowKind.BARTLETT);
		addEEnumLiteral(windowKindEEnum, WindowKind.HANN);
		addEEnumLiteral(windowKindEEnum, WindowKind.HAMMING);
		addEEnumLiteral(windowKindEEnum, WindowKind.HAMMING_EXACT);
		addEEnumLiteral(windowKindEEnum, WindowKind.BLACKMAN);
		addEEnumLiteral(windowKindEEnum, WindowKind.BLACKMAN_EXACT);
		addEEnumLiteral(windowKindEEnum, WindowKind.BLACKMAN_HARRIS);
		addEEnumLiteral(windowKindEEnum, WindowKind.NUTTALL);
		addEEnumLiteral(windowKindEEnum, WindowKind.FLAT_TOP);
		addEEnumLiteral(windowKindEEnum, WindowKind.GAUSSIAN);
		addEEnumLiteral(windowKindEEnum, WindowKind.TUKEY);
		addEEnumLiteral(windowKindEEnum, WindowKind.KAISER);
		addEEnumLiteral(windowKindEEnum, WindowKind.DOLPH_CHEBYSHEV);
		addEEnumLiteral(windowKindEEnum, WindowKind.DISCRETE_PROLATE);

		initEEnum(pulseGainEEnum, PulseGain.class, "PulseGain");
		addEEnumLiteral(pulseGainEEnum, PulseGain.UNITY_AT_ZERO);
		addEEnumLiteral(pulseGainEEnum, PulseGain.UNIT_ENERGY);
		addEEnumLiteral(pulseGainEEnum, PulseGain.CLOSED_FORM);

		// Initialize data types
		initEDataType(quantityEDataType, String.class, "Quantity", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);

		// Create resource
		createResource(eNS_URI);

		// Create annotations
		// http://www.eclipse.org/emf/2002/GenModel
		createGenModelAnnotations();
		// urn:tapwright:meta
		createUrntapwrightmetaAnnotations();
	}

	/**
	 * Initializes the annotations for <b>http://www.eclipse.org/emf/2002/GenModel</b>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void createGenModelAnnotations() {
		String source = "http://www.eclipse.org/emf/2002/GenModel";
		addAnnotation
		  (this,
		   source,
		   new String[] {
			   "documentation", "All digital filters of one product: what is asked of them, where their coefficients come from, the numbers that ship, and the history. One file holds one root object: a portfolio, a filter, a revision, a baseline or a sign-off. Objects of different files refer to each other by name, so that files merge line by line."
		   });
		addAnnotation
		  (quantityEDataType,
		   source,
		   new String[] {
			   "documentation", "A decimal number, or plain arithmetic (+ - * / min max and parentheses) over the portfolio\'s parameters, such as \'0.45 * adcRate\'. A number without a unit is in the unit that the feature\'s documentation gives; a unit may be written behind it (\'8 kHz\')."
		   });
		addAnnotation
		  (severityEEnum,
		   source,
		   new String[] {
			   "documentation", "How grave a missed requirement is."
		   });
		addAnnotation
		  (severityEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "A miss is an error."
		   });
		addAnnotation
		  (severityEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "A miss is a warning."
		   });
		addAnnotation
		  (unitEEnum,
		   source,
		   new String[] {
			   "documentation", "What a parameter is measured in."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "A plain number."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Hertz."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "Seconds."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(3),
		   source,
		   new String[] {
			   "documentation", "Decibels."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(4),
		   source,
		   new String[] {
			   "documentation", "Per cent."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(5),
		   source,
		   new String[] {
			   "documentation", "Bits."
		   });
		addAnnotation
		  (unitEEnum.getELiterals().get(6),
		   source,
		   new String[] {
			   "documentation", "Parts per million."
		   });
		addAnnotation
		  (sideEEnum,
		   source,
		   new String[] {
			   "documentation", "Which side of a limit line is allowed."
		   });
		addAnnotation
		  (sideEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "The gain stays at or below the line."
		   });
		addAnnotation
		  (sideEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "The gain stays at or above the line."
		   });
		addAnnotation
		  (interpolationEEnum,
		   source,
		   new String[] {
			   "documentation", "How a limit line runs between its points."
		   });
		addAnnotation
		  (interpolationEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Straight in dB over frequency."
		   });
		addAnnotation
		  (interpolationEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Straight in dB over the logarithm of frequency."
		   });
		addAnnotation
		  (phaseTypeEEnum,
		   source,
		   new String[] {
			   "documentation", "The four kinds of linear phase."
		   });
		addAnnotation
		  (phaseTypeEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Any of the four."
		   });
		addAnnotation
		  (phaseTypeEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Even symmetry, odd length."
		   });
		addAnnotation
		  (phaseTypeEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "Even symmetry, even length."
		   });
		addAnnotation
		  (phaseTypeEEnum.getELiterals().get(3),
		   source,
		   new String[] {
			   "documentation", "Odd symmetry, odd length."
		   });
		addAnnotation
		  (phaseTypeEEnum.getELiterals().get(4),
		   source,
		   new String[] {
			   "documentation", "Odd symmetry, even length."
		   });
		addAnnotation
		  (inputClassEEnum,
		   source,
		   new String[] {
			   "documentation", "The input signals that a guarantee speaks of."
		   });
		addAnnotation
		  (inputClassEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Any sequence of samples of the input format."
		   });
		addAnnotation
		  (inputClassEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Any sampled sinusoid whose amplitude fits the input format."
		   });
		addAnnotation
		  (structureEEnum,
		   source,
		   new String[] {
			   "documentation", "The order in which a filter multiplies and adds."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Delay line, one multiplier per coefficient, one accumulator."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Samples that share a coefficient are added before the multiplier; needs symmetric coefficients."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "One multiplier per coefficient, delays between the adders."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(3),
		   source,
		   new String[] {
			   "documentation", "Like folded, but zero coefficients cost nothing; needs a half-band filter."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(4),
		   source,
		   new String[] {
			   "documentation", "Computes only the samples that are kept."
		   });
		addAnnotation
		  (structureEEnum.getELiterals().get(5),
		   source,
		   new String[] {
			   "documentation", "Leaves out the products with inserted zeros."
		   });
		addAnnotation
		  (roundingEEnum,
		   source,
		   new String[] {
			   "documentation", "How a number between two steps of a format is brought to one of them."
		   });
		addAnnotation
		  (roundingEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "To the step nearer to zero."
		   });
		addAnnotation
		  (roundingEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "To the lower step."
		   });
		addAnnotation
		  (roundingEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "To the nearest step, ties upward."
		   });
		addAnnotation
		  (roundingEEnum.getELiterals().get(3),
		   source,
		   new String[] {
			   "documentation", "To the nearest step, ties to the even one."
		   });
		addAnnotation
		  (roundingEEnum.getELiterals().get(4),
		   source,
		   new String[] {
			   "documentation", "To the nearest step, ties away from zero."
		   });
		addAnnotation
		  (overflowEEnum,
		   source,
		   new String[] {
			   "documentation", "What happens to a number outside the range of a format."
		   });
		addAnnotation
		  (overflowEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "High bits are dropped."
		   });
		addAnnotation
		  (overflowEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "The nearest end of the range is taken."
		   });
		addAnnotation
		  (verdictEEnum,
		   source,
		   new String[] {
			   "documentation", "What a verification says of a requirement."
		   });
		addAnnotation
		  (verdictEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Proven to hold."
		   });
		addAnnotation
		  (verdictEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Proven not to hold."
		   });
		addAnnotation
		  (verdictEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "Neither was proven."
		   });
		addAnnotation
		  (decisionEEnum,
		   source,
		   new String[] {
			   "documentation", "A reviewer\'s decision."
		   });
		addAnnotation
		  (decisionEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "Accepted as it is."
		   });
		addAnnotation
		  (decisionEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Rejected."
		   });
		addAnnotation
		  (decisionEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "Accepted when the conditions in the comment are fulfilled."
		   });
		addAnnotation
		  (portfolioEClass,
		   source,
		   new String[] {
			   "documentation", "All filters of one product: root of the file portfolio.tapwright. The filters are the .filter files in the same folder and below."
		   });
		addAnnotation
		  (getPortfolio_Name(),
		   source,
		   new String[] {
			   "documentation", "Name of the product."
		   });
		addAnnotation
		  (getPortfolio_Description(),
		   source,
		   new String[] {
			   "documentation", "What the product is, for a reader."
		   });
		addAnnotation
		  (getPortfolio_Erosion(),
		   source,
		   new String[] {
			   "documentation", "A margin that shrank by more than this since the last revision or the active baseline is reported."
		   });
		addAnnotation
		  (getPortfolio_ActiveBaseline(),
		   source,
		   new String[] {
			   "documentation", "Name of the baseline that regressions are judged against; none when empty."
		   });
		addAnnotation
		  (getPortfolio_Parameters(),
		   source,
		   new String[] {
			   "documentation", "Named numbers that filters may use in place of numbers."
		   });
		addAnnotation
		  (getPortfolio_Processors(),
		   source,
		   new String[] {
			   "documentation", "What the filters run on."
		   });
		addAnnotation
		  (getPortfolio_Paths(),
		   source,
		   new String[] {
			   "documentation", "Chains of filters with requirements from end to end."
		   });
		addAnnotation
		  (parameterEClass,
		   source,
		   new String[] {
			   "documentation", "A named number that requirements, designs and formats may use."
		   });
		addAnnotation
		  (getParameter_Name(),
		   source,
		   new String[] {
			   "documentation", "A letter followed by letters, digits and underscores."
		   });
		addAnnotation
		  (getParameter_Value(),
		   source,
		   new String[] {
			   "documentation", "The number, or arithmetic over other parameters."
		   });
		addAnnotation
		  (getParameter_Unit(),
		   source,
		   new String[] {
			   "documentation", "Unit of the value."
		   });
		addAnnotation
		  (getParameter_Description(),
		   source,
		   new String[] {
			   "documentation", "What it stands for."
		   });
		addAnnotation
		  (processorEClass,
		   source,
		   new String[] {
			   "documentation", "A compute target."
		   });
		addAnnotation
		  (getProcessor_Name(),
		   source,
		   new String[] {
			   "documentation", "Name that deployments refer to."
		   });
		addAnnotation
		  (getProcessor_Description(),
		   source,
		   new String[] {
			   "documentation", "What it is, for a reader."
		   });
		addAnnotation
		  (getProcessor_MacRate(),
		   source,
		   new String[] {
			   "documentation", "Multiply-accumulate operations per second that are available to filters."
		   });
		addAnnotation
		  (getProcessor_Word(),
		   source,
		   new String[] {
			   "documentation", "Word length of the multiplier inputs in bits."
		   });
		addAnnotation
		  (getProcessor_Accumulator(),
		   source,
		   new String[] {
			   "documentation", "Length of the accumulator in bits."
		   });
		addAnnotation
		  (getProcessor_CoefficientMemory(),
		   source,
		   new String[] {
			   "documentation", "Words available for coefficients."
		   });
		addAnnotation
		  (getProcessor_DelayMemory(),
		   source,
		   new String[] {
			   "documentation", "Words available for delay lines."
		   });
		addAnnotation
		  (signalPathEClass,
		   source,
		   new String[] {
			   "documentation", "An ordered chain of filters and rate changes with requirements from end to end."
		   });
		addAnnotation
		  (getSignalPath_Name(),
		   source,
		   new String[] {
			   "documentation", "Name of the path."
		   });
		addAnnotation
		  (getSignalPath_Description(),
		   source,
		   new String[] {
			   "documentation", "What it does, for a reader."
		   });
		addAnnotation
		  (getSignalPath_SampleRate(),
		   source,
		   new String[] {
			   "documentation", "Sample rate at its input in Hz."
		   });
		addAnnotation
		  (getSignalPath_Stages(),
		   source,
		   new String[] {
			   "documentation", "From input to output."
		   });
		addAnnotation
		  (getSignalPath_Requirements(),
		   source,
		   new String[] {
			   "documentation", "What is asked from end to end."
		   });
		addAnnotation
		  (stageEClass,
		   source,
		   new String[] {
			   "documentation", "One step of a signal path."
		   });
		addAnnotation
		  (filterStageEClass,
		   source,
		   new String[] {
			   "documentation", "A filter of the portfolio."
		   });
		addAnnotation
		  (getFilterStage_Filter(),
		   source,
		   new String[] {
			   "documentation", "Name of the filter."
		   });
		addAnnotation
		  (decimationEClass,
		   source,
		   new String[] {
			   "documentation", "Keeps one sample of every so many."
		   });
		addAnnotation
		  (getDecimation_Factor(),
		   source,
		   new String[] {
			   "documentation", "How many samples become one."
		   });
		addAnnotation
		  (expansionEClass,
		   source,
		   new String[] {
			   "documentation", "Inserts zeros: one sample becomes so many."
		   });
		addAnnotation
		  (getExpansion_Factor(),
		   source,
		   new String[] {
			   "documentation", "How many samples one becomes."
		   });
		addAnnotation
		  (filterEClass,
		   source,
		   new String[] {
			   "documentation", "One digital filter with a finite impulse response: root of a file NAME.filter."
		   });
		addAnnotation
		  (getFilter_Name(),
		   source,
		   new String[] {
			   "documentation", "Name of the filter; the file has the same name."
		   });
		addAnnotation
		  (getFilter_Identity(),
		   source,
		   new String[] {
			   "documentation", "Stays the same through renames and revisions; made once, at random."
		   });
		addAnnotation
		  (getFilter_Purpose(),
		   source,
		   new String[] {
			   "documentation", "What the filter is for, for a reader."
		   });
		addAnnotation
		  (getFilter_SampleRate(),
		   source,
		   new String[] {
			   "documentation", "Sample rate at its input in Hz."
		   });
		addAnnotation
		  (getFilter_Requirements(),
		   source,
		   new String[] {
			   "documentation", "What is asked of the filter."
		   });
		addAnnotation
		  (getFilter_Design(),
		   source,
		   new String[] {
			   "documentation", "Where the coefficients come from."
		   });
		addAnnotation
		  (getFilter_Coefficients(),
		   source,
		   new String[] {
			   "documentation", "The numbers h[0..N-1]."
		   });
		addAnnotation
		  (getFilter_Arithmetic(),
		   source,
		   new String[] {
			   "documentation", "Structure and number formats that the filter runs in."
		   });
		addAnnotation
		  (getFilter_Deployments(),
		   source,
		   new String[] {
			   "documentation", "Where the filter runs."
		   });
		addAnnotation
		  (deploymentEClass,
		   source,
		   new String[] {
			   "documentation", "A filter on a processor."
		   });
		addAnnotation
		  (getDeployment_Processor(),
		   source,
		   new String[] {
			   "documentation", "Name of the processor."
		   });
		addAnnotation
		  (getDeployment_Channels(),
		   source,
		   new String[] {
			   "documentation", "Independent channels."
		   });
		addAnnotation
		  (getDeployment_Copies(),
		   source,
		   new String[] {
			   "documentation", "Instances of the filter per channel."
		   });
		addAnnotation
		  (getDeployment_InputRate(),
		   source,
		   new String[] {
			   "documentation", "Sample rate at the input in Hz; the filter\'s own when empty."
		   });
		addAnnotation
		  (requirementEClass,
		   source,
		   new String[] {
			   "documentation", "One checkable statement about a filter."
		   });
		addAnnotation
		  (getRequirement_Id(),
		   source,
		   new String[] {
			   "documentation", "Short name, unique in the filter."
		   });
		addAnnotation
		  (getRequirement_Severity(),
		   source,
		   new String[] {
			   "documentation", "How grave a miss is."
		   });
		addAnnotation
		  (getRequirement_Note(),
		   source,
		   new String[] {
			   "documentation", "Where the requirement comes from, or why it was changed."
		   });
		addAnnotation
		  (getRequirement_ClockTolerance(),
		   source,
		   new String[] {
			   "documentation", "The statement holds at every sample clock that is off by up to this many parts per million."
		   });
		addAnnotation
		  (limitPointEClass,
		   source,
		   new String[] {
			   "documentation", "A corner of a limit line."
		   });
		addAnnotation
		  (getLimitPoint_Frequency(),
		   source,
		   new String[] {
			   "documentation", "Frequency in Hz."
		   });
		addAnnotation
		  (getLimitPoint_Level(),
		   source,
		   new String[] {
			   "documentation", "Limit in dB."
		   });
		addAnnotation
		  (gainRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The gain stays within limits over a band. Either a constant limit between two band edges (from, to, min, max), or a line through points (points, side, interpolate)."
		   });
		addAnnotation
		  (getGainRequirement_From(),
		   source,
		   new String[] {
			   "documentation", "Lower band edge in Hz."
		   });
		addAnnotation
		  (getGainRequirement_To(),
		   source,
		   new String[] {
			   "documentation", "Upper band edge in Hz."
		   });
		addAnnotation
		  (getGainRequirement_Min(),
		   source,
		   new String[] {
			   "documentation", "Lowest gain in dB."
		   });
		addAnnotation
		  (getGainRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Highest gain in dB."
		   });
		addAnnotation
		  (getGainRequirement_Points(),
		   source,
		   new String[] {
			   "documentation", "Corners of a limit line, by rising frequency."
		   });
		addAnnotation
		  (getGainRequirement_Side(),
		   source,
		   new String[] {
			   "documentation", "Which side of the line is allowed."
		   });
		addAnnotation
		  (getGainRequirement_Interpolate(),
		   source,
		   new String[] {
			   "documentation", "How the line runs between its points."
		   });
		addAnnotation
		  (getGainRequirement_ReferenceAt(),
		   source,
		   new String[] {
			   "documentation", "Limits are relative to the gain at this frequency in Hz."
		   });
		addAnnotation
		  (getGainRequirement_ReferenceFrom(),
		   source,
		   new String[] {
			   "documentation", "Limits are relative to the largest gain of the band that starts here, in Hz."
		   });
		addAnnotation
		  (getGainRequirement_ReferenceTo(),
		   source,
		   new String[] {
			   "documentation", "Upper edge in Hz of the band whose largest gain is the reference."
		   });
		addAnnotation
		  (linearPhaseRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The coefficients are exactly symmetric or antisymmetric."
		   });
		addAnnotation
		  (getLinearPhaseRequirement_Type(),
		   source,
		   new String[] {
			   "documentation", "Which of the four kinds."
		   });
		addAnnotation
		  (groupDelayRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The group delay stays within limits over a band."
		   });
		addAnnotation
		  (getGroupDelayRequirement_From(),
		   source,
		   new String[] {
			   "documentation", "Lower band edge in Hz."
		   });
		addAnnotation
		  (getGroupDelayRequirement_To(),
		   source,
		   new String[] {
			   "documentation", "Upper band edge in Hz."
		   });
		addAnnotation
		  (getGroupDelayRequirement_Min(),
		   source,
		   new String[] {
			   "documentation", "Shortest delay in seconds."
		   });
		addAnnotation
		  (getGroupDelayRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Longest delay in seconds."
		   });
		addAnnotation
		  (groupDelayVariationRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "Largest minus smallest group delay over a band stays within a limit."
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_From(),
		   source,
		   new String[] {
			   "documentation", "Lower band edge in Hz."
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_To(),
		   source,
		   new String[] {
			   "documentation", "Upper band edge in Hz."
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Largest variation in seconds."
		   });
		addAnnotation
		  (bulkDelayRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The delay of the filter as a whole stays within limits: the middle of symmetric coefficients, otherwise the group delay at 0 Hz."
		   });
		addAnnotation
		  (getBulkDelayRequirement_Min(),
		   source,
		   new String[] {
			   "documentation", "Shortest delay in seconds."
		   });
		addAnnotation
		  (getBulkDelayRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Longest delay in seconds."
		   });
		addAnnotation
		  (stepOvershootRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The step response exceeds its final value by no more than this."
		   });
		addAnnotation
		  (getStepOvershootRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Largest overshoot in per cent of the final value."
		   });
		addAnnotation
		  (stepUndershootRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The step response goes below zero by no more than this."
		   });
		addAnnotation
		  (getStepUndershootRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Largest undershoot in per cent of the final value."
		   });
		addAnnotation
		  (stepSettlingRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "After this time the step response stays within a tolerance of its final value."
		   });
		addAnnotation
		  (getStepSettlingRequirement_Within(),
		   source,
		   new String[] {
			   "documentation", "Tolerance in per cent of the final value."
		   });
		addAnnotation
		  (getStepSettlingRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Longest settling time in seconds."
		   });
		addAnnotation
		  (impulseTailRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "After this time the impulse response stays below a part of its largest value."
		   });
		addAnnotation
		  (getImpulseTailRequirement_After(),
		   source,
		   new String[] {
			   "documentation", "Start of the tail in seconds."
		   });
		addAnnotation
		  (getImpulseTailRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Largest magnitude in the tail in per cent of the largest magnitude of all."
		   });
		addAnnotation
		  (nullRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The gain at one frequency is exactly zero."
		   });
		addAnnotation
		  (getNullRequirement_At(),
		   source,
		   new String[] {
			   "documentation", "Frequency in Hz."
		   });
		addAnnotation
		  (exactGainRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The gain at one frequency has exactly this value."
		   });
		addAnnotation
		  (getExactGainRequirement_At(),
		   source,
		   new String[] {
			   "documentation", "Frequency in Hz."
		   });
		addAnnotation
		  (getExactGainRequirement_Value(),
		   source,
		   new String[] {
			   "documentation", "Magnitude, a plain number."
		   });
		addAnnotation
		  (nonNegativeAmplitudeRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The real amplitude of symmetric coefficients is nowhere negative."
		   });
		addAnnotation
		  (noOverflowRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "No node of the structure leaves its format."
		   });
		addAnnotation
		  (getNoOverflowRequirement_Input(),
		   source,
		   new String[] {
			   "documentation", "The signals that it must hold for."
		   });
		addAnnotation
		  (outputNoiseRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The noise power that rounding adds at the output stays below a limit."
		   });
		addAnnotation
		  (getOutputNoiseRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Highest noise power in dB relative to a full-scale square wave."
		   });
		addAnnotation
		  (coefficientWordRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The coefficients fit a word of this length."
		   });
		addAnnotation
		  (getCoefficientWordRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Longest word in bits."
		   });
		addAnnotation
		  (tapsRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The filter has no more coefficients than this."
		   });
		addAnnotation
		  (getTapsRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Most coefficients."
		   });
		addAnnotation
		  (multipliesRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The structure needs no more multiplications per output sample than this."
		   });
		addAnnotation
		  (getMultipliesRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Most multiplications."
		   });
		addAnnotation
		  (addsRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The structure needs no more additions per output sample than this."
		   });
		addAnnotation
		  (getAddsRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Most additions."
		   });
		addAnnotation
		  (memoryRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "Coefficients and delay line need no more words than this."
		   });
		addAnnotation
		  (getMemoryRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Most words."
		   });
		addAnnotation
		  (multiplyRateRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The filter needs no more multiplications per second than this."
		   });
		addAnnotation
		  (getMultiplyRateRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Most multiplications per second."
		   });
		addAnnotation
		  (aliasRejectionRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "What folds into the kept band when one sample in so many is kept is this far below the gain limit of 0 dB."
		   });
		addAnnotation
		  (getAliasRejectionRequirement_Factor(),
		   source,
		   new String[] {
			   "documentation", "How many samples become one."
		   });
		addAnnotation
		  (getAliasRejectionRequirement_To(),
		   source,
		   new String[] {
			   "documentation", "Upper edge of the kept band in Hz."
		   });
		addAnnotation
		  (getAliasRejectionRequirement_Min(),
		   source,
		   new String[] {
			   "documentation", "Smallest rejection in dB, positive."
		   });
		addAnnotation
		  (powerComplementaryRequirementEClass,
		   source,
		   new String[] {
			   "documentation", "The squared gains of this filter and a partner add up to one."
		   });
		addAnnotation
		  (getPowerComplementaryRequirement_Partner(),
		   source,
		   new String[] {
			   "documentation", "Name of the partner filter."
		   });
		addAnnotation
		  (getPowerComplementaryRequirement_Max(),
		   source,
		   new String[] {
			   "documentation", "Largest deviation of the sum from 0 dB."
		   });
		addAnnotation
		  (windowKindEEnum,
		   source,
		   new String[] {
			   "documentation", "A window function."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "All ones."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "Triangle with zero ends."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "Raised cosine."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(3),
		   source,
		   new String[] {
			   "documentation", "0.54 and 0.46."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(4),
		   source,
		   new String[] {
			   "documentation", "25/46 and 21/46."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(5),
		   source,
		   new String[] {
			   "documentation", "0.42, 0.5 and 0.08."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(6),
		   source,
		   new String[] {
			   "documentation", "7938/18608, 9240/18608 and 1430/18608."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(7),
		   source,
		   new String[] {
			   "documentation", "Four terms, -92 dB."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(8),
		   source,
		   new String[] {
			   "documentation", "Four terms with continuous first derivative."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(9),
		   source,
		   new String[] {
			   "documentation", "Five terms for amplitude measurement."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(10),
		   source,
		   new String[] {
			   "documentation", "Gaussian; the parameter is the standard deviation relative to half the length."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(11),
		   source,
		   new String[] {
			   "documentation", "Flat middle with cosine ends; the parameter is the part of the length that is tapered."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(12),
		   source,
		   new String[] {
			   "documentation", "The parameter is beta."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(13),
		   source,
		   new String[] {
			   "documentation", "The parameter is the side-lobe level in dB, positive."
		   });
		addAnnotation
		  (windowKindEEnum.getELiterals().get(14),
		   source,
		   new String[] {
			   "documentation", "The parameter is the time-half-bandwidth product."
		   });
		addAnnotation
		  (designEClass,
		   source,
		   new String[] {
			   "documentation", "Where coefficients come from: a method with its parameters."
		   });
		addAnnotation
		  (bandDesignEClass,
		   source,
		   new String[] {
			   "documentation", "A method that approximates a target over bands. Without bands of its own it takes them from the gain requirements."
		   });
		addAnnotation
		  (getBandDesign_Taps(),
		   source,
		   new String[] {
			   "documentation", "Number of coefficients."
		   });
		addAnnotation
		  (getBandDesign_Bands(),
		   source,
		   new String[] {
			   "documentation", "Target, by rising frequency."
		   });
		addAnnotation
		  (designBandEClass,
		   source,
		   new String[] {
			   "documentation", "A straight line of desired amplitude over a band."
		   });
		addAnnotation
		  (getDesignBand_From(),
		   source,
		   new String[] {
			   "documentation", "Lower band edge in Hz."
		   });
		addAnnotation
		  (getDesignBand_To(),
		   source,
		   new String[] {
			   "documentation", "Upper band edge in Hz."
		   });
		addAnnotation
		  (getDesignBand_Desired(),
		   source,
		   new String[] {
			   "documentation", "Desired amplitude at the lower edge, a plain number."
		   });
		addAnnotation
		  (getDesignBand_DesiredTo(),
		   source,
		   new String[] {
			   "documentation", "Desired amplitude at the upper edge; the same as at the lower when empty."
		   });
		addAnnotation
		  (getDesignBand_Weight(),
		   source,
		   new String[] {
			   "documentation", "Weight of the error at the lower edge; 1 when empty."
		   });
		addAnnotation
		  (getDesignBand_WeightTo(),
		   source,
		   new String[] {
			   "documentation", "Weight of the error at the upper edge; the same as at the lower when empty."
		   });
		addAnnotation
		  (givenDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The coefficients were made elsewhere."
		   });
		addAnnotation
		  (getGivenDesign_Source(),
		   source,
		   new String[] {
			   "documentation", "Where they come from."
		   });
		addAnnotation
		  (windowDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The ideal response cut by a window."
		   });
		addAnnotation
		  (getWindowDesign_Window(),
		   source,
		   new String[] {
			   "documentation", "Which window."
		   });
		addAnnotation
		  (getWindowDesign_Parameter(),
		   source,
		   new String[] {
			   "documentation", "Shape parameter of windows that have one; for the Kaiser window beta, taken from the requirements when empty."
		   });
		addAnnotation
		  (equirippleDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Smallest largest weighted error, by the exchange algorithm of Parks and McClellan (1972)."
		   });
		addAnnotation
		  (getEquirippleDesign_Type(),
		   source,
		   new String[] {
			   "documentation", "Kind of linear phase; type I or II by the number of taps when any."
		   });
		addAnnotation
		  (getEquirippleDesign_Tolerance(),
		   source,
		   new String[] {
			   "documentation", "Relative distance from the optimum at which the exchange stops; 0.0001 when empty."
		   });
		addAnnotation
		  (movingAverageDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The mean of the last samples, once or several times one after the other."
		   });
		addAnnotation
		  (getMovingAverageDesign_Taps(),
		   source,
		   new String[] {
			   "documentation", "Samples of one mean."
		   });
		addAnnotation
		  (getMovingAverageDesign_Sections(),
		   source,
		   new String[] {
			   "documentation", "How many means follow each other; 1 when empty."
		   });
		addAnnotation
		  (binomialDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The mean of two samples, many times one after the other: neither ripple nor overshoot."
		   });
		addAnnotation
		  (getBinomialDesign_Order(),
		   source,
		   new String[] {
			   "documentation", "Number of coefficients less one."
		   });
		addAnnotation
		  (maximallyFlatDesignEClass,
		   source,
		   new String[] {
			   "documentation", "As flat as possible at 0 Hz and at half the sample rate (Herrmann, 1971); equal orders give a half-band filter."
		   });
		addAnnotation
		  (getMaximallyFlatDesign_Flatness(),
		   source,
		   new String[] {
			   "documentation", "Order of contact at 0 Hz."
		   });
		addAnnotation
		  (getMaximallyFlatDesign_Zeros(),
		   source,
		   new String[] {
			   "documentation", "Order of the zero at half the sample rate."
		   });
		addAnnotation
		  (savitzkyGolayDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Smoothing or differentiation by a polynomial that is fitted to the last samples (Savitzky and Golay, 1964)."
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Points(),
		   source,
		   new String[] {
			   "documentation", "Number of samples, odd."
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Degree(),
		   source,
		   new String[] {
			   "documentation", "Degree of the polynomial."
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Derivative(),
		   source,
		   new String[] {
			   "documentation", "Which derivative, per sample; 0 smooths, also when empty."
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Position(),
		   source,
		   new String[] {
			   "documentation", "Where the polynomial is evaluated, in samples from the middle; positive is toward the newest."
		   });
		addAnnotation
		  (lagrangeDelayDesignEClass,
		   source,
		   new String[] {
			   "documentation", "A delay by any number of samples, maximally flat at 0 Hz."
		   });
		addAnnotation
		  (getLagrangeDelayDesign_Order(),
		   source,
		   new String[] {
			   "documentation", "Number of coefficients less one."
		   });
		addAnnotation
		  (getLagrangeDelayDesign_Delay(),
		   source,
		   new String[] {
			   "documentation", "Delay in seconds."
		   });
		addAnnotation
		  (pulseGainEEnum,
		   source,
		   new String[] {
			   "documentation", "What a pulse is scaled to."
		   });
		addAnnotation
		  (pulseGainEEnum.getELiterals().get(0),
		   source,
		   new String[] {
			   "documentation", "The coefficients add up to 1."
		   });
		addAnnotation
		  (pulseGainEEnum.getELiterals().get(1),
		   source,
		   new String[] {
			   "documentation", "The squares of the coefficients add up to 1."
		   });
		addAnnotation
		  (pulseGainEEnum.getELiterals().get(2),
		   source,
		   new String[] {
			   "documentation", "The closed form for symbols of duration 1, unscaled."
		   });
		addAnnotation
		  (raisedCosineDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Pulse of a data transmission: the raised cosine or its square root, sampled and cut."
		   });
		addAnnotation
		  (getRaisedCosineDesign_RollOff(),
		   source,
		   new String[] {
			   "documentation", "Part of the band that rolls off, 0 to 1."
		   });
		addAnnotation
		  (getRaisedCosineDesign_SamplesPerSymbol(),
		   source,
		   new String[] {
			   "documentation", "Samples per symbol."
		   });
		addAnnotation
		  (getRaisedCosineDesign_Symbols(),
		   source,
		   new String[] {
			   "documentation", "Length in symbols."
		   });
		addAnnotation
		  (getRaisedCosineDesign_Root(),
		   source,
		   new String[] {
			   "documentation", "The square root, otherwise the raised cosine itself."
		   });
		addAnnotation
		  (getRaisedCosineDesign_Gain(),
		   source,
		   new String[] {
			   "documentation", "What the pulse is scaled to."
		   });
		addAnnotation
		  (leastSquaresDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Smallest weighted squared error. Nulls and exact gains that the requirements ask for hold exactly."
		   });
		addAnnotation
		  (getLeastSquaresDesign_Type(),
		   source,
		   new String[] {
			   "documentation", "Kind of linear phase; type I or II by the number of taps when any."
		   });
		addAnnotation
		  (constrainedLeastSquaresDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Smallest squared error within the gain limits of the requirements (Selesnick, Lang and Burrus, 1996)."
		   });
		addAnnotation
		  (getConstrainedLeastSquaresDesign_Type(),
		   source,
		   new String[] {
			   "documentation", "Kind of linear phase; type I or II by the number of taps when any."
		   });
		addAnnotation
		  (linearProgramDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Smallest largest error within all gain limits, step limits, nulls and exact gains that the requirements ask for."
		   });
		addAnnotation
		  (getLinearProgramDesign_Monotone(),
		   source,
		   new String[] {
			   "documentation", "The amplitude only falls in the first band."
		   });
		addAnnotation
		  (halfBandDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Equiripple half-band filter with exact zeros (Vaidyanathan and Nguyen, 1987), or its Hilbert transformer."
		   });
		addAnnotation
		  (getHalfBandDesign_Taps(),
		   source,
		   new String[] {
			   "documentation", "Number of coefficients, 4 J - 1."
		   });
		addAnnotation
		  (getHalfBandDesign_PassEdge(),
		   source,
		   new String[] {
			   "documentation", "Upper edge of the pass band in Hz, below a quarter of the sample rate."
		   });
		addAnnotation
		  (getHalfBandDesign_Hilbert(),
		   source,
		   new String[] {
			   "documentation", "The Hilbert transformer instead."
		   });
		addAnnotation
		  (cicCompensatorDesignEClass,
		   source,
		   new String[] {
			   "documentation", "Makes the pass band of a cascaded integrator-comb decimator in front of it flat."
		   });
		addAnnotation
		  (getCicCompensatorDesign_Taps(),
		   source,
		   new String[] {
			   "documentation", "Number of coefficients."
		   });
		addAnnotation
		  (getCicCompensatorDesign_Sections(),
		   source,
		   new String[] {
			   "documentation", "Sections of the decimator."
		   });
		addAnnotation
		  (getCicCompensatorDesign_Rate(),
		   source,
		   new String[] {
			   "documentation", "Factor of the decimator."
		   });
		addAnnotation
		  (getCicCompensatorDesign_PassEdge(),
		   source,
		   new String[] {
			   "documentation", "Upper edge of the flat band in Hz."
		   });
		addAnnotation
		  (getCicCompensatorDesign_StopEdge(),
		   source,
		   new String[] {
			   "documentation", "Lower edge of the stop band in Hz."
		   });
		addAnnotation
		  (getCicCompensatorDesign_StopWeight(),
		   source,
		   new String[] {
			   "documentation", "Weight of the error in the stop band; 1 when empty."
		   });
		addAnnotation
		  (combDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The sum or difference of two samples, a period apart."
		   });
		addAnnotation
		  (getCombDesign_Period(),
		   source,
		   new String[] {
			   "documentation", "Distance of the samples in seconds."
		   });
		addAnnotation
		  (getCombDesign_Difference(),
		   source,
		   new String[] {
			   "documentation", "0 Hz is a zero."
		   });
		addAnnotation
		  (minimumPhaseDesignEClass,
		   source,
		   new String[] {
			   "documentation", "The filter of shortest delay with the gain of another one, by spectral factorisation (Wilson, 1969)."
		   });
		addAnnotation
		  (getMinimumPhaseDesign_Prototype(),
		   source,
		   new String[] {
			   "documentation", "A design with symmetric coefficients, whose squared gain is that of the result."
		   });
		addAnnotation
		  (complementDesignEClass,
		   source,
		   new String[] {
			   "documentation", "What another filter leaves over: a pure delay less that filter."
		   });
		addAnnotation
		  (getComplementDesign_Prototype(),
		   source,
		   new String[] {
			   "documentation", "A design with an odd number of symmetric coefficients."
		   });
		addAnnotation
		  (coefficientsEClass,
		   source,
		   new String[] {
			   "documentation", "The coefficients h[0..N-1] of a filter, exactly."
		   });
		addAnnotation
		  (getCoefficients_DesignHash(),
		   source,
		   new String[] {
			   "documentation", "Content hash of the design that computed them and of the numbers it used; empty when they were given."
		   });
		addAnnotation
		  (realCoefficientsEClass,
		   source,
		   new String[] {
			   "documentation", "Coefficients as IEEE 754 doubles; each is the rational number that it is."
		   });
		addAnnotation
		  (getRealCoefficients_Values(),
		   source,
		   new String[] {
			   "documentation", "h[0..N-1], a plain number each."
		   });
		addAnnotation
		  (integerCoefficientsEClass,
		   source,
		   new String[] {
			   "documentation", "Coefficients as integers times a scale."
		   });
		addAnnotation
		  (getIntegerCoefficients_Integers(),
		   source,
		   new String[] {
			   "documentation", "h[0..N-1] divided by the scale."
		   });
		addAnnotation
		  (getIntegerCoefficients_Scale(),
		   source,
		   new String[] {
			   "documentation", "What one step is worth: a power of two such as \'2^-15\', a fraction such as \'1/35\', or a decimal."
		   });
		addAnnotation
		  (arithmeticEClass,
		   source,
		   new String[] {
			   "documentation", "Structure and number formats that a filter runs in. A format that is missing puts no bound on its node."
		   });
		addAnnotation
		  (getArithmetic_Structure(),
		   source,
		   new String[] {
			   "documentation", "Order of operations."
		   });
		addAnnotation
		  (getArithmetic_Factor(),
		   source,
		   new String[] {
			   "documentation", "Rate factor of polyphase and half-band structures; 1 when empty."
		   });
		addAnnotation
		  (getArithmetic_Coefficient(),
		   source,
		   new String[] {
			   "documentation", "Format of the coefficients."
		   });
		addAnnotation
		  (getArithmetic_Input(),
		   source,
		   new String[] {
			   "documentation", "Format of the input samples."
		   });
		addAnnotation
		  (getArithmetic_Product(),
		   source,
		   new String[] {
			   "documentation", "Format that every product is rounded to; exact when missing."
		   });
		addAnnotation
		  (getArithmetic_Accumulator(),
		   source,
		   new String[] {
			   "documentation", "Format of the running sum."
		   });
		addAnnotation
		  (getArithmetic_Output(),
		   source,
		   new String[] {
			   "documentation", "Format of the output samples."
		   });
		addAnnotation
		  (getArithmetic_Rounding(),
		   source,
		   new String[] {
			   "documentation", "Wherever bits are dropped."
		   });
		addAnnotation
		  (getArithmetic_Overflow(),
		   source,
		   new String[] {
			   "documentation", "In the accumulator and at the output."
		   });
		addAnnotation
		  (formatEClass,
		   source,
		   new String[] {
			   "documentation", "A binary fixed-point format."
		   });
		addAnnotation
		  (getFormat_Word(),
		   source,
		   new String[] {
			   "documentation", "Bits in all."
		   });
		addAnnotation
		  (getFormat_Fraction(),
		   source,
		   new String[] {
			   "documentation", "Bits after the binary point."
		   });
		addAnnotation
		  (getFormat_Signed(),
		   source,
		   new String[] {
			   "documentation", "Two\'s complement, otherwise unsigned."
		   });
		addAnnotation
		  (evidenceEClass,
		   source,
		   new String[] {
			   "documentation", "Results of one verification, kept with a revision."
		   });
		addAnnotation
		  (getEvidence_Tool(),
		   source,
		   new String[] {
			   "documentation", "Name and version of the program."
		   });
		addAnnotation
		  (getEvidence_Verdict(),
		   source,
		   new String[] {
			   "documentation", "The gravest of the results."
		   });
		addAnnotation
		  (getEvidence_Results(),
		   source,
		   new String[] {
			   "documentation", "One for each requirement."
		   });
		addAnnotation
		  (resultEClass,
		   source,
		   new String[] {
			   "documentation", "What was proven of one requirement."
		   });
		addAnnotation
		  (getResult_Requirement(),
		   source,
		   new String[] {
			   "documentation", "Id of the requirement."
		   });
		addAnnotation
		  (getResult_Kind(),
		   source,
		   new String[] {
			   "documentation", "Kind of the requirement."
		   });
		addAnnotation
		  (getResult_Verdict(),
		   source,
		   new String[] {
			   "documentation", "What was proven."
		   });
		addAnnotation
		  (getResult_Worst(),
		   source,
		   new String[] {
			   "documentation", "Where the margin is smallest, in the unit of the kind; NaN without a place."
		   });
		addAnnotation
		  (getResult_ValueLow(),
		   source,
		   new String[] {
			   "documentation", "Lower end of the enclosure of the worst value, in the unit of the limit."
		   });
		addAnnotation
		  (getResult_ValueHigh(),
		   source,
		   new String[] {
			   "documentation", "Upper end of the enclosure of the worst value."
		   });
		addAnnotation
		  (getResult_Limit(),
		   source,
		   new String[] {
			   "documentation", "The limit at that place."
		   });
		addAnnotation
		  (getResult_MarginLow(),
		   source,
		   new String[] {
			   "documentation", "Lower end of the enclosure of the margin, in the unit of the limit."
		   });
		addAnnotation
		  (getResult_MarginHigh(),
		   source,
		   new String[] {
			   "documentation", "Upper end of the enclosure of the margin."
		   });
		addAnnotation
		  (revisionEClass,
		   source,
		   new String[] {
			   "documentation", "An immutable snapshot of a filter."
		   });
		addAnnotation
		  (getRevision_Parents(),
		   source,
		   new String[] {
			   "documentation", "Hashes of the revisions that it was made from."
		   });
		addAnnotation
		  (getRevision_Author(),
		   source,
		   new String[] {
			   "documentation", "Who recorded it."
		   });
		addAnnotation
		  (getRevision_Email(),
		   source,
		   new String[] {
			   "documentation", "Address of the author."
		   });
		addAnnotation
		  (getRevision_Time(),
		   source,
		   new String[] {
			   "documentation", "When, as ISO 8601 in UTC."
		   });
		addAnnotation
		  (getRevision_Message(),
		   source,
		   new String[] {
			   "documentation", "Why."
		   });
		addAnnotation
		  (getRevision_Parameters(),
		   source,
		   new String[] {
			   "documentation", "Values of the parameters that the filter uses, at that time."
		   });
		addAnnotation
		  (getRevision_Filter(),
		   source,
		   new String[] {
			   "documentation", "The filter as it was."
		   });
		addAnnotation
		  (getRevision_Evidence(),
		   source,
		   new String[] {
			   "documentation", "What was proven of it."
		   });
		addAnnotation
		  (baselineEClass,
		   source,
		   new String[] {
			   "documentation", "A named set of revisions, for a release or a review."
		   });
		addAnnotation
		  (getBaseline_Name(),
		   source,
		   new String[] {
			   "documentation", "Name of the baseline."
		   });
		addAnnotation
		  (getBaseline_Author(),
		   source,
		   new String[] {
			   "documentation", "Who made it."
		   });
		addAnnotation
		  (getBaseline_Email(),
		   source,
		   new String[] {
			   "documentation", "Address of the author."
		   });
		addAnnotation
		  (getBaseline_Time(),
		   source,
		   new String[] {
			   "documentation", "When, as ISO 8601 in UTC."
		   });
		addAnnotation
		  (getBaseline_Message(),
		   source,
		   new String[] {
			   "documentation", "What it is for."
		   });
		addAnnotation
		  (getBaseline_Entries(),
		   source,
		   new String[] {
			   "documentation", "One for each filter."
		   });
		addAnnotation
		  (baselineEntryEClass,
		   source,
		   new String[] {
			   "documentation", "One filter of a baseline."
		   });
		addAnnotation
		  (getBaselineEntry_Filter(),
		   source,
		   new String[] {
			   "documentation", "Name of the filter."
		   });
		addAnnotation
		  (getBaselineEntry_Identity(),
		   source,
		   new String[] {
			   "documentation", "Identity of the filter."
		   });
		addAnnotation
		  (getBaselineEntry_Revision(),
		   source,
		   new String[] {
			   "documentation", "Hash of its revision."
		   });
		addAnnotation
		  (signOffEClass,
		   source,
		   new String[] {
			   "documentation", "A reviewer\'s decision on one revision."
		   });
		addAnnotation
		  (getSignOff_Filter(),
		   source,
		   new String[] {
			   "documentation", "Name of the filter."
		   });
		addAnnotation
		  (getSignOff_Revision(),
		   source,
		   new String[] {
			   "documentation", "Hash of the revision."
		   });
		addAnnotation
		  (getSignOff_Reviewer(),
		   source,
		   new String[] {
			   "documentation", "Who decided."
		   });
		addAnnotation
		  (getSignOff_Email(),
		   source,
		   new String[] {
			   "documentation", "Address of the reviewer."
		   });
		addAnnotation
		  (getSignOff_Time(),
		   source,
		   new String[] {
			   "documentation", "When, as ISO 8601 in UTC."
		   });
		addAnnotation
		  (getSignOff_Decision(),
		   source,
		   new String[] {
			   "documentation", "What was decided."
		   });
		addAnnotation
		  (getSignOff_Comment(),
		   source,
		   new String[] {
			   "documentation", "Why, and on what conditions."
		   });
	}

	/**
	 * Initializes the annotations for <b>urn:tapwright:meta</b>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void createUrntapwrightmetaAnnotations() {
		String source = "urn:tapwright:meta";
		addAnnotation
		  (getPortfolio_Erosion(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (getProcessor_MacRate(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getProcessor_Word(),
		   source,
		   new String[] {
			   "unit", "bit"
		   });
		addAnnotation
		  (getProcessor_Accumulator(),
		   source,
		   new String[] {
			   "unit", "bit"
		   });
		addAnnotation
		  (getProcessor_CoefficientMemory(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getProcessor_DelayMemory(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getSignalPath_SampleRate(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getDecimation_Factor(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getExpansion_Factor(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getFilter_SampleRate(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getDeployment_Channels(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDeployment_Copies(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDeployment_InputRate(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getRequirement_ClockTolerance(),
		   source,
		   new String[] {
			   "unit", "ppm"
		   });
		addAnnotation
		  (getLimitPoint_Frequency(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getLimitPoint_Level(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (gainRequirementEClass,
		   source,
		   new String[] {
			   "kind", "gain",
			   "label", "Gain"
		   });
		addAnnotation
		  (getGainRequirement_From(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGainRequirement_To(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGainRequirement_Min(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (getGainRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (getGainRequirement_Points(),
		   source,
		   new String[] {
			   "json", "pairs"
		   });
		addAnnotation
		  (getGainRequirement_ReferenceAt(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGainRequirement_ReferenceFrom(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGainRequirement_ReferenceTo(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (linearPhaseRequirementEClass,
		   source,
		   new String[] {
			   "kind", "linear-phase",
			   "label", "Linear phase"
		   });
		addAnnotation
		  (groupDelayRequirementEClass,
		   source,
		   new String[] {
			   "kind", "group-delay",
			   "label", "Group delay"
		   });
		addAnnotation
		  (getGroupDelayRequirement_From(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGroupDelayRequirement_To(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGroupDelayRequirement_Min(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (getGroupDelayRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (groupDelayVariationRequirementEClass,
		   source,
		   new String[] {
			   "kind", "group-delay-variation",
			   "label", "Group delay variation"
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_From(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_To(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getGroupDelayVariationRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (bulkDelayRequirementEClass,
		   source,
		   new String[] {
			   "kind", "bulk-delay",
			   "label", "Bulk delay"
		   });
		addAnnotation
		  (getBulkDelayRequirement_Min(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (getBulkDelayRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (stepOvershootRequirementEClass,
		   source,
		   new String[] {
			   "kind", "step-overshoot",
			   "label", "Step overshoot"
		   });
		addAnnotation
		  (getStepOvershootRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "%"
		   });
		addAnnotation
		  (stepUndershootRequirementEClass,
		   source,
		   new String[] {
			   "kind", "step-undershoot",
			   "label", "Step undershoot"
		   });
		addAnnotation
		  (getStepUndershootRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "%"
		   });
		addAnnotation
		  (stepSettlingRequirementEClass,
		   source,
		   new String[] {
			   "kind", "step-settling",
			   "label", "Step settling"
		   });
		addAnnotation
		  (getStepSettlingRequirement_Within(),
		   source,
		   new String[] {
			   "unit", "%"
		   });
		addAnnotation
		  (getStepSettlingRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (impulseTailRequirementEClass,
		   source,
		   new String[] {
			   "kind", "impulse-tail",
			   "label", "Impulse tail"
		   });
		addAnnotation
		  (getImpulseTailRequirement_After(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (getImpulseTailRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "%"
		   });
		addAnnotation
		  (nullRequirementEClass,
		   source,
		   new String[] {
			   "kind", "null",
			   "label", "Null"
		   });
		addAnnotation
		  (getNullRequirement_At(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (exactGainRequirementEClass,
		   source,
		   new String[] {
			   "kind", "exact-gain",
			   "label", "Exact gain"
		   });
		addAnnotation
		  (getExactGainRequirement_At(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getExactGainRequirement_Value(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (nonNegativeAmplitudeRequirementEClass,
		   source,
		   new String[] {
			   "kind", "non-negative-amplitude",
			   "label", "Non-negative amplitude"
		   });
		addAnnotation
		  (noOverflowRequirementEClass,
		   source,
		   new String[] {
			   "kind", "no-overflow",
			   "label", "No overflow"
		   });
		addAnnotation
		  (outputNoiseRequirementEClass,
		   source,
		   new String[] {
			   "kind", "output-noise",
			   "label", "Output noise"
		   });
		addAnnotation
		  (getOutputNoiseRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (coefficientWordRequirementEClass,
		   source,
		   new String[] {
			   "kind", "coefficient-word",
			   "label", "Coefficient word length"
		   });
		addAnnotation
		  (getCoefficientWordRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "bit"
		   });
		addAnnotation
		  (tapsRequirementEClass,
		   source,
		   new String[] {
			   "kind", "taps",
			   "label", "Taps"
		   });
		addAnnotation
		  (getTapsRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (multipliesRequirementEClass,
		   source,
		   new String[] {
			   "kind", "multiplies",
			   "label", "Multiplies"
		   });
		addAnnotation
		  (getMultipliesRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (addsRequirementEClass,
		   source,
		   new String[] {
			   "kind", "adds",
			   "label", "Adds"
		   });
		addAnnotation
		  (getAddsRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (memoryRequirementEClass,
		   source,
		   new String[] {
			   "kind", "memory",
			   "label", "Memory"
		   });
		addAnnotation
		  (getMemoryRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (multiplyRateRequirementEClass,
		   source,
		   new String[] {
			   "kind", "multiplies-per-second",
			   "label", "Multiplies per second"
		   });
		addAnnotation
		  (getMultiplyRateRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (aliasRejectionRequirementEClass,
		   source,
		   new String[] {
			   "kind", "alias-rejection",
			   "label", "Alias rejection"
		   });
		addAnnotation
		  (getAliasRejectionRequirement_Factor(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getAliasRejectionRequirement_To(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getAliasRejectionRequirement_Min(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (powerComplementaryRequirementEClass,
		   source,
		   new String[] {
			   "kind", "power-complementary",
			   "label", "Power complementary"
		   });
		addAnnotation
		  (getPowerComplementaryRequirement_Max(),
		   source,
		   new String[] {
			   "unit", "dB"
		   });
		addAnnotation
		  (getBandDesign_Taps(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDesignBand_From(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getDesignBand_To(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getDesignBand_Desired(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDesignBand_DesiredTo(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDesignBand_Weight(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getDesignBand_WeightTo(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (givenDesignEClass,
		   source,
		   new String[] {
			   "method", "given",
			   "label", "Given"
		   });
		addAnnotation
		  (windowDesignEClass,
		   source,
		   new String[] {
			   "method", "window",
			   "label", "Window"
		   });
		addAnnotation
		  (getWindowDesign_Parameter(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (equirippleDesignEClass,
		   source,
		   new String[] {
			   "method", "equiripple",
			   "label", "Equiripple"
		   });
		addAnnotation
		  (getEquirippleDesign_Tolerance(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (movingAverageDesignEClass,
		   source,
		   new String[] {
			   "method", "moving-average",
			   "label", "Moving average"
		   });
		addAnnotation
		  (getMovingAverageDesign_Taps(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getMovingAverageDesign_Sections(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (binomialDesignEClass,
		   source,
		   new String[] {
			   "method", "binomial",
			   "label", "Binomial"
		   });
		addAnnotation
		  (getBinomialDesign_Order(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (maximallyFlatDesignEClass,
		   source,
		   new String[] {
			   "method", "maximally-flat",
			   "label", "Maximally flat"
		   });
		addAnnotation
		  (getMaximallyFlatDesign_Flatness(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getMaximallyFlatDesign_Zeros(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (savitzkyGolayDesignEClass,
		   source,
		   new String[] {
			   "method", "savitzky-golay",
			   "label", "Savitzky-Golay"
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Points(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Degree(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Derivative(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getSavitzkyGolayDesign_Position(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (lagrangeDelayDesignEClass,
		   source,
		   new String[] {
			   "method", "lagrange-delay",
			   "label", "Lagrange fractional delay"
		   });
		addAnnotation
		  (getLagrangeDelayDesign_Order(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getLagrangeDelayDesign_Delay(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (raisedCosineDesignEClass,
		   source,
		   new String[] {
			   "method", "raised-cosine",
			   "label", "Raised cosine pulse"
		   });
		addAnnotation
		  (getRaisedCosineDesign_RollOff(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getRaisedCosineDesign_SamplesPerSymbol(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getRaisedCosineDesign_Symbols(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (leastSquaresDesignEClass,
		   source,
		   new String[] {
			   "method", "least-squares",
			   "label", "Least squares"
		   });
		addAnnotation
		  (constrainedLeastSquaresDesignEClass,
		   source,
		   new String[] {
			   "method", "constrained-least-squares",
			   "label", "Constrained least squares"
		   });
		addAnnotation
		  (linearProgramDesignEClass,
		   source,
		   new String[] {
			   "method", "linear-program",
			   "label", "Linear program"
		   });
		addAnnotation
		  (halfBandDesignEClass,
		   source,
		   new String[] {
			   "method", "half-band",
			   "label", "Half-band"
		   });
		addAnnotation
		  (getHalfBandDesign_Taps(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getHalfBandDesign_PassEdge(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (cicCompensatorDesignEClass,
		   source,
		   new String[] {
			   "method", "cic-compensator",
			   "label", "Droop compensator"
		   });
		addAnnotation
		  (getCicCompensatorDesign_Taps(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getCicCompensatorDesign_Sections(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getCicCompensatorDesign_Rate(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getCicCompensatorDesign_PassEdge(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getCicCompensatorDesign_StopEdge(),
		   source,
		   new String[] {
			   "unit", "Hz"
		   });
		addAnnotation
		  (getCicCompensatorDesign_StopWeight(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (combDesignEClass,
		   source,
		   new String[] {
			   "method", "comb",
			   "label", "Comb"
		   });
		addAnnotation
		  (getCombDesign_Period(),
		   source,
		   new String[] {
			   "unit", "s"
		   });
		addAnnotation
		  (minimumPhaseDesignEClass,
		   source,
		   new String[] {
			   "method", "minimum-phase",
			   "label", "Minimum phase"
		   });
		addAnnotation
		  (complementDesignEClass,
		   source,
		   new String[] {
			   "method", "complement",
			   "label", "Complement"
		   });
		addAnnotation
		  (realCoefficientsEClass,
		   source,
		   new String[] {
			   "json", "values"
		   });
		addAnnotation
		  (integerCoefficientsEClass,
		   source,
		   new String[] {
			   "json", "integers"
		   });
		addAnnotation
		  (getArithmetic_Factor(),
		   source,
		   new String[] {
			   "unit", "1"
		   });
		addAnnotation
		  (getFormat_Word(),
		   source,
		   new String[] {
			   "unit", "bit"
		   });
		addAnnotation
		  (getFormat_Fraction(),
		   source,
		   new String[] {
			   "unit", "bit"
		   });
	}

} //ModelPackageImpl
