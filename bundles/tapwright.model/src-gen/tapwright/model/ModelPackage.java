/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

/**
 * <!-- begin-user-doc -->
 * The <b>Package</b> for the model.
 * It contains accessors for the meta objects to represent
 * <ul>
 *   <li>each class,</li>
 *   <li>each feature of each class,</li>
 *   <li>each enum,</li>
 *   <li>and each data type</li>
 * </ul>
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * All digital filters of one product: what is asked of them, where their coefficients come from, the numbers that ship, and the history. One file holds one root object: a portfolio, a filter, a revision, a baseline or a sign-off. Objects of different files refer to each other by name, so that files merge line by line.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelFactory
 * @model kind="package"
 * @generated
 */
public interface ModelPackage extends EPackage {
	/**
	 * The package name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNAME = "model";

	/**
	 * The package namespace URI.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_URI = "urn:tapwright:1";

	/**
	 * The package namespace name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_PREFIX = "tapwright";

	/**
	 * The singleton instance of the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	ModelPackage eINSTANCE = tapwright.model.impl.ModelPackageImpl.init();

	/**
	 * The meta object id for the '{@link tapwright.model.impl.PortfolioImpl <em>Portfolio</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.PortfolioImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getPortfolio()
	 * @generated
	 */
	int PORTFOLIO = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__NAME = 0;

	/**
	 * The feature id for the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__DESCRIPTION = 1;

	/**
	 * The feature id for the '<em><b>Erosion</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__EROSION = 2;

	/**
	 * The feature id for the '<em><b>Active Baseline</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__ACTIVE_BASELINE = 3;

	/**
	 * The feature id for the '<em><b>Parameters</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__PARAMETERS = 4;

	/**
	 * The feature id for the '<em><b>Processors</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__PROCESSORS = 5;

	/**
	 * The feature id for the '<em><b>Paths</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO__PATHS = 6;

	/**
	 * The number of structural features of the '<em>Portfolio</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PORTFOLIO_FEATURE_COUNT = 7;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ParameterImpl <em>Parameter</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ParameterImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getParameter()
	 * @generated
	 */
	int PARAMETER = 1;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PARAMETER__NAME = 0;

	/**
	 * The feature id for the '<em><b>Value</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PARAMETER__VALUE = 1;

	/**
	 * The feature id for the '<em><b>Unit</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PARAMETER__UNIT = 2;

	/**
	 * The feature id for the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PARAMETER__DESCRIPTION = 3;

	/**
	 * The number of structural features of the '<em>Parameter</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PARAMETER_FEATURE_COUNT = 4;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ProcessorImpl <em>Processor</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ProcessorImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getProcessor()
	 * @generated
	 */
	int PROCESSOR = 2;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__NAME = 0;

	/**
	 * The feature id for the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__DESCRIPTION = 1;

	/**
	 * The feature id for the '<em><b>Mac Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__MAC_RATE = 2;

	/**
	 * The feature id for the '<em><b>Word</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__WORD = 3;

	/**
	 * The feature id for the '<em><b>Accumulator</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__ACCUMULATOR = 4;

	/**
	 * The feature id for the '<em><b>Coefficient Memory</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__COEFFICIENT_MEMORY = 5;

	/**
	 * The feature id for the '<em><b>Delay Memory</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR__DELAY_MEMORY = 6;

	/**
	 * The number of structural features of the '<em>Processor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROCESSOR_FEATURE_COUNT = 7;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.SignalPathImpl <em>Signal Path</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.SignalPathImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getSignalPath()
	 * @generated
	 */
	int SIGNAL_PATH = 3;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH__NAME = 0;

	/**
	 * The feature id for the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH__DESCRIPTION = 1;

	/**
	 * The feature id for the '<em><b>Sample Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH__SAMPLE_RATE = 2;

	/**
	 * The feature id for the '<em><b>Stages</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH__STAGES = 3;

	/**
	 * The feature id for the '<em><b>Requirements</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH__REQUIREMENTS = 4;

	/**
	 * The number of structural features of the '<em>Signal Path</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGNAL_PATH_FEATURE_COUNT = 5;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.StageImpl <em>Stage</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.StageImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getStage()
	 * @generated
	 */
	int STAGE = 4;

	/**
	 * The number of structural features of the '<em>Stage</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STAGE_FEATURE_COUNT = 0;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.FilterStageImpl <em>Filter Stage</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.FilterStageImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getFilterStage()
	 * @generated
	 */
	int FILTER_STAGE = 5;

	/**
	 * The feature id for the '<em><b>Filter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER_STAGE__FILTER = STAGE_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Filter Stage</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER_STAGE_FEATURE_COUNT = STAGE_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.DecimationImpl <em>Decimation</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.DecimationImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getDecimation()
	 * @generated
	 */
	int DECIMATION = 6;

	/**
	 * The feature id for the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DECIMATION__FACTOR = STAGE_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Decimation</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DECIMATION_FEATURE_COUNT = STAGE_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ExpansionImpl <em>Expansion</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ExpansionImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getExpansion()
	 * @generated
	 */
	int EXPANSION = 7;

	/**
	 * The feature id for the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXPANSION__FACTOR = STAGE_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Expansion</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXPANSION_FEATURE_COUNT = STAGE_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.FilterImpl <em>Filter</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.FilterImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getFilter()
	 * @generated
	 */
	int FILTER = 8;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__NAME = 0;

	/**
	 * The feature id for the '<em><b>Identity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__IDENTITY = 1;

	/**
	 * The feature id for the '<em><b>Purpose</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__PURPOSE = 2;

	/**
	 * The feature id for the '<em><b>Sample Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__SAMPLE_RATE = 3;

	/**
	 * The feature id for the '<em><b>Requirements</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__REQUIREMENTS = 4;

	/**
	 * The feature id for the '<em><b>Design</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__DESIGN = 5;

	/**
	 * The feature id for the '<em><b>Coefficients</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__COEFFICIENTS = 6;

	/**
	 * The feature id for the '<em><b>Arithmetic</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__ARITHMETIC = 7;

	/**
	 * The feature id for the '<em><b>Deployments</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER__DEPLOYMENTS = 8;

	/**
	 * The number of structural features of the '<em>Filter</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FILTER_FEATURE_COUNT = 9;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.DeploymentImpl <em>Deployment</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.DeploymentImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getDeployment()
	 * @generated
	 */
	int DEPLOYMENT = 9;

	/**
	 * The feature id for the '<em><b>Processor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DEPLOYMENT__PROCESSOR = 0;

	/**
	 * The feature id for the '<em><b>Channels</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DEPLOYMENT__CHANNELS = 1;

	/**
	 * The feature id for the '<em><b>Copies</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DEPLOYMENT__COPIES = 2;

	/**
	 * The feature id for the '<em><b>Input Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DEPLOYMENT__INPUT_RATE = 3;

	/**
	 * The number of structural features of the '<em>Deployment</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DEPLOYMENT_FEATURE_COUNT = 4;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.RequirementImpl <em>Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.RequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getRequirement()
	 * @generated
	 */
	int REQUIREMENT = 10;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REQUIREMENT__ID = 0;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REQUIREMENT__SEVERITY = 1;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REQUIREMENT__NOTE = 2;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REQUIREMENT__CLOCK_TOLERANCE = 3;

	/**
	 * The number of structural features of the '<em>Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REQUIREMENT_FEATURE_COUNT = 4;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.LimitPointImpl <em>Limit Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.LimitPointImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getLimitPoint()
	 * @generated
	 */
	int LIMIT_POINT = 11;

	/**
	 * The feature id for the '<em><b>Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LIMIT_POINT__FREQUENCY = 0;

	/**
	 * The feature id for the '<em><b>Level</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LIMIT_POINT__LEVEL = 1;

	/**
	 * The number of structural features of the '<em>Limit Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LIMIT_POINT_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.GainRequirementImpl <em>Gain Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.GainRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getGainRequirement()
	 * @generated
	 */
	int GAIN_REQUIREMENT = 12;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__FROM = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__TO = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__MIN = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Points</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__POINTS = REQUIREMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Side</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__SIDE = REQUIREMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Interpolate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__INTERPOLATE = REQUIREMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Reference At</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__REFERENCE_AT = REQUIREMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Reference From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__REFERENCE_FROM = REQUIREMENT_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Reference To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT__REFERENCE_TO = REQUIREMENT_FEATURE_COUNT + 9;

	/**
	 * The number of structural features of the '<em>Gain Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GAIN_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 10;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.LinearPhaseRequirementImpl <em>Linear Phase Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.LinearPhaseRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getLinearPhaseRequirement()
	 * @generated
	 */
	int LINEAR_PHASE_REQUIREMENT = 13;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Type</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT__TYPE = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Linear Phase Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PHASE_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.GroupDelayRequirementImpl <em>Group Delay Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.GroupDelayRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getGroupDelayRequirement()
	 * @generated
	 */
	int GROUP_DELAY_REQUIREMENT = 14;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__FROM = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__TO = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__MIN = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Group Delay Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.GroupDelayVariationRequirementImpl <em>Group Delay Variation Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.GroupDelayVariationRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getGroupDelayVariationRequirement()
	 * @generated
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT = 15;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__FROM = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__TO = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Group Delay Variation Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_DELAY_VARIATION_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.BulkDelayRequirementImpl <em>Bulk Delay Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.BulkDelayRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getBulkDelayRequirement()
	 * @generated
	 */
	int BULK_DELAY_REQUIREMENT = 16;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__MIN = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Bulk Delay Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BULK_DELAY_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.StepOvershootRequirementImpl <em>Step Overshoot Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.StepOvershootRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getStepOvershootRequirement()
	 * @generated
	 */
	int STEP_OVERSHOOT_REQUIREMENT = 17;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Step Overshoot Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_OVERSHOOT_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.StepUndershootRequirementImpl <em>Step Undershoot Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.StepUndershootRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getStepUndershootRequirement()
	 * @generated
	 */
	int STEP_UNDERSHOOT_REQUIREMENT = 18;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Step Undershoot Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_UNDERSHOOT_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.StepSettlingRequirementImpl <em>Step Settling Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.StepSettlingRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getStepSettlingRequirement()
	 * @generated
	 */
	int STEP_SETTLING_REQUIREMENT = 19;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Within</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__WITHIN = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Step Settling Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STEP_SETTLING_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ImpulseTailRequirementImpl <em>Impulse Tail Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ImpulseTailRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getImpulseTailRequirement()
	 * @generated
	 */
	int IMPULSE_TAIL_REQUIREMENT = 20;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>After</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__AFTER = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Impulse Tail Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IMPULSE_TAIL_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.NullRequirementImpl <em>Null Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.NullRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getNullRequirement()
	 * @generated
	 */
	int NULL_REQUIREMENT = 21;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>At</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT__AT = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Null Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NULL_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ExactGainRequirementImpl <em>Exact Gain Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ExactGainRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getExactGainRequirement()
	 * @generated
	 */
	int EXACT_GAIN_REQUIREMENT = 22;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>At</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__AT = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Value</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT__VALUE = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Exact Gain Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EXACT_GAIN_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.NonNegativeAmplitudeRequirementImpl <em>Non Negative Amplitude Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.NonNegativeAmplitudeRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getNonNegativeAmplitudeRequirement()
	 * @generated
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT = 23;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The number of structural features of the '<em>Non Negative Amplitude Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NON_NEGATIVE_AMPLITUDE_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.NoOverflowRequirementImpl <em>No Overflow Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.NoOverflowRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getNoOverflowRequirement()
	 * @generated
	 */
	int NO_OVERFLOW_REQUIREMENT = 24;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Input</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT__INPUT = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>No Overflow Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NO_OVERFLOW_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.OutputNoiseRequirementImpl <em>Output Noise Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.OutputNoiseRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getOutputNoiseRequirement()
	 * @generated
	 */
	int OUTPUT_NOISE_REQUIREMENT = 25;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Output Noise Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTPUT_NOISE_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.CoefficientWordRequirementImpl <em>Coefficient Word Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.CoefficientWordRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getCoefficientWordRequirement()
	 * @generated
	 */
	int COEFFICIENT_WORD_REQUIREMENT = 26;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Coefficient Word Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENT_WORD_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.TapsRequirementImpl <em>Taps Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.TapsRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getTapsRequirement()
	 * @generated
	 */
	int TAPS_REQUIREMENT = 27;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Taps Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TAPS_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MultipliesRequirementImpl <em>Multiplies Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MultipliesRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMultipliesRequirement()
	 * @generated
	 */
	int MULTIPLIES_REQUIREMENT = 28;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Multiplies Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLIES_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.AddsRequirementImpl <em>Adds Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.AddsRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getAddsRequirement()
	 * @generated
	 */
	int ADDS_REQUIREMENT = 29;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Adds Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ADDS_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MemoryRequirementImpl <em>Memory Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MemoryRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMemoryRequirement()
	 * @generated
	 */
	int MEMORY_REQUIREMENT = 30;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Memory Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMORY_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MultiplyRateRequirementImpl <em>Multiply Rate Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MultiplyRateRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMultiplyRateRequirement()
	 * @generated
	 */
	int MULTIPLY_RATE_REQUIREMENT = 31;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Multiply Rate Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTIPLY_RATE_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.AliasRejectionRequirementImpl <em>Alias Rejection Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.AliasRejectionRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getAliasRejectionRequirement()
	 * @generated
	 */
	int ALIAS_REJECTION_REQUIREMENT = 32;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__FACTOR = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__TO = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT__MIN = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Alias Rejection Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIAS_REJECTION_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.PowerComplementaryRequirementImpl <em>Power Complementary Requirement</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.PowerComplementaryRequirementImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getPowerComplementaryRequirement()
	 * @generated
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT = 33;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__ID = REQUIREMENT__ID;

	/**
	 * The feature id for the '<em><b>Severity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__SEVERITY = REQUIREMENT__SEVERITY;

	/**
	 * The feature id for the '<em><b>Note</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__NOTE = REQUIREMENT__NOTE;

	/**
	 * The feature id for the '<em><b>Clock Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__CLOCK_TOLERANCE = REQUIREMENT__CLOCK_TOLERANCE;

	/**
	 * The feature id for the '<em><b>Partner</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__PARTNER = REQUIREMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT__MAX = REQUIREMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Power Complementary Requirement</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_COMPLEMENTARY_REQUIREMENT_FEATURE_COUNT = REQUIREMENT_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.DesignImpl <em>Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.DesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getDesign()
	 * @generated
	 */
	int DESIGN = 34;

	/**
	 * The number of structural features of the '<em>Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_FEATURE_COUNT = 0;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.BandDesignImpl <em>Band Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.BandDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getBandDesign()
	 * @generated
	 */
	int BAND_DESIGN = 35;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BAND_DESIGN__TAPS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BAND_DESIGN__BANDS = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Band Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BAND_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.DesignBandImpl <em>Design Band</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.DesignBandImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getDesignBand()
	 * @generated
	 */
	int DESIGN_BAND = 36;

	/**
	 * The feature id for the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__FROM = 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__TO = 1;

	/**
	 * The feature id for the '<em><b>Desired</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__DESIRED = 2;

	/**
	 * The feature id for the '<em><b>Desired To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__DESIRED_TO = 3;

	/**
	 * The feature id for the '<em><b>Weight</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__WEIGHT = 4;

	/**
	 * The feature id for the '<em><b>Weight To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND__WEIGHT_TO = 5;

	/**
	 * The number of structural features of the '<em>Design Band</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int DESIGN_BAND_FEATURE_COUNT = 6;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.GivenDesignImpl <em>Given Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.GivenDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getGivenDesign()
	 * @generated
	 */
	int GIVEN_DESIGN = 37;

	/**
	 * The feature id for the '<em><b>Source</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GIVEN_DESIGN__SOURCE = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Given Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GIVEN_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.WindowDesignImpl <em>Window Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.WindowDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getWindowDesign()
	 * @generated
	 */
	int WINDOW_DESIGN = 38;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDOW_DESIGN__TAPS = BAND_DESIGN__TAPS;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDOW_DESIGN__BANDS = BAND_DESIGN__BANDS;

	/**
	 * The feature id for the '<em><b>Window</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDOW_DESIGN__WINDOW = BAND_DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Parameter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDOW_DESIGN__PARAMETER = BAND_DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Window Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WINDOW_DESIGN_FEATURE_COUNT = BAND_DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.EquirippleDesignImpl <em>Equiripple Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.EquirippleDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getEquirippleDesign()
	 * @generated
	 */
	int EQUIRIPPLE_DESIGN = 39;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EQUIRIPPLE_DESIGN__TAPS = BAND_DESIGN__TAPS;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EQUIRIPPLE_DESIGN__BANDS = BAND_DESIGN__BANDS;

