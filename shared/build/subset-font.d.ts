/** The part of subset-font that is used here; it ships no types of its own. */
declare module 'subset-font' {
  export interface SubsetOptions {
    readonly targetFormat: 'woff2' | 'truetype';
    readonly variationAxes?: Readonly<
      Record<string, number | { readonly min: number; readonly max: number }>
    >;
    readonly keepFeatures?: readonly string[];
    readonly noHinting?: boolean;
  }

  export default function subsetFont(
    font: Uint8Array,
    text: string,
    options: SubsetOptions,
  ): Promise<Uint8Array>;
}
