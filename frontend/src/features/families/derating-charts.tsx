import { chakra } from '@chakra-ui/react';
import type { DeratingCurve } from '@resistry/engineering/ratings/ratings';
import { DeratingChart } from '../../components/charts/derating-chart';
import type { FamilySize } from './requests/family-revision';
import { sizeWords } from './size-words';

interface SharedCurve {
  /** W */
  ratedDissipation: number;
  curve: DeratingCurve;
  /** Sizes and modes that share it. */
  names: string[];
}

/** Sizes that share curve and rated dissipation share a drawing. */
function sharedCurves(sizes: readonly FamilySize[]): SharedCurve[] {
  const shared = new Map<string, SharedCurve>();
  for (const { size, modes } of sizes) {
    for (const { name, ratings } of modes) {
      const { ratedDissipation, derating } = ratings;
      if (ratedDissipation === undefined || derating === undefined) continue;
      const key = JSON.stringify([ratedDissipation, derating]);
      const words = modes.length === 1 ? sizeWords(size) : `${sizeWords(size)} ${name}`;
      const known = shared.get(key);
      if (known === undefined) shared.set(key, { ratedDissipation, curve: derating, names: [words] });
      else known.names.push(words);
    }
  }
  return [...shared.values()];
}

const Grid = chakra('div', {
  base: { display: 'grid', gap: 6, gridTemplateColumns: 'repeat(auto-fill, minmax(min(20rem, 100%), 1fr))' },
});

/** The derating curves of a family; what states none is in the table as not stated. */
export function DeratingCharts({ sizes }: { sizes: readonly FamilySize[] }) {
  const curves = sharedCurves(sizes);
  if (curves.length === 0) {
    return (
      <p className="not-stated">
        No size states both a rated dissipation and a derating curve, so there is nothing to draw.
      </p>
    );
  }
  return (
    <Grid>
      {curves.map(({ ratedDissipation, curve, names }) => (
        <div key={names.join(' ')}>
          <chakra.h3 fontSize="sm" mb={1}>
            {names.join(', ')}
          </chakra.h3>
          <DeratingChart ratedDissipation={ratedDissipation} curve={curve} />
        </div>
      ))}
    </Grid>
  );
}