	/**
	 * The feature id for the '<em><b>Type</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EQUIRIPPLE_DESIGN__TYPE = BAND_DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EQUIRIPPLE_DESIGN__TOLERANCE = BAND_DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Equiripple Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EQUIRIPPLE_DESIGN_FEATURE_COUNT = BAND_DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MovingAverageDesignImpl <em>Moving Average Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MovingAverageDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMovingAverageDesign()
	 * @generated
	 */
	int MOVING_AVERAGE_DESIGN = 40;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MOVING_AVERAGE_DESIGN__TAPS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Sections</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MOVING_AVERAGE_DESIGN__SECTIONS = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Moving Average Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MOVING_AVERAGE_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.BinomialDesignImpl <em>Binomial Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.BinomialDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getBinomialDesign()
	 * @generated
	 */
	int BINOMIAL_DESIGN = 41;

	/**
	 * The feature id for the '<em><b>Order</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BINOMIAL_DESIGN__ORDER = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Binomial Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BINOMIAL_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MaximallyFlatDesignImpl <em>Maximally Flat Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MaximallyFlatDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMaximallyFlatDesign()
	 * @generated
	 */
	int MAXIMALLY_FLAT_DESIGN = 42;

	/**
	 * The feature id for the '<em><b>Flatness</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAXIMALLY_FLAT_DESIGN__FLATNESS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Zeros</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAXIMALLY_FLAT_DESIGN__ZEROS = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Maximally Flat Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MAXIMALLY_FLAT_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.SavitzkyGolayDesignImpl <em>Savitzky Golay Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.SavitzkyGolayDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getSavitzkyGolayDesign()
	 * @generated
	 */
	int SAVITZKY_GOLAY_DESIGN = 43;

	/**
	 * The feature id for the '<em><b>Points</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAVITZKY_GOLAY_DESIGN__POINTS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Degree</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAVITZKY_GOLAY_DESIGN__DEGREE = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Derivative</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAVITZKY_GOLAY_DESIGN__DERIVATIVE = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Position</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAVITZKY_GOLAY_DESIGN__POSITION = DESIGN_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Savitzky Golay Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAVITZKY_GOLAY_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.LagrangeDelayDesignImpl <em>Lagrange Delay Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.LagrangeDelayDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getLagrangeDelayDesign()
	 * @generated
	 */
	int LAGRANGE_DELAY_DESIGN = 44;

	/**
	 * The feature id for the '<em><b>Order</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LAGRANGE_DELAY_DESIGN__ORDER = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Delay</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LAGRANGE_DELAY_DESIGN__DELAY = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Lagrange Delay Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LAGRANGE_DELAY_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.RaisedCosineDesignImpl <em>Raised Cosine Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.RaisedCosineDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getRaisedCosineDesign()
	 * @generated
	 */
	int RAISED_COSINE_DESIGN = 45;

	/**
	 * The feature id for the '<em><b>Roll Off</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN__ROLL_OFF = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Samples Per Symbol</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Symbols</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN__SYMBOLS = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Root</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN__ROOT = DESIGN_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Gain</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN__GAIN = DESIGN_FEATURE_COUNT + 4;

	/**
	 * The number of structural features of the '<em>Raised Cosine Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RAISED_COSINE_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 5;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.LeastSquaresDesignImpl <em>Least Squares Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.LeastSquaresDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getLeastSquaresDesign()
	 * @generated
	 */
	int LEAST_SQUARES_DESIGN = 46;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEAST_SQUARES_DESIGN__TAPS = BAND_DESIGN__TAPS;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEAST_SQUARES_DESIGN__BANDS = BAND_DESIGN__BANDS;

	/**
	 * The feature id for the '<em><b>Type</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEAST_SQUARES_DESIGN__TYPE = BAND_DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Least Squares Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEAST_SQUARES_DESIGN_FEATURE_COUNT = BAND_DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ConstrainedLeastSquaresDesignImpl <em>Constrained Least Squares Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ConstrainedLeastSquaresDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getConstrainedLeastSquaresDesign()
	 * @generated
	 */
	int CONSTRAINED_LEAST_SQUARES_DESIGN = 47;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONSTRAINED_LEAST_SQUARES_DESIGN__TAPS = BAND_DESIGN__TAPS;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONSTRAINED_LEAST_SQUARES_DESIGN__BANDS = BAND_DESIGN__BANDS;

	/**
	 * The feature id for the '<em><b>Type</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONSTRAINED_LEAST_SQUARES_DESIGN__TYPE = BAND_DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Constrained Least Squares Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONSTRAINED_LEAST_SQUARES_DESIGN_FEATURE_COUNT = BAND_DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.LinearProgramDesignImpl <em>Linear Program Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.LinearProgramDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getLinearProgramDesign()
	 * @generated
	 */
	int LINEAR_PROGRAM_DESIGN = 48;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PROGRAM_DESIGN__TAPS = BAND_DESIGN__TAPS;

	/**
	 * The feature id for the '<em><b>Bands</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PROGRAM_DESIGN__BANDS = BAND_DESIGN__BANDS;

	/**
	 * The feature id for the '<em><b>Monotone</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PROGRAM_DESIGN__MONOTONE = BAND_DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Linear Program Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINEAR_PROGRAM_DESIGN_FEATURE_COUNT = BAND_DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.HalfBandDesignImpl <em>Half Band Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.HalfBandDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getHalfBandDesign()
	 * @generated
	 */
	int HALF_BAND_DESIGN = 49;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int HALF_BAND_DESIGN__TAPS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Pass Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int HALF_BAND_DESIGN__PASS_EDGE = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Hilbert</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int HALF_BAND_DESIGN__HILBERT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Half Band Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int HALF_BAND_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.CicCompensatorDesignImpl <em>Cic Compensator Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.CicCompensatorDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getCicCompensatorDesign()
	 * @generated
	 */
	int CIC_COMPENSATOR_DESIGN = 50;

	/**
	 * The feature id for the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__TAPS = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Sections</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__SECTIONS = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__RATE = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Pass Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__PASS_EDGE = DESIGN_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Stop Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__STOP_EDGE = DESIGN_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Stop Weight</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN__STOP_WEIGHT = DESIGN_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Cic Compensator Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIC_COMPENSATOR_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 6;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.CombDesignImpl <em>Comb Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.CombDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getCombDesign()
	 * @generated
	 */
	int COMB_DESIGN = 51;

	/**
	 * The feature id for the '<em><b>Period</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COMB_DESIGN__PERIOD = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Difference</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COMB_DESIGN__DIFFERENCE = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Comb Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COMB_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.MinimumPhaseDesignImpl <em>Minimum Phase Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.MinimumPhaseDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getMinimumPhaseDesign()
	 * @generated
	 */
	int MINIMUM_PHASE_DESIGN = 52;

	/**
	 * The feature id for the '<em><b>Prototype</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MINIMUM_PHASE_DESIGN__PROTOTYPE = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Minimum Phase Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MINIMUM_PHASE_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ComplementDesignImpl <em>Complement Design</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ComplementDesignImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getComplementDesign()
	 * @generated
	 */
	int COMPLEMENT_DESIGN = 53;

	/**
	 * The feature id for the '<em><b>Prototype</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COMPLEMENT_DESIGN__PROTOTYPE = DESIGN_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Complement Design</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COMPLEMENT_DESIGN_FEATURE_COUNT = DESIGN_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.CoefficientsImpl <em>Coefficients</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.CoefficientsImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getCoefficients()
	 * @generated
	 */
	int COEFFICIENTS = 54;

	/**
	 * The feature id for the '<em><b>Design Hash</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENTS__DESIGN_HASH = 0;

	/**
	 * The number of structural features of the '<em>Coefficients</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int COEFFICIENTS_FEATURE_COUNT = 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.RealCoefficientsImpl <em>Real Coefficients</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.RealCoefficientsImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getRealCoefficients()
	 * @generated
	 */
	int REAL_COEFFICIENTS = 55;

	/**
	 * The feature id for the '<em><b>Design Hash</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REAL_COEFFICIENTS__DESIGN_HASH = COEFFICIENTS__DESIGN_HASH;

	/**
	 * The feature id for the '<em><b>Values</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REAL_COEFFICIENTS__VALUES = COEFFICIENTS_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Real Coefficients</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REAL_COEFFICIENTS_FEATURE_COUNT = COEFFICIENTS_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.IntegerCoefficientsImpl <em>Integer Coefficients</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.IntegerCoefficientsImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getIntegerCoefficients()
	 * @generated
	 */
	int INTEGER_COEFFICIENTS = 56;

	/**
	 * The feature id for the '<em><b>Design Hash</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INTEGER_COEFFICIENTS__DESIGN_HASH = COEFFICIENTS__DESIGN_HASH;

	/**
	 * The feature id for the '<em><b>Integers</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INTEGER_COEFFICIENTS__INTEGERS = COEFFICIENTS_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Scale</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INTEGER_COEFFICIENTS__SCALE = COEFFICIENTS_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Integer Coefficients</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int INTEGER_COEFFICIENTS_FEATURE_COUNT = COEFFICIENTS_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ArithmeticImpl <em>Arithmetic</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ArithmeticImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getArithmetic()
	 * @generated
	 */
	int ARITHMETIC = 57;

	/**
	 * The feature id for the '<em><b>Structure</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__STRUCTURE = 0;

	/**
	 * The feature id for the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__FACTOR = 1;

	/**
	 * The feature id for the '<em><b>Coefficient</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__COEFFICIENT = 2;

	/**
	 * The feature id for the '<em><b>Input</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__INPUT = 3;

	/**
	 * The feature id for the '<em><b>Product</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__PRODUCT = 4;

	/**
	 * The feature id for the '<em><b>Accumulator</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__ACCUMULATOR = 5;

	/**
	 * The feature id for the '<em><b>Output</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__OUTPUT = 6;

	/**
	 * The feature id for the '<em><b>Rounding</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__ROUNDING = 7;

	/**
	 * The feature id for the '<em><b>Overflow</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC__OVERFLOW = 8;

	/**
	 * The number of structural features of the '<em>Arithmetic</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ARITHMETIC_FEATURE_COUNT = 9;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.FormatImpl <em>Format</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.FormatImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getFormat()
	 * @generated
	 */
	int FORMAT = 58;

	/**
	 * The feature id for the '<em><b>Word</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FORMAT__WORD = 0;

	/**
	 * The feature id for the '<em><b>Fraction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FORMAT__FRACTION = 1;

	/**
	 * The feature id for the '<em><b>Signed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FORMAT__SIGNED = 2;

	/**
	 * The number of structural features of the '<em>Format</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FORMAT_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.EvidenceImpl <em>Evidence</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.EvidenceImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getEvidence()
	 * @generated
	 */
	int EVIDENCE = 59;

	/**
	 * The feature id for the '<em><b>Tool</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EVIDENCE__TOOL = 0;

	/**
	 * The feature id for the '<em><b>Verdict</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EVIDENCE__VERDICT = 1;

	/**
	 * The feature id for the '<em><b>Results</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EVIDENCE__RESULTS = 2;

	/**
	 * The number of structural features of the '<em>Evidence</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EVIDENCE_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.ResultImpl <em>Result</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.ResultImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getResult()
	 * @generated
	 */
	int RESULT = 60;

	/**
	 * The feature id for the '<em><b>Requirement</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__REQUIREMENT = 0;

	/**
	 * The feature id for the '<em><b>Kind</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__KIND = 1;

	/**
	 * The feature id for the '<em><b>Verdict</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__VERDICT = 2;

	/**
	 * The feature id for the '<em><b>Worst</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__WORST = 3;

	/**
	 * The feature id for the '<em><b>Value Low</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__VALUE_LOW = 4;

	/**
	 * The feature id for the '<em><b>Value High</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__VALUE_HIGH = 5;

	/**
	 * The feature id for the '<em><b>Limit</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__LIMIT = 6;

	/**
	 * The feature id for the '<em><b>Margin Low</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__MARGIN_LOW = 7;

	/**
	 * The feature id for the '<em><b>Margin High</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT__MARGIN_HIGH = 8;

	/**
	 * The number of structural features of the '<em>Result</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RESULT_FEATURE_COUNT = 9;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.RevisionImpl <em>Revision</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.RevisionImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getRevision()
	 * @generated
	 */
	int REVISION = 61;

	/**
	 * The feature id for the '<em><b>Parents</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__PARENTS = 0;

	/**
	 * The feature id for the '<em><b>Author</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__AUTHOR = 1;

	/**
	 * The feature id for the '<em><b>Email</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__EMAIL = 2;

	/**
	 * The feature id for the '<em><b>Time</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__TIME = 3;

	/**
	 * The feature id for the '<em><b>Message</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__MESSAGE = 4;

	/**
	 * The feature id for the '<em><b>Parameters</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__PARAMETERS = 5;

	/**
	 * The feature id for the '<em><b>Filter</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__FILTER = 6;

	/**
	 * The feature id for the '<em><b>Evidence</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION__EVIDENCE = 7;

	/**
	 * The number of structural features of the '<em>Revision</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int REVISION_FEATURE_COUNT = 8;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.BaselineImpl <em>Baseline</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.BaselineImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getBaseline()
	 * @generated
	 */
	int BASELINE = 62;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__NAME = 0;

	/**
	 * The feature id for the '<em><b>Author</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__AUTHOR = 1;

	/**
	 * The feature id for the '<em><b>Email</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__EMAIL = 2;

	/**
	 * The feature id for the '<em><b>Time</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__TIME = 3;

	/**
	 * The feature id for the '<em><b>Message</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__MESSAGE = 4;

	/**
	 * The feature id for the '<em><b>Entries</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE__ENTRIES = 5;

	/**
	 * The number of structural features of the '<em>Baseline</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE_FEATURE_COUNT = 6;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.BaselineEntryImpl <em>Baseline Entry</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.BaselineEntryImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getBaselineEntry()
	 * @generated
	 */
	int BASELINE_ENTRY = 63;

	/**
	 * The feature id for the '<em><b>Filter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE_ENTRY__FILTER = 0;

	/**
	 * The feature id for the '<em><b>Identity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE_ENTRY__IDENTITY = 1;

	/**
	 * The feature id for the '<em><b>Revision</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE_ENTRY__REVISION = 2;

	/**
	 * The number of structural features of the '<em>Baseline Entry</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int BASELINE_ENTRY_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link tapwright.model.impl.SignOffImpl <em>Sign Off</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.impl.SignOffImpl
	 * @see tapwright.model.impl.ModelPackageImpl#getSignOff()
	 * @generated
	 */
	int SIGN_OFF = 64;

	/**
	 * The feature id for the '<em><b>Filter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__FILTER = 0;

	/**
	 * The feature id for the '<em><b>Revision</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__REVISION = 1;

	/**
	 * The feature id for the '<em><b>Reviewer</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__REVIEWER = 2;

	/**
	 * The feature id for the '<em><b>Email</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__EMAIL = 3;

	/**
	 * The feature id for the '<em><b>Time</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__TIME = 4;

	/**
	 * The feature id for the '<em><b>Decision</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__DECISION = 5;

	/**
	 * The feature id for the '<em><b>Comment</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF__COMMENT = 6;

	/**
	 * The number of structural features of the '<em>Sign Off</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SIGN_OFF_FEATURE_COUNT = 7;

	/**
	 * The meta object id for the '{@link tapwright.model.Severity <em>Severity</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Severity
	 * @see tapwright.model.impl.ModelPackageImpl#getSeverity()
	 * @generated
	 */
	int SEVERITY = 65;

	/**
	 * The meta object id for the '{@link tapwright.model.Unit <em>Unit</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Unit
	 * @see tapwright.model.impl.ModelPackageImpl#getUnit()
	 * @generated
	 */
	int UNIT = 66;

	/**
	 * The meta object id for the '{@link tapwright.model.Side <em>Side</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Side
	 * @see tapwright.model.impl.ModelPackageImpl#getSide()
	 * @generated
	 */
	int SIDE = 67;

	/**
	 * The meta object id for the '{@link tapwright.model.Interpolation <em>Interpolation</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Interpolation
	 * @see tapwright.model.impl.ModelPackageImpl#getInterpolation()
	 * @generated
	 */
	int INTERPOLATION = 68;

	/**
	 * The meta object id for the '{@link tapwright.model.PhaseType <em>Phase Type</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.PhaseType
	 * @see tapwright.model.impl.ModelPackageImpl#getPhaseType()
	 * @generated
	 */
	int PHASE_TYPE = 69;

	/**
	 * The meta object id for the '{@link tapwright.model.InputClass <em>Input Class</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.InputClass
	 * @see tapwright.model.impl.ModelPackageImpl#getInputClass()
	 * @generated
	 */
	int INPUT_CLASS = 70;

	/**
	 * The meta object id for the '{@link tapwright.model.Structure <em>Structure</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Structure
	 * @see tapwright.model.impl.ModelPackageImpl#getStructure()
	 * @generated
	 */
	int STRUCTURE = 71;

	/**
	 * The meta object id for the '{@link tapwright.model.Rounding <em>Rounding</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Rounding
	 * @see tapwright.model.impl.ModelPackageImpl#getRounding()
	 * @generated
	 */
	int ROUNDING = 72;

	/**
	 * The meta object id for the '{@link tapwright.model.Overflow <em>Overflow</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Overflow
	 * @see tapwright.model.impl.ModelPackageImpl#getOverflow()
	 * @generated
	 */
	int OVERFLOW = 73;

