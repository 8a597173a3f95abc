import { endpoints, type Drawing, type ProjectId } from "@cleatwork/contracts";
import { useMutation, useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { calendarDateText } from "../../lib/format/dates.ts";
import { bytesText } from "../../lib/format/bytes.ts";
import { api, apiUrl } from "../../lib/http.ts";
import { Button, IconButton } from "../../ui/button.tsx";
import { ConfirmByName } from "../../ui/confirm-dialog.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { TrashIcon, UploadIcon } from "../../ui/icons/icon.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { DrawingUpload } from "./drawing-upload.tsx";
import { projectQueries } from "./projects.queries.ts";

/** The drawings of a project, by sheet and revision. */
export function Drawings({ projectId }: { projectId: ProjectId }) {
  const { slug, may } = useSession();
  const { data } = useSuspenseQuery(projectQueries.drawings(slug, projectId));
  const [uploading, setUploading] = useState(false);
  const [removing, setRemoving] = useState<Drawing | null>(null);
  const cache = useQueryClient();
  const mayWrite = may("drawings.write");
  const remove = useMutation({
    mutationFn: (drawing: Drawing) =>
      api(endpoints.deleteDrawing, { params: { company: slug, projectId, drawingId: drawing.id } }),
    onSuccess: async (_, drawing) => {
      setRemoving(null);
      notify(`${drawing.sheetNumber} is taken out.`, { severity: "good" });
      await cache.invalidateQueries(projectQueries.drawings(slug, projectId));
    },
    onError: (error) => notify(error.message, { severity: "stop" }),
  });

  const columns = useMemo((): readonly TableColumn<Drawing>[] => {
    const fileOf = (drawing: Drawing) =>
      apiUrl(endpoints.getDrawingFile, { company: slug, projectId, drawingId: drawing.id });
    return [
      {
        id: "sheet",
        head: "Sheet",
        value: (drawing) => drawing.sheetNumber,
        cell: (drawing) => (
          <a href={fileOf(drawing)} target="_blank" rel="noreferrer">
            {drawing.sheetNumber}
          </a>
        ),
      },
      { id: "title", head: "Title", value: (drawing) => drawing.title || null },
      { id: "revision", head: "Rev.", value: (drawing) => drawing.revision || null },
      {
        id: "date",
        head: "Dated",
        value: (drawing) => drawing.datedOn,
        cell: (drawing) => calendarDateText(drawing.datedOn),
        className: "whitespace-nowrap",
      },
      { id: "pages", head: "Pages", align: "right", value: (drawing) => drawing.pageCount },
      {
        id: "size",
        head: "Size",
        align: "right",
        value: (drawing) => drawing.byteCount,
        cell: (drawing) => bytesText(drawing.byteCount),
        csv: { head: "Bytes", value: (drawing) => drawing.byteCount },
      },
      { id: "by", head: "Uploaded by", value: (drawing) => drawing.uploadedBy, className: "text-ink-2" },
      {
        id: "actions",
        head: "",
        value: () => null,
        className: "w-10",
        cell: (drawing) =>
          mayWrite && (
            <IconButton size="small" label={`Take ${drawing.sheetNumber} out`} onClick={() => setRemoving(drawing)}>
              <TrashIcon />
            </IconButton>
          ),
      },
    ];
  }, [slug, projectId, mayWrite]);

  const add = mayWrite && (
    <Button size="small" rank="primary" onClick={() => setUploading(true)}>
      <UploadIcon />
      Drawing
    </Button>
  );
  return (
    <>
      <DataTable
        title="Drawings"
        fact={data.items.length === 0 ? "PDF, PNG or JPEG" : `${data.items.length} in all`}
        rows={data.items}
        columns={columns}
        rowId={(drawing) => drawing.id}
        sort={{ id: "sheet", desc: false }}
        csvName="drawings"
        actions={add}
        className="min-h-64"
        empty={
          <EmptyState title="No drawing yet" actions={add}>
            Upload the plan as PDF or picture to lay ducts out over it, or start in the schedule without one.
          </EmptyState>
        }
      />
      <DrawingUpload projectId={projectId} open={uploading} onOpenChange={setUploading} />
      {removing && (
        <ConfirmByName
          open
          onOpenChange={(open) => {
            if (!open) setRemoving(null);
          }}
          title={`Take ${removing.sheetNumber} out of the project`}
          name={removing.sheetNumber}
          consequence="The file leaves the project, and levels that lie over it lose their plan. Ducts stay where they are."
          action="Take it out"
          busy={remove.isPending}
          onConfirm={() => remove.mutate(removing)}
        />
      )}
    </>
  );
}
