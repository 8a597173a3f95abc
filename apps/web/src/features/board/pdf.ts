/** pdf.js, loaded only where a drawing is a PDF. */
import * as pdfjs from "pdfjs-dist";
import workerUrl from "pdfjs-dist/build/pdf.worker.min.mjs?url";

pdfjs.GlobalWorkerOptions.workerSrc = workerUrl;

export const openPdf = (data: ArrayBuffer) => pdfjs.getDocument({ data, isEvalSupported: false });
