/** The demo's clients: invented. */
interface DemoClient {
  readonly name: string;
  readonly address: { line1: string; line2: string; city: string; region: string; postalCode: string };
  readonly notes: string;
  readonly contacts: readonly { name: string; email: string; phone: string; title: string }[];
}

export const clients: readonly DemoClient[] = [
  {
    name: "Oxbow Builders",
    address: { line1: "2200 Oxbow Road", line2: "Suite 4", city: "Marrow Creek", region: "KS", postalCode: "67001" },
    notes: "Asks for the addenda by number. Retainage released within 45 days so far.",
    contacts: [
      {
        name: "Priya Lindqvist",
        email: "priya.lindqvist@oxbowbuilders.example",
        phone: "316 555 0171",
        title: "Project manager",
      },
      {
        name: "Anselm Roe",
        email: "anselm.roe@oxbowbuilders.example",
        phone: "316 555 0172",
        title: "Chief estimator",
      },
    ],
  },
  {
    name: "Harrow & Pell",
    address: { line1: "15 Quarry Street", line2: "", city: "Sorrel Ridge", region: "KS", postalCode: "67009" },
    notes: "",
    contacts: [{ name: "Dana Whitlock", email: "dana@harrowpell.example", phone: "620 555 0114", title: "Estimator" }],
  },
  {
    name: "Meridian West",
    address: { line1: "900 Lakeshore Drive", line2: "", city: "Tern Lake", region: "KS", postalCode: "67020" },
    notes: "Owner-direct work; the architect answers questions.",
    contacts: [
      {
        name: "Ilse Moreno",
        email: "ilse.moreno@meridianwest.example",
        phone: "620 555 0188",
        title: "Construction manager",
      },
    ],
  },
];
