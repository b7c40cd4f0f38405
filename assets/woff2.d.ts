/** Metro turns an imported face into the number of its asset. */
declare module '*.woff2' {
  const asset: number;
  export = asset;
}
