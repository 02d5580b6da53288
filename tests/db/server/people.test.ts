import { expect, test } from "vitest";
import { registerDevice } from "@/db/server/devices";
import { everybodyHere, personShown } from "@/db/server/people";
import { endRole } from "@/db/server/role-grants";
import { promised } from "@/lib/result";
import { at, hoursLater, personWith, yard } from "./yard";

test("everybody stands with the parts held now and the phones ever held", () => {
  const { db, engineer, test: id } = yard();
  const lead = personWith({ db, test: id }, "lead", "Ragna");
  const device = { device: "6f0f3f4e-8a4f-4a52-9c0c-0b8e6f6d1a01", name: "Wheelhouse", publicKey: null };
  promised(registerDevice(db, device, lead.id, { by: lead.id, at }));
  expect(everybodyHere(db, at).map(({ name, parts, phones }) => ({ name, roles: parts.map(({ role }) => role), phones }))).toEqual([
    { name: "Ellen Moe", roles: ["engineer"], phones: 0 },
    { name: "Ragna", roles: ["lead"], phones: 1 },
  ]);
  endRole(db, { test: id, account: lead.id, role: "lead" }, { by: engineer.id, at: hoursLater(1) });
  expect(personShown(db, lead.id, hoursLater(2))).toMatchObject({ parts: [], devices: [{ device: device.device, name: "Wheelhouse" }] });
  expect(personShown(db, lead.id, at)?.parts).toMatchObject([{ test: id, role: "lead", title: "Inclining test" }]);
});

test("nobody is nobody", () => {
  expect(personShown(yard().db, "nobody", at)).toBeUndefined();
});
