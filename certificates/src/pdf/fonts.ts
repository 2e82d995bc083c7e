import { createRequire } from 'node:module';
import fontkit from '@pdf-lib/fontkit';
import { type PDFDocument, type PDFFont } from 'pdf-lib';
import subsetFont from 'subset-font';
import { type CertificateFonts } from '../certificate.ts';
import { CharacterNotInFonts } from '../errors.ts';

export type Face = keyof CertificateFonts;

/**
 * Where the font files are. The library reads no files: the caller reads these once and passes the
 * bytes to `renderCertificate`.
 */
export function fontFiles(): Record<Face, string> {
  const require = createRequire(import.meta.url);
  return {
    text: require.resolve('@expo-google-fonts/merriweather/400Regular/Merriweather_400Regular.ttf'),
    textBold: require.resolve('@expo-google-fonts/merriweather/700Bold/Merriweather_700Bold.ttf'),
    textItalic:
      require.resolve('@expo-google-fonts/merriweather/400Regular_Italic/Merriweather_400Regular_Italic.ttf'),
    data: require.resolve('@expo-google-fonts/source-sans-3/400Regular/SourceSans3_400Regular.ttf'),
    dataBold:
      require.resolve('@expo-google-fonts/source-sans-3/600SemiBold/SourceSans3_600SemiBold.ttf'),
    number:
      require.resolve('@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-600-normal.woff'),
  };
}

/** Ligatures would make searching and copying the text unreliable. */
const features = { liga: false, clig: false };

const faces: Face[] = ['text', 'textBold', 'textItalic', 'data', 'dataBold', 'number'];

/** Which face lends a letter that another lacks. */
const lenders: Readonly<Record<Face, Face[]>> = {
  text: ['data'],
  textBold: ['dataBold'],
  textItalic: ['data'],
  data: ['text'],
  dataBold: ['textBold'],
  number: ['dataBold', 'textBold'],
};

type LoadedFont = ReturnType<typeof fontkit.create>;

/** One glyph with where it stands, in thousandths of the type size. */
interface Glyph {
  code: string;
  ownAdvance: number;
  advance: number;
  offsetX: number;
  offsetY: number;
}

/** Letters of one face, ready to be shown. */
interface Run {
  face: Face;
  glyphs: Glyph[];
}

export interface TypeSetter {
  /** Sets a line; its letters are then part of the file. */
  runs(line: string, face: Face): Run[];
  /** In thousandths of the type size. */
  widthOf(line: string, face: Face): number;
  fontRefs(): [Face, PDFFont['ref']][];
}

interface CutFont {
  loaded: LoadedFont;
  embedded: PDFFont;
}

/**
 * Embeds just the letters of `text`, in every face.
 *
 * Cut by HarfBuzz first: handed the whole file, pdf-lib's own cutting loses glyphs without a word.
 */
export async function embedFonts(
  document: PDFDocument,
  files: CertificateFonts,
  text: string,
): Promise<TypeSetter> {
  document.registerFontkit(fontkit);
  const cut = {} as Record<Face, CutFont>;
  for (const face of faces) {
    const bytes = await cutFont(files[face], text);
    cut[face] = {
      loaded: fontkit.create(bytes),
      embedded: await document.embedFont(bytes, { subset: true, features }),
    };
  }
  const widths = new Map<string, number>();
  return {
    runs: (line, wanted) =>
      splitByFace(cut, line, wanted).map(({ face, text: part }) => ({
        face,
        glyphs: setGlyphs(cut[face], part),
      })),
    widthOf: (line, wanted) => {
      const key = `${wanted} ${line}`;
      const width =
        widths.get(key) ??
        splitByFace(cut, line, wanted).reduce(
          (sum, { face, text: part }) => sum + widthOf(cut[face].loaded, part),
          0,
        );
      widths.set(key, width);
      return width;
    },
    fontRefs: () => faces.map((face) => [face, cut[face].embedded.ref]),
  };
}

// A space has no outline, and fontkit reads the head of one all the same: past the end of the file
// where the space comes last, so that many names of plain letters could not be measured.
const outlineHead = Buffer.alloc(10);

async function cutFont(file: Uint8Array, text: string): Promise<Buffer> {
  // The A, because a font cut down to no letter at all cannot be read.
  const cut = await subsetFont(Buffer.from(file), `A${text}`, { targetFormat: 'sfnt' });
  return Buffer.concat([cut, outlineHead]);
}

// By whole characters with their accents: a mark is never taken from another face than its letter.
function splitByFace(
  cut: Record<Face, CutFont>,
  line: string,
  wanted: Face,
): { face: Face; text: string }[] {
  const pieces: { face: Face; text: string }[] = [];
  for (const { segment } of new Intl.Segmenter('en').segment(line)) {
    const face = [wanted, ...lenders[wanted]].find((one) => hasAll(cut[one].loaded, segment));
    if (face === undefined) throw new CharacterNotInFonts(segment, line);
    const last = pieces.at(-1);
    if (last?.face === face) last.text += segment;
    else pieces.push({ face, text: segment });
  }
  return pieces;
}

function hasAll(font: LoadedFont, letter: string): boolean {
  return [...letter].every((part) => font.hasGlyphForCodePoint(part.codePointAt(0) ?? 0));
}

function widthOf(font: LoadedFont, text: string): number {
  const { positions } = font.layout(text, features);
  return (positions.reduce((sum, position) => sum + position.xAdvance, 0) * 1000) / font.unitsPerEm;
}

function setGlyphs(font: CutFont, text: string): Glyph[] {
  const { glyphs, positions } = font.loaded.layout(text, features);
  const codes = font.embedded.encodeText(text).asString();
  const scale = 1000 / font.loaded.unitsPerEm;
  return glyphs.map((glyph, index) => ({
    code: codes.slice(index * 4, index * 4 + 4),
    ownAdvance: glyph.advanceWidth * scale,
    advance: (positions[index]?.xAdvance ?? glyph.advanceWidth) * scale,
    offsetX: (positions[index]?.xOffset ?? 0) * scale,
    offsetY: (positions[index]?.yOffset ?? 0) * scale,
  }));
}
