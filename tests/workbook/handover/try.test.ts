import { writeFileSync } from 'node:fs';
import { demoWorkbook } from '../../../workbook/demo/demo';
import { calculate } from '../../../workbook/engine/univer/headless';
import { createWorkbook } from '../../../workbook/xlsx/create';
import { handOver } from '../../../workbook/handover/handOver';
import { otherEngines, shownIn } from './otherEngines';
test('x', async () => {
  const b = demoWorkbook();
  const bytes = createWorkbook(b, await calculate(b));
  writeFileSync('/tmp/demo.xlsx', bytes);
  const r = await handOver(bytes, { version: '0', date: '2026-12-01' });
  writeFileSync('/tmp/demo-out.xlsx', r.bytes);
  console.log(
    r.formulas
      .map(
        (f) => f.sheet + ' ' + f.original.slice(0, 60) + ' :: ' + (f.said ? 'LIVE ' + f.said[0][0] : f.why),
      )
      .join('\n'),
  );
  const ours = shownIn(r.bytes);
  const out: string[] = [];
  for (const e of otherEngines) {
    const s = e.recalculated(r.bytes);
    let n = 0;
    for (const [k, v] of ours) {
      const w = s.get(k) ?? null;
      const same =
        typeof v === 'number' && typeof w === 'number'
          ? Math.abs(v - w) <= 1e-9 * Math.abs(v)
          : JSON.stringify(v ?? '') === JSON.stringify(w ?? '');
      if (!same && n++ < 30) out.push(`${e.name} ${k} ${JSON.stringify(v)} / ${JSON.stringify(w)}`);
    }
    out.push(`${e.name}: ${n} off of ${ours.size}`);
  }
  console.log(out.join('\n'));
}, 120000);
