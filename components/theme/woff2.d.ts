/** The address of a font file. */
declare module '*.woff2' {
  const address: string;
  export default address;
}
