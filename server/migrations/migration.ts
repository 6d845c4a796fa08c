/** One step of the database's shape. `down` takes back exactly what `up` did. SQL, because constraints are the last guard of the data. */
export interface Migration {
  readonly name: string;
  readonly up: string;
  readonly down: string;
}
