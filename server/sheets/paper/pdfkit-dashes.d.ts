/** The library takes any number of dashes; its types know one length only. */
declare namespace PDFKit.Mixins {
  interface PDFVector {
    dash(lengths: readonly number[], option: { phase?: number }): this;
  }
}
