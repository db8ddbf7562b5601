import { describe, expect, it } from 'vitest';
import { checkDiagram } from '../../../shared/oven/check-layout.ts';
import { ovenLayout, type OvenLayout } from '../../../shared/oven/layout.ts';
import { definition, layout } from '../../support/larkfield.ts';

const withParts = (parts: OvenLayout['diagram']['parts']): OvenLayout => ({
  ...layout,
  diagram: { ...layout.diagram, parts },
});

describe('the places in the wiring diagram', () => {
  it('are all there in the oven that is delivered', () => {
    expect(checkDiagram(definition, layout)).toEqual([]);
  });

  it('are told one by one where a part has none', () => {
    const { F1: _fuse, V1: _magnetron, ...parts } = layout.diagram.parts;
    expect(checkDiagram(definition, withParts(parts))).toEqual([
      { path: 'diagram.parts.F1', message: 'F1 has no place in the wiring diagram' },
      { path: 'diagram.parts.V1', message: 'V1 has no place in the wiring diagram' },
    ]);
  });

  it('are of parts that the oven has, or the nearest name is offered', () => {
    const parts = { ...layout.diagram.parts, F9: { at: [10, 10] as [number, number] } };
    const [problem, ...more] = checkDiagram(definition, withParts(parts));
    expect(more).toEqual([]);
    expect(problem?.path).toBe('diagram.parts.F9');
    expect(problem?.message).toMatch(/^unknown part F9; did you mean F[123]\?$/);
  });

  it('lie on the sheet', () => {
    const parts = { ...layout.diagram.parts, F1: { at: [5000, 10] as [number, number] } };
    expect(checkDiagram(definition, withParts(parts)).map(({ path }) => path)).toEqual([
      'diagram.parts.F1.at',
    ]);
  });

  it('lie on the grid', () => {
    const parts = { ...layout.diagram.parts, F1: { at: [95, 70] } };
    const read = ovenLayout.safeParse({ ...layout, diagram: { ...layout.diagram, parts } });
    expect(read.error?.issues.map(({ path, message }) => [path.join('.'), message])).toEqual([
      ['diagram.parts.F1.at.0', 'a multiple of 10'],
    ]);
  });
});
