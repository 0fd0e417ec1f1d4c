import type { DoubtBody } from '@leeside/contracts/field-schemas';
import type { ReactNode } from 'react';

type Weight = 'did' | 'cite' | 'caution' | DoubtBody['weight'];

const looks: Record<Weight, { rule: string; word: string; name: string }> = {
  'did': { rule: 'border-edge', word: 'text-faded', name: '' },
  'cite': { rule: 'border-edge border-dotted', word: 'text-faded', name: 'Source' },
  'caution': { rule: 'border-copper border-s-4', word: 'text-copper', name: 'Caution' },
  'note': { rule: 'border-slate', word: 'text-slate', name: 'Note' },
  'doubt': { rule: 'border-ochre', word: 'text-ochre', name: 'Doubt' },
  'stops signing': { rule: 'border-plum border-double border-s-[5px]', word: 'text-plum', name: 'Stops signing' },
};

/** One thing that Leeside did, doubts or cites. */
export function Remark({ weight = 'did', children }: { weight?: Weight; children: ReactNode }) {
  const look = looks[weight];
  return (
    <li className={`border-s-2 ps-3 text-sm ${look.rule}`}>
      {look.name && <strong className={`block text-xs ${look.word}`}>{look.name}</strong>}
      <span className={weight === 'did' || weight === 'cite' ? 'text-faded' : ''}>{children}</span>
    </li>
  );
}

const weights: readonly DoubtBody['weight'][] = ['note', 'doubt', 'stops signing'];

/** The gravest first. */
export function DoubtRemarks({ doubts }: { doubts: readonly DoubtBody[] }) {
  return [...doubts].sort((a, b) => weights.indexOf(b.weight) - weights.indexOf(a.weight)).map((doubt) => (
    <Remark key={`${doubt.code} ${String(doubt.line ?? '')} ${doubt.message}`} weight={doubt.weight}>
      {doubt.message}{doubt.line === undefined ? '' : ` (line ${String(doubt.line)})`}
    </Remark>
  ));
}

/** The right-hand column beside one passage; under it where there is no room. */
export function Remarks({ about, children }: { about: string; children: ReactNode }) {
  return (
    <aside aria-label={`Remarks on ${about}`} className="mt-4 wide:mt-0">
      <ul className="flex list-none flex-col gap-3">{children}</ul>
    </aside>
  );
}
