import { chakra } from '@chakra-ui/react';
import { Button } from '../../../components/button';
import { Empty } from '../../../components/states';
import { checkWords } from '../../../wording/check-words';
import type { DutyText } from '../duty/duty-text';
import { readyRelaxations } from '../ledger/relaxation-words';
import type { ChangeDuty } from '../panel/change-duty';
import type { SearchAnswer } from '../requests/search-parts';

const count = new Intl.NumberFormat('en');
const mostOffered = 4;

export interface NothingMeetsProps {
  answer: SearchAnswer;
  duty: DutyText;
  /** The list is narrowed to some of the catalogue. */
  narrowed: boolean;
  onChange: ChangeDuty;
  onShowUnrated: () => void;
  onWithoutFilters: () => void;
}

/** Which check stands in the way most, said by what would be left without it. */
function obstacle({ knockouts }: SearchAnswer): string {
  const [worst] = [...knockouts].sort((first, second) => second.removesAlone - first.removesAlone);
  if (worst === undefined || worst.removes === 0) return 'No part of the catalogue was left to look at.';
  const check = checkWords[worst.check].toLowerCase();
  const alone = worst.removesAlone;
  return alone > 0
    ? `Most stand against ${check}: ${count.format(alone)} ${alone === 1 ? 'part fails' : 'parts fail'} it and nothing else.`
    : 'Every part fails two checks or more, so one change may not be enough.';
}

/** No part is left: what removes them, and which smallest change of the duty would bring some back. */
export function NothingMeets(props: NothingMeetsProps) {
  const { answer, duty, narrowed, onChange, onShowUnrated, onWithoutFilters } = props;
  const offers = readyRelaxations(answer.relaxations, duty)
    .sort((first, second) => second.gains - first.gains)
    .slice(0, mostOffered);
  return (
    <Empty title="No part meets all of this">
      {obstacle(answer)}
      {narrowed && ' The filters leave only some of the catalogue.'}
      <chakra.span display="grid" gap={2} justifyItems="start" mt={3}>
        {offers.map(({ words, gains, relaxed }) => (
          <Button key={words} onClick={() => onChange(relaxed)}>
            {words} brings {count.format(gains)}
          </Button>
        ))}
        {narrowed && <Button onClick={onWithoutFilters}>Search the whole catalogue</Button>}
        {answer.unrated > 0 && (
          <Button onClick={onShowUnrated}>
            Show {count.format(answer.unrated)} that cannot be told for lack of data
          </Button>
        )}
      </chakra.span>
    </Empty>
  );
}
