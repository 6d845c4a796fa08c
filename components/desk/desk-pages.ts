/** Every page of the desk, as one piece: see desk-later.tsx. */
export { DeskLayout } from './desk-layout';
export { LeadScreen } from './lead-screen';
export { LeadsScreen } from './leads-screen';
export { SignInScreen } from './sign-in-screen';
