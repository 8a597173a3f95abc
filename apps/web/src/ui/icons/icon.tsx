import type { ReactNode } from "react";

export interface IconProps {
  readonly size?: number;
  readonly className?: string;
  /** Said by screen readers; without it the icon is decoration beside its word. */
  readonly label?: string;
}

/** Square line icons on a 20-unit grid, drawn for this product. */
function icon(path: string) {
  return function Icon({ size = 16, className, label }: IconProps) {
    return (
      <svg
        width={size}
        height={size}
        viewBox="0 0 20 20"
        fill="none"
        stroke="currentColor"
        strokeWidth={size < 20 ? 1.75 : 1.5}
        className={`shrink-0 ${className ?? ""}`}
        {...(label ? { role: "img", "aria-label": label } : { "aria-hidden": true })}
      >
        <path d={path} />
      </svg>
    );
  };
}

export type Icon = (props: IconProps) => ReactNode;

export const ProjectsIcon = icon("M3.5 3.5h9l4 4v9h-13zM12.5 3.5v4h4M6.5 11h7M6.5 13.5h4");
export const ClientsIcon = icon("M3 5.5h14v10H3zM3 6l7 5 7-5");
export const PricesIcon = icon("M10 3.5a6.5 6.5 0 1 0 6.5 6.5M10 6.5A3.5 3.5 0 1 0 13.5 10M10 3.5h7M10 9.2v1.6");
export const SpecsIcon = icon("M3.5 16V6.5h10a2 2 0 0 0 0-4h-6M7 16V10h9.5v6");
export const CompanyIcon = icon("M3.5 17V6.5L10 3l6.5 3.5V17M2 17h16M8 17v-5h4v5M7 8.5h1.5M11.5 8.5H13");
export const FieldIcon = icon("M3 16.5h14M4.5 16.5v-6h4v6M8.5 13h7v3.5M6.5 10.5V6h7v7M13.5 6l2-2.5");
export const PlusIcon = icon("M10 4v12M4 10h12");
export const CloseIcon = icon("M5 5l10 10M15 5L5 15");
export const SearchIcon = icon("M8.5 3.5a5 5 0 1 1 0 10 5 5 0 0 1 0-10zM12.2 12.2L17 17");
export const DownloadIcon = icon("M10 3v9M6 8.5l4 4 4-4M3.5 16.5h13");
export const UploadIcon = icon("M10 13V4M6 7.5l4-4 4 4M3.5 16.5h13");
export const EyeIcon = icon("M2.5 10S5.5 5 10 5s7.5 5 7.5 5-3 5-7.5 5-7.5-5-7.5-5zM10 8a2 2 0 1 1 0 4 2 2 0 0 1 0-4z");
export const LockIcon = icon("M5 9h10v8H5zM7 9V6.5a3 3 0 0 1 6 0V9");
export const CheckIcon = icon("M4 10.5l4 4 8-9");
export const TrashIcon = icon("M4 5.5h12M7.5 5.5v-2h5v2M5.5 5.5l1 11h7l1-11M8.5 8.5v5M11.5 8.5v5");
export const EditIcon = icon("M4 16l.8-3.6L13.5 3.7l2.8 2.8-8.7 8.7zM11.5 5.7l2.8 2.8");
export const UndoIcon = icon("M7.5 4L4 7.5 7.5 11M4 7.5h8a4.5 4.5 0 0 1 0 9H7");
export const RedoIcon = icon("M12.5 4L16 7.5 12.5 11M16 7.5H8a4.5 4.5 0 0 0 0 9h5");
export const LightIcon = icon(
  "M10 6.5a3.5 3.5 0 1 1 0 7 3.5 3.5 0 0 1 0-7zM10 2v2M10 16v2M2 10h2M16 10h2M4.3 4.3l1.5 1.5M14.2 14.2l1.5 1.5M4.3 15.7l1.5-1.5M14.2 5.8l1.5-1.5",
);
export const DarkIcon = icon("M15.5 12.5A6.5 6.5 0 0 1 8 4a6.5 6.5 0 1 0 7.5 8.5z");
export const SystemIcon = icon("M3 4.5h14v9H3zM7 16.5h6M10 13.5v3");
export const DrawingIcon = icon("M3 4h14v12H3zM3 12.5h14M12.5 12.5V16M6 9.5V7h4v2.5");
export const OfflineIcon = icon(
  "M3 3l14 14M4 8.5c1-.9 2-1.5 3-1.9M10.5 6c2 .1 4 .9 5.5 2.5M6.5 11.5c1-.8 2-1.2 3.5-1.2M10 15.3v.2",
);
