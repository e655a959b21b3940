import { agreement, shareWithin, type Agreement } from './agreement.ts';
import { evidenceKinds, type EvidenceKind } from './evidenceRow.ts';
import type { EvidenceLine } from './runEvidence.ts';

/** What quantities are to reach: the median deviation, and the share of figures within a limit. */
export interface Aim {
  readonly medianAtMost: number;
  readonly shareAtLeast: number;
  readonly limit: number;
}

/** Designed examples and built bridges have aims; mechanics is exact but for its print, and laws decide nothing. */
const aims: Readonly<Partial<Record<EvidenceKind, Aim>>> = {
  designed: { medianAtMost: 0.1, shareAtLeast: 0.9, limit: 0.25 },
  built: { medianAtMost: 0.15, shareAtLeast: 0.85, limit: 0.3 },
};

/** How the lines of one kind stand, and whether they reach its aim. */
export interface KindSummary extends Agreement {
  readonly kind: EvidenceKind;
  readonly aim: (Aim & { readonly share: number; readonly met: boolean }) | null;
}

/** By kind, those without a line left out. */
export function kindSummaries(lines: readonly EvidenceLine[]): KindSummary[] {
  return evidenceKinds.flatMap((kind) => {
    const own = lines.filter((line) => line.kind === kind);
    if (own.length === 0) return [];
    const stands = agreement(own);
    return [{ kind, ...stands, aim: aimOf(kind, own, stands) }];
  });
}

function aimOf(kind: EvidenceKind, lines: readonly EvidenceLine[], stands: Agreement): KindSummary['aim'] {
  const aim = aims[kind];
  if (aim === undefined) return null;
  const share = shareWithin(lines, aim.limit);
  return { ...aim, share, met: stands.medianDeviation <= aim.medianAtMost && share >= aim.shareAtLeast };
}
