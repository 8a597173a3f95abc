/** Archivo, embedded in every PDF: whole TrueType files, read once. (SIL Open Font License 1.1.) */
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";

const require = createRequire(import.meta.url);
const read = (path: string): Buffer => readFileSync(require.resolve(`@expo-google-fonts/${path}`));

export const FONTS = ["regular", "medium", "bold", "narrow"] as const;
export type FontName = (typeof FONTS)[number];

const files: Readonly<Record<FontName, string>> = {
  regular: "archivo/400Regular/Archivo_400Regular.ttf",
  medium: "archivo/600SemiBold/Archivo_600SemiBold.ttf",
  bold: "archivo/700Bold/Archivo_700Bold.ttf",
  narrow: "archivo-narrow/400Regular/ArchivoNarrow_400Regular.ttf",
};

let cached: Readonly<Record<FontName, Buffer>> | null = null;

export function fontFiles(): Readonly<Record<FontName, Buffer>> {
  cached ??= Object.fromEntries(FONTS.map((name) => [name, read(files[name])])) as Record<FontName, Buffer>;
  return cached;
}
