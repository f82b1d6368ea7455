import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Question } from '../question';
import { type SearchAnswer, searchPage } from './search-parts';

/** An answer with the question that it answers. */
export interface Answered {
  answer: SearchAnswer;
  question: Question;
}

export interface Search {
  /** The latest answer there is: to this question, or to an earlier one while this is on its way. */
  latest: Answered | undefined;
  waiting: boolean;
  error: Error | null;
  retry: () => void;
}

/** Asks the catalogue and keeps the old answer whole until the new one is there. */
export function useSearch(question: Question): Search {
  const [latest, setLatest] = useState<Answered>();
  const { data, error, isError, refetch } = useQuery(searchPage(question.request, 1));
  const answered = data !== undefined && question.request !== undefined;
  if (answered && (latest?.answer !== data || latest.question !== question))
    setLatest({ answer: data, question });
  return {
    latest,
    waiting: question.request !== undefined && data === undefined && !isError,
    error,
    retry: () => void refetch(),
  };
}
