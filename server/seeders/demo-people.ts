/** Invented people of the demo: names of nobody, streets of no town. */
export const demoPeople = [
  'Maren Oakes', 'Ione Vasari', 'Tamsin Roe', 'Wren Castellane', 'Dov Lindqvist', 'Piet Amadi', 'Ola Ferrante', 'Hesper Lunn', 'Bram Okafor', 'Sunniva Hart',
  'Jory Bellamy', 'Anneke Dray', 'Teo Marchetti', 'Saoirse Quill', 'Idris Fennimore', 'Lotte Abara', 'Caspian Wolde', 'Nell Ardizzone', 'Rufus Tamm', 'Ysolde Kerr',
  'Emeka Strand', 'Petra Vauquelin', 'Linus Orme', 'Zadie Holloway', 'Kit Barroso', 'Marguerite Sorn', 'Otis Pellgrin', 'Freya Nakashi', 'Silas Bonaventure', 'Nadia Threlkeld',
  'Gideon Ashe', 'Perpetua Lowe', 'Hugo Mirza', 'Clementine Rask', 'Amos Delacour', 'Vesna Holt', 'Barnaby Ito', 'Ottoline Frye', 'Ezra Montague', 'Signe Calloway', 'Lionel Pask', 'Aurelia Vance',
] as const;

export const demoStreets = ['Tanner’s Row', 'Copper Beech Lane', 'Millrace Road', 'Old Orchard Way', 'Lantern Street', 'Quarry Hill', 'Heron Close', 'Saltbox Lane', 'Weaver’s Yard', 'Larkspur Court'] as const;

/** "maren.oakes@example.com" */
export const demoEmail = (name: string): string => `${name.toLowerCase().replaceAll(' ', '.')}@example.com`;

/** Numbers that are kept for fiction: 555-0100 to 555-0199. */
export const demoPhone = (index: number): string => `555-01${String(10 + (index % 80)).padStart(2, '0')}`;
