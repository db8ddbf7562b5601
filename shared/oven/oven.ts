import { z } from 'zod';

/** `C1`: letters as in IEC 81346-2, then a number. `CH` is the chassis. */
export const partRef = z.string().regex(/^[A-Z]{1,2}[0-9]{0,2}$/, 'a part reference such as C1');
/** `C1.1`, `T1.core`: where a probe or a connector can touch. */
export const terminalRef = z
  .string()
  .regex(/^[A-Z]{1,2}[0-9]{0,2}\.[A-Za-z0-9]{1,6}$/, 'a terminal such as C1.1');
/** `W12` */
export const leadRef = z.string().regex(/^W[0-9]{1,3}$/, 'a lead such as W12');
/** `W12/a`: one end of a lead; while it is lifted a probe can touch it. */
export const leadEndRef = z.string().regex(/^W[0-9]{1,3}\/[ab]$/, 'a lead end such as W12/a');

export type PartRef = string;
export type TerminalRef = string;
export type LeadRef = string;
export type LeadEndRef = string;
/** A terminal, a lifted lead end, or a pole of a bench tool (`BAT.pos`, `BAT.neg`): all that a probe can touch. */
export type TargetRef = string;

const finite = z.number();

export const partKindName = z.enum([
  'plug',
  'chassis',
  'fuse',
  'filter-board',
  'cut-out',
  'door-switch',
  'relay',
  'board-transformer',
  'control-board',
  'mechanical-timer',
  'resistor',
  'lamp',
  'motor',
  'hv-transformer',
  'hv-fuse',
  'hv-capacitor',
  'hv-diode',
  'magnetron',
]);
export type PartKindName = z.infer<typeof partKindName>;

export const ovenPart = z.strictObject({
  ref: partRef,
  kind: partKindName,
  name: z.string().min(1).max(60),
  /** values that differ from the kind's own nominal, SI units */ values: z
    .record(z.string(), finite)
    .optional(),
  /** the kind's variant: for a door switch which contacts it has, for a motor what it turns */ variant:
    z.string().optional(),
  /** reached without taking the cover off */ isOutside: z.boolean().optional(),
});

export const ovenLead = z.strictObject({
  ref: leadRef,
  name: z.string().min(1).max(60),
  ends: z.tuple([terminalRef, terminalRef]),
  /** Ohm, of the wire alone; each connector adds its contact */ resistance: finite.positive(),
  insulation: z.enum([
    'black',
    'white',
    'blue',
    'brown',
    'red',
    'green',
    'green-yellow',
    'yellow',
    'grey',
    'orange',
  ]),
  isHighVoltage: z.boolean().optional(),
});

/** One line of the maker's service data: where, how and what a good part gives. */
export const serviceMeasurement = z.strictObject({
  id: z.string().regex(/^[a-z0-9-]+$/),
  part: partRef,
  label: z.string().min(1).max(60),
  between: z.tuple([terminalRef, terminalRef]),
  /** lead ends to lift first */ lift: z.array(leadEndRef),
  /** varnished spots to clean first */ clean: z.array(terminalRef).optional(),
  /** parts to hold by hand: a switch pressed, a timer turned up */ press: z
    .array(partRef)
    .optional(),
  /** a function and range of the manual meter */ setting: z.string(),
  /** what a good part gives, in the unit shown; a limit left out is open */ low: finite.optional(),
  high: finite.optional(),
  expect: z.enum(['range', 'open', 'beep']),
  unit: z.string(),
});

export const ovenDefinition = z.strictObject({
  schemaVersion: z.literal(1),
  id: z.string().regex(/^[a-z0-9-]+$/),
  maker: z.string().min(1),
  model: z.string().min(1),
  type: z.enum(['countertop', 'over-the-range']),
  control: z.enum(['electronic', 'mechanical timer']),
  supply: z.strictObject({
    volts: finite.positive(),
    hertz: finite.positive(),
    amps: finite.positive(),
  }),
  parts: z.array(ovenPart).min(1),
  leads: z.array(ovenLead).min(1),
  serviceData: z.array(serviceMeasurement),
  cautions: z.array(z.string()),
});

export type OvenPart = z.infer<typeof ovenPart>;
export type OvenLead = z.infer<typeof ovenLead>;
export type ServiceMeasurement = z.infer<typeof serviceMeasurement>;
export type OvenDefinition = z.infer<typeof ovenDefinition>;
