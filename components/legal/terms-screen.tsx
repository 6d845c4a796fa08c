import { PlainPage } from './plain-page';

/** What a price, a deposit and a cancellation mean, in plain words. */
export const TermsScreen = () => (
  <PlainPage
    title="Terms, in plain words"
    sections={[
      { heading: 'This is a demo', paragraphs: ['The contractor is invented, and the payment page charges no card. A real contractor puts its own terms here.'] },
      { heading: 'The price', paragraphs: ['A range says what the job costs with what we know. Each line has its reason. It is held until the day that stands beside it.', 'A licensed electrician checks your answers and sends one firm price. If that is above the range, you may say no and get the whole deposit back.', 'Work outside the firm price is never done without asking you first.'] },
      { heading: 'The deposit', paragraphs: ['It comes off the bill. All of it comes back if you cancel before you pick a day, or within three business days of paying. Saturday counts as a business day; Sundays and federal holidays do not.', 'We start no work within those three days.'] },
      { heading: 'The rules we follow', paragraphs: ['We design to the National Electrical Code in the edition that stands with your price. Your local code, the permit office and the licensed electrician decide.', 'We pull the permit and meet the inspector.'] },
      { heading: 'Your safety', paragraphs: ['Never remove the metal cover of the panel. Open the hinged door only.', 'Do not switch any breaker for this. If anything is sparking or smoking, leave the house and call 911.'] },
    ]}
  />
);
