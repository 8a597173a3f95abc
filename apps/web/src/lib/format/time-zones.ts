/** Zones that bids are due in, the common ones of the United States first. */
const FIRST: readonly { readonly value: string; readonly label: string }[] = [
  { value: "America/New_York", label: "Eastern (New York)" },
  { value: "America/Chicago", label: "Central (Chicago)" },
  { value: "America/Denver", label: "Mountain (Denver)" },
  { value: "America/Phoenix", label: "Mountain, no daylight time (Phoenix)" },
  { value: "America/Los_Angeles", label: "Pacific (Los Angeles)" },
  { value: "America/Anchorage", label: "Alaska (Anchorage)" },
  { value: "Pacific/Honolulu", label: "Hawaii (Honolulu)" },
];

export function timeZoneChoices(current = Intl.DateTimeFormat().resolvedOptions().timeZone) {
  const named = new Set(FIRST.map((zone) => zone.value));
  const rest = [...new Set(["UTC", current, ...Intl.supportedValuesOf("timeZone")])]
    .filter((zone) => !named.has(zone))
    .sort();
  return [...FIRST, ...rest.map((value) => ({ value, label: value.replace(/_/g, " ") }))];
}
