import type { Register } from "../../register/Register.ts";
import { numberCell } from "../cells/numberCell.ts";
import { numberColumn } from "../cells/numberColumn.ts";
import { textColumn } from "../cells/textColumn.ts";
import { registerAnchor } from "../registerAnchor.ts";
import type { TableModel } from "../TableModel.ts";

/** What stands in for the axial energy of a group that no row covers, by class of groups. */
export function standInsTable(register: Register): TableModel {
  const members = (key: string) =>
    register.groups.filter((group) => group.groupClass === key).map((group) => group.key);
  return {
    id: "register-stand-ins",
    caption: "Stand-ins for groups that no row covers",
    columns: [
      { ...textColumn("class", "Class of groups"), rowHeader: true },
      numberColumn("value", "Axial minus equatorial", "kcal/mol"),
      numberColumn("u", "u", "kcal/mol"),
      textColumn("groups", "Groups of the class"),
      textColumn("standing", "Basis"),
    ],
    rows: register.groupClasses.map(({ key, title, axial }) => ({
      id: registerAnchor(`class/${key}`),
      cells: [
        { text: title },
        numberCell(axial.value),
        numberCell(axial.u),
        { text: members(key).join(", ") },
        { text: "not available, stand-in", standing: "estimated" },
      ],
    })),
    notes: ["A stand-in is wide on purpose: it keeps a missing value visible and never counts as zero."],
  };
}