	/**
	 * The meta object id for the '{@link tapwright.model.Verdict <em>Verdict</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Verdict
	 * @see tapwright.model.impl.ModelPackageImpl#getVerdict()
	 * @generated
	 */
	int VERDICT = 74;

	/**
	 * The meta object id for the '{@link tapwright.model.Decision <em>Decision</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.Decision
	 * @see tapwright.model.impl.ModelPackageImpl#getDecision()
	 * @generated
	 */
	int DECISION = 75;

	/**
	 * The meta object id for the '{@link tapwright.model.WindowKind <em>Window Kind</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.WindowKind
	 * @see tapwright.model.impl.ModelPackageImpl#getWindowKind()
	 * @generated
	 */
	int WINDOW_KIND = 76;

	/**
	 * The meta object id for the '{@link tapwright.model.PulseGain <em>Pulse Gain</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see tapwright.model.PulseGain
	 * @see tapwright.model.impl.ModelPackageImpl#getPulseGain()
	 * @generated
	 */
	int PULSE_GAIN = 77;

	/**
	 * The meta object id for the '<em>Quantity</em>' data type.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see java.lang.String
	 * @see tapwright.model.impl.ModelPackageImpl#getQuantity()
	 * @generated
	 */
	int QUANTITY = 78;


	/**
	 * Returns the meta object for class '{@link tapwright.model.Portfolio <em>Portfolio</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Portfolio</em>'.
	 * @see tapwright.model.Portfolio
	 * @generated
	 */
	EClass getPortfolio();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Portfolio#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.Portfolio#getName()
	 * @see #getPortfolio()
	 * @generated
	 */
	EAttribute getPortfolio_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Portfolio#getDescription <em>Description</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Description</em>'.
	 * @see tapwright.model.Portfolio#getDescription()
	 * @see #getPortfolio()
	 * @generated
	 */
	EAttribute getPortfolio_Description();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Portfolio#getErosion <em>Erosion</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Erosion</em>'.
	 * @see tapwright.model.Portfolio#getErosion()
	 * @see #getPortfolio()
	 * @generated
	 */
	EAttribute getPortfolio_Erosion();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Portfolio#getActiveBaseline <em>Active Baseline</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Active Baseline</em>'.
	 * @see tapwright.model.Portfolio#getActiveBaseline()
	 * @see #getPortfolio()
	 * @generated
	 */
	EAttribute getPortfolio_ActiveBaseline();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Portfolio#getParameters <em>Parameters</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Parameters</em>'.
	 * @see tapwright.model.Portfolio#getParameters()
	 * @see #getPortfolio()
	 * @generated
	 */
	EReference getPortfolio_Parameters();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Portfolio#getProcessors <em>Processors</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Processors</em>'.
	 * @see tapwright.model.Portfolio#getProcessors()
	 * @see #getPortfolio()
	 * @generated
	 */
	EReference getPortfolio_Processors();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Portfolio#getPaths <em>Paths</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Paths</em>'.
	 * @see tapwright.model.Portfolio#getPaths()
	 * @see #getPortfolio()
	 * @generated
	 */
	EReference getPortfolio_Paths();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Parameter <em>Parameter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Parameter</em>'.
	 * @see tapwright.model.Parameter
	 * @generated
	 */
	EClass getParameter();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Parameter#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.Parameter#getName()
	 * @see #getParameter()
	 * @generated
	 */
	EAttribute getParameter_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Parameter#getValue <em>Value</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Value</em>'.
	 * @see tapwright.model.Parameter#getValue()
	 * @see #getParameter()
	 * @generated
	 */
	EAttribute getParameter_Value();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Parameter#getUnit <em>Unit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Unit</em>'.
	 * @see tapwright.model.Parameter#getUnit()
	 * @see #getParameter()
	 * @generated
	 */
	EAttribute getParameter_Unit();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Parameter#getDescription <em>Description</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Description</em>'.
	 * @see tapwright.model.Parameter#getDescription()
	 * @see #getParameter()
	 * @generated
	 */
	EAttribute getParameter_Description();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Processor <em>Processor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Processor</em>'.
	 * @see tapwright.model.Processor
	 * @generated
	 */
	EClass getProcessor();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.Processor#getName()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getDescription <em>Description</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Description</em>'.
	 * @see tapwright.model.Processor#getDescription()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_Description();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getMacRate <em>Mac Rate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mac Rate</em>'.
	 * @see tapwright.model.Processor#getMacRate()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_MacRate();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getWord <em>Word</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Word</em>'.
	 * @see tapwright.model.Processor#getWord()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_Word();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getAccumulator <em>Accumulator</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Accumulator</em>'.
	 * @see tapwright.model.Processor#getAccumulator()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_Accumulator();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getCoefficientMemory <em>Coefficient Memory</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Coefficient Memory</em>'.
	 * @see tapwright.model.Processor#getCoefficientMemory()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_CoefficientMemory();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Processor#getDelayMemory <em>Delay Memory</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Delay Memory</em>'.
	 * @see tapwright.model.Processor#getDelayMemory()
	 * @see #getProcessor()
	 * @generated
	 */
	EAttribute getProcessor_DelayMemory();

	/**
	 * Returns the meta object for class '{@link tapwright.model.SignalPath <em>Signal Path</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Signal Path</em>'.
	 * @see tapwright.model.SignalPath
	 * @generated
	 */
	EClass getSignalPath();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignalPath#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.SignalPath#getName()
	 * @see #getSignalPath()
	 * @generated
	 */
	EAttribute getSignalPath_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignalPath#getDescription <em>Description</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Description</em>'.
	 * @see tapwright.model.SignalPath#getDescription()
	 * @see #getSignalPath()
	 * @generated
	 */
	EAttribute getSignalPath_Description();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignalPath#getSampleRate <em>Sample Rate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Sample Rate</em>'.
	 * @see tapwright.model.SignalPath#getSampleRate()
	 * @see #getSignalPath()
	 * @generated
	 */
	EAttribute getSignalPath_SampleRate();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.SignalPath#getStages <em>Stages</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Stages</em>'.
	 * @see tapwright.model.SignalPath#getStages()
	 * @see #getSignalPath()
	 * @generated
	 */
	EReference getSignalPath_Stages();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.SignalPath#getRequirements <em>Requirements</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Requirements</em>'.
	 * @see tapwright.model.SignalPath#getRequirements()
	 * @see #getSignalPath()
	 * @generated
	 */
	EReference getSignalPath_Requirements();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Stage <em>Stage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Stage</em>'.
	 * @see tapwright.model.Stage
	 * @generated
	 */
	EClass getStage();

	/**
	 * Returns the meta object for class '{@link tapwright.model.FilterStage <em>Filter Stage</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Filter Stage</em>'.
	 * @see tapwright.model.FilterStage
	 * @generated
	 */
	EClass getFilterStage();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.FilterStage#getFilter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Filter</em>'.
	 * @see tapwright.model.FilterStage#getFilter()
	 * @see #getFilterStage()
	 * @generated
	 */
	EAttribute getFilterStage_Filter();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Decimation <em>Decimation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Decimation</em>'.
	 * @see tapwright.model.Decimation
	 * @generated
	 */
	EClass getDecimation();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Decimation#getFactor <em>Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Factor</em>'.
	 * @see tapwright.model.Decimation#getFactor()
	 * @see #getDecimation()
	 * @generated
	 */
	EAttribute getDecimation_Factor();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Expansion <em>Expansion</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Expansion</em>'.
	 * @see tapwright.model.Expansion
	 * @generated
	 */
	EClass getExpansion();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Expansion#getFactor <em>Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Factor</em>'.
	 * @see tapwright.model.Expansion#getFactor()
	 * @see #getExpansion()
	 * @generated
	 */
	EAttribute getExpansion_Factor();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Filter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Filter</em>'.
	 * @see tapwright.model.Filter
	 * @generated
	 */
	EClass getFilter();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Filter#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.Filter#getName()
	 * @see #getFilter()
	 * @generated
	 */
	EAttribute getFilter_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Filter#getIdentity <em>Identity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Identity</em>'.
	 * @see tapwright.model.Filter#getIdentity()
	 * @see #getFilter()
	 * @generated
	 */
	EAttribute getFilter_Identity();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Filter#getPurpose <em>Purpose</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Purpose</em>'.
	 * @see tapwright.model.Filter#getPurpose()
	 * @see #getFilter()
	 * @generated
	 */
	EAttribute getFilter_Purpose();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Filter#getSampleRate <em>Sample Rate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Sample Rate</em>'.
	 * @see tapwright.model.Filter#getSampleRate()
	 * @see #getFilter()
	 * @generated
	 */
	EAttribute getFilter_SampleRate();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Filter#getRequirements <em>Requirements</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Requirements</em>'.
	 * @see tapwright.model.Filter#getRequirements()
	 * @see #getFilter()
	 * @generated
	 */
	EReference getFilter_Requirements();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Filter#getDesign <em>Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Design</em>'.
	 * @see tapwright.model.Filter#getDesign()
	 * @see #getFilter()
	 * @generated
	 */
	EReference getFilter_Design();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Filter#getCoefficients <em>Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Coefficients</em>'.
	 * @see tapwright.model.Filter#getCoefficients()
	 * @see #getFilter()
	 * @generated
	 */
	EReference getFilter_Coefficients();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Filter#getArithmetic <em>Arithmetic</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Arithmetic</em>'.
	 * @see tapwright.model.Filter#getArithmetic()
	 * @see #getFilter()
	 * @generated
	 */
	EReference getFilter_Arithmetic();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Filter#getDeployments <em>Deployments</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Deployments</em>'.
	 * @see tapwright.model.Filter#getDeployments()
	 * @see #getFilter()
	 * @generated
	 */
	EReference getFilter_Deployments();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Deployment <em>Deployment</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Deployment</em>'.
	 * @see tapwright.model.Deployment
	 * @generated
	 */
	EClass getDeployment();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Deployment#getProcessor <em>Processor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Processor</em>'.
	 * @see tapwright.model.Deployment#getProcessor()
	 * @see #getDeployment()
	 * @generated
	 */
	EAttribute getDeployment_Processor();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Deployment#getChannels <em>Channels</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Channels</em>'.
	 * @see tapwright.model.Deployment#getChannels()
	 * @see #getDeployment()
	 * @generated
	 */
	EAttribute getDeployment_Channels();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Deployment#getCopies <em>Copies</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Copies</em>'.
	 * @see tapwright.model.Deployment#getCopies()
	 * @see #getDeployment()
	 * @generated
	 */
	EAttribute getDeployment_Copies();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Deployment#getInputRate <em>Input Rate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Input Rate</em>'.
	 * @see tapwright.model.Deployment#getInputRate()
	 * @see #getDeployment()
	 * @generated
	 */
	EAttribute getDeployment_InputRate();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Requirement <em>Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Requirement</em>'.
	 * @see tapwright.model.Requirement
	 * @generated
	 */
	EClass getRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Requirement#getId <em>Id</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Id</em>'.
	 * @see tapwright.model.Requirement#getId()
	 * @see #getRequirement()
	 * @generated
	 */
	EAttribute getRequirement_Id();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Requirement#getSeverity <em>Severity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Severity</em>'.
	 * @see tapwright.model.Requirement#getSeverity()
	 * @see #getRequirement()
	 * @generated
	 */
	EAttribute getRequirement_Severity();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Requirement#getNote <em>Note</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Note</em>'.
	 * @see tapwright.model.Requirement#getNote()
	 * @see #getRequirement()
	 * @generated
	 */
	EAttribute getRequirement_Note();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Requirement#getClockTolerance <em>Clock Tolerance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Clock Tolerance</em>'.
	 * @see tapwright.model.Requirement#getClockTolerance()
	 * @see #getRequirement()
	 * @generated
	 */
	EAttribute getRequirement_ClockTolerance();

	/**
	 * Returns the meta object for class '{@link tapwright.model.LimitPoint <em>Limit Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Limit Point</em>'.
	 * @see tapwright.model.LimitPoint
	 * @generated
	 */
	EClass getLimitPoint();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LimitPoint#getFrequency <em>Frequency</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Frequency</em>'.
	 * @see tapwright.model.LimitPoint#getFrequency()
	 * @see #getLimitPoint()
	 * @generated
	 */
	EAttribute getLimitPoint_Frequency();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LimitPoint#getLevel <em>Level</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Level</em>'.
	 * @see tapwright.model.LimitPoint#getLevel()
	 * @see #getLimitPoint()
	 * @generated
	 */
	EAttribute getLimitPoint_Level();

	/**
	 * Returns the meta object for class '{@link tapwright.model.GainRequirement <em>Gain Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Gain Requirement</em>'.
	 * @see tapwright.model.GainRequirement
	 * @generated
	 */
	EClass getGainRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>From</em>'.
	 * @see tapwright.model.GainRequirement#getFrom()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_From();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To</em>'.
	 * @see tapwright.model.GainRequirement#getTo()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_To();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getMin <em>Min</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Min</em>'.
	 * @see tapwright.model.GainRequirement#getMin()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_Min();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.GainRequirement#getMax()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_Max();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.GainRequirement#getPoints <em>Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Points</em>'.
	 * @see tapwright.model.GainRequirement#getPoints()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EReference getGainRequirement_Points();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getSide <em>Side</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Side</em>'.
	 * @see tapwright.model.GainRequirement#getSide()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_Side();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getInterpolate <em>Interpolate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Interpolate</em>'.
	 * @see tapwright.model.GainRequirement#getInterpolate()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_Interpolate();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getReferenceAt <em>Reference At</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reference At</em>'.
	 * @see tapwright.model.GainRequirement#getReferenceAt()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_ReferenceAt();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getReferenceFrom <em>Reference From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reference From</em>'.
	 * @see tapwright.model.GainRequirement#getReferenceFrom()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_ReferenceFrom();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GainRequirement#getReferenceTo <em>Reference To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reference To</em>'.
	 * @see tapwright.model.GainRequirement#getReferenceTo()
	 * @see #getGainRequirement()
	 * @generated
	 */
	EAttribute getGainRequirement_ReferenceTo();

	/**
	 * Returns the meta object for class '{@link tapwright.model.LinearPhaseRequirement <em>Linear Phase Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Linear Phase Requirement</em>'.
	 * @see tapwright.model.LinearPhaseRequirement
	 * @generated
	 */
	EClass getLinearPhaseRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LinearPhaseRequirement#getType <em>Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Type</em>'.
	 * @see tapwright.model.LinearPhaseRequirement#getType()
	 * @see #getLinearPhaseRequirement()
	 * @generated
	 */
	EAttribute getLinearPhaseRequirement_Type();

