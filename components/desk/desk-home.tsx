import { Redirect } from 'expo-router';

/** The desk opens on its leads. */
export const DeskHome = () => <Redirect href="/desk/leads" />;
