import type { MethodUsed } from "./result";

/** Published sources that results and docstrings cite. */
export const sources = {
  raoult: "F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory)",
  mccabeThiele1925: "W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605",
  smoker1938: "E. H. Smoker, Trans. AIChE 34 (1938) 165",
  fenske1932: "M. R. Fenske, Ind. Eng. Chem. 24 (1932) 482",
  underwood1948: "A. J. V. Underwood, Chem. Eng. Prog. 44 (1948) 603",
  shiras1950: "R. N. Shiras, D. N. Hanson and C. H. Gibson, Ind. Eng. Chem. 42 (1950) 871",
  gilliland1940: "E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220",
  molokanov1972: "Y. K. Molokanov et al., Int. Chem. Eng. 12 (1972) 209",
  eduljee1975: "H. E. Eduljee, Hydrocarbon Process. 54(9) (1975) 120",
  liddle1968: "C. J. Liddle, Chem. Eng. 75(23) (1968) 137",
  kirkbride1944: "C. G. Kirkbride, Pet. Refiner 23(9) (1944) 321",
  hengstebeck1946: "R. J. Hengstebeck, Trans. AIChE 42 (1946) 309; R. L. Geddes, AIChE J. 4 (1958) 389",
  rachfordRice1952: "H. H. Rachford and J. D. Rice, J. Pet. Technol. 4(10) (1952) 19",
  leiboviciNeoschil1992: "C. F. Leibovici and J. Neoschil, Fluid Phase Equilib. 74 (1992) 303",
  haggenmacher1946: "J. E. Haggenmacher, J. Am. Chem. Soc. 68 (1946) 1633 (citation from memory)",
  commonPractice: "common practice",
} as const;

/** Key of a published source. */
export type SourceId = keyof typeof sources;

/** Names a method together with its published source. */
export function method(name: string, source: SourceId): MethodUsed {
  return { name, source: sources[source] };
}
