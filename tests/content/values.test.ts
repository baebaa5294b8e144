import { describe, expect, it } from "vitest";
import { findAttached } from "../../src/dossier/content/values/findAttached.ts";
import { QUANTITY_KINDS } from "../../src/dossier/content/values/quantityKinds.ts";
import { readCode } from "../../src/dossier/content/values/readCode.ts";
import { readDate } from "../../src/dossier/content/values/readDate.ts";
import { readQuantity } from "../../src/dossier/content/values/readQuantity.ts";
import { readTemperature } from "../../src/dossier/content/values/readTemperature.ts";
import { slugOf } from "../../src/dossier/content/values/slugOf.ts";

const kelvin = (found: unknown) => {
  const reading = readTemperature(found);
  return "value" in reading ? reading.value.kelvin : reading.problem.code;
};
const message = (found: unknown) => {
  const reading = readTemperature(found);
  return "problem" in reading ? reading.problem : undefined;
};

describe("a temperature", () => {
  it("is read in kelvin and in degrees Celsius (source: SI Brochure, 9th edition, 2.3.1: t/°C = T/K − 273.15)", () => {
    expect(["298.15 K", "25 °C", "25 C", "25°C", "25.00 °C", "−78.5 °C", "-78.5 °C"].map(kelvin)).toEqual([
      298.15, 298.15, 298.15, 298.15, 298.15, 194.65, 194.65,
    ]);
  });

  it("may have a no-break or a narrow space before its unit", () => {
    expect(["298 K", "298\u00A0K", "298\u202FK", "298K"].map(kelvin)).toEqual([298, 298, 298, 298]);
  });

  it("is refused without a unit, with the likelier unit offered", () => {
    expect(message(298)).toMatchObject({ code: "bad-temperature", suggestion: "298 K" });
    expect(message(25)).toMatchObject({ code: "bad-temperature", suggestion: "25 °C" });
    expect(message("298.15")?.suggestion).toBe("298.15 K");
    expect(message(298)?.message).toContain("Add one");
  });

  it.each([
    "77 °F",
    "298,15 K",
    "warm",
    "-300 °C",
    "-1 K",
    "0 K",
    "0.5 K",
    "1001 K",
    "1e3 K",
    "NaN K",
    "",
    null,
    [298],
    { K: 298 },
    true,
    "298 K or so",
  ])("is refused when it is %j", (found) => {
    expect(kelvin(found)).toBe("bad-temperature");
  });

  it("says that nothing lies below absolute zero (source: SI Brochure, 9th edition, 2.3.1)", () => {
    expect(message("-273.16 °C")?.message).toContain("absolute zero");
    expect(message("-272.15 °C")).toBeUndefined();
  });
});

describe("a quantity", () => {
  it("keeps the author's digits and gives a true minus sign", () => {
    expect(readQuantity("-12.50 Hz", QUANTITY_KINDS.coupling)).toEqual({
      value: { value: -12.5, unit: "Hz", text: "\u221212.50" },
    });
    expect(readQuantity("97%", QUANTITY_KINDS.population)).toEqual({
      value: { value: 97, unit: "%", text: "97" },
    });
  });

  it("names the units that are allowed and offers the nearest", () => {
    const reading = readQuantity("10.9 hz", QUANTITY_KINDS.coupling);
    expect(reading).toMatchObject({ problem: { code: "bad-quantity", suggestion: "10.9 Hz" } });
    expect("problem" in reading && reading.problem.message).toContain("(Hz)");
  });
});

describe("a date", () => {
  it("is a day of the calendar, leap days by the Gregorian rule (common practice)", () => {
    const days = [
      "2026-11-20",
      "2024-02-29",
      "2000-02-29",
      "1900-02-29",
      "2026-02-29",
      "2026-13-01",
      "2026-04-31",
      "2026-11-00",
    ];
    expect(days.map((day) => "value" in readDate(day))).toEqual([
      true,
      true,
      true,
      false,
      false,
      false,
      false,
      false,
    ]);
    expect("problem" in readDate(20261120)).toBe(true);
  });
});

describe("a code", () => {
  it.each(["KS-07", "a", "A.1_b-2", "7"])("may be %s", (code) => {
    expect(readCode(code)).toEqual({ value: code });
  });

  it.each([
    ["KS 07", "KS-07"],
    ["../KS-07", "KS-07"],
    ["KS/07", "KS-07"],
    ["-KS", "KS"],
    ["KÄ-1", "KA-1"],
  ])("may not be %s", (code, suggestion) => {
    const reading = readCode(code);
    expect("problem" in reading ? [reading.problem.code, reading.problem.suggestion] : reading).toEqual([
      "unsafe-code",
      suggestion,
    ]);
  });

  it("gives an address in lower case with single hyphens", () => {
    expect(["KS-07", "A.1_b-2", "Kestrel  Series"].map(slugOf)).toEqual([
      "ks-07",
      "a-1-b-2",
      "kestrel-series",
    ]);
  });
});

describe("a file of evidence", () => {
  const attached = [
    { path: "series/tern/tn-01.cif", sha256: "1" },
    { path: "series/shared/x.xyz", sha256: "2" },
  ];
  const find = (name: string) => {
    const reading = findAttached(name, "series/tern/tn-01.md", attached);
    return "value" in reading ? reading.value.sha256 : reading.problem.code;
  };

  it("is found by its path from the compound file", () => {
    expect(["tn-01.cif", "./tn-01.cif", "../shared/x.xyz"].map(find)).toEqual(["1", "1", "2"]);
  });

  it.each(["../../../etc/passwd", "/etc/passwd", "C:\\x.cif", "https://example.org/x.cif", "..\\x.cif"])(
    "never lies outside the content folder: %s",
    (name) => {
      expect(find(name)).toBe("evidence-file-outside");
    },
  );

  it("is offered under its right name when it was misspelt", () => {
    expect(findAttached("TN-1.cif", "series/tern/tn-01.md", attached)).toMatchObject({
      problem: { code: "missing-evidence-file", suggestion: "tn-01.cif" },
    });
  });
});
