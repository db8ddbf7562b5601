/**
 * The junction's current and conductance at v (V across the junction itself, RS outside it):
 *
 *   i = IS (exp(v / a) - 1) - IBV exp(-(v + BV) / a),   a = N Vt
 *   g = di/dv
 *
 * Positive from anode to cathode. The breakdown term is left out when there is no BV, and makes
 * i(-BV) = -IBV.
 *
 * With the law `spice` the reverse tail is the cubic other simulators use,
 *   i = -IS (1 + (3 a / (e v))^3) for v < -3 a,   i = -IS exp(-(v + x) / a) for v < -x,
 * x being matched to BV and IBV, and a conductance of 1e-12 S lies across every junction. It differs
 * from the exponential by less than 0.4 % of IS and serves comparison only.
 *
 * Sources: W. Shockley, Bell Syst. Tech. J. 28 (1949) 435-489; ngspice manual, chapter on diodes,
 * for the meaning of BV, IBV and the cubic tail.
 */
import { exp, expm1 } from '../elementary/exponential.ts';
export type JunctionLaw = 'shockley' | 'spice';

export interface Junction {
  readonly branch: number;
  /** IS, A */ readonly saturation: number;
  /** N Vt, V */ readonly slope: number;
  /** RS, Ohm */ readonly seriesResistance: number;
  /** where breakdown begins: BV, V, or Infinity */ readonly breakdown: number;
  /** A there */ readonly breakdownCurrent: number;
  /** V; above this the exponential outruns Newton's method */ readonly critical: number;
  readonly law: JunctionLaw;
  /** V about which the law was last made linear */ voltage: number;
  /** A there */ current: number;
  /** S there */ conductance: number;
  /** S of the straight line that stands in the matrix: the slope there, or one near it */ line: number;
}

const SPICE_CONDUCTANCE = 1e-12;
/** exp beyond this is continued by its tangent: an iterate may pass here, a solution never does. */
const LARGEST_EXPONENT = 230;

/** Sets the junction's linear form at `voltage`. */
export function linearise(junction: Junction, voltage: number): void {
  const { slope, law, breakdown } = junction;
  junction.voltage = voltage;
  if (law === 'shockley') {
    setForward(junction, voltage);
    if (breakdown < Infinity) addBreakdown(junction, voltage);
    return;
  }
  if (voltage >= -3 * slope) setForward(junction, voltage);
  else if (voltage >= -breakdown) setTail(junction, voltage);
  else {
    junction.current = 0;
    junction.conductance = 0;
    addBreakdown(junction, voltage);
  }
  junction.current += SPICE_CONDUCTANCE * voltage;
  junction.conductance += SPICE_CONDUCTANCE;
}

function setForward(junction: Junction, voltage: number): void {
  const { saturation, slope } = junction;
  const exponent = voltage / slope;
  const grown = exp(Math.min(exponent, LARGEST_EXPONENT));
  const beyond = Math.max(0, exponent - LARGEST_EXPONENT);
  junction.current = beyond > 0 ? saturation * grown * (1 + beyond) : saturation * expm1(exponent);
  junction.conductance = (saturation * grown) / slope;
}

function setTail(junction: Junction, voltage: number): void {
  const { saturation, slope } = junction;
  const share = (3 * slope) / (Math.E * voltage);
  const tail = share * share * share;
  junction.current = -saturation * (1 + tail);
  junction.conductance = (3 * saturation * tail) / voltage;
}

function addBreakdown(junction: Junction, voltage: number): void {
  const exponent = -(voltage + junction.breakdown) / junction.slope;
  const grown = junction.breakdownCurrent * exp(Math.min(exponent, LARGEST_EXPONENT));
  const beyond = Math.max(0, exponent - LARGEST_EXPONENT);
  junction.current -= grown * (1 + beyond);
  junction.conductance += grown / junction.slope;
}
