import { meters } from "@cleatwork/calc";
import { randomUUID } from "node:crypto";
import { request } from "node:http";
import { text } from "node:stream/consumers";
import { pipeline } from "node:stream/promises";
import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { aProject, drawingFields, onePixel } from "../../testing/a-project.ts";

const bytesOf = (text: string) => new Uint8Array(Buffer.from(text));

/** Streams a form with one file of so many bytes, without holding it in memory. */
function uploadOf(bytes: number, to: { url: string; cookie: string; origin: string }) {
  const head = '--x\r\ncontent-disposition: form-data; name="file"; filename="huge.png"\r\n\r\n';
  const headers = { cookie: to.cookie, origin: to.origin, "content-type": "multipart/form-data; boundary=x" };
  return new Promise<{ status: number | undefined; body: string }>((resolve, reject) => {
    const sending = request(to.url, { method: "POST", agent: false, headers }, (response) => {
      text(response).then((body) => resolve({ status: response.statusCode, body }), reject);
    });
    sending.on("error", reject);
    const chunk = Buffer.alloc(2 ** 20);
    const form = function* () {
      yield head;
      for (let left = bytes; left > 0; left -= chunk.length) yield chunk.subarray(0, left);
      yield "\r\n--x--\r\n";
    };
    pipeline(form(), sending).catch(reject);
  });
}

describe("drawings", () => {
  test("come back byte for byte, and cannot run anything", async () => {
    const { estimator } = await foundCompany();
    const { params, uploadDrawing } = await aProject(estimator);
    const drawing = await uploadDrawing(onePixel, "Blatt 1 – Übersicht.png");
    expect(drawing).toMatchObject({ mediaType: "image/png", pageCount: 1, byteCount: onePixel.length });
    const { status, headers, bytes } = await estimator.download("getDrawingFile", {
      params: { ...params, drawingId: drawing.id },
    });
    expect(status).toBe(200);
    expect(Buffer.from(bytes).equals(Buffer.from(onePixel))).toBe(true);
    expect(headers.get("content-type")).toBe("image/png");
    expect(headers.get("x-content-type-options")).toBe("nosniff");
    expect(headers.get("content-security-policy")).toMatch(/sandbox/);
    expect(headers.get("content-disposition")).toContain(encodeURIComponent("Blatt 1 – Übersicht.png"));
  });

  test("are listed with who uploaded them", async () => {
    const { estimator } = await foundCompany();
    const { params, uploadDrawing } = await aProject(estimator);
    const drawing = await uploadDrawing();
    expect((await estimator.ok("listDrawings", { params })).items).toEqual([drawing]);
    expect(drawing).toMatchObject({ ...drawingFields, uploadedBy: estimator.name });
  });

  test("are told by content, not by name", async () => {
    const { estimator } = await foundCompany();
    const { params } = await aProject(estimator);
    const file = { bytes: bytesOf("<html><script>alert(1)</script></html>"), name: "plan.pdf" };
    expect(await estimator.refused("uploadDrawing", { params, body: drawingFields, file })).toMatchObject({
      status: 415,
      type: "/problems/file-type-refused",
      errors: [{ pointer: "/file", code: "other-type" }],
    });
    expect((await estimator.ok("listDrawings", { params })).items).toEqual([]);
  });

  test("that were cut off are refused", async () => {
    const { estimator } = await foundCompany();
    const { params } = await aProject(estimator);
    const file = { bytes: bytesOf("%PDF-1.7\n1 0 obj << /Type /Page >>"), name: "plan.pdf" };
    expect(await estimator.refused("uploadDrawing", { params, body: drawingFields, file })).toMatchObject({
      status: 415,
      errors: [{ code: "damaged" }],
    });
  });

  test("over 50 MB are refused", async () => {
    const { estimator, server, slug } = await foundCompany();
    const { params } = await aProject(estimator);
    const { status, body } = await uploadOf(50 * 2 ** 20 + 1, {
      url: `${server.url}/api/companies/${slug}/projects/${params.projectId}/drawings`,
      cookie: estimator.cookie,
      origin: server.deps.config.publicUrl,
    });
    expect(status).toBe(413);
    expect(JSON.parse(body)).toMatchObject({ type: "/problems/file-too-large" });
  });

  test("without a sheet number or a file are refused with the field named", async () => {
    const { estimator } = await foundCompany();
    const { params } = await aProject(estimator);
    const file = { bytes: onePixel, name: "plan.png" };
    const body = { ...drawingFields, sheetNumber: "" };
    expect(await estimator.refused("uploadDrawing", { params, body, file })).toMatchObject({
      status: 422,
      errors: [{ pointer: "/sheetNumber", value: "" }],
    });
    expect(await estimator.refused("uploadDrawing", { params, body: drawingFields, form: true })).toMatchObject({
      status: 422,
      errors: [{ pointer: "/file", code: "missing" }],
    });
  });

  test("under a level stay until they are taken out there", async () => {
    const { estimator } = await foundCompany();
    const { params, uploadDrawing } = await aProject(estimator);
    const drawing = await uploadDrawing();
    const [level] = (await estimator.ok("getLayout", { params })).records;
    if (level?.kind !== "level") throw new Error("a new project has a level");
    const underlay = {
      drawingId: drawing.id,
      page: 1,
      metersPerUnit: 0.03,
      x_m: meters(0),
      y_m: meters(0),
      rotation_rad: 0,
    };
    const under = { ...level, underlay };
    const save = (baseSequence: number, before: typeof level, after: typeof level) =>
      estimator.ok("saveLayout", {
        params,
        body: {
          batchId: randomUUID(),
          baseSequence,
          sets: [{ label: "Underlay", changes: [{ id: level.id, before, after }] }],
        },
      });
    await save(1, level, under);
    const drawingParams = { ...params, drawingId: drawing.id };
    expect((await estimator.refused("deleteDrawing", { params: drawingParams })).status).toBe(409);
    await save(2, under, level);
    await estimator.ok("deleteDrawing", { params: drawingParams });
    expect((await estimator.ok("listDrawings", { params })).items).toEqual([]);
    expect((await estimator.refused("deleteDrawing", { params: drawingParams })).status).toBe(404);
  });

  test("of another company are not there", async () => {
    const [ours, theirs] = [await foundCompany(), await foundCompany()];
    const { params, uploadDrawing } = await aProject(ours.estimator);
    const drawingParams = { ...params, drawingId: (await uploadDrawing()).id };
    expect((await theirs.owner.download("getDrawingFile", { params: drawingParams })).status).toBe(404);
    expect((await theirs.owner.refused("deleteDrawing", { params: drawingParams })).status).toBe(404);
    const file = { bytes: onePixel, name: "plan.png" };
    expect((await theirs.owner.refused("uploadDrawing", { params, body: drawingFields, file })).status).toBe(404);
  });
});