	/**
	 * Returns the meta object for class '{@link tapwright.model.GroupDelayRequirement <em>Group Delay Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Group Delay Requirement</em>'.
	 * @see tapwright.model.GroupDelayRequirement
	 * @generated
	 */
	EClass getGroupDelayRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayRequirement#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>From</em>'.
	 * @see tapwright.model.GroupDelayRequirement#getFrom()
	 * @see #getGroupDelayRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayRequirement_From();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayRequirement#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To</em>'.
	 * @see tapwright.model.GroupDelayRequirement#getTo()
	 * @see #getGroupDelayRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayRequirement_To();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayRequirement#getMin <em>Min</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Min</em>'.
	 * @see tapwright.model.GroupDelayRequirement#getMin()
	 * @see #getGroupDelayRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayRequirement_Min();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.GroupDelayRequirement#getMax()
	 * @see #getGroupDelayRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.GroupDelayVariationRequirement <em>Group Delay Variation Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Group Delay Variation Requirement</em>'.
	 * @see tapwright.model.GroupDelayVariationRequirement
	 * @generated
	 */
	EClass getGroupDelayVariationRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayVariationRequirement#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>From</em>'.
	 * @see tapwright.model.GroupDelayVariationRequirement#getFrom()
	 * @see #getGroupDelayVariationRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayVariationRequirement_From();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayVariationRequirement#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To</em>'.
	 * @see tapwright.model.GroupDelayVariationRequirement#getTo()
	 * @see #getGroupDelayVariationRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayVariationRequirement_To();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GroupDelayVariationRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.GroupDelayVariationRequirement#getMax()
	 * @see #getGroupDelayVariationRequirement()
	 * @generated
	 */
	EAttribute getGroupDelayVariationRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.BulkDelayRequirement <em>Bulk Delay Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Bulk Delay Requirement</em>'.
	 * @see tapwright.model.BulkDelayRequirement
	 * @generated
	 */
	EClass getBulkDelayRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BulkDelayRequirement#getMin <em>Min</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Min</em>'.
	 * @see tapwright.model.BulkDelayRequirement#getMin()
	 * @see #getBulkDelayRequirement()
	 * @generated
	 */
	EAttribute getBulkDelayRequirement_Min();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BulkDelayRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.BulkDelayRequirement#getMax()
	 * @see #getBulkDelayRequirement()
	 * @generated
	 */
	EAttribute getBulkDelayRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.StepOvershootRequirement <em>Step Overshoot Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Step Overshoot Requirement</em>'.
	 * @see tapwright.model.StepOvershootRequirement
	 * @generated
	 */
	EClass getStepOvershootRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.StepOvershootRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.StepOvershootRequirement#getMax()
	 * @see #getStepOvershootRequirement()
	 * @generated
	 */
	EAttribute getStepOvershootRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.StepUndershootRequirement <em>Step Undershoot Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Step Undershoot Requirement</em>'.
	 * @see tapwright.model.StepUndershootRequirement
	 * @generated
	 */
	EClass getStepUndershootRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.StepUndershootRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.StepUndershootRequirement#getMax()
	 * @see #getStepUndershootRequirement()
	 * @generated
	 */
	EAttribute getStepUndershootRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.StepSettlingRequirement <em>Step Settling Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Step Settling Requirement</em>'.
	 * @see tapwright.model.StepSettlingRequirement
	 * @generated
	 */
	EClass getStepSettlingRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.StepSettlingRequirement#getWithin <em>Within</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Within</em>'.
	 * @see tapwright.model.StepSettlingRequirement#getWithin()
	 * @see #getStepSettlingRequirement()
	 * @generated
	 */
	EAttribute getStepSettlingRequirement_Within();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.StepSettlingRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.StepSettlingRequirement#getMax()
	 * @see #getStepSettlingRequirement()
	 * @generated
	 */
	EAttribute getStepSettlingRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.ImpulseTailRequirement <em>Impulse Tail Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Impulse Tail Requirement</em>'.
	 * @see tapwright.model.ImpulseTailRequirement
	 * @generated
	 */
	EClass getImpulseTailRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.ImpulseTailRequirement#getAfter <em>After</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>After</em>'.
	 * @see tapwright.model.ImpulseTailRequirement#getAfter()
	 * @see #getImpulseTailRequirement()
	 * @generated
	 */
	EAttribute getImpulseTailRequirement_After();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.ImpulseTailRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.ImpulseTailRequirement#getMax()
	 * @see #getImpulseTailRequirement()
	 * @generated
	 */
	EAttribute getImpulseTailRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.NullRequirement <em>Null Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Null Requirement</em>'.
	 * @see tapwright.model.NullRequirement
	 * @generated
	 */
	EClass getNullRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.NullRequirement#getAt <em>At</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>At</em>'.
	 * @see tapwright.model.NullRequirement#getAt()
	 * @see #getNullRequirement()
	 * @generated
	 */
	EAttribute getNullRequirement_At();

	/**
	 * Returns the meta object for class '{@link tapwright.model.ExactGainRequirement <em>Exact Gain Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Exact Gain Requirement</em>'.
	 * @see tapwright.model.ExactGainRequirement
	 * @generated
	 */
	EClass getExactGainRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.ExactGainRequirement#getAt <em>At</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>At</em>'.
	 * @see tapwright.model.ExactGainRequirement#getAt()
	 * @see #getExactGainRequirement()
	 * @generated
	 */
	EAttribute getExactGainRequirement_At();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.ExactGainRequirement#getValue <em>Value</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Value</em>'.
	 * @see tapwright.model.ExactGainRequirement#getValue()
	 * @see #getExactGainRequirement()
	 * @generated
	 */
	EAttribute getExactGainRequirement_Value();

	/**
	 * Returns the meta object for class '{@link tapwright.model.NonNegativeAmplitudeRequirement <em>Non Negative Amplitude Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Non Negative Amplitude Requirement</em>'.
	 * @see tapwright.model.NonNegativeAmplitudeRequirement
	 * @generated
	 */
	EClass getNonNegativeAmplitudeRequirement();

	/**
	 * Returns the meta object for class '{@link tapwright.model.NoOverflowRequirement <em>No Overflow Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>No Overflow Requirement</em>'.
	 * @see tapwright.model.NoOverflowRequirement
	 * @generated
	 */
	EClass getNoOverflowRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.NoOverflowRequirement#getInput <em>Input</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Input</em>'.
	 * @see tapwright.model.NoOverflowRequirement#getInput()
	 * @see #getNoOverflowRequirement()
	 * @generated
	 */
	EAttribute getNoOverflowRequirement_Input();

	/**
	 * Returns the meta object for class '{@link tapwright.model.OutputNoiseRequirement <em>Output Noise Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Output Noise Requirement</em>'.
	 * @see tapwright.model.OutputNoiseRequirement
	 * @generated
	 */
	EClass getOutputNoiseRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.OutputNoiseRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.OutputNoiseRequirement#getMax()
	 * @see #getOutputNoiseRequirement()
	 * @generated
	 */
	EAttribute getOutputNoiseRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.CoefficientWordRequirement <em>Coefficient Word Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Coefficient Word Requirement</em>'.
	 * @see tapwright.model.CoefficientWordRequirement
	 * @generated
	 */
	EClass getCoefficientWordRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CoefficientWordRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.CoefficientWordRequirement#getMax()
	 * @see #getCoefficientWordRequirement()
	 * @generated
	 */
	EAttribute getCoefficientWordRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.TapsRequirement <em>Taps Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Taps Requirement</em>'.
	 * @see tapwright.model.TapsRequirement
	 * @generated
	 */
	EClass getTapsRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.TapsRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.TapsRequirement#getMax()
	 * @see #getTapsRequirement()
	 * @generated
	 */
	EAttribute getTapsRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MultipliesRequirement <em>Multiplies Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Multiplies Requirement</em>'.
	 * @see tapwright.model.MultipliesRequirement
	 * @generated
	 */
	EClass getMultipliesRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MultipliesRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.MultipliesRequirement#getMax()
	 * @see #getMultipliesRequirement()
	 * @generated
	 */
	EAttribute getMultipliesRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.AddsRequirement <em>Adds Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Adds Requirement</em>'.
	 * @see tapwright.model.AddsRequirement
	 * @generated
	 */
	EClass getAddsRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.AddsRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.AddsRequirement#getMax()
	 * @see #getAddsRequirement()
	 * @generated
	 */
	EAttribute getAddsRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MemoryRequirement <em>Memory Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Memory Requirement</em>'.
	 * @see tapwright.model.MemoryRequirement
	 * @generated
	 */
	EClass getMemoryRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MemoryRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.MemoryRequirement#getMax()
	 * @see #getMemoryRequirement()
	 * @generated
	 */
	EAttribute getMemoryRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MultiplyRateRequirement <em>Multiply Rate Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Multiply Rate Requirement</em>'.
	 * @see tapwright.model.MultiplyRateRequirement
	 * @generated
	 */
	EClass getMultiplyRateRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MultiplyRateRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.MultiplyRateRequirement#getMax()
	 * @see #getMultiplyRateRequirement()
	 * @generated
	 */
	EAttribute getMultiplyRateRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.AliasRejectionRequirement <em>Alias Rejection Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Alias Rejection Requirement</em>'.
	 * @see tapwright.model.AliasRejectionRequirement
	 * @generated
	 */
	EClass getAliasRejectionRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.AliasRejectionRequirement#getFactor <em>Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Factor</em>'.
	 * @see tapwright.model.AliasRejectionRequirement#getFactor()
	 * @see #getAliasRejectionRequirement()
	 * @generated
	 */
	EAttribute getAliasRejectionRequirement_Factor();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.AliasRejectionRequirement#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To</em>'.
	 * @see tapwright.model.AliasRejectionRequirement#getTo()
	 * @see #getAliasRejectionRequirement()
	 * @generated
	 */
	EAttribute getAliasRejectionRequirement_To();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.AliasRejectionRequirement#getMin <em>Min</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Min</em>'.
	 * @see tapwright.model.AliasRejectionRequirement#getMin()
	 * @see #getAliasRejectionRequirement()
	 * @generated
	 */
	EAttribute getAliasRejectionRequirement_Min();

	/**
	 * Returns the meta object for class '{@link tapwright.model.PowerComplementaryRequirement <em>Power Complementary Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Power Complementary Requirement</em>'.
	 * @see tapwright.model.PowerComplementaryRequirement
	 * @generated
	 */
	EClass getPowerComplementaryRequirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.PowerComplementaryRequirement#getPartner <em>Partner</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Partner</em>'.
	 * @see tapwright.model.PowerComplementaryRequirement#getPartner()
	 * @see #getPowerComplementaryRequirement()
	 * @generated
	 */
	EAttribute getPowerComplementaryRequirement_Partner();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.PowerComplementaryRequirement#getMax <em>Max</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Max</em>'.
	 * @see tapwright.model.PowerComplementaryRequirement#getMax()
	 * @see #getPowerComplementaryRequirement()
	 * @generated
	 */
	EAttribute getPowerComplementaryRequirement_Max();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Design <em>Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Design</em>'.
	 * @see tapwright.model.Design
	 * @generated
	 */
	EClass getDesign();

	/**
	 * Returns the meta object for class '{@link tapwright.model.BandDesign <em>Band Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Band Design</em>'.
	 * @see tapwright.model.BandDesign
	 * @generated
	 */
	EClass getBandDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BandDesign#getTaps <em>Taps</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Taps</em>'.
	 * @see tapwright.model.BandDesign#getTaps()
	 * @see #getBandDesign()
	 * @generated
	 */
	EAttribute getBandDesign_Taps();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.BandDesign#getBands <em>Bands</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Bands</em>'.
	 * @see tapwright.model.BandDesign#getBands()
	 * @see #getBandDesign()
	 * @generated
	 */
	EReference getBandDesign_Bands();

	/**
	 * Returns the meta object for class '{@link tapwright.model.DesignBand <em>Design Band</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Design Band</em>'.
	 * @see tapwright.model.DesignBand
	 * @generated
	 */
	EClass getDesignBand();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>From</em>'.
	 * @see tapwright.model.DesignBand#getFrom()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_From();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To</em>'.
	 * @see tapwright.model.DesignBand#getTo()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_To();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getDesired <em>Desired</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Desired</em>'.
	 * @see tapwright.model.DesignBand#getDesired()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_Desired();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getDesiredTo <em>Desired To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Desired To</em>'.
	 * @see tapwright.model.DesignBand#getDesiredTo()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_DesiredTo();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getWeight <em>Weight</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Weight</em>'.
	 * @see tapwright.model.DesignBand#getWeight()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_Weight();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.DesignBand#getWeightTo <em>Weight To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Weight To</em>'.
	 * @see tapwright.model.DesignBand#getWeightTo()
	 * @see #getDesignBand()
	 * @generated
	 */
	EAttribute getDesignBand_WeightTo();

	/**
	 * Returns the meta object for class '{@link tapwright.model.GivenDesign <em>Given Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Given Design</em>'.
	 * @see tapwright.model.GivenDesign
	 * @generated
	 */
	EClass getGivenDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.GivenDesign#getSource <em>Source</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Source</em>'.
	 * @see tapwright.model.GivenDesign#getSource()
	 * @see #getGivenDesign()
	 * @generated
	 */
	EAttribute getGivenDesign_Source();

	/**
	 * Returns the meta object for class '{@link tapwright.model.WindowDesign <em>Window Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Window Design</em>'.
	 * @see tapwright.model.WindowDesign
	 * @generated
	 */
	EClass getWindowDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.WindowDesign#getWindow <em>Window</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Window</em>'.
	 * @see tapwright.model.WindowDesign#getWindow()
	 * @see #getWindowDesign()
	 * @generated
	 */
	EAttribute getWindowDesign_Window();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.WindowDesign#getParameter <em>Parameter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Parameter</em>'.
	 * @see tapwright.model.WindowDesign#getParameter()
	 * @see #getWindowDesign()
	 * @generated
	 */
	EAttribute getWindowDesign_Parameter();

	/**
	 * Returns the meta object for class '{@link tapwright.model.EquirippleDesign <em>Equiripple Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Equiripple Design</em>'.
	 * @see tapwright.model.EquirippleDesign
	 * @generated
	 */
	EClass getEquirippleDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.EquirippleDesign#getType <em>Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Type</em>'.
	 * @see tapwright.model.EquirippleDesign#getType()
	 * @see #getEquirippleDesign()
	 * @generated
	 */
	EAttribute getEquirippleDesign_Type();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.EquirippleDesign#getTolerance <em>Tolerance</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Tolerance</em>'.
	 * @see tapwright.model.EquirippleDesign#getTolerance()
	 * @see #getEquirippleDesign()
	 * @generated
	 */
	EAttribute getEquirippleDesign_Tolerance();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MovingAverageDesign <em>Moving Average Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Moving Average Design</em>'.
	 * @see tapwright.model.MovingAverageDesign
	 * @generated
	 */
	EClass getMovingAverageDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MovingAverageDesign#getTaps <em>Taps</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Taps</em>'.
	 * @see tapwright.model.MovingAverageDesign#getTaps()
	 * @see #getMovingAverageDesign()
	 * @generated
	 */
	EAttribute getMovingAverageDesign_Taps();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MovingAverageDesign#getSections <em>Sections</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Sections</em>'.
	 * @see tapwright.model.MovingAverageDesign#getSections()
	 * @see #getMovingAverageDesign()
	 * @generated
	 */
	EAttribute getMovingAverageDesign_Sections();

	/**
	 * Returns the meta object for class '{@link tapwright.model.BinomialDesign <em>Binomial Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Binomial Design</em>'.
	 * @see tapwright.model.BinomialDesign
	 * @generated
	 */
	EClass getBinomialDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BinomialDesign#getOrder <em>Order</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Order</em>'.
	 * @see tapwright.model.BinomialDesign#getOrder()
	 * @see #getBinomialDesign()
	 * @generated
	 */
	EAttribute getBinomialDesign_Order();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MaximallyFlatDesign <em>Maximally Flat Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Maximally Flat Design</em>'.
	 * @see tapwright.model.MaximallyFlatDesign
	 * @generated
	 */
	EClass getMaximallyFlatDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MaximallyFlatDesign#getFlatness <em>Flatness</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Flatness</em>'.
	 * @see tapwright.model.MaximallyFlatDesign#getFlatness()
	 * @see #getMaximallyFlatDesign()
	 * @generated
	 */
	EAttribute getMaximallyFlatDesign_Flatness();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.MaximallyFlatDesign#getZeros <em>Zeros</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Zeros</em>'.
	 * @see tapwright.model.MaximallyFlatDesign#getZeros()
	 * @see #getMaximallyFlatDesign()
	 * @generated
	 */
	EAttribute getMaximallyFlatDesign_Zeros();

	/**
	 * Returns the meta object for class '{@link tapwright.model.SavitzkyGolayDesign <em>Savitzky Golay Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Savitzky Golay Design</em>'.
	 * @see tapwright.model.SavitzkyGolayDesign
	 * @generated
	 */
	EClass getSavitzkyGolayDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SavitzkyGolayDesign#getPoints <em>Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Points</em>'.
	 * @see tapwright.model.SavitzkyGolayDesign#getPoints()
	 * @see #getSavitzkyGolayDesign()
	 * @generated
	 */
	EAttribute getSavitzkyGolayDesign_Points();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SavitzkyGolayDesign#getDegree <em>Degree</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Degree</em>'.
	 * @see tapwright.model.SavitzkyGolayDesign#getDegree()
	 * @see #getSavitzkyGolayDesign()
	 * @generated
	 */
	EAttribute getSavitzkyGolayDesign_Degree();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SavitzkyGolayDesign#getDerivative <em>Derivative</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Derivative</em>'.
	 * @see tapwright.model.SavitzkyGolayDesign#getDerivative()
	 * @see #getSavitzkyGolayDesign()
	 * @generated
	 */
	EAttribute getSavitzkyGolayDesign_Derivative();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SavitzkyGolayDesign#getPosition <em>Position</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Position</em>'.
	 * @see tapwright.model.SavitzkyGolayDesign#getPosition()
	 * @see #getSavitzkyGolayDesign()
	 * @generated
	 */
	EAttribute getSavitzkyGolayDesign_Position();

	/**
	 * Returns the meta object for class '{@link tapwright.model.LagrangeDelayDesign <em>Lagrange Delay Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Lagrange Delay Design</em>'.
	 * @see tapwright.model.LagrangeDelayDesign
	 * @generated
	 */
	EClass getLagrangeDelayDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LagrangeDelayDesign#getOrder <em>Order</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Order</em>'.
	 * @see tapwright.model.LagrangeDelayDesign#getOrder()
	 * @see #getLagrangeDelayDesign()
	 * @generated
	 */
	EAttribute getLagrangeDelayDesign_Order();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LagrangeDelayDesign#getDelay <em>Delay</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Delay</em>'.
	 * @see tapwright.model.LagrangeDelayDesign#getDelay()
	 * @see #getLagrangeDelayDesign()
	 * @generated
	 */
	EAttribute getLagrangeDelayDesign_Delay();

