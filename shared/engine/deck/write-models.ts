import type { Circuit, DiodeModel, SwitchModel } from '../circuit/circuit.ts';

/** The `.model` lines of a circuit, and the name of each model by its values. */
export interface ModelNames {
  readonly lines: readonly string[];
  diode(model: DiodeModel): string;
  switch(model: SwitchModel): string;
}

/** Gives equal models one `.model` line. */
export function writeModels(circuit: Circuit): ModelNames {
  const names = new Map<string, string>();
  for (const element of circuit.elements) {
    if (element.kind !== 'diode' && element.kind !== 'switch') continue;
    const text = element.kind === 'diode' ? diodeText(element.model) : switchText(element.model);
    if (!names.has(text)) names.set(text, `model${names.size + 1}`);
  }
  return {
    lines: Array.from(names, ([text, name]) => `.model ${name} ${text}`),
    diode: (model) => names.get(diodeText(model)) ?? '',
    switch: (model) => names.get(switchText(model)) ?? '',
  };
}

function diodeText(model: DiodeModel): string {
  const { saturationCurrent, emission, seriesResistance, breakdownVoltage } = model;
  const breakdown =
    breakdownVoltage === undefined
      ? ''
      : ` bv=${breakdownVoltage} ibv=${model.breakdownCurrent ?? 1e-3}`;
  return `d(is=${saturationCurrent} n=${emission} rs=${seriesResistance}${breakdown})`;
}

function switchText({ threshold, hysteresis, onResistance, offResistance }: SwitchModel): string {
  return `sw(vt=${threshold} vh=${hysteresis} ron=${onResistance} roff=${offResistance})`;
}
