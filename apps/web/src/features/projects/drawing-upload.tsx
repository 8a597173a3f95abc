import { drawingFields, endpoints, type ProjectId } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useRef, useState } from "react";
import type { z } from "zod";
import { bytesText } from "../../lib/format/bytes.ts";
import { todayIn } from "../../lib/format/dates.ts";
import { api } from "../../lib/http.ts";
import { HttpProblem } from "../../lib/problem.ts";
import { classNames } from "../../lib/class-names.ts";
import { Button } from "../../ui/button.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { DrawingIcon } from "../../ui/icons/icon.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { sheetFromFileName } from "./sheet-name.ts";
import { projectQueries } from "./projects.queries.ts";

type Values = z.input<typeof drawingFields>;
const { Text } = formParts<Values>();
const TYPES = "application/pdf,image/png,image/jpeg";

export function DrawingUpload({
  projectId,
  open,
  onOpenChange,
}: {
  projectId: ProjectId;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Upload a drawing">
      <UploadForm projectId={projectId} onDone={() => onOpenChange(false)} />
    </Dialog>
  );
}

function UploadForm({ projectId, onDone }: { projectId: ProjectId; onDone: () => void }) {
  const { slug, company } = useSession();
  const cache = useQueryClient();
  const [file, setFile] = useState<File | null>(null);
  const [missed, setMissed] = useState(false);
  const [today] = useState(() => todayIn(company.timeZone, Date.now()));
  const contractForm = useContractForm({
    schema: drawingFields,
    initial: { sheetNumber: "", title: "", revision: "", datedOn: today },
    save: (body) => {
      if (!file) throw new Error("Choose a file first.");
      return api(endpoints.uploadDrawing, { params: { company: slug, projectId }, body, file });
    },
    onSaved: async (drawing) => {
      notify(`${drawing.sheetNumber} is uploaded.`, { severity: "good" });
      onDone();
      await cache.invalidateQueries(projectQueries.drawings(slug, projectId));
    },
  });
  const { form } = contractForm;

  const take = (chosen: File) => {
    setFile(chosen);
    setMissed(false);
    const guess = sheetFromFileName(chosen.name);
    for (const key of ["sheetNumber", "title", "revision"] as const) {
      if (guess[key] && form.getValues(key) === "") form.setValue(key, guess[key], { shouldDirty: true });
    }
  };
  const problem = contractForm.problem;
  const refused =
    problem instanceof HttpProblem && /^file-/.test(problem.code) ? problem.detail || problem.title : null;
  return (
    <ContractFormView
      contractForm={{
        ...contractForm,
        problem: refused ? null : problem,
        submit: (event) => {
          if (file) return contractForm.submit(event);
          event?.preventDefault();
          setMissed(true);
          return Promise.resolve();
        },
      }}
      actions={
        <DialogActions>
          <Button onClick={onDone}>Cancel</Button>
          <Button type="submit" rank="primary" busy={contractForm.busy}>
            {contractForm.busy ? "Uploading" : "Upload"}
          </Button>
        </DialogActions>
      }
    >
      <FileDrop file={file} onFile={take} error={refused ?? (missed && !file ? "Needed: a PDF, PNG or JPEG." : null)} />
      <div className="grid grid-cols-2 gap-3">
        <Text name="sheetNumber" label="Sheet number" placeholder="M-101" autoComplete="off" />
        <Text name="revision" label="Revision" autoComplete="off" />
      </div>
      <Text name="title" label="Title" autoComplete="off" />
      <Text name="datedOn" label="Dated" type="date" />
    </ContractFormView>
  );
}

/** Choose or drop. The input itself is what keys and readers use; the box around it takes the drop. */
function FileDrop({ file, onFile, error }: { file: File | null; onFile: (file: File) => void; error: string | null }) {
  const [over, setOver] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  return (
    <div
      className={classNames(
        "border border-dashed border-line-strong bg-sheet-hi p-4",
        over && "border-dye bg-dye-tint",
      )}
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={(event) => {
        event.preventDefault();
        setOver(false);
        const dropped = event.dataTransfer.files[0];
        if (dropped) onFile(dropped);
      }}
    >
      <label className="flex items-center gap-3">
        <DrawingIcon size={24} className="text-ink-3" />
        <span className="min-w-0">
          <span className="block font-semibold">{file ? file.name : "Choose a file or drop it here"}</span>
          <span className="block text-help text-ink-3">
            {file ? bytesText(file.size) : "PDF, PNG or JPEG. What it is is told by its content, not by its name."}
          </span>
        </span>
        <input
          ref={input}
          type="file"
          accept={TYPES}
          aria-label="Drawing file"
          {...(error ? { "aria-invalid": true, "aria-describedby": "drawing-file-error" } : {})}
          className="sr-only"
          onChange={(event) => {
            const chosen = event.target.files?.[0];
            if (chosen) onFile(chosen);
          }}
        />
        <span aria-hidden className="ml-auto rounded-edge border border-line-strong px-2 py-1 text-help">
          {file ? "Another" : "Choose"}
        </span>
      </label>
      {error && (
        <p id="drawing-file-error" className="mt-2">
          <SeverityText severity="stop">{error}</SeverityText>
        </p>
      )}
    </div>
  );
}
