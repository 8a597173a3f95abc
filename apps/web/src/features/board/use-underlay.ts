import { endpoints, type CompanySlug, type Drawing, type ProjectId, type Underlay } from "@cleatwork/contracts";
import { useQuery } from "@tanstack/react-query";
import { apiFile } from "../../lib/http.ts";
import type { PaintedUnderlay } from "./canvas/paint-ground.ts";

/** A page is drawn this sharp: enough to read a room's name when zoomed in, and no more memory than a photo. */
const LONGEST_SIDE = 3600;

interface Page {
  readonly image: CanvasImageSource;
  readonly width: number;
  readonly height: number;
  /** Pixels of the picture for one unit of the page (a point of a PDF, a pixel of an image). */
  readonly pixelsPerUnit: number;
}

/** The level's drawing page, ready to be painted. */
export function useUnderlay(
  company: CompanySlug,
  projectId: ProjectId,
  underlay: Underlay | null,
  drawings: readonly Drawing[],
): { readonly painted: PaintedUnderlay | null; readonly failed: boolean } {
  const drawing = underlay ? drawings.find(({ id }) => id === underlay.drawingId) : undefined;
  const { data, isError } = useQuery({
    queryKey: [company, "projects", projectId, "drawing-page", drawing?.id, underlay?.page],
    enabled: drawing !== undefined && underlay !== null,
    staleTime: Infinity,
    queryFn: async ({ signal }): Promise<Page> => {
      if (!drawing || !underlay) throw new Error("there is no drawing to read");
      const file = await apiFile(endpoints.getDrawingFile, {
        params: { company, projectId, drawingId: drawing.id },
        signal,
      });
      return drawing.mediaType === "application/pdf" ? pdfPage(file, underlay.page) : picture(file);
    },
  });
  if (!data || !underlay) return { painted: null, failed: isError };
  return {
    failed: false,
    painted: {
      image: data.image,
      width: data.width,
      height: data.height,
      metersPerPixel: underlay.metersPerUnit / data.pixelsPerUnit,
      x_m: underlay.x_m,
      y_m: underlay.y_m,
      rotation_rad: underlay.rotation_rad,
    },
  };
}

async function picture(file: Blob): Promise<Page> {
  const image = await createImageBitmap(file);
  return { image, width: image.width, height: image.height, pixelsPerUnit: 1 };
}

async function pdfPage(file: Blob, number: number): Promise<Page> {
  const { openPdf } = await import("./pdf.ts");
  const task = openPdf(await file.arrayBuffer());
  try {
    const page = await (await task.promise).getPage(number);
    const natural = page.getViewport({ scale: 1 });
    const pixelsPerUnit = LONGEST_SIDE / Math.max(natural.width, natural.height);
    const viewport = page.getViewport({ scale: pixelsPerUnit });
    const canvas = document.createElement("canvas");
    canvas.width = Math.round(viewport.width);
    canvas.height = Math.round(viewport.height);
    await page.render({ canvas, viewport }).promise;
    return { image: canvas, width: canvas.width, height: canvas.height, pixelsPerUnit };
  } finally {
    void task.destroy();
  }
}
