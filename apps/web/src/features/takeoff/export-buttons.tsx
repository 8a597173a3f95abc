import { endpoints, EXPORT_FORMATS } from "@cleatwork/contracts";
import { useMutation } from "@tanstack/react-query";
import { downloadBlob } from "../../lib/format/csv.ts";
import { apiFile } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { DownloadIcon } from "../../ui/icons/icon.tsx";
import { notify } from "../../ui/toast.tsx";
import { useWorkspace } from "../workspace/index.ts";

/** Files are made by the server from what is stored, so what was just drawn is sent first. */
export function ExportButtons() {
  const { company, project, store } = useWorkspace();
  const make = useMutation({
    mutationFn: async (format: (typeof EXPORT_FORMATS)[number]) => {
      await store.flush();
      const file = await apiFile(endpoints.getTakeoffFile, {
        params: { company: company.slug, projectId: project.id },
        query: { format },
      });
      downloadBlob(`${project.name} takeoff.${format}`, file);
    },
    onError: (error) => notify(`No file was made. ${error.message}`, { severity: "stop" }),
  });
  return EXPORT_FORMATS.map((format) => (
    <Button
      key={format}
      size="small"
      busy={make.isPending && make.variables === format}
      onClick={() => make.mutate(format)}
    >
      <DownloadIcon size={14} /> {format.toUpperCase()}
    </Button>
  ));
}