	/**
	 * Returns the meta object for class '{@link tapwright.model.RaisedCosineDesign <em>Raised Cosine Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Raised Cosine Design</em>'.
	 * @see tapwright.model.RaisedCosineDesign
	 * @generated
	 */
	EClass getRaisedCosineDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.RaisedCosineDesign#getRollOff <em>Roll Off</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Roll Off</em>'.
	 * @see tapwright.model.RaisedCosineDesign#getRollOff()
	 * @see #getRaisedCosineDesign()
	 * @generated
	 */
	EAttribute getRaisedCosineDesign_RollOff();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.RaisedCosineDesign#getSamplesPerSymbol <em>Samples Per Symbol</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Samples Per Symbol</em>'.
	 * @see tapwright.model.RaisedCosineDesign#getSamplesPerSymbol()
	 * @see #getRaisedCosineDesign()
	 * @generated
	 */
	EAttribute getRaisedCosineDesign_SamplesPerSymbol();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.RaisedCosineDesign#getSymbols <em>Symbols</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Symbols</em>'.
	 * @see tapwright.model.RaisedCosineDesign#getSymbols()
	 * @see #getRaisedCosineDesign()
	 * @generated
	 */
	EAttribute getRaisedCosineDesign_Symbols();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.RaisedCosineDesign#isRoot <em>Root</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Root</em>'.
	 * @see tapwright.model.RaisedCosineDesign#isRoot()
	 * @see #getRaisedCosineDesign()
	 * @generated
	 */
	EAttribute getRaisedCosineDesign_Root();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.RaisedCosineDesign#getGain <em>Gain</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Gain</em>'.
	 * @see tapwright.model.RaisedCosineDesign#getGain()
	 * @see #getRaisedCosineDesign()
	 * @generated
	 */
	EAttribute getRaisedCosineDesign_Gain();

	/**
	 * Returns the meta object for class '{@link tapwright.model.LeastSquaresDesign <em>Least Squares Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Least Squares Design</em>'.
	 * @see tapwright.model.LeastSquaresDesign
	 * @generated
	 */
	EClass getLeastSquaresDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LeastSquaresDesign#getType <em>Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Type</em>'.
	 * @see tapwright.model.LeastSquaresDesign#getType()
	 * @see #getLeastSquaresDesign()
	 * @generated
	 */
	EAttribute getLeastSquaresDesign_Type();

	/**
	 * Returns the meta object for class '{@link tapwright.model.ConstrainedLeastSquaresDesign <em>Constrained Least Squares Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Constrained Least Squares Design</em>'.
	 * @see tapwright.model.ConstrainedLeastSquaresDesign
	 * @generated
	 */
	EClass getConstrainedLeastSquaresDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.ConstrainedLeastSquaresDesign#getType <em>Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Type</em>'.
	 * @see tapwright.model.ConstrainedLeastSquaresDesign#getType()
	 * @see #getConstrainedLeastSquaresDesign()
	 * @generated
	 */
	EAttribute getConstrainedLeastSquaresDesign_Type();

	/**
	 * Returns the meta object for class '{@link tapwright.model.LinearProgramDesign <em>Linear Program Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Linear Program Design</em>'.
	 * @see tapwright.model.LinearProgramDesign
	 * @generated
	 */
	EClass getLinearProgramDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.LinearProgramDesign#isMonotone <em>Monotone</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Monotone</em>'.
	 * @see tapwright.model.LinearProgramDesign#isMonotone()
	 * @see #getLinearProgramDesign()
	 * @generated
	 */
	EAttribute getLinearProgramDesign_Monotone();

	/**
	 * Returns the meta object for class '{@link tapwright.model.HalfBandDesign <em>Half Band Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Half Band Design</em>'.
	 * @see tapwright.model.HalfBandDesign
	 * @generated
	 */
	EClass getHalfBandDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.HalfBandDesign#getTaps <em>Taps</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Taps</em>'.
	 * @see tapwright.model.HalfBandDesign#getTaps()
	 * @see #getHalfBandDesign()
	 * @generated
	 */
	EAttribute getHalfBandDesign_Taps();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.HalfBandDesign#getPassEdge <em>Pass Edge</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Pass Edge</em>'.
	 * @see tapwright.model.HalfBandDesign#getPassEdge()
	 * @see #getHalfBandDesign()
	 * @generated
	 */
	EAttribute getHalfBandDesign_PassEdge();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.HalfBandDesign#isHilbert <em>Hilbert</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Hilbert</em>'.
	 * @see tapwright.model.HalfBandDesign#isHilbert()
	 * @see #getHalfBandDesign()
	 * @generated
	 */
	EAttribute getHalfBandDesign_Hilbert();

	/**
	 * Returns the meta object for class '{@link tapwright.model.CicCompensatorDesign <em>Cic Compensator Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Cic Compensator Design</em>'.
	 * @see tapwright.model.CicCompensatorDesign
	 * @generated
	 */
	EClass getCicCompensatorDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getTaps <em>Taps</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Taps</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getTaps()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_Taps();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getSections <em>Sections</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Sections</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getSections()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_Sections();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getRate <em>Rate</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rate</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getRate()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_Rate();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getPassEdge <em>Pass Edge</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Pass Edge</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getPassEdge()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_PassEdge();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getStopEdge <em>Stop Edge</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Stop Edge</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getStopEdge()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_StopEdge();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CicCompensatorDesign#getStopWeight <em>Stop Weight</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Stop Weight</em>'.
	 * @see tapwright.model.CicCompensatorDesign#getStopWeight()
	 * @see #getCicCompensatorDesign()
	 * @generated
	 */
	EAttribute getCicCompensatorDesign_StopWeight();

	/**
	 * Returns the meta object for class '{@link tapwright.model.CombDesign <em>Comb Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Comb Design</em>'.
	 * @see tapwright.model.CombDesign
	 * @generated
	 */
	EClass getCombDesign();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CombDesign#getPeriod <em>Period</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Period</em>'.
	 * @see tapwright.model.CombDesign#getPeriod()
	 * @see #getCombDesign()
	 * @generated
	 */
	EAttribute getCombDesign_Period();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.CombDesign#isDifference <em>Difference</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Difference</em>'.
	 * @see tapwright.model.CombDesign#isDifference()
	 * @see #getCombDesign()
	 * @generated
	 */
	EAttribute getCombDesign_Difference();

	/**
	 * Returns the meta object for class '{@link tapwright.model.MinimumPhaseDesign <em>Minimum Phase Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Minimum Phase Design</em>'.
	 * @see tapwright.model.MinimumPhaseDesign
	 * @generated
	 */
	EClass getMinimumPhaseDesign();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.MinimumPhaseDesign#getPrototype <em>Prototype</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Prototype</em>'.
	 * @see tapwright.model.MinimumPhaseDesign#getPrototype()
	 * @see #getMinimumPhaseDesign()
	 * @generated
	 */
	EReference getMinimumPhaseDesign_Prototype();

	/**
	 * Returns the meta object for class '{@link tapwright.model.ComplementDesign <em>Complement Design</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Complement Design</em>'.
	 * @see tapwright.model.ComplementDesign
	 * @generated
	 */
	EClass getComplementDesign();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.ComplementDesign#getPrototype <em>Prototype</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Prototype</em>'.
	 * @see tapwright.model.ComplementDesign#getPrototype()
	 * @see #getComplementDesign()
	 * @generated
	 */
	EReference getComplementDesign_Prototype();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Coefficients <em>Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Coefficients</em>'.
	 * @see tapwright.model.Coefficients
	 * @generated
	 */
	EClass getCoefficients();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Coefficients#getDesignHash <em>Design Hash</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Design Hash</em>'.
	 * @see tapwright.model.Coefficients#getDesignHash()
	 * @see #getCoefficients()
	 * @generated
	 */
	EAttribute getCoefficients_DesignHash();

	/**
	 * Returns the meta object for class '{@link tapwright.model.RealCoefficients <em>Real Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Real Coefficients</em>'.
	 * @see tapwright.model.RealCoefficients
	 * @generated
	 */
	EClass getRealCoefficients();

	/**
	 * Returns the meta object for the attribute list '{@link tapwright.model.RealCoefficients#getValues <em>Values</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>Values</em>'.
	 * @see tapwright.model.RealCoefficients#getValues()
	 * @see #getRealCoefficients()
	 * @generated
	 */
	EAttribute getRealCoefficients_Values();

	/**
	 * Returns the meta object for class '{@link tapwright.model.IntegerCoefficients <em>Integer Coefficients</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Integer Coefficients</em>'.
	 * @see tapwright.model.IntegerCoefficients
	 * @generated
	 */
	EClass getIntegerCoefficients();

	/**
	 * Returns the meta object for the attribute list '{@link tapwright.model.IntegerCoefficients#getIntegers <em>Integers</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>Integers</em>'.
	 * @see tapwright.model.IntegerCoefficients#getIntegers()
	 * @see #getIntegerCoefficients()
	 * @generated
	 */
	EAttribute getIntegerCoefficients_Integers();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.IntegerCoefficients#getScale <em>Scale</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Scale</em>'.
	 * @see tapwright.model.IntegerCoefficients#getScale()
	 * @see #getIntegerCoefficients()
	 * @generated
	 */
	EAttribute getIntegerCoefficients_Scale();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Arithmetic <em>Arithmetic</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Arithmetic</em>'.
	 * @see tapwright.model.Arithmetic
	 * @generated
	 */
	EClass getArithmetic();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Arithmetic#getStructure <em>Structure</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Structure</em>'.
	 * @see tapwright.model.Arithmetic#getStructure()
	 * @see #getArithmetic()
	 * @generated
	 */
	EAttribute getArithmetic_Structure();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Arithmetic#getFactor <em>Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Factor</em>'.
	 * @see tapwright.model.Arithmetic#getFactor()
	 * @see #getArithmetic()
	 * @generated
	 */
	EAttribute getArithmetic_Factor();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Arithmetic#getCoefficient <em>Coefficient</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Coefficient</em>'.
	 * @see tapwright.model.Arithmetic#getCoefficient()
	 * @see #getArithmetic()
	 * @generated
	 */
	EReference getArithmetic_Coefficient();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Arithmetic#getInput <em>Input</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Input</em>'.
	 * @see tapwright.model.Arithmetic#getInput()
	 * @see #getArithmetic()
	 * @generated
	 */
	EReference getArithmetic_Input();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Arithmetic#getProduct <em>Product</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Product</em>'.
	 * @see tapwright.model.Arithmetic#getProduct()
	 * @see #getArithmetic()
	 * @generated
	 */
	EReference getArithmetic_Product();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Arithmetic#getAccumulator <em>Accumulator</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Accumulator</em>'.
	 * @see tapwright.model.Arithmetic#getAccumulator()
	 * @see #getArithmetic()
	 * @generated
	 */
	EReference getArithmetic_Accumulator();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Arithmetic#getOutput <em>Output</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Output</em>'.
	 * @see tapwright.model.Arithmetic#getOutput()
	 * @see #getArithmetic()
	 * @generated
	 */
	EReference getArithmetic_Output();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Arithmetic#getRounding <em>Rounding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rounding</em>'.
	 * @see tapwright.model.Arithmetic#getRounding()
	 * @see #getArithmetic()
	 * @generated
	 */
	EAttribute getArithmetic_Rounding();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Arithmetic#getOverflow <em>Overflow</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Overflow</em>'.
	 * @see tapwright.model.Arithmetic#getOverflow()
	 * @see #getArithmetic()
	 * @generated
	 */
	EAttribute getArithmetic_Overflow();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Format <em>Format</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Format</em>'.
	 * @see tapwright.model.Format
	 * @generated
	 */
	EClass getFormat();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Format#getWord <em>Word</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Word</em>'.
	 * @see tapwright.model.Format#getWord()
	 * @see #getFormat()
	 * @generated
	 */
	EAttribute getFormat_Word();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Format#getFraction <em>Fraction</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Fraction</em>'.
	 * @see tapwright.model.Format#getFraction()
	 * @see #getFormat()
	 * @generated
	 */
	EAttribute getFormat_Fraction();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Format#isSigned <em>Signed</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Signed</em>'.
	 * @see tapwright.model.Format#isSigned()
	 * @see #getFormat()
	 * @generated
	 */
	EAttribute getFormat_Signed();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Evidence <em>Evidence</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Evidence</em>'.
	 * @see tapwright.model.Evidence
	 * @generated
	 */
	EClass getEvidence();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Evidence#getTool <em>Tool</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Tool</em>'.
	 * @see tapwright.model.Evidence#getTool()
	 * @see #getEvidence()
	 * @generated
	 */
	EAttribute getEvidence_Tool();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Evidence#getVerdict <em>Verdict</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Verdict</em>'.
	 * @see tapwright.model.Evidence#getVerdict()
	 * @see #getEvidence()
	 * @generated
	 */
	EAttribute getEvidence_Verdict();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Evidence#getResults <em>Results</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Results</em>'.
	 * @see tapwright.model.Evidence#getResults()
	 * @see #getEvidence()
	 * @generated
	 */
	EReference getEvidence_Results();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Result <em>Result</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Result</em>'.
	 * @see tapwright.model.Result
	 * @generated
	 */
	EClass getResult();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getRequirement <em>Requirement</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Requirement</em>'.
	 * @see tapwright.model.Result#getRequirement()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_Requirement();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getKind <em>Kind</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Kind</em>'.
	 * @see tapwright.model.Result#getKind()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_Kind();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getVerdict <em>Verdict</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Verdict</em>'.
	 * @see tapwright.model.Result#getVerdict()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_Verdict();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getWorst <em>Worst</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Worst</em>'.
	 * @see tapwright.model.Result#getWorst()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_Worst();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getValueLow <em>Value Low</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Value Low</em>'.
	 * @see tapwright.model.Result#getValueLow()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_ValueLow();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getValueHigh <em>Value High</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Value High</em>'.
	 * @see tapwright.model.Result#getValueHigh()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_ValueHigh();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getLimit <em>Limit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Limit</em>'.
	 * @see tapwright.model.Result#getLimit()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_Limit();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getMarginLow <em>Margin Low</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Margin Low</em>'.
	 * @see tapwright.model.Result#getMarginLow()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_MarginLow();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Result#getMarginHigh <em>Margin High</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Margin High</em>'.
	 * @see tapwright.model.Result#getMarginHigh()
	 * @see #getResult()
	 * @generated
	 */
	EAttribute getResult_MarginHigh();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Revision <em>Revision</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Revision</em>'.
	 * @see tapwright.model.Revision
	 * @generated
	 */
	EClass getRevision();

	/**
	 * Returns the meta object for the attribute list '{@link tapwright.model.Revision#getParents <em>Parents</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>Parents</em>'.
	 * @see tapwright.model.Revision#getParents()
	 * @see #getRevision()
	 * @generated
	 */
	EAttribute getRevision_Parents();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Revision#getAuthor <em>Author</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Author</em>'.
	 * @see tapwright.model.Revision#getAuthor()
	 * @see #getRevision()
	 * @generated
	 */
	EAttribute getRevision_Author();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Revision#getEmail <em>Email</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Email</em>'.
	 * @see tapwright.model.Revision#getEmail()
	 * @see #getRevision()
	 * @generated
	 */
	EAttribute getRevision_Email();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Revision#getTime <em>Time</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Time</em>'.
	 * @see tapwright.model.Revision#getTime()
	 * @see #getRevision()
	 * @generated
	 */
	EAttribute getRevision_Time();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Revision#getMessage <em>Message</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Message</em>'.
	 * @see tapwright.model.Revision#getMessage()
	 * @see #getRevision()
	 * @generated
	 */
	EAttribute getRevision_Message();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Revision#getParameters <em>Parameters</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Parameters</em>'.
	 * @see tapwright.model.Revision#getParameters()
	 * @see #getRevision()
	 * @generated
	 */
	EReference getRevision_Parameters();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Revision#getFilter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Filter</em>'.
	 * @see tapwright.model.Revision#getFilter()
	 * @see #getRevision()
	 * @generated
	 */
	EReference getRevision_Filter();

	/**
	 * Returns the meta object for the containment reference '{@link tapwright.model.Revision#getEvidence <em>Evidence</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Evidence</em>'.
	 * @see tapwright.model.Revision#getEvidence()
	 * @see #getRevision()
	 * @generated
	 */
	EReference getRevision_Evidence();

	/**
	 * Returns the meta object for class '{@link tapwright.model.Baseline <em>Baseline</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Baseline</em>'.
	 * @see tapwright.model.Baseline
	 * @generated
	 */
	EClass getBaseline();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Baseline#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see tapwright.model.Baseline#getName()
	 * @see #getBaseline()
	 * @generated
	 */
	EAttribute getBaseline_Name();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Baseline#getAuthor <em>Author</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Author</em>'.
	 * @see tapwright.model.Baseline#getAuthor()
	 * @see #getBaseline()
	 * @generated
	 */
	EAttribute getBaseline_Author();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Baseline#getEmail <em>Email</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Email</em>'.
	 * @see tapwright.model.Baseline#getEmail()
	 * @see #getBaseline()
	 * @generated
	 */
	EAttribute getBaseline_Email();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Baseline#getTime <em>Time</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Time</em>'.
	 * @see tapwright.model.Baseline#getTime()
	 * @see #getBaseline()
	 * @generated
	 */
	EAttribute getBaseline_Time();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.Baseline#getMessage <em>Message</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Message</em>'.
	 * @see tapwright.model.Baseline#getMessage()
	 * @see #getBaseline()
	 * @generated
	 */
	EAttribute getBaseline_Message();

