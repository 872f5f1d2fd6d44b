/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EFactory;

/**
 * <!-- begin-user-doc -->
 * The <b>Factory</b> for the model.
 * It provides a create method for each non-abstract class of the model.
 * <!-- end-user-doc -->
 * @see tapwright.model.ModelPackage
 * @generated
 */
public interface ModelFactory extends EFactory {
	/**
	 * The singleton instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	ModelFactory eINSTANCE = tapwright.model.impl.ModelFactoryImpl.init();

	/**
	 * Returns a new object of class '<em>Portfolio</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Portfolio</em>'.
	 * @generated
	 */
	Portfolio createPortfolio();

	/**
	 * Returns a new object of class '<em>Parameter</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Parameter</em>'.
	 * @generated
	 */
	Parameter createParameter();

	/**
	 * Returns a new object of class '<em>Processor</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Processor</em>'.
	 * @generated
	 */
	Processor createProcessor();

	/**
	 * Returns a new object of class '<em>Signal Path</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Signal Path</em>'.
	 * @generated
	 */
	SignalPath createSignalPath();

	/**
	 * Returns a new object of class '<em>Filter Stage</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Filter Stage</em>'.
	 * @generated
	 */
	FilterStage createFilterStage();

	/**
	 * Returns a new object of class '<em>Decimation</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Decimation</em>'.
	 * @generated
	 */
	Decimation createDecimation();

	/**
	 * Returns a new object of class '<em>Expansion</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Expansion</em>'.
	 * @generated
	 */
	Expansion createExpansion();

	/**
	 * Returns a new object of class '<em>Filter</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Filter</em>'.
	 * @generated
	 */
	Filter createFilter();

	/**
	 * Returns a new object of class '<em>Deployment</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Deployment</em>'.
	 * @generated
	 */
	Deployment createDeployment();

	/**
	 * Returns a new object of class '<em>Limit Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Limit Point</em>'.
	 * @generated
	 */
	LimitPoint createLimitPoint();

	/**
	 * Returns a new object of class '<em>Gain Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Gain Requirement</em>'.
	 * @generated
	 */
	GainRequirement createGainRequirement();

	/**
	 * Returns a new object of class '<em>Linear Phase Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Linear Phase Requirement</em>'.
	 * @generated
	 */
	LinearPhaseRequirement createLinearPhaseRequirement();

	/**
	 * Returns a new object of class '<em>Group Delay Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Group Delay Requirement</em>'.
	 * @generated
	 */
	GroupDelayRequirement createGroupDelayRequirement();

	/**
	 * Returns a new object of class '<em>Group Delay Variation Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Group Delay Variation Requirement</em>'.
	 * @generated
	 */
	GroupDelayVariationRequirement createGroupDelayVariationRequirement();

	/**
	 * Returns a new object of class '<em>Bulk Delay Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Bulk Delay Requirement</em>'.
	 * @generated
	 */
	BulkDelayRequirement createBulkDelayRequirement();

	/**
	 * Returns a new object of class '<em>Step Overshoot Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Step Overshoot Requirement</em>'.
	 * @generated
	 */
	StepOvershootRequirement createStepOvershootRequirement();

	/**
	 * Returns a new object of class '<em>Step Undershoot Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Step Undershoot Requirement</em>'.
	 * @generated
	 */
	StepUndershootRequirement createStepUndershootRequirement();

	/**
	 * Returns a new object of class '<em>Step Settling Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Step Settling Requirement</em>'.
	 * @generated
	 */
	StepSettlingRequirement createStepSettlingRequirement();

	/**
	 * Returns a new object of class '<em>Impulse Tail Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Impulse Tail Requirement</em>'.
	 * @generated
	 */
	ImpulseTailRequirement createImpulseTailRequirement();

	/**
	 * Returns a new object of class '<em>Null Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Null Requirement</em>'.
	 * @generated
	 */
	NullRequirement createNullRequirement();

	/**
	 * Returns a new object of class '<em>Exact Gain Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Exact Gain Requirement</em>'.
	 * @generated
	 */
	ExactGainRequirement createExactGainRequirement();

	/**
	 * Returns a new object of class '<em>Non Negative Amplitude Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Non Negative Amplitude Requirement</em>'.
	 * @generated
	 */
	NonNegativeAmplitudeRequirement createNonNegativeAmplitudeRequirement();

	/**
	 * Returns a new object of class '<em>No Overflow Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>No Overflow Requirement</em>'.
	 * @generated
	 */
	NoOverflowRequirement createNoOverflowRequirement();

	/**
	 * Returns a new object of class '<em>Output Noise Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Output Noise Requirement</em>'.
	 * @generated
	 */
	OutputNoiseRequirement createOutputNoiseRequirement();

	/**
	 * Returns a new object of class '<em>Coefficient Word Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Coefficient Word Requirement</em>'.
	 * @generated
	 */
	CoefficientWordRequirement createCoefficientWordRequirement();

	/**
	 * Returns a new object of class '<em>Taps Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Taps Requirement</em>'.
	 * @generated
	 */
	TapsRequirement createTapsRequirement();

	/**
	 * Returns a new object of class '<em>Multiplies Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Multiplies Requirement</em>'.
	 * @generated
	 */
	MultipliesRequirement createMultipliesRequirement();

	/**
	 * Returns a new object of class '<em>Adds Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Adds Requirement</em>'.
	 * @generated
	 */
	AddsRequirement createAddsRequirement();

	/**
	 * Returns a new object of class '<em>Memory Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Memory Requirement</em>'.
	 * @generated
	 */
	MemoryRequirement createMemoryRequirement();

