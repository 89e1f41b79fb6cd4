import { DRAG_LAWS, type DragLawId } from "../scenario";

/** How each drag law is called on screen and in print, in the order a form offers them. */
export const DRAG_LAW_NAMES: Record<DragLawId, string> = {
  largeYeager2009: "Large and Yeager (2009)",
  largePond1981: "Large and Pond (1981)",
  trenberth1990: "Trenberth et al. (1990)",
  smith1980: "Smith (1980)",
  garratt1977: "Garratt (1977)",
  wu1982: "Wu (1982)",
  wu1982floor: "Wu (1982), held below 7.5 m/s",
  zijlema2012: "Zijlema et al. (2012)",
  coare35: "COARE 3.5, neutral",
  constant: "constant coefficient",
};

/** The name of a law; a text that is none of them as it is. */
export function dragLawName(id: string): string {
  const law = DRAG_LAWS.find((known) => known === id);
  return law ? DRAG_LAW_NAMES[law] : id;
}