	/**
	 * Returns the meta object for the containment reference list '{@link tapwright.model.Baseline#getEntries <em>Entries</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Entries</em>'.
	 * @see tapwright.model.Baseline#getEntries()
	 * @see #getBaseline()
	 * @generated
	 */
	EReference getBaseline_Entries();

	/**
	 * Returns the meta object for class '{@link tapwright.model.BaselineEntry <em>Baseline Entry</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Baseline Entry</em>'.
	 * @see tapwright.model.BaselineEntry
	 * @generated
	 */
	EClass getBaselineEntry();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BaselineEntry#getFilter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Filter</em>'.
	 * @see tapwright.model.BaselineEntry#getFilter()
	 * @see #getBaselineEntry()
	 * @generated
	 */
	EAttribute getBaselineEntry_Filter();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BaselineEntry#getIdentity <em>Identity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Identity</em>'.
	 * @see tapwright.model.BaselineEntry#getIdentity()
	 * @see #getBaselineEntry()
	 * @generated
	 */
	EAttribute getBaselineEntry_Identity();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.BaselineEntry#getRevision <em>Revision</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Revision</em>'.
	 * @see tapwright.model.BaselineEntry#getRevision()
	 * @see #getBaselineEntry()
	 * @generated
	 */
	EAttribute getBaselineEntry_Revision();

	/**
	 * Returns the meta object for class '{@link tapwright.model.SignOff <em>Sign Off</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Sign Off</em>'.
	 * @see tapwright.model.SignOff
	 * @generated
	 */
	EClass getSignOff();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getFilter <em>Filter</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Filter</em>'.
	 * @see tapwright.model.SignOff#getFilter()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Filter();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getRevision <em>Revision</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Revision</em>'.
	 * @see tapwright.model.SignOff#getRevision()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Revision();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getReviewer <em>Reviewer</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reviewer</em>'.
	 * @see tapwright.model.SignOff#getReviewer()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Reviewer();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getEmail <em>Email</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Email</em>'.
	 * @see tapwright.model.SignOff#getEmail()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Email();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getTime <em>Time</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Time</em>'.
	 * @see tapwright.model.SignOff#getTime()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Time();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getDecision <em>Decision</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Decision</em>'.
	 * @see tapwright.model.SignOff#getDecision()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Decision();

	/**
	 * Returns the meta object for the attribute '{@link tapwright.model.SignOff#getComment <em>Comment</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Comment</em>'.
	 * @see tapwright.model.SignOff#getComment()
	 * @see #getSignOff()
	 * @generated
	 */
	EAttribute getSignOff_Comment();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Severity <em>Severity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Severity</em>'.
	 * @see tapwright.model.Severity
	 * @generated
	 */
	EEnum getSeverity();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Unit <em>Unit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Unit</em>'.
	 * @see tapwright.model.Unit
	 * @generated
	 */
	EEnum getUnit();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Side <em>Side</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Side</em>'.
	 * @see tapwright.model.Side
	 * @generated
	 */
	EEnum getSide();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Interpolation <em>Interpolation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Interpolation</em>'.
	 * @see tapwright.model.Interpolation
	 * @generated
	 */
	EEnum getInterpolation();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.PhaseType <em>Phase Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Phase Type</em>'.
	 * @see tapwright.model.PhaseType
	 * @generated
	 */
	EEnum getPhaseType();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.InputClass <em>Input Class</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Input Class</em>'.
	 * @see tapwright.model.InputClass
	 * @generated
	 */
	EEnum getInputClass();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Structure <em>Structure</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Structure</em>'.
	 * @see tapwright.model.Structure
	 * @generated
	 */
	EEnum getStructure();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Rounding <em>Rounding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Rounding</em>'.
	 * @see tapwright.model.Rounding
	 * @generated
	 */
	EEnum getRounding();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Overflow <em>Overflow</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Overflow</em>'.
	 * @see tapwright.model.Overflow
	 * @generated
	 */
	EEnum getOverflow();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Verdict <em>Verdict</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Verdict</em>'.
	 * @see tapwright.model.Verdict
	 * @generated
	 */
	EEnum getVerdict();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.Decision <em>Decision</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Decision</em>'.
	 * @see tapwright.model.Decision
	 * @generated
	 */
	EEnum getDecision();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.WindowKind <em>Window Kind</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Window Kind</em>'.
	 * @see tapwright.model.WindowKind
	 * @generated
	 */
	EEnum getWindowKind();

	/**
	 * Returns the meta object for enum '{@link tapwright.model.PulseGain <em>Pulse Gain</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Pulse Gain</em>'.
	 * @see tapwright.model.PulseGain
	 * @generated
	 */
	EEnum getPulseGain();

	/**
	 * Returns the meta object for data type '{@link java.lang.String <em>Quantity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
     * <!-- begin-model-doc -->
     * A decimal number, or plain arithmetic (+ - * / min max and parentheses) over the portfolio's parameters, such as '0.45 * adcRate'. A number without a unit is in the unit that the feature's documentation gives; a unit may be written behind it ('8 kHz').
     * <!-- end-model-doc -->
	 * @return the meta object for data type '<em>Quantity</em>'.
	 * @see java.lang.String
	 * @model instanceClass="java.lang.String"
	 * @generated
	 */
	EDataType getQuantity();

	/**
	 * Returns the factory that creates the instances of the model.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the factory that creates the instances of the model.
	 * @generated
	 */
	ModelFactory getModelFactory();

	/**
	 * <!-- begin-user-doc -->
	 * Defines literals for the meta objects that represent
	 * <ul>
	 *   <li>each class,</li>
	 *   <li>each feature of each class,</li>
	 *   <li>each enum,</li>
	 *   <li>and each data type</li>
	 * </ul>
	 * <!-- end-user-doc -->
	 * @generated
	 */
	interface Literals {
		/**
		 * The meta object literal for the '{@link tapwright.model.impl.PortfolioImpl <em>Portfolio</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.PortfolioImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getPortfolio()
		 * @generated
		 */
		EClass PORTFOLIO = eINSTANCE.getPortfolio();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PORTFOLIO__NAME = eINSTANCE.getPortfolio_Name();

		/**
		 * The meta object literal for the '<em><b>Description</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PORTFOLIO__DESCRIPTION = eINSTANCE.getPortfolio_Description();

		/**
		 * The meta object literal for the '<em><b>Erosion</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PORTFOLIO__EROSION = eINSTANCE.getPortfolio_Erosion();

		/**
		 * The meta object literal for the '<em><b>Active Baseline</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PORTFOLIO__ACTIVE_BASELINE = eINSTANCE.getPortfolio_ActiveBaseline();

		/**
		 * The meta object literal for the '<em><b>Parameters</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference PORTFOLIO__PARAMETERS = eINSTANCE.getPortfolio_Parameters();

		/**
		 * The meta object literal for the '<em><b>Processors</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference PORTFOLIO__PROCESSORS = eINSTANCE.getPortfolio_Processors();

		/**
		 * The meta object literal for the '<em><b>Paths</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference PORTFOLIO__PATHS = eINSTANCE.getPortfolio_Paths();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ParameterImpl <em>Parameter</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ParameterImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getParameter()
		 * @generated
		 */
		EClass PARAMETER = eINSTANCE.getParameter();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PARAMETER__NAME = eINSTANCE.getParameter_Name();

		/**
		 * The meta object literal for the '<em><b>Value</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PARAMETER__VALUE = eINSTANCE.getParameter_Value();

		/**
		 * The meta object literal for the '<em><b>Unit</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PARAMETER__UNIT = eINSTANCE.getParameter_Unit();

		/**
		 * The meta object literal for the '<em><b>Description</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PARAMETER__DESCRIPTION = eINSTANCE.getParameter_Description();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ProcessorImpl <em>Processor</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ProcessorImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getProcessor()
		 * @generated
		 */
		EClass PROCESSOR = eINSTANCE.getProcessor();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__NAME = eINSTANCE.getProcessor_Name();

		/**
		 * The meta object literal for the '<em><b>Description</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__DESCRIPTION = eINSTANCE.getProcessor_Description();

		/**
		 * The meta object literal for the '<em><b>Mac Rate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__MAC_RATE = eINSTANCE.getProcessor_MacRate();

		/**
		 * The meta object literal for the '<em><b>Word</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__WORD = eINSTANCE.getProcessor_Word();

		/**
		 * The meta object literal for the '<em><b>Accumulator</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__ACCUMULATOR = eINSTANCE.getProcessor_Accumulator();

		/**
		 * The meta object literal for the '<em><b>Coefficient Memory</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__COEFFICIENT_MEMORY = eINSTANCE.getProcessor_CoefficientMemory();

		/**
		 * The meta object literal for the '<em><b>Delay Memory</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROCESSOR__DELAY_MEMORY = eINSTANCE.getProcessor_DelayMemory();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.SignalPathImpl <em>Signal Path</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.SignalPathImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getSignalPath()
		 * @generated
		 */
		EClass SIGNAL_PATH = eINSTANCE.getSignalPath();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGNAL_PATH__NAME = eINSTANCE.getSignalPath_Name();

		/**
		 * The meta object literal for the '<em><b>Description</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGNAL_PATH__DESCRIPTION = eINSTANCE.getSignalPath_Description();

		/**
		 * The meta object literal for the '<em><b>Sample Rate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGNAL_PATH__SAMPLE_RATE = eINSTANCE.getSignalPath_SampleRate();

		/**
		 * The meta object literal for the '<em><b>Stages</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SIGNAL_PATH__STAGES = eINSTANCE.getSignalPath_Stages();

		/**
		 * The meta object literal for the '<em><b>Requirements</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SIGNAL_PATH__REQUIREMENTS = eINSTANCE.getSignalPath_Requirements();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.StageImpl <em>Stage</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.StageImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getStage()
		 * @generated
		 */
		EClass STAGE = eINSTANCE.getStage();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.FilterStageImpl <em>Filter Stage</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.FilterStageImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getFilterStage()
		 * @generated
		 */
		EClass FILTER_STAGE = eINSTANCE.getFilterStage();

		/**
		 * The meta object literal for the '<em><b>Filter</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FILTER_STAGE__FILTER = eINSTANCE.getFilterStage_Filter();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.DecimationImpl <em>Decimation</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.DecimationImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getDecimation()
		 * @generated
		 */
		EClass DECIMATION = eINSTANCE.getDecimation();

		/**
		 * The meta object literal for the '<em><b>Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DECIMATION__FACTOR = eINSTANCE.getDecimation_Factor();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ExpansionImpl <em>Expansion</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ExpansionImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getExpansion()
		 * @generated
		 */
		EClass EXPANSION = eINSTANCE.getExpansion();

		/**
		 * The meta object literal for the '<em><b>Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EXPANSION__FACTOR = eINSTANCE.getExpansion_Factor();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.FilterImpl <em>Filter</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.FilterImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getFilter()
		 * @generated
		 */
		EClass FILTER = eINSTANCE.getFilter();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FILTER__NAME = eINSTANCE.getFilter_Name();

		/**
		 * The meta object literal for the '<em><b>Identity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FILTER__IDENTITY = eINSTANCE.getFilter_Identity();

		/**
		 * The meta object literal for the '<em><b>Purpose</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FILTER__PURPOSE = eINSTANCE.getFilter_Purpose();

		/**
		 * The meta object literal for the '<em><b>Sample Rate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FILTER__SAMPLE_RATE = eINSTANCE.getFilter_SampleRate();

		/**
		 * The meta object literal for the '<em><b>Requirements</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference FILTER__REQUIREMENTS = eINSTANCE.getFilter_Requirements();

		/**
		 * The meta object literal for the '<em><b>Design</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference FILTER__DESIGN = eINSTANCE.getFilter_Design();

		/**
		 * The meta object literal for the '<em><b>Coefficients</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference FILTER__COEFFICIENTS = eINSTANCE.getFilter_Coefficients();

		/**
		 * The meta object literal for the '<em><b>Arithmetic</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference FILTER__ARITHMETIC = eINSTANCE.getFilter_Arithmetic();

		/**
		 * The meta object literal for the '<em><b>Deployments</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference FILTER__DEPLOYMENTS = eINSTANCE.getFilter_Deployments();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.DeploymentImpl <em>Deployment</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.DeploymentImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getDeployment()
		 * @generated
		 */
		EClass DEPLOYMENT = eINSTANCE.getDeployment();

		/**
		 * The meta object literal for the '<em><b>Processor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DEPLOYMENT__PROCESSOR = eINSTANCE.getDeployment_Processor();

		/**
		 * The meta object literal for the '<em><b>Channels</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DEPLOYMENT__CHANNELS = eINSTANCE.getDeployment_Channels();

		/**
		 * The meta object literal for the '<em><b>Copies</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DEPLOYMENT__COPIES = eINSTANCE.getDeployment_Copies();

		/**
		 * The meta object literal for the '<em><b>Input Rate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DEPLOYMENT__INPUT_RATE = eINSTANCE.getDeployment_InputRate();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.RequirementImpl <em>Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.RequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getRequirement()
		 * @generated
		 */
		EClass REQUIREMENT = eINSTANCE.getRequirement();

		/**
		 * The meta object literal for the '<em><b>Id</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REQUIREMENT__ID = eINSTANCE.getRequirement_Id();

		/**
		 * The meta object literal for the '<em><b>Severity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REQUIREMENT__SEVERITY = eINSTANCE.getRequirement_Severity();

		/**
		 * The meta object literal for the '<em><b>Note</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REQUIREMENT__NOTE = eINSTANCE.getRequirement_Note();

		/**
		 * The meta object literal for the '<em><b>Clock Tolerance</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REQUIREMENT__CLOCK_TOLERANCE = eINSTANCE.getRequirement_ClockTolerance();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.LimitPointImpl <em>Limit Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.LimitPointImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getLimitPoint()
		 * @generated
		 */
		EClass LIMIT_POINT = eINSTANCE.getLimitPoint();

		/**
		 * The meta object literal for the '<em><b>Frequency</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LIMIT_POINT__FREQUENCY = eINSTANCE.getLimitPoint_Frequency();

		/**
		 * The meta object literal for the '<em><b>Level</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LIMIT_POINT__LEVEL = eINSTANCE.getLimitPoint_Level();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.GainRequirementImpl <em>Gain Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.GainRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getGainRequirement()
		 * @generated
		 */
		EClass GAIN_REQUIREMENT = eINSTANCE.getGainRequirement();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__FROM = eINSTANCE.getGainRequirement_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__TO = eINSTANCE.getGainRequirement_To();

		/**
		 * The meta object literal for the '<em><b>Min</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__MIN = eINSTANCE.getGainRequirement_Min();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__MAX = eINSTANCE.getGainRequirement_Max();

		/**
		 * The meta object literal for the '<em><b>Points</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference GAIN_REQUIREMENT__POINTS = eINSTANCE.getGainRequirement_Points();

		/**
		 * The meta object literal for the '<em><b>Side</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__SIDE = eINSTANCE.getGainRequirement_Side();

		/**
		 * The meta object literal for the '<em><b>Interpolate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__INTERPOLATE = eINSTANCE.getGainRequirement_Interpolate();

		/**
		 * The meta object literal for the '<em><b>Reference At</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__REFERENCE_AT = eINSTANCE.getGainRequirement_ReferenceAt();

		/**
		 * The meta object literal for the '<em><b>Reference From</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__REFERENCE_FROM = eINSTANCE.getGainRequirement_ReferenceFrom();

		/**
		 * The meta object literal for the '<em><b>Reference To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GAIN_REQUIREMENT__REFERENCE_TO = eINSTANCE.getGainRequirement_ReferenceTo();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.LinearPhaseRequirementImpl <em>Linear Phase Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.LinearPhaseRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getLinearPhaseRequirement()
		 * @generated
		 */
		EClass LINEAR_PHASE_REQUIREMENT = eINSTANCE.getLinearPhaseRequirement();

		/**
		 * The meta object literal for the '<em><b>Type</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LINEAR_PHASE_REQUIREMENT__TYPE = eINSTANCE.getLinearPhaseRequirement_Type();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.GroupDelayRequirementImpl <em>Group Delay Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.GroupDelayRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getGroupDelayRequirement()
		 * @generated
		 */
		EClass GROUP_DELAY_REQUIREMENT = eINSTANCE.getGroupDelayRequirement();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_REQUIREMENT__FROM = eINSTANCE.getGroupDelayRequirement_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_REQUIREMENT__TO = eINSTANCE.getGroupDelayRequirement_To();