	/**
	 * Returns a new object of class '<em>Multiply Rate Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Multiply Rate Requirement</em>'.
	 * @generated
	 */
	MultiplyRateRequirement createMultiplyRateRequirement();

	/**
	 * Returns a new object of class '<em>Alias Rejection Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Alias Rejection Requirement</em>'.
	 * @generated
	 */
	AliasRejectionRequirement createAliasRejectionRequirement();

	/**
	 * Returns a new object of class '<em>Power Complementary Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Power Complementary Requirement</em>'.
	 * @generated
	 */
	PowerComplementaryRequirement createPowerComplementaryRequirement();

	/**
	 * Returns a new object of class '<em>Design Band</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Design Band</em>'.
	 * @generated
	 */
	DesignBand createDesignBand();

	/**
	 * Returns a new object of class '<em>Given Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Given Design</em>'.
	 * @generated
	 */
	GivenDesign createGivenDesign();

	/**
	 * Returns a new object of class '<em>Window Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Window Design</em>'.
	 * @generated
	 */
	WindowDesign createWindowDesign();

	/**
	 * Returns a new object of class '<em>Equiripple Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Equiripple Design</em>'.
	 * @generated
	 */
	EquirippleDesign createEquirippleDesign();

	/**
	 * Returns a new object of class '<em>Moving Average Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Moving Average Design</em>'.
	 * @generated
	 */
	MovingAverageDesign createMovingAverageDesign();

	/**
	 * Returns a new object of class '<em>Binomial Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Binomial Design</em>'.
	 * @generated
	 */
	BinomialDesign createBinomialDesign();

	/**
	 * Returns a new object of class '<em>Maximally Flat Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Maximally Flat Design</em>'.
	 * @generated
	 */
	MaximallyFlatDesign createMaximallyFlatDesign();

	/**
	 * Returns a new object of class '<em>Savitzky Golay Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Savitzky Golay Design</em>'.
	 * @generated
	 */
	SavitzkyGolayDesign createSavitzkyGolayDesign();

	/**
	 * Returns a new object of class '<em>Lagrange Delay Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Lagrange Delay Design</em>'.
	 * @generated
	 */
	LagrangeDelayDesign createLagrangeDelayDesign();

	/**
	 * Returns a new object of class '<em>Raised Cosine Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Raised Cosine Design</em>'.
	 * @generated
	 */
	RaisedCosineDesign createRaisedCosineDesign();

	/**
	 * Returns a new object of class '<em>Least Squares Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Least Squares Design</em>'.
	 * @generated
	 */
	LeastSquaresDesign createLeastSquaresDesign();

	/**
	 * Returns a new object of class '<em>Constrained Least Squares Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Constrained Least Squares Design</em>'.
	 * @generated
	 */
	ConstrainedLeastSquaresDesign createConstrainedLeastSquaresDesign();

	/**
	 * Returns a new object of class '<em>Linear Program Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Linear Program Design</em>'.
	 * @generated
	 */
	LinearProgramDesign createLinearProgramDesign();

	/**
	 * Returns a new object of class '<em>Half Band Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Half Band Design</em>'.
	 * @generated
	 */
	HalfBandDesign createHalfBandDesign();

	/**
	 * Returns a new object of class '<em>Cic Compensator Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Cic Compensator Design</em>'.
	 * @generated
	 */
	CicCompensatorDesign createCicCompensatorDesign();

	/**
	 * Returns a new object of class '<em>Comb Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Comb Design</em>'.
	 * @generated
	 */
	CombDesign createCombDesign();

	/**
	 * Returns a new object of class '<em>Minimum Phase Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Minimum Phase Design</em>'.
	 * @generated
	 */
	MinimumPhaseDesign createMinimumPhaseDesign();

	/**
	 * Returns a new object of class '<em>Complement Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Complement Design</em>'.
	 * @generated
	 */
	ComplementDesign createComplementDesign();

	/**
	 * Returns a new object of class '<em>Real Coefficients</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Real Coefficients</em>'.
	 * @generated
	 */
	RealCoefficients createRealCoefficients();

	/**
	 * Returns a new object of class '<em>Integer Coefficients</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Integer Coefficients</em>'.
	 * @generated
	 */
	IntegerCoefficients createIntegerCoefficients();

	/**
	 * Returns a new object of class '<em>Arithmetic</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Arithmetic</em>'.
	 * @generated
	 */
	Arithmetic createArithmetic();

	/**
	 * Returns a new object of class '<em>Format</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Format</em>'.
	 * @generated
	 */
	Format createFormat();

	/**
	 * Returns a new object of class '<em>Evidence</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Evidence</em>'.
	 * @generated
	 */
	Evidence createEvidence();

	/**
	 * Returns a new object of class '<em>Result</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Result</em>'.
	 * @generated
	 */
	Result createResult();

	/**
	 * Returns a new object of class '<em>Revision</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Revision</em>'.
	 * @generated
	 */
	Revision createRevision();

	/**
	 * Returns a new object of class '<em>Baseline</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Baseline</em>'.
	 * @generated
	 */
	Baseline createBaseline();

	/**
	 * Returns a new object of class '<em>Baseline Entry</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Baseline Entry</em>'.
	 * @generated
	 */
	BaselineEntry createBaselineEntry();

	/**
	 * Returns a new object of class '<em>Sign Off</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Sign Off</em>'.
	 * @generated
	 */
	SignOff createSignOff();

	/**
	 * Returns the package supported by this factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the package supported by this factory.
	 * @generated
	 */
	ModelPackage getModelPackage();

} //ModelFactory
