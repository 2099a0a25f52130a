/** A typeface's address, as the bundler gives it on the web. */
declare module '*.ttf' {
  const address: string;
  export = address;
}