		/**
		 * The meta object literal for the '<em><b>Min</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_REQUIREMENT__MIN = eINSTANCE.getGroupDelayRequirement_Min();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_REQUIREMENT__MAX = eINSTANCE.getGroupDelayRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.GroupDelayVariationRequirementImpl <em>Group Delay Variation Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.GroupDelayVariationRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getGroupDelayVariationRequirement()
		 * @generated
		 */
		EClass GROUP_DELAY_VARIATION_REQUIREMENT = eINSTANCE.getGroupDelayVariationRequirement();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_VARIATION_REQUIREMENT__FROM = eINSTANCE.getGroupDelayVariationRequirement_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_VARIATION_REQUIREMENT__TO = eINSTANCE.getGroupDelayVariationRequirement_To();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP_DELAY_VARIATION_REQUIREMENT__MAX = eINSTANCE.getGroupDelayVariationRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.BulkDelayRequirementImpl <em>Bulk Delay Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.BulkDelayRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getBulkDelayRequirement()
		 * @generated
		 */
		EClass BULK_DELAY_REQUIREMENT = eINSTANCE.getBulkDelayRequirement();

		/**
		 * The meta object literal for the '<em><b>Min</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BULK_DELAY_REQUIREMENT__MIN = eINSTANCE.getBulkDelayRequirement_Min();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BULK_DELAY_REQUIREMENT__MAX = eINSTANCE.getBulkDelayRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.StepOvershootRequirementImpl <em>Step Overshoot Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.StepOvershootRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getStepOvershootRequirement()
		 * @generated
		 */
		EClass STEP_OVERSHOOT_REQUIREMENT = eINSTANCE.getStepOvershootRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEP_OVERSHOOT_REQUIREMENT__MAX = eINSTANCE.getStepOvershootRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.StepUndershootRequirementImpl <em>Step Undershoot Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.StepUndershootRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getStepUndershootRequirement()
		 * @generated
		 */
		EClass STEP_UNDERSHOOT_REQUIREMENT = eINSTANCE.getStepUndershootRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEP_UNDERSHOOT_REQUIREMENT__MAX = eINSTANCE.getStepUndershootRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.StepSettlingRequirementImpl <em>Step Settling Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.StepSettlingRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getStepSettlingRequirement()
		 * @generated
		 */
		EClass STEP_SETTLING_REQUIREMENT = eINSTANCE.getStepSettlingRequirement();

		/**
		 * The meta object literal for the '<em><b>Within</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEP_SETTLING_REQUIREMENT__WITHIN = eINSTANCE.getStepSettlingRequirement_Within();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STEP_SETTLING_REQUIREMENT__MAX = eINSTANCE.getStepSettlingRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ImpulseTailRequirementImpl <em>Impulse Tail Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ImpulseTailRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getImpulseTailRequirement()
		 * @generated
		 */
		EClass IMPULSE_TAIL_REQUIREMENT = eINSTANCE.getImpulseTailRequirement();

		/**
		 * The meta object literal for the '<em><b>After</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute IMPULSE_TAIL_REQUIREMENT__AFTER = eINSTANCE.getImpulseTailRequirement_After();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute IMPULSE_TAIL_REQUIREMENT__MAX = eINSTANCE.getImpulseTailRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.NullRequirementImpl <em>Null Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.NullRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getNullRequirement()
		 * @generated
		 */
		EClass NULL_REQUIREMENT = eINSTANCE.getNullRequirement();

		/**
		 * The meta object literal for the '<em><b>At</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NULL_REQUIREMENT__AT = eINSTANCE.getNullRequirement_At();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ExactGainRequirementImpl <em>Exact Gain Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ExactGainRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getExactGainRequirement()
		 * @generated
		 */
		EClass EXACT_GAIN_REQUIREMENT = eINSTANCE.getExactGainRequirement();

		/**
		 * The meta object literal for the '<em><b>At</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EXACT_GAIN_REQUIREMENT__AT = eINSTANCE.getExactGainRequirement_At();

		/**
		 * The meta object literal for the '<em><b>Value</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EXACT_GAIN_REQUIREMENT__VALUE = eINSTANCE.getExactGainRequirement_Value();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.NonNegativeAmplitudeRequirementImpl <em>Non Negative Amplitude Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.NonNegativeAmplitudeRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getNonNegativeAmplitudeRequirement()
		 * @generated
		 */
		EClass NON_NEGATIVE_AMPLITUDE_REQUIREMENT = eINSTANCE.getNonNegativeAmplitudeRequirement();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.NoOverflowRequirementImpl <em>No Overflow Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.NoOverflowRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getNoOverflowRequirement()
		 * @generated
		 */
		EClass NO_OVERFLOW_REQUIREMENT = eINSTANCE.getNoOverflowRequirement();

		/**
		 * The meta object literal for the '<em><b>Input</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NO_OVERFLOW_REQUIREMENT__INPUT = eINSTANCE.getNoOverflowRequirement_Input();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.OutputNoiseRequirementImpl <em>Output Noise Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.OutputNoiseRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getOutputNoiseRequirement()
		 * @generated
		 */
		EClass OUTPUT_NOISE_REQUIREMENT = eINSTANCE.getOutputNoiseRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute OUTPUT_NOISE_REQUIREMENT__MAX = eINSTANCE.getOutputNoiseRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.CoefficientWordRequirementImpl <em>Coefficient Word Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.CoefficientWordRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getCoefficientWordRequirement()
		 * @generated
		 */
		EClass COEFFICIENT_WORD_REQUIREMENT = eINSTANCE.getCoefficientWordRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COEFFICIENT_WORD_REQUIREMENT__MAX = eINSTANCE.getCoefficientWordRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.TapsRequirementImpl <em>Taps Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.TapsRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getTapsRequirement()
		 * @generated
		 */
		EClass TAPS_REQUIREMENT = eINSTANCE.getTapsRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TAPS_REQUIREMENT__MAX = eINSTANCE.getTapsRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MultipliesRequirementImpl <em>Multiplies Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MultipliesRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMultipliesRequirement()
		 * @generated
		 */
		EClass MULTIPLIES_REQUIREMENT = eINSTANCE.getMultipliesRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MULTIPLIES_REQUIREMENT__MAX = eINSTANCE.getMultipliesRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.AddsRequirementImpl <em>Adds Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.AddsRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getAddsRequirement()
		 * @generated
		 */
		EClass ADDS_REQUIREMENT = eINSTANCE.getAddsRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ADDS_REQUIREMENT__MAX = eINSTANCE.getAddsRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MemoryRequirementImpl <em>Memory Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MemoryRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMemoryRequirement()
		 * @generated
		 */
		EClass MEMORY_REQUIREMENT = eINSTANCE.getMemoryRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMORY_REQUIREMENT__MAX = eINSTANCE.getMemoryRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MultiplyRateRequirementImpl <em>Multiply Rate Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MultiplyRateRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMultiplyRateRequirement()
		 * @generated
		 */
		EClass MULTIPLY_RATE_REQUIREMENT = eINSTANCE.getMultiplyRateRequirement();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MULTIPLY_RATE_REQUIREMENT__MAX = eINSTANCE.getMultiplyRateRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.AliasRejectionRequirementImpl <em>Alias Rejection Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.AliasRejectionRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getAliasRejectionRequirement()
		 * @generated
		 */
		EClass ALIAS_REJECTION_REQUIREMENT = eINSTANCE.getAliasRejectionRequirement();

		/**
		 * The meta object literal for the '<em><b>Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ALIAS_REJECTION_REQUIREMENT__FACTOR = eINSTANCE.getAliasRejectionRequirement_Factor();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ALIAS_REJECTION_REQUIREMENT__TO = eINSTANCE.getAliasRejectionRequirement_To();

		/**
		 * The meta object literal for the '<em><b>Min</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ALIAS_REJECTION_REQUIREMENT__MIN = eINSTANCE.getAliasRejectionRequirement_Min();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.PowerComplementaryRequirementImpl <em>Power Complementary Requirement</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.PowerComplementaryRequirementImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getPowerComplementaryRequirement()
		 * @generated
		 */
		EClass POWER_COMPLEMENTARY_REQUIREMENT = eINSTANCE.getPowerComplementaryRequirement();

		/**
		 * The meta object literal for the '<em><b>Partner</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute POWER_COMPLEMENTARY_REQUIREMENT__PARTNER = eINSTANCE.getPowerComplementaryRequirement_Partner();

		/**
		 * The meta object literal for the '<em><b>Max</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute POWER_COMPLEMENTARY_REQUIREMENT__MAX = eINSTANCE.getPowerComplementaryRequirement_Max();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.DesignImpl <em>Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.DesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getDesign()
		 * @generated
		 */
		EClass DESIGN = eINSTANCE.getDesign();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.BandDesignImpl <em>Band Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.BandDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getBandDesign()
		 * @generated
		 */
		EClass BAND_DESIGN = eINSTANCE.getBandDesign();

		/**
		 * The meta object literal for the '<em><b>Taps</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BAND_DESIGN__TAPS = eINSTANCE.getBandDesign_Taps();

		/**
		 * The meta object literal for the '<em><b>Bands</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference BAND_DESIGN__BANDS = eINSTANCE.getBandDesign_Bands();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.DesignBandImpl <em>Design Band</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.DesignBandImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getDesignBand()
		 * @generated
		 */
		EClass DESIGN_BAND = eINSTANCE.getDesignBand();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__FROM = eINSTANCE.getDesignBand_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__TO = eINSTANCE.getDesignBand_To();

		/**
		 * The meta object literal for the '<em><b>Desired</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__DESIRED = eINSTANCE.getDesignBand_Desired();

		/**
		 * The meta object literal for the '<em><b>Desired To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__DESIRED_TO = eINSTANCE.getDesignBand_DesiredTo();

		/**
		 * The meta object literal for the '<em><b>Weight</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__WEIGHT = eINSTANCE.getDesignBand_Weight();

		/**
		 * The meta object literal for the '<em><b>Weight To</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute DESIGN_BAND__WEIGHT_TO = eINSTANCE.getDesignBand_WeightTo();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.GivenDesignImpl <em>Given Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.GivenDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getGivenDesign()
		 * @generated
		 */
		EClass GIVEN_DESIGN = eINSTANCE.getGivenDesign();

		/**
		 * The meta object literal for the '<em><b>Source</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GIVEN_DESIGN__SOURCE = eINSTANCE.getGivenDesign_Source();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.WindowDesignImpl <em>Window Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.WindowDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getWindowDesign()
		 * @generated
		 */
		EClass WINDOW_DESIGN = eINSTANCE.getWindowDesign();

		/**
		 * The meta object literal for the '<em><b>Window</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDOW_DESIGN__WINDOW = eINSTANCE.getWindowDesign_Window();

		/**
		 * The meta object literal for the '<em><b>Parameter</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute WINDOW_DESIGN__PARAMETER = eINSTANCE.getWindowDesign_Parameter();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.EquirippleDesignImpl <em>Equiripple Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.EquirippleDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getEquirippleDesign()
		 * @generated
		 */
		EClass EQUIRIPPLE_DESIGN = eINSTANCE.getEquirippleDesign();

		/**
		 * The meta object literal for the '<em><b>Type</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EQUIRIPPLE_DESIGN__TYPE = eINSTANCE.getEquirippleDesign_Type();

		/**
		 * The meta object literal for the '<em><b>Tolerance</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EQUIRIPPLE_DESIGN__TOLERANCE = eINSTANCE.getEquirippleDesign_Tolerance();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MovingAverageDesignImpl <em>Moving Average Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MovingAverageDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMovingAverageDesign()
		 * @generated
		 */
		EClass MOVING_AVERAGE_DESIGN = eINSTANCE.getMovingAverageDesign();

		/**
		 * The meta object literal for the '<em><b>Taps</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MOVING_AVERAGE_DESIGN__TAPS = eINSTANCE.getMovingAverageDesign_Taps();

		/**
		 * The meta object literal for the '<em><b>Sections</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MOVING_AVERAGE_DESIGN__SECTIONS = eINSTANCE.getMovingAverageDesign_Sections();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.BinomialDesignImpl <em>Binomial Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.BinomialDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getBinomialDesign()
		 * @generated
		 */
		EClass BINOMIAL_DESIGN = eINSTANCE.getBinomialDesign();

		/**
		 * The meta object literal for the '<em><b>Order</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BINOMIAL_DESIGN__ORDER = eINSTANCE.getBinomialDesign_Order();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MaximallyFlatDesignImpl <em>Maximally Flat Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MaximallyFlatDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMaximallyFlatDesign()
		 * @generated
		 */
		EClass MAXIMALLY_FLAT_DESIGN = eINSTANCE.getMaximallyFlatDesign();

		/**
		 * The meta object literal for the '<em><b>Flatness</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAXIMALLY_FLAT_DESIGN__FLATNESS = eINSTANCE.getMaximallyFlatDesign_Flatness();

		/**
		 * The meta object literal for the '<em><b>Zeros</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MAXIMALLY_FLAT_DESIGN__ZEROS = eINSTANCE.getMaximallyFlatDesign_Zeros();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.SavitzkyGolayDesignImpl <em>Savitzky Golay Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.SavitzkyGolayDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getSavitzkyGolayDesign()
		 * @generated
		 */
		EClass SAVITZKY_GOLAY_DESIGN = eINSTANCE.getSavitzkyGolayDesign();

		/**
		 * The meta object literal for the '<em><b>Points</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SAVITZKY_GOLAY_DESIGN__POINTS = eINSTANCE.getSavitzkyGolayDesign_Points();

		/**
		 * The meta object literal for the '<em><b>Degree</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SAVITZKY_GOLAY_DESIGN__DEGREE = eINSTANCE.getSavitzkyGolayDesign_Degree();

		/**
		 * The meta object literal for the '<em><b>Derivative</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SAVITZKY_GOLAY_DESIGN__DERIVATIVE = eINSTANCE.getSavitzkyGolayDesign_Derivative();

		/**
		 * The meta object literal for the '<em><b>Position</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SAVITZKY_GOLAY_DESIGN__POSITION = eINSTANCE.getSavitzkyGolayDesign_Position();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.LagrangeDelayDesignImpl <em>Lagrange Delay Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.LagrangeDelayDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getLagrangeDelayDesign()
		 * @generated
		 */
		EClass LAGRANGE_DELAY_DESIGN = eINSTANCE.getLagrangeDelayDesign();

		/**
		 * The meta object literal for the '<em><b>Order</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LAGRANGE_DELAY_DESIGN__ORDER = eINSTANCE.getLagrangeDelayDesign_Order();

		/**
		 * The meta object literal for the '<em><b>Delay</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LAGRANGE_DELAY_DESIGN__DELAY = eINSTANCE.getLagrangeDelayDesign_Delay();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.RaisedCosineDesignImpl <em>Raised Cosine Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.RaisedCosineDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getRaisedCosineDesign()
		 * @generated
		 */
		EClass RAISED_COSINE_DESIGN = eINSTANCE.getRaisedCosineDesign();

		/**
		 * The meta object literal for the '<em><b>Roll Off</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RAISED_COSINE_DESIGN__ROLL_OFF = eINSTANCE.getRaisedCosineDesign_RollOff();

		/**
		 * The meta object literal for the '<em><b>Samples Per Symbol</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL = eINSTANCE.getRaisedCosineDesign_SamplesPerSymbol();

		/**
		 * The meta object literal for the '<em><b>Symbols</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RAISED_COSINE_DESIGN__SYMBOLS = eINSTANCE.getRaisedCosineDesign_Symbols();

		/**
		 * The meta object literal for the '<em><b>Root</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RAISED_COSINE_DESIGN__ROOT = eINSTANCE.getRaisedCosineDesign_Root();

		/**
		 * The meta object literal for the '<em><b>Gain</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RAISED_COSINE_DESIGN__GAIN = eINSTANCE.getRaisedCosineDesign_Gain();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.LeastSquaresDesignImpl <em>Least Squares Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.LeastSquaresDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getLeastSquaresDesign()
		 * @generated
		 */
		EClass LEAST_SQUARES_DESIGN = eINSTANCE.getLeastSquaresDesign();

		/**
		 * The meta object literal for the '<em><b>Type</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEAST_SQUARES_DESIGN__TYPE = eINSTANCE.getLeastSquaresDesign_Type();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ConstrainedLeastSquaresDesignImpl <em>Constrained Least Squares Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ConstrainedLeastSquaresDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getConstrainedLeastSquaresDesign()
		 * @generated
		 */
		EClass CONSTRAINED_LEAST_SQUARES_DESIGN = eINSTANCE.getConstrainedLeastSquaresDesign();

		/**
		 * The meta object literal for the '<em><b>Type</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONSTRAINED_LEAST_SQUARES_DESIGN__TYPE = eINSTANCE.getConstrainedLeastSquaresDesign_Type();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.LinearProgramDesignImpl <em>Linear Program Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.LinearProgramDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getLinearProgramDesign()
		 * @generated
		 */
		EClass LINEAR_PROGRAM_DESIGN = eINSTANCE.getLinearProgramDesign();

