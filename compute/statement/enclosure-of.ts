import { perBand } from "../acoustics/bands.ts";
import type { Enclosure } from "../acoustics/enclosure.ts";
import type { EnclosureControl } from "../documents/types/statement.gen.ts";
import { bandsOf } from "./emission-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";

/** An enclosure with the values of its data sheets; a bare inside without a sheet counts as absorbing nothing. */
export function enclosureOf(inputs: StatementInputs, control: EnclosureControl): Enclosure {
  const absorption = (sheet: string) => bandsOf(entry(inputs.linings, sheet, "lining").absorption);
  return {
    faces: control.faces.map((face) => ({
      areaM2: face.areaM2,
      indexDb: bandsOf(entry(inputs.panels, face.panel, "panel").reductionIndexDb),
    })),
    openings: control.openings.map((opening) => ({
      areaM2: opening.areaM2,
      silencerLossDb: opening.silencer
        ? bandsOf(entry(inputs.silencers, opening.silencer, "silencer").insertionLossDb)
        : undefined,
    })),
    lining: { areaM2: control.lining.areaM2, absorption: absorption(control.lining.sheet) },
    unlined: control.unlinedSheet ? absorption(control.unlinedSheet) : perBand(() => 0),
    floor: { areaM2: control.floor.areaM2, absorption: absorption(control.floor.sheet) },
    siteBuildDeductionDb: control.siteBuildDeductionDb,
  };
}
