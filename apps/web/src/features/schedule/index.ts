/** The door of the schedule. */
export { ScheduleView } from "./schedule-view.tsx";
