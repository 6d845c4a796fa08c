import { Redirect } from 'expo-router';
import { useState } from 'react';
import { firstOpenStep } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useIntake } from '../api/use-intake';
import { useQuote } from '../api/use-quote';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Failure } from './failure';
import { NoIntake } from './no-intake';
import { PriceView } from './price-view';

/** The frozen price of this browser's intake: options, lines, the deposit. Without one, the way to it. */
export function PriceScreen() {
  const intake = useIntake();
  const open = intake.data ? firstOpenStep(intake.data.answers) : null;
  const ready = open?.id === 'price' && intake.data?.stage !== 'visit-asked';
  const quote = useQuote(ready ? intake.data?.version : undefined);
  const [chosen, choose] = useState<string | null>(null);

  if (intake.data && open && open.id !== 'price') return <Redirect href={`/quote/${open.id}`} />;
  if (intake.data?.stage === 'paid') return <Redirect href="/quote/deposit" />;
  if (intake.data?.stage === 'visit-asked') return <Redirect href="/quote/visit" />;
  if (isProblem(intake.error, 401, 404, 410)) return <NoIntake />;
  if (quote.data?.document.outcome === 'visit') return <Redirect href="/quote/visit" />;
  if (quote.data) {
    const { document } = quote.data;
    const option = document.options.find((entry) => entry.id === (chosen ?? document.recommendedOptionId)) ?? document.options[0];
    if (option) return <PriceView document={document} option={option} onChoose={choose} />;
  }
  const error = intake.error ?? quote.error;
  return (
    <Page title="Your price">
      {error ? <Failure error={error} onRetry={() => void (intake.error ? intake.refetch() : quote.refetch())} /> : <Skeleton label="Working out your price" lines={8} />}
    </Page>
  );
}
