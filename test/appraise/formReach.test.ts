import { describe, expect, it } from 'vitest';
import { formReach, limitM, reachFigure, reachPath, type FormReach, type NoReach } from '../../lib/index.ts';
import { finish } from '../../lib/appraise/work.ts';
import { sizeCommand } from '../../lib/cli/size.ts';
import { answer } from '../cli/run.ts';

const reachOf = (form: FormReach['form'], widthM = 12.5, radiusM = Infinity): FormReach | NoReach =>
  finish(formReach(form, { widthM, radiusM }));
const said = (reach: FormReach | NoReach): FormReach => {
  if ('because' in reach) throw new Error(reach.because);
  return reach;
};

describe('formReach(form, deck)', () => {
  it('is what the command line says of the same unit', () => {
    const reach = said(reachOf('composite-i'));
    const { out } = answer(
      sizeCommand,
      '--form composite-i --spans 78,100,78 --width 12.5 --lanes 3 --limit',
    );
    const printed = JSON.parse(out) as { limitingSpanM: number; limit: string };
    expect(limitM(reach)).toBeCloseTo(printed.limitingSpanM, 2);
    expect(reach.fails!.check.label).toBe(printed.limit);
  });

  it('a wider deck has more lanes and carries less far; a tight curve stops a form sooner', () => {
    const usual = said(reachOf('composite-i'));
    const wide = said(reachOf('composite-i', 20));
    expect(wide.lanes).toBeGreaterThan(usual.lanes);
    expect(limitM(said(reachOf('concrete-box', 12.5, 120)))!).toBeLessThan(
      limitM(said(reachOf('concrete-box')))!,
    );
  });

  it('a frame stands alone, a unit that is continuous has side spans', () => {
    expect(said(reachOf('portal-frame')).ratios).toEqual([1]);
    expect(said(reachOf('slab')).ratios).toEqual([0.78, 1, 0.78]);
  });

  it('says why where there is nothing to say: a deck without room for a lane, a form that is not sized', () => {
    expect(reachOf('slab', 3)).toMatchObject({ because: 'a deck 3 m wide holds no lane between barriers' });
    expect(reachOf('suspension')).toMatchObject({ because: 'it is not sized by this tool' });
  });
});

describe('reachFigure(reaches, path)', () => {
  const reach = said(reachOf('slab', 12.5, 800));

  it('the limiting span comes from the span that failed, and every input can be asked in turn', () => {
    const figure = reachFigure([reach], reachPath('slab', 'spanM'));
    expect(figure.value).toBe(limitM(reach));
    expect(figure.because.formula).toContain(reach.fails!.check.label);
    const seen = new Set<string>();
    const ask = (path: string): void => {
      if (seen.has(path)) return;
      seen.add(path);
      const { because, usedBy, value } = reachFigure([reach], path);
      for (const input of because.inputs) {
        expect(reachFigure([reach], input.path)).toMatchObject({ value: input.value, label: input.label });
        expect(reachFigure([reach], input.path).usedBy).toContain(path);
        ask(input.path);
      }
      expect(value).not.toBeNaN();
      for (const user of usedBy) ask(user);
    };
    ask(figure.path);
    expect([...seen].sort()).toEqual(
      [
        'carries/depthM',
        'carries/ownWeightShare',
        'carries/spanM',
        'carries/utilisation',
        'fails/depthM',
        'fails/ownWeightShare',
        'fails/utilisation',
        'lanes',
        'radiusM',
        'spanM',
        'widthM',
      ].map((name) => reachPath('slab', name)),
    );
    expect(reachFigure([reach], reachPath('slab', 'carries/utilisation')).value).toBeLessThanOrEqual(1);
    expect(reachFigure([reach], reachPath('slab', 'fails/utilisation')).value).toBeGreaterThan(1);
  });

  it('throws where there is no such figure', () => {
    for (const path of ['reach/truss/spanM', 'reach/slab/none', 'options/1/cost'])
      expect(() => reachFigure([reach], path)).toThrow(RangeError);
  });
});
