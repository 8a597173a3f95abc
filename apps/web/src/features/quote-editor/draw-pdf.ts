/** Draws the pages of a PDF as pictures, named for those who cannot see them. Loaded only beside a quote. */
import * as pdfjs from "pdfjs-dist";
import workerUrl from "pdfjs-dist/build/pdf.worker.min.mjs?url";

pdfjs.GlobalWorkerOptions.workerSrc = workerUrl;

export async function drawPdf(data: ArrayBuffer, width: number): Promise<HTMLCanvasElement[]> {
  const task = pdfjs.getDocument({ data, isEvalSupported: false });
  try {
    const document = await task.promise;
    const pages: HTMLCanvasElement[] = [];
    for (let number = 1; number <= document.numPages; number++) {
      const page = await document.getPage(number);
      const natural = page.getViewport({ scale: 1 });
      const viewport = page.getViewport({ scale: (2 * width) / natural.width });
      const canvas = window.document.createElement("canvas");
      canvas.width = Math.round(viewport.width);
      canvas.height = Math.round(viewport.height);
      canvas.className = "w-full border border-line bg-paper";
      canvas.setAttribute("role", "img");
      canvas.setAttribute("aria-label", `Page ${number} of ${document.numPages}`);
      await page.render({ canvas, viewport }).promise;
      pages.push(canvas);
    }
    return pages;
  } finally {
    void task.destroy();
  }
}