		/**
		 * The meta object literal for the '<em><b>Monotone</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LINEAR_PROGRAM_DESIGN__MONOTONE = eINSTANCE.getLinearProgramDesign_Monotone();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.HalfBandDesignImpl <em>Half Band Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.HalfBandDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getHalfBandDesign()
		 * @generated
		 */
		EClass HALF_BAND_DESIGN = eINSTANCE.getHalfBandDesign();

		/**
		 * The meta object literal for the '<em><b>Taps</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute HALF_BAND_DESIGN__TAPS = eINSTANCE.getHalfBandDesign_Taps();

		/**
		 * The meta object literal for the '<em><b>Pass Edge</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute HALF_BAND_DESIGN__PASS_EDGE = eINSTANCE.getHalfBandDesign_PassEdge();

		/**
		 * The meta object literal for the '<em><b>Hilbert</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute HALF_BAND_DESIGN__HILBERT = eINSTANCE.getHalfBandDesign_Hilbert();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.CicCompensatorDesignImpl <em>Cic Compensator Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.CicCompensatorDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getCicCompensatorDesign()
		 * @generated
		 */
		EClass CIC_COMPENSATOR_DESIGN = eINSTANCE.getCicCompensatorDesign();

		/**
		 * The meta object literal for the '<em><b>Taps</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__TAPS = eINSTANCE.getCicCompensatorDesign_Taps();

		/**
		 * The meta object literal for the '<em><b>Sections</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__SECTIONS = eINSTANCE.getCicCompensatorDesign_Sections();

		/**
		 * The meta object literal for the '<em><b>Rate</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__RATE = eINSTANCE.getCicCompensatorDesign_Rate();

		/**
		 * The meta object literal for the '<em><b>Pass Edge</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__PASS_EDGE = eINSTANCE.getCicCompensatorDesign_PassEdge();

		/**
		 * The meta object literal for the '<em><b>Stop Edge</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__STOP_EDGE = eINSTANCE.getCicCompensatorDesign_StopEdge();

		/**
		 * The meta object literal for the '<em><b>Stop Weight</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIC_COMPENSATOR_DESIGN__STOP_WEIGHT = eINSTANCE.getCicCompensatorDesign_StopWeight();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.CombDesignImpl <em>Comb Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.CombDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getCombDesign()
		 * @generated
		 */
		EClass COMB_DESIGN = eINSTANCE.getCombDesign();

		/**
		 * The meta object literal for the '<em><b>Period</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COMB_DESIGN__PERIOD = eINSTANCE.getCombDesign_Period();

		/**
		 * The meta object literal for the '<em><b>Difference</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COMB_DESIGN__DIFFERENCE = eINSTANCE.getCombDesign_Difference();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.MinimumPhaseDesignImpl <em>Minimum Phase Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.MinimumPhaseDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getMinimumPhaseDesign()
		 * @generated
		 */
		EClass MINIMUM_PHASE_DESIGN = eINSTANCE.getMinimumPhaseDesign();

		/**
		 * The meta object literal for the '<em><b>Prototype</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MINIMUM_PHASE_DESIGN__PROTOTYPE = eINSTANCE.getMinimumPhaseDesign_Prototype();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ComplementDesignImpl <em>Complement Design</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ComplementDesignImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getComplementDesign()
		 * @generated
		 */
		EClass COMPLEMENT_DESIGN = eINSTANCE.getComplementDesign();

		/**
		 * The meta object literal for the '<em><b>Prototype</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference COMPLEMENT_DESIGN__PROTOTYPE = eINSTANCE.getComplementDesign_Prototype();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.CoefficientsImpl <em>Coefficients</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.CoefficientsImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getCoefficients()
		 * @generated
		 */
		EClass COEFFICIENTS = eINSTANCE.getCoefficients();

		/**
		 * The meta object literal for the '<em><b>Design Hash</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute COEFFICIENTS__DESIGN_HASH = eINSTANCE.getCoefficients_DesignHash();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.RealCoefficientsImpl <em>Real Coefficients</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.RealCoefficientsImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getRealCoefficients()
		 * @generated
		 */
		EClass REAL_COEFFICIENTS = eINSTANCE.getRealCoefficients();

		/**
		 * The meta object literal for the '<em><b>Values</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REAL_COEFFICIENTS__VALUES = eINSTANCE.getRealCoefficients_Values();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.IntegerCoefficientsImpl <em>Integer Coefficients</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.IntegerCoefficientsImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getIntegerCoefficients()
		 * @generated
		 */
		EClass INTEGER_COEFFICIENTS = eINSTANCE.getIntegerCoefficients();

		/**
		 * The meta object literal for the '<em><b>Integers</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute INTEGER_COEFFICIENTS__INTEGERS = eINSTANCE.getIntegerCoefficients_Integers();

		/**
		 * The meta object literal for the '<em><b>Scale</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute INTEGER_COEFFICIENTS__SCALE = eINSTANCE.getIntegerCoefficients_Scale();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ArithmeticImpl <em>Arithmetic</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ArithmeticImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getArithmetic()
		 * @generated
		 */
		EClass ARITHMETIC = eINSTANCE.getArithmetic();

		/**
		 * The meta object literal for the '<em><b>Structure</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARITHMETIC__STRUCTURE = eINSTANCE.getArithmetic_Structure();

		/**
		 * The meta object literal for the '<em><b>Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARITHMETIC__FACTOR = eINSTANCE.getArithmetic_Factor();

		/**
		 * The meta object literal for the '<em><b>Coefficient</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference ARITHMETIC__COEFFICIENT = eINSTANCE.getArithmetic_Coefficient();

		/**
		 * The meta object literal for the '<em><b>Input</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference ARITHMETIC__INPUT = eINSTANCE.getArithmetic_Input();

		/**
		 * The meta object literal for the '<em><b>Product</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference ARITHMETIC__PRODUCT = eINSTANCE.getArithmetic_Product();

		/**
		 * The meta object literal for the '<em><b>Accumulator</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference ARITHMETIC__ACCUMULATOR = eINSTANCE.getArithmetic_Accumulator();

		/**
		 * The meta object literal for the '<em><b>Output</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference ARITHMETIC__OUTPUT = eINSTANCE.getArithmetic_Output();

		/**
		 * The meta object literal for the '<em><b>Rounding</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARITHMETIC__ROUNDING = eINSTANCE.getArithmetic_Rounding();

		/**
		 * The meta object literal for the '<em><b>Overflow</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ARITHMETIC__OVERFLOW = eINSTANCE.getArithmetic_Overflow();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.FormatImpl <em>Format</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.FormatImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getFormat()
		 * @generated
		 */
		EClass FORMAT = eINSTANCE.getFormat();

		/**
		 * The meta object literal for the '<em><b>Word</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FORMAT__WORD = eINSTANCE.getFormat_Word();

		/**
		 * The meta object literal for the '<em><b>Fraction</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FORMAT__FRACTION = eINSTANCE.getFormat_Fraction();

		/**
		 * The meta object literal for the '<em><b>Signed</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FORMAT__SIGNED = eINSTANCE.getFormat_Signed();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.EvidenceImpl <em>Evidence</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.EvidenceImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getEvidence()
		 * @generated
		 */
		EClass EVIDENCE = eINSTANCE.getEvidence();

		/**
		 * The meta object literal for the '<em><b>Tool</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EVIDENCE__TOOL = eINSTANCE.getEvidence_Tool();

		/**
		 * The meta object literal for the '<em><b>Verdict</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EVIDENCE__VERDICT = eINSTANCE.getEvidence_Verdict();

		/**
		 * The meta object literal for the '<em><b>Results</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference EVIDENCE__RESULTS = eINSTANCE.getEvidence_Results();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.ResultImpl <em>Result</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.ResultImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getResult()
		 * @generated
		 */
		EClass RESULT = eINSTANCE.getResult();

		/**
		 * The meta object literal for the '<em><b>Requirement</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__REQUIREMENT = eINSTANCE.getResult_Requirement();

		/**
		 * The meta object literal for the '<em><b>Kind</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__KIND = eINSTANCE.getResult_Kind();

		/**
		 * The meta object literal for the '<em><b>Verdict</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__VERDICT = eINSTANCE.getResult_Verdict();

		/**
		 * The meta object literal for the '<em><b>Worst</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__WORST = eINSTANCE.getResult_Worst();

		/**
		 * The meta object literal for the '<em><b>Value Low</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__VALUE_LOW = eINSTANCE.getResult_ValueLow();

		/**
		 * The meta object literal for the '<em><b>Value High</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__VALUE_HIGH = eINSTANCE.getResult_ValueHigh();

		/**
		 * The meta object literal for the '<em><b>Limit</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__LIMIT = eINSTANCE.getResult_Limit();

		/**
		 * The meta object literal for the '<em><b>Margin Low</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__MARGIN_LOW = eINSTANCE.getResult_MarginLow();

		/**
		 * The meta object literal for the '<em><b>Margin High</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RESULT__MARGIN_HIGH = eINSTANCE.getResult_MarginHigh();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.RevisionImpl <em>Revision</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.RevisionImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getRevision()
		 * @generated
		 */
		EClass REVISION = eINSTANCE.getRevision();

		/**
		 * The meta object literal for the '<em><b>Parents</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REVISION__PARENTS = eINSTANCE.getRevision_Parents();

		/**
		 * The meta object literal for the '<em><b>Author</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REVISION__AUTHOR = eINSTANCE.getRevision_Author();

		/**
		 * The meta object literal for the '<em><b>Email</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REVISION__EMAIL = eINSTANCE.getRevision_Email();

		/**
		 * The meta object literal for the '<em><b>Time</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REVISION__TIME = eINSTANCE.getRevision_Time();

		/**
		 * The meta object literal for the '<em><b>Message</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute REVISION__MESSAGE = eINSTANCE.getRevision_Message();

		/**
		 * The meta object literal for the '<em><b>Parameters</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference REVISION__PARAMETERS = eINSTANCE.getRevision_Parameters();

		/**
		 * The meta object literal for the '<em><b>Filter</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference REVISION__FILTER = eINSTANCE.getRevision_Filter();

		/**
		 * The meta object literal for the '<em><b>Evidence</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference REVISION__EVIDENCE = eINSTANCE.getRevision_Evidence();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.BaselineImpl <em>Baseline</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.BaselineImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getBaseline()
		 * @generated
		 */
		EClass BASELINE = eINSTANCE.getBaseline();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE__NAME = eINSTANCE.getBaseline_Name();

		/**
		 * The meta object literal for the '<em><b>Author</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE__AUTHOR = eINSTANCE.getBaseline_Author();

		/**
		 * The meta object literal for the '<em><b>Email</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE__EMAIL = eINSTANCE.getBaseline_Email();

		/**
		 * The meta object literal for the '<em><b>Time</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE__TIME = eINSTANCE.getBaseline_Time();

		/**
		 * The meta object literal for the '<em><b>Message</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE__MESSAGE = eINSTANCE.getBaseline_Message();

		/**
		 * The meta object literal for the '<em><b>Entries</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference BASELINE__ENTRIES = eINSTANCE.getBaseline_Entries();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.BaselineEntryImpl <em>Baseline Entry</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.BaselineEntryImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getBaselineEntry()
		 * @generated
		 */
		EClass BASELINE_ENTRY = eINSTANCE.getBaselineEntry();

		/**
		 * The meta object literal for the '<em><b>Filter</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE_ENTRY__FILTER = eINSTANCE.getBaselineEntry_Filter();

		/**
		 * The meta object literal for the '<em><b>Identity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE_ENTRY__IDENTITY = eINSTANCE.getBaselineEntry_Identity();

		/**
		 * The meta object literal for the '<em><b>Revision</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute BASELINE_ENTRY__REVISION = eINSTANCE.getBaselineEntry_Revision();

		/**
		 * The meta object literal for the '{@link tapwright.model.impl.SignOffImpl <em>Sign Off</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.impl.SignOffImpl
		 * @see tapwright.model.impl.ModelPackageImpl#getSignOff()
		 * @generated
		 */
		EClass SIGN_OFF = eINSTANCE.getSignOff();

		/**
		 * The meta object literal for the '<em><b>Filter</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__FILTER = eINSTANCE.getSignOff_Filter();

		/**
		 * The meta object literal for the '<em><b>Revision</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__REVISION = eINSTANCE.getSignOff_Revision();

		/**
		 * The meta object literal for the '<em><b>Reviewer</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__REVIEWER = eINSTANCE.getSignOff_Reviewer();

		/**
		 * The meta object literal for the '<em><b>Email</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__EMAIL = eINSTANCE.getSignOff_Email();

		/**
		 * The meta object literal for the '<em><b>Time</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__TIME = eINSTANCE.getSignOff_Time();

		/**
		 * The meta object literal for the '<em><b>Decision</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__DECISION = eINSTANCE.getSignOff_Decision();

		/**
		 * The meta object literal for the '<em><b>Comment</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SIGN_OFF__COMMENT = eINSTANCE.getSignOff_Comment();

		/**
		 * The meta object literal for the '{@link tapwright.model.Severity <em>Severity</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Severity
		 * @see tapwright.model.impl.ModelPackageImpl#getSeverity()
		 * @generated
		 */
		EEnum SEVERITY = eINSTANCE.getSeverity();

		/**
		 * The meta object literal for the '{@link tapwright.model.Unit <em>Unit</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Unit
		 * @see tapwright.model.impl.ModelPackageImpl#getUnit()
		 * @generated
		 */
		EEnum UNIT = eINSTANCE.getUnit();

		/**
		 * The meta object literal for the '{@link tapwright.model.Side <em>Side</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Side
		 * @see tapwright.model.impl.ModelPackageImpl#getSide()
		 * @generated
		 */
		EEnum SIDE = eINSTANCE.getSide();

		/**
		 * The meta object literal for the '{@link tapwright.model.Interpolation <em>Interpolation</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Interpolation
		 * @see tapwright.model.impl.ModelPackageImpl#getInterpolation()
		 * @generated
		 */
		EEnum INTERPOLATION = eINSTANCE.getInterpolation();

		/**
		 * The meta object literal for the '{@link tapwright.model.PhaseType <em>Phase Type</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.PhaseType
		 * @see tapwright.model.impl.ModelPackageImpl#getPhaseType()
		 * @generated
		 */
		EEnum PHASE_TYPE = eINSTANCE.getPhaseType();

		/**
		 * The meta object literal for the '{@link tapwright.model.InputClass <em>Input Class</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.InputClass
		 * @see tapwright.model.impl.ModelPackageImpl#getInputClass()
		 * @generated
		 */
		EEnum INPUT_CLASS = eINSTANCE.getInputClass();

		/**
		 * The meta object literal for the '{@link tapwright.model.Structure <em>Structure</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Structure
		 * @see tapwright.model.impl.ModelPackageImpl#getStructure()
		 * @generated
		 */
		EEnum STRUCTURE = eINSTANCE.getStructure();

		/**
		 * The meta object literal for the '{@link tapwright.model.Rounding <em>Rounding</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Rounding
		 * @see tapwright.model.impl.ModelPackageImpl#getRounding()
		 * @generated
		 */
		EEnum ROUNDING = eINSTANCE.getRounding();

		/**
		 * The meta object literal for the '{@link tapwright.model.Overflow <em>Overflow</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Overflow
		 * @see tapwright.model.impl.ModelPackageImpl#getOverflow()
		 * @generated
		 */
		EEnum OVERFLOW = eINSTANCE.getOverflow();

		/**
		 * The meta object literal for the '{@link tapwright.model.Verdict <em>Verdict</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Verdict
		 * @see tapwright.model.impl.ModelPackageImpl#getVerdict()
		 * @generated
		 */
		EEnum VERDICT = eINSTANCE.getVerdict();

		/**
		 * The meta object literal for the '{@link tapwright.model.Decision <em>Decision</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.Decision
		 * @see tapwright.model.impl.ModelPackageImpl#getDecision()
		 * @generated
		 */
		EEnum DECISION = eINSTANCE.getDecision();

		/**
		 * The meta object literal for the '{@link tapwright.model.WindowKind <em>Window Kind</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.WindowKind
		 * @see tapwright.model.impl.ModelPackageImpl#getWindowKind()
		 * @generated
		 */
		EEnum WINDOW_KIND = eINSTANCE.getWindowKind();

		/**
		 * The meta object literal for the '{@link tapwright.model.PulseGain <em>Pulse Gain</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see tapwright.model.PulseGain
		 * @see tapwright.model.impl.ModelPackageImpl#getPulseGain()
		 * @generated
		 */
		EEnum PULSE_GAIN = eINSTANCE.getPulseGain();

		/**
		 * The meta object literal for the '<em>Quantity</em>' data type.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see java.lang.String
		 * @see tapwright.model.impl.ModelPackageImpl#getQuantity()
		 * @generated
		 */
		EDataType QUANTITY = eINSTANCE.getQuantity();

	}

} //ModelPackage
