/** The catalogue: every calculator by its public id. A new calculator is its file and one line here. */
import type { Calculator, CalculatorSet } from '../calculator.ts';
import { fromVacuum } from './air/from-vacuum.ts';
import { toVacuum } from './air/to-vacuum.ts';
import { diffraction } from './angle/diffraction.ts';
import { angularSize } from './angle/size.ts';
import { bandFraction } from './blackbody/band-fraction.ts';
import { planck } from './blackbody/planck.ts';
import { total } from './blackbody/total.ts';
import { ageDiff } from './cosmology/age-diff.ts';
import { atZ } from './cosmology/at-z.ts';
import { inverse } from './cosmology/inverse.ts';
import { omegaNu } from './cosmology/omega-nu.ts';
import { radiometricAge } from './decay/age.ts';
import { halfLife } from './decay/half-life.ts';
import { inFlight } from './decay/in-flight.ts';
import { betaFromZ } from './doppler/beta-from-z.ts';
import { combine } from './doppler/combine.ts';
import { zFromBeta } from './doppler/z-from-beta.ts';
import { zGeneral } from './doppler/z-general.ts';
import { convert } from './energy/convert.ts';
import { counterweight } from './energy/counterweight.ts';
import { drop } from './energy/drop.ts';
import { radialVelocity } from './exoplanet/radial-velocity.ts';
import { transit } from './exoplanet/transit.ts';
import { fallDrag } from './fall/drag.ts';
import { adiabatic } from './g21/adiabatic.ts';
import { brightness } from './g21/brightness.ts';
import { darkAges } from './g21/dark-ages.ts';
import { deepest } from './g21/deepest.ts';
import { flattenedGaussian } from './g21/flattened-gaussian.ts';
import { foreground } from './g21/foreground.ts';
import { frequencyFromZ } from './g21/frequency-from-z.ts';
import { gaussian } from './g21/gaussian.ts';
import { kappa } from './g21/kappa.ts';
import { mfCooling } from './g21/mf-cooling.ts';
import { radioExcess } from './g21/radio-excess.ts';
import { radiometer } from './g21/radiometer.ts';
import { spinTemperatureCalculator } from './g21/spin-temperature.ts';
import { tanh } from './g21/tanh.ts';
import { tkForDepth } from './g21/tk-for-depth.ts';
import { lymanAlpha } from './g21/x-alpha.ts';
import { collisional } from './g21/x-c.ts';
import { zFromFrequency } from './g21/z-from-frequency.ts';
import { adiabaticGas } from './gas/adiabatic.ts';
import { jeans } from './gas/jeans.ts';
import { gasSpeeds } from './gas/speeds.ts';
import { blackHole } from './gravity/black-hole.ts';
import { body } from './gravity/body.ts';
import { inspiral } from './gw/inspiral.ts';
import { impactEnergy } from './impact/energy.ts';
import { hinged } from './launcher/hinged.ts';
import { flux } from './light/flux.ts';
import { lightTravel } from './light/travel.ts';
import { band } from './line/band.ts';
import { observe } from './line/observe.ts';
import { redshift } from './line/redshift.ts';
import { rydberg } from './line/rydberg.ts';
import { ballisticPendulum } from './mech/ballistic-pendulum.ts';
import { buoyancy } from './mech/buoyancy.ts';
import { collision } from './mech/collision.ts';
import { pendulum } from './mech/pendulum.ts';
import { rolling } from './mech/rolling.ts';
import { spring } from './mech/spring.ts';
import { keplerEquation } from './orbit/kepler-equation.ts';
import { kepler } from './orbit/kepler.ts';
import { photon } from './photon/convert.ts';
import { drag } from './projectile/drag.ts';
import { vacuum } from './projectile/vacuum.ts';
import { addSpeeds } from './relativity/add.ts';
import { fromGamma } from './relativity/from-gamma.ts';
import { kinematics } from './relativity/kinematics.ts';
import { rocketTrip } from './relativity/rocket-trip.ts';
import { deltaV } from './rocket/delta-v.ts';
import { decimals } from './round/decimals.ts';
import { significant } from './round/significant.ts';
import { withUncertainty } from './round/with-uncertainty.ts';
import { magnitude } from './stars/magnitude.ts';
import { tla1 } from './thermal/tla1.ts';
import { roche } from './tide/roche.ts';
import { asymmetricInterval } from './unc/asymmetric-interval.ts';
import { linear } from './unc/linear.ts';
import { power } from './unc/power.ts';
import { weightedMean } from './unc/weighted-mean.ts';

const calculators: Calculator[] = [
	observe,
	redshift,
	band,
	rydberg,
	frequencyFromZ,
	zFromFrequency,
	spinTemperatureCalculator,
	collisional,
	lymanAlpha,
	kappa,
	tla1,
	adiabatic,
	mfCooling,
	brightness,
	deepest,
	darkAges,
	tkForDepth,
	radioExcess,
	gaussian,
	flattenedGaussian,
	tanh,
	foreground,
	radiometer,
	atZ,
	inverse,
	ageDiff,
	omegaNu,
	drop,
	counterweight,
	vacuum,
	drag,
	fallDrag,
	hinged,
	convert,
	photon,
	planck,
	total,
	bandFraction,
	betaFromZ,
	zFromBeta,
	zGeneral,
	combine,
	fromVacuum,
	toVacuum,
	lightTravel,
	flux,
	angularSize,
	diffraction,
	magnitude,
	transit,
	radialVelocity,
	kinematics,
	fromGamma,
	addSpeeds,
	rocketTrip,
	inFlight,
	body,
	blackHole,
	kepler,
	keplerEquation,
	roche,
	inspiral,
	impactEnergy,
	deltaV,
	halfLife,
	radiometricAge,
	gasSpeeds,
	jeans,
	adiabaticGas,
	pendulum,
	spring,
	rolling,
	collision,
	ballisticPendulum,
	buoyancy,
	power,
	linear,
	weightedMean,
	asymmetricInterval,
	significant,
	decimals,
	withUncertainty
];

export const catalogue: CalculatorSet = new Map(
	calculators.map((calculator) => [calculator.id, calculator])
);
