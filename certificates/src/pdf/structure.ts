import { PDFHexString, type PDFDocument, type PDFPage, PDFName, type PDFRef } from 'pdf-lib';

/** One element of what a screen reader reads, in reading order. */
export interface Element {
  role: 'P' | 'H1' | 'H2' | 'Figure';
  markedContent: number;
  /** What a figure shows. */
  alternative?: string;
}

/** Ties the page's marked content to a structure tree (ISO 32000-1, 14.7). */
export function addStructure(document: PDFDocument, page: PDFPage, elements: Element[]): void {
  const { context } = document;
  const treeRef = context.nextRef();
  const documentRef = context.nextRef();
  const refs: PDFRef[] = elements.map(({ role, markedContent, alternative }) =>
    context.register(
      context.obj({
        Type: 'StructElem',
        S: role,
        P: documentRef,
        Pg: page.ref,
        K: markedContent,
        ...(alternative === undefined ? {} : { Alt: PDFHexString.fromText(alternative) }),
      }),
    ),
  );
  const byContent = elements
    .map(({ markedContent }, index) => ({ markedContent, ref: refs[index] }))
    .toSorted((one, other) => one.markedContent - other.markedContent)
    .flatMap(({ ref }) => (ref === undefined ? [] : [ref]));
  context.assign(
    documentRef,
    context.obj({ Type: 'StructElem', S: 'Document', P: treeRef, K: refs }),
  );
  context.assign(
    treeRef,
    context.obj({
      Type: 'StructTreeRoot',
      K: [documentRef],
      ParentTree: { Nums: [0, byContent] },
      ParentTreeNextKey: 1,
    }),
  );
  document.catalog.set(PDFName.of('StructTreeRoot'), treeRef);
  document.catalog.set(PDFName.of('MarkInfo'), context.obj({ Marked: true }));
  page.node.set(PDFName.of('StructParents'), context.obj(0));
  page.node.set(PDFName.of('Tabs'), PDFName.of('S'));
}
