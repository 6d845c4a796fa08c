import { PlainPage } from './plain-page';

/** What is kept, why and for how long, in plain words. */
export const PrivacyScreen = () => (
  <PlainPage
    title="What we keep, and why"
    sections={[
      { heading: 'This is a demo', paragraphs: ['The contractor, the towns and the prices here are invented. Do not type real details into a demo.'] },
      { heading: 'Your answers', paragraphs: ['We keep what you answer about the home, the car and the panel, so that we can price the job and you can come back to it. You need no account and we ask your name only when you book or ask for a visit.', 'One cookie holds your place. It is not used to follow you, and nothing of yours is kept in the browser beside it.'] },
      { heading: 'Your photos', paragraphs: ['The electrician reads them to check your answers. Before a photo is kept, we draw it anew: the place it was taken, the time and the phone are gone from it. Only you and our staff can open it.'] },
      { heading: 'Your name, e-mail, phone and street', paragraphs: ['We use them for this job and for nothing else, in the ways you ticked. We sell nothing to anyone.', 'You pay on the payment provider’s page. We never see your card.'] },
      { heading: 'How long', paragraphs: ['Answers stay until you ask us to delete them: write or call. Records of a booked job are kept as long as the law asks of a contractor.'] },
    ]}
  />
);
