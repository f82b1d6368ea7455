import { Link } from 'react-router-dom';
import type { Cite } from '../../components/assessment/basis-view';
import type { Citation } from './requests/get-part';

/** Leads from a field of the ratings to the datasheet and page where it stands. */
export function citeFrom(citations: readonly Citation[], familyId: number): Cite {
  return function cite(field) {
    const citation = citations.find((each) => each.field === field);
    if (citation === undefined) return undefined;
    return (
      <Link to={`/families/${familyId}#datasheet-${citation.datasheet.id}`}>
        {citation.datasheet.title}, page {citation.page}
      </Link>
    );
  };
}
