/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.util;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.util.Switch;

import tapwright.model.*;

/**
 * <!-- begin-user-doc -->
 * The <b>Switch</b> for the model's inheritance hierarchy.
 * It supports the call {@link #doSwitch(EObject) doSwitch(object)}
 * to invoke the <code>caseXXX</code> method for each class of the model,
 * starting with the actual class of the object
 * and proceeding up the inheritance hierarchy
 * until a non-null result is returned,
 * which is the result of the switch.
 * <!-- end-user-doc -->
 * @see tapwright.model.ModelPackage
 * @generated
 */
public class ModelSwitch<T> extends Switch<T> {
	/**
	 * The cached model package
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static ModelPackage modelPackage;

	/**
	 * Creates an instance of the switch.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ModelSwitch() {
		if (modelPackage == null) {
			modelPackage = ModelPackage.eINSTANCE;
		}
	}

	/**
	 * Checks whether this is a switch for the given package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param ePackage the package in question.
	 * @return whether this is a switch for the given package.
	 * @generated
	 */
	@Override
	protected boolean isSwitchFor(EPackage ePackage) {
		return ePackage == modelPackage;
	}

	/**
	 * Calls <code>caseXXX</code> for each class of the model until one returns a non null result; it yields that result.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the first non-null result returned by a <code>caseXXX</code> call.
	 * @generated
	 */
	@Override
	protected T doSwitch(int classifierID, EObject theEObject) {
		switch (classifierID) {
			case ModelPackage.PORTFOLIO: {
				Portfolio portfolio = (Portfolio)theEObject;
				T result = casePortfolio(portfolio);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.PARAMETER: {
				Parameter parameter = (Parameter)theEObject;
				T result = caseParameter(parameter);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.PROCESSOR: {
				Processor processor = (Processor)theEObject;
				T result = caseProcessor(processor);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.SIGNAL_PATH: {
				SignalPath signalPath = (SignalPath)theEObject;
				T result = caseSignalPath(signalPath);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.STAGE: {
				Stage stage = (Stage)theEObject;
				T result = caseStage(stage);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.FILTER_STAGE: {
				FilterStage filterStage = (FilterStage)theEObject;
				T result = caseFilterStage(filterStage);
				if (result == null) result = caseStage(filterStage);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.DECIMATION: {
				Decimation decimation = (Decimation)theEObject;
				T result = caseDecimation(decimation);
				if (result == null) result = caseStage(decimation);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.EXPANSION: {
				Expansion expansion = (Expansion)theEObject;
				T result = caseExpansion(expansion);
				if (result == null) result = caseStage(expansion);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.FILTER: {
				Filter filter = (Filter)theEObject;
				T result = caseFilter(filter);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.DEPLOYMENT: {
				Deployment deployment = (Deployment)theEObject;
				T result = caseDeployment(deployment);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.REQUIREMENT: {
				Requirement requirement = (Requirement)theEObject;
				T result = caseRequirement(requirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.LIMIT_POINT: {
				LimitPoint limitPoint = (LimitPoint)theEObject;
				T result = caseLimitPoint(limitPoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.GAIN_REQUIREMENT: {
				GainRequirement gainRequirement = (GainRequirement)theEObject;
				T result = caseGainRequirement(gainRequirement);
				if (result == null) result = caseRequirement(gainRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.LINEAR_PHASE_REQUIREMENT: {
				LinearPhaseRequirement linearPhaseRequirement = (LinearPhaseRequirement)theEObject;
				T result = caseLinearPhaseRequirement(linearPhaseRequirement);
				if (result == null) result = caseRequirement(linearPhaseRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.GROUP_DELAY_REQUIREMENT: {
				GroupDelayRequirement groupDelayRequirement = (GroupDelayRequirement)theEObject;
				T result = caseGroupDelayRequirement(groupDelayRequirement);
				if (result == null) result = caseRequirement(groupDelayRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.GROUP_DELAY_VARIATION_REQUIREMENT: {
				GroupDelayVariationRequirement groupDelayVariationRequirement = (GroupDelayVariationRequirement)theEObject;
				T result = caseGroupDelayVariationRequirement(groupDelayVariationRequirement);
				if (result == null) result = caseRequirement(groupDelayVariationRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.BULK_DELAY_REQUIREMENT: {
				BulkDelayRequirement bulkDelayRequirement = (BulkDelayRequirement)theEObject;
				T result = caseBulkDelayRequirement(bulkDelayRequirement);
				if (result == null) result = caseRequirement(bulkDelayRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.STEP_OVERSHOOT_REQUIREMENT: {
				StepOvershootRequirement stepOvershootRequirement = (StepOvershootRequirement)theEObject;
				T result = caseStepOvershootRequirement(stepOvershootRequirement);
				if (result == null) result = caseRequirement(stepOvershootRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.STEP_UNDERSHOOT_REQUIREMENT: {
				StepUndershootRequirement stepUndershootRequirement = (StepUndershootRequirement)theEObject;
				T result = caseStepUndershootRequirement(stepUndershootRequirement);
				if (result == null) result = caseRequirement(stepUndershootRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.STEP_SETTLING_REQUIREMENT: {
				StepSettlingRequirement stepSettlingRequirement = (StepSettlingRequirement)theEObject;
				T result = caseStepSettlingRequirement(stepSettlingRequirement);
				if (result == null) result = caseRequirement(stepSettlingRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.IMPULSE_TAIL_REQUIREMENT: {
				ImpulseTailRequirement impulseTailRequirement = (ImpulseTailRequirement)theEObject;
				T result = caseImpulseTailRequirement(impulseTailRequirement);
				if (result == null) result = caseRequirement(impulseTailRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.NULL_REQUIREMENT: {
				NullRequirement nullRequirement = (NullRequirement)theEObject;
				T result = caseNullRequirement(nullRequirement);
				if (result == null) result = caseRequirement(nullRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.EXACT_GAIN_REQUIREMENT: {
				ExactGainRequirement exactGainRequirement = (ExactGainRequirement)theEObject;
				T result = caseExactGainRequirement(exactGainRequirement);
				if (result == null) result = caseRequirement(exactGainRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.NON_NEGATIVE_AMPLITUDE_REQUIREMENT: {
				NonNegativeAmplitudeRequirement nonNegativeAmplitudeRequirement = (NonNegativeAmplitudeRequirement)theEObject;
				T result = caseNonNegativeAmplitudeRequirement(nonNegativeAmplitudeRequirement);
				if (result == null) result = caseRequirement(nonNegativeAmplitudeRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.NO_OVERFLOW_REQUIREMENT: {
				NoOverflowRequirement noOverflowRequirement = (NoOverflowRequirement)theEObject;
				T result = caseNoOverflowRequirement(noOverflowRequirement);
				if (result == null) result = caseRequirement(noOverflowRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.OUTPUT_NOISE_REQUIREMENT: {
				OutputNoiseRequirement outputNoiseRequirement = (OutputNoiseRequirement)theEObject;
				T result = caseOutputNoiseRequirement(outputNoiseRequirement);
				if (result == null) result = caseRequirement(outputNoiseRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.COEFFICIENT_WORD_REQUIREMENT: {
				CoefficientWordRequirement coefficientWordRequirement = (CoefficientWordRequirement)theEObject;
				T result = caseCoefficientWordRequirement(coefficientWordRequirement);
				if (result == null) result = caseRequirement(coefficientWordRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.TAPS_REQUIREMENT: {
				TapsRequirement tapsRequirement = (TapsRequirement)theEObject;
				T result = caseTapsRequirement(tapsRequirement);
				if (result == null) result = caseRequirement(tapsRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MULTIPLIES_REQUIREMENT: {
				MultipliesRequirement multipliesRequirement = (MultipliesRequirement)theEObject;
				T result = caseMultipliesRequirement(multipliesRequirement);
				if (result == null) result = caseRequirement(multipliesRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.ADDS_REQUIREMENT: {
				AddsRequirement addsRequirement = (AddsRequirement)theEObject;
				T result = caseAddsRequirement(addsRequirement);
				if (result == null) result = caseRequirement(addsRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MEMORY_REQUIREMENT: {
				MemoryRequirement memoryRequirement = (MemoryRequirement)theEObject;
				T result = caseMemoryRequirement(memoryRequirement);
				if (result == null) result = caseRequirement(memoryRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MULTIPLY_RATE_REQUIREMENT: {
				MultiplyRateRequirement multiplyRateRequirement = (MultiplyRateRequirement)theEObject;
				T result = caseMultiplyRateRequirement(multiplyRateRequirement);
				if (result == null) result = caseRequirement(multiplyRateRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.ALIAS_REJECTION_REQUIREMENT: {
				AliasRejectionRequirement aliasRejectionRequirement = (AliasRejectionRequirement)theEObject;
				T result = caseAliasRejectionRequirement(aliasRejectionRequirement);
				if (result == null) result = caseRequirement(aliasRejectionRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.POWER_COMPLEMENTARY_REQUIREMENT: {
				PowerComplementaryRequirement powerComplementaryRequirement = (PowerComplementaryRequirement)theEObject;
				T result = casePowerComplementaryRequirement(powerComplementaryRequirement);
				if (result == null) result = caseRequirement(powerComplementaryRequirement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.DESIGN: {
				Design design = (Design)theEObject;
				T result = caseDesign(design);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.BAND_DESIGN: {
				BandDesign bandDesign = (BandDesign)theEObject;
				T result = caseBandDesign(bandDesign);
				if (result == null) result = caseDesign(bandDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.DESIGN_BAND: {
				DesignBand designBand = (DesignBand)theEObject;
				T result = caseDesignBand(designBand);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.GIVEN_DESIGN: {
				GivenDesign givenDesign = (GivenDesign)theEObject;
				T result = caseGivenDesign(givenDesign);
				if (result == null) result = caseDesign(givenDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.WINDOW_DESIGN: {
				WindowDesign windowDesign = (WindowDesign)theEObject;
				T result = caseWindowDesign(windowDesign);
				if (result == null) result = caseBandDesign(windowDesign);
				if (result == null) result = caseDesign(windowDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.EQUIRIPPLE_DESIGN: {
				EquirippleDesign equirippleDesign = (EquirippleDesign)theEObject;
				T result = caseEquirippleDesign(equirippleDesign);
				if (result == null) result = caseBandDesign(equirippleDesign);
				if (result == null) result = caseDesign(equirippleDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MOVING_AVERAGE_DESIGN: {
				MovingAverageDesign movingAverageDesign = (MovingAverageDesign)theEObject;
				T result = caseMovingAverageDesign(movingAverageDesign);
				if (result == null) result = caseDesign(movingAverageDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.BINOMIAL_DESIGN: {
				BinomialDesign binomialDesign = (BinomialDesign)theEObject;
				T result = caseBinomialDesign(binomialDesign);
				if (result == null) result = caseDesign(binomialDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MAXIMALLY_FLAT_DESIGN: {
				MaximallyFlatDesign maximallyFlatDesign = (MaximallyFlatDesign)theEObject;
				T result = caseMaximallyFlatDesign(maximallyFlatDesign);
				if (result == null) result = caseDesign(maximallyFlatDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.SAVITZKY_GOLAY_DESIGN: {
				SavitzkyGolayDesign savitzkyGolayDesign = (SavitzkyGolayDesign)theEObject;
				T result = caseSavitzkyGolayDesign(savitzkyGolayDesign);
				if (result == null) result = caseDesign(savitzkyGolayDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.LAGRANGE_DELAY_DESIGN: {
				LagrangeDelayDesign lagrangeDelayDesign = (LagrangeDelayDesign)theEObject;
				T result = caseLagrangeDelayDesign(lagrangeDelayDesign);
				if (result == null) result = caseDesign(lagrangeDelayDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.RAISED_COSINE_DESIGN: {
				RaisedCosineDesign raisedCosineDesign = (RaisedCosineDesign)theEObject;
				T result = caseRaisedCosineDesign(raisedCosineDesign);
				if (result == null) result = caseDesign(raisedCosineDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.LEAST_SQUARES_DESIGN: {
				LeastSquaresDesign leastSquaresDesign = (LeastSquaresDesign)theEObject;
				T result = caseLeastSquaresDesign(leastSquaresDesign);
				if (result == null) result = caseBandDesign(leastSquaresDesign);
				if (result == null) result = caseDesign(leastSquaresDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.CONSTRAINED_LEAST_SQUARES_DESIGN: {
				ConstrainedLeastSquaresDesign constrainedLeastSquaresDesign = (ConstrainedLeastSquaresDesign)theEObject;
				T result = caseConstrainedLeastSquaresDesign(constrainedLeastSquaresDesign);
				if (result == null) result = caseBandDesign(constrainedLeastSquaresDesign);
				if (result == null) result = caseDesign(constrainedLeastSquaresDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.LINEAR_PROGRAM_DESIGN: {
				LinearProgramDesign linearProgramDesign = (LinearProgramDesign)theEObject;
				T result = caseLinearProgramDesign(linearProgramDesign);
				if (result == null) result = caseBandDesign(linearProgramDesign);
				if (result == null) result = caseDesign(linearProgramDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.HALF_BAND_DESIGN: {
				HalfBandDesign halfBandDesign = (HalfBandDesign)theEObject;
				T result = caseHalfBandDesign(halfBandDesign);
				if (result == null) result = caseDesign(halfBandDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.CIC_COMPENSATOR_DESIGN: {
				CicCompensatorDesign cicCompensatorDesign = (CicCompensatorDesign)theEObject;
				T result = caseCicCompensatorDesign(cicCompensatorDesign);
				if (result == null) result = caseDesign(cicCompensatorDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.COMB_DESIGN: {
				CombDesign combDesign = (CombDesign)theEObject;
				T result = caseCombDesign(combDesign);
				if (result == null) result = caseDesign(combDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.MINIMUM_PHASE_DESIGN: {
				MinimumPhaseDesign minimumPhaseDesign = (MinimumPhaseDesign)theEObject;
				T result = caseMinimumPhaseDesign(minimumPhaseDesign);
				if (result == null) result = caseDesign(minimumPhaseDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.COMPLEMENT_DESIGN: {
				ComplementDesign complementDesign = (ComplementDesign)theEObject;
				T result = caseComplementDesign(complementDesign);
				if (result == null) result = caseDesign(complementDesign);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.COEFFICIENTS: {
				Coefficients coefficients = (Coefficients)theEObject;
				T result = caseCoefficients(coefficients);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.REAL_COEFFICIENTS: {
				RealCoefficients realCoefficients = (RealCoefficients)theEObject;
				T result = caseRealCoefficients(realCoefficients);
				if (result == null) result = caseCoefficients(realCoefficients);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.INTEGER_COEFFICIENTS: {
				IntegerCoefficients integerCoefficients = (IntegerCoefficients)theEObject;
				T result = caseIntegerCoefficients(integerCoefficients);
				if (result == null) result = caseCoefficients(integerCoefficients);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.ARITHMETIC: {
				Arithmetic arithmetic = (Arithmetic)theEObject;
				T result = caseArithmetic(arithmetic);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.FORMAT: {
				Format format = (Format)theEObject;
				T result = caseFormat(format);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.EVIDENCE: {
				Evidence evidence = (Evidence)theEObject;
				T result = caseEvidence(evidence);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.RESULT: {
				Result result = (Result)theEObject;
				T theResult = caseResult(result);
				if (theResult == null) theResult = defaultCase(theEObject);
				return theResult;
			}
			case ModelPackage.REVISION: {
				Revision revision = (Revision)theEObject;
				T result = caseRevision(revision);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.BASELINE: {
				Baseline baseline = (Baseline)theEObject;
				T result = caseBaseline(baseline);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.BASELINE_ENTRY: {
				BaselineEntry baselineEntry = (BaselineEntry)theEObject;
				T result = caseBaselineEntry(baselineEntry);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case ModelPackage.SIGN_OFF: {
				SignOff signOff = (SignOff)theEObject;
				T result = caseSignOff(signOff);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			default: return defaultCase(theEObject);
		}
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Portfolio</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Portfolio</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePortfolio(Portfolio object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Parameter</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Parameter</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseParameter(Parameter object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Processor</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Processor</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseProcessor(Processor object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Signal Path</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Signal Path</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSignalPath(SignalPath object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Stage</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Stage</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStage(Stage object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Filter Stage</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Filter Stage</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseFilterStage(FilterStage object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Decimation</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Decimation</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDecimation(Decimation object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Expansion</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Expansion</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseExpansion(Expansion object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Filter</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Filter</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseFilter(Filter object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Deployment</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Deployment</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDeployment(Deployment object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseRequirement(Requirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Limit Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Limit Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLimitPoint(LimitPoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Gain Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Gain Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGainRequirement(GainRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Linear Phase Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Linear Phase Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLinearPhaseRequirement(LinearPhaseRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Group Delay Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Group Delay Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGroupDelayRequirement(GroupDelayRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Group Delay Variation Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Group Delay Variation Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGroupDelayVariationRequirement(GroupDelayVariationRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Bulk Delay Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Bulk Delay Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseBulkDelayRequirement(BulkDelayRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Step Overshoot Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Step Overshoot Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStepOvershootRequirement(StepOvershootRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Step Undershoot Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Step Undershoot Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStepUndershootRequirement(StepUndershootRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Step Settling Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Step Settling Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStepSettlingRequirement(StepSettlingRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Impulse Tail Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Impulse Tail Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseImpulseTailRequirement(ImpulseTailRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Null Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Null Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseNullRequirement(NullRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Exact Gain Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Exact Gain Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseExactGainRequirement(ExactGainRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Non Negative Amplitude Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Non Negative Amplitude Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseNonNegativeAmplitudeRequirement(NonNegativeAmplitudeRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>No Overflow Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>No Overflow Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseNoOverflowRequirement(NoOverflowRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Output Noise Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Output Noise Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseOutputNoiseRequirement(OutputNoiseRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Coefficient Word Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Coefficient Word Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCoefficientWordRequirement(CoefficientWordRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Taps Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Taps Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseTapsRequirement(TapsRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Multiplies Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Multiplies Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMultipliesRequirement(MultipliesRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Adds Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Adds Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseAddsRequirement(AddsRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Memory Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Memory Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMemoryRequirement(MemoryRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Multiply Rate Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Multiply Rate Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMultiplyRateRequirement(MultiplyRateRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Alias Rejection Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Alias Rejection Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseAliasRejectionRequirement(AliasRejectionRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Power Complementary Requirement</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Power Complementary Requirement</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePowerComplementaryRequirement(PowerComplementaryRequirement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDesign(Design object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Band Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Band Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseBandDesign(BandDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Design Band</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Design Band</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDesignBand(DesignBand object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Given Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Given Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGivenDesign(GivenDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Window Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Window Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseWindowDesign(WindowDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Equiripple Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Equiripple Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseEquirippleDesign(EquirippleDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Moving Average Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Moving Average Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMovingAverageDesign(MovingAverageDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Binomial Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Binomial Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseBinomialDesign(BinomialDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Maximally Flat Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Maximally Flat Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMaximallyFlatDesign(MaximallyFlatDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Savitzky Golay Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Savitzky Golay Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSavitzkyGolayDesign(SavitzkyGolayDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Lagrange Delay Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Lagrange Delay Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLagrangeDelayDesign(LagrangeDelayDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Raised Cosine Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Raised Cosine Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseRaisedCosineDesign(RaisedCosineDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Least Squares Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Least Squares Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLeastSquaresDesign(LeastSquaresDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Constrained Least Squares Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Constrained Least Squares Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseConstrainedLeastSquaresDesign(ConstrainedLeastSquaresDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Linear Program Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Linear Program Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLinearProgramDesign(LinearProgramDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Half Band Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Half Band Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseHalfBandDesign(HalfBandDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Cic Compensator Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Cic Compensator Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCicCompensatorDesign(CicCompensatorDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Comb Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Comb Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCombDesign(CombDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Minimum Phase Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Minimum Phase Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMinimumPhaseDesign(MinimumPhaseDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Complement Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Complement Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseComplementDesign(ComplementDesign object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Coefficients</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Coefficients</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCoefficients(Coefficients object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Real Coefficients</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Real Coefficients</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseRealCoefficients(RealCoefficients object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Integer Coefficients</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Integer Coefficients</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseIntegerCoefficients(IntegerCoefficients object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Arithmetic</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Arithmetic</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseArithmetic(Arithmetic object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Format</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Format</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseFormat(Format object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Evidence</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Evidence</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseEvidence(Evidence object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Result</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Result</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseResult(Result object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Revision</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Revision</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseRevision(Revision object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Baseline</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Baseline</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseBaseline(Baseline object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Baseline Entry</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Baseline Entry</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseBaselineEntry(BaselineEntry object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Sign Off</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Sign Off</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSignOff(SignOff object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch, but this is the last case anyway.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject)
	 * @generated
	 */
	@Override
	public T defaultCase(EObject object) {
		return null;
	}

} //ModelSwitch
