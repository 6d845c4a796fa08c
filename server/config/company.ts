/** The contractor. Invented for the demo: whoever runs this for a real one puts their own here. */
export const company = {
  name: 'Alder & Finch Electric',
  phone: '555-0142',
  licence: 'EL-00417',
  postalAddress: '12 Demo Street, Harrow Bend, XX 00017',
  email: 'office@example.com',
} as const;
