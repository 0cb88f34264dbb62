// ISO 286-1:2010, Table 4: fundamental deviations of shafts a to j, in µm.
// a to h are upper limit deviations es; j is the lower limit deviation ei of the grades named.
// cd, ef and fg over 10 mm are of the 2010 edition only.

import type { DeviationColumn } from "../deviationColumn.js";

/** Upper limit deviations es, alike in every grade. */
export const SHAFTS_A_TO_H: Readonly<Record<string, DeviationColumn>> = {
  a: {
    steps: "intermediate",
    first: 0,
    um: [-270, -270, -280, -290, -290, -300, -300, -310, -320, -340, -360, -380, -410, -460, -520, -580, -660, -740, -820, -920, -1050, -1200, -1350, -1500, -1650],
    marks: "2222222222222222222222222",
  },
  b: {
    steps: "intermediate",
    first: 0,
    um: [-140, -140, -150, -150, -150, -160, -160, -170, -180, -190, -200, -220, -240, -260, -280, -310, -340, -380, -420, -480, -540, -600, -680, -760, -840],
    marks: "2222222222222222222222222",
  },
  c: {
    steps: "intermediate",
    first: 0,
    um: [-60, -70, -80, -95, -95, -110, -110, -120, -130, -140, -150, -170, -180, -200, -210, -230, -240, -260, -280, -300, -330, -360, -400, -440, -480],
    marks: "2222222222222222222222222",
  },
  cd: {
    steps: "main",
    first: 0,
    um: [-34, -46, -56, -70, -85, -100],
    marks: "222mmm",
  },
  d: {
    steps: "main",
    first: 0,
    um: [-20, -30, -40, -50, -65, -80, -100, -120, -145, -170, -190, -210, -230, -260, -290, -320, -350, -390, -430, -480, -520],
    marks: "2222222222222++++++++",
  },
  e: {
    steps: "main",
    first: 0,
    um: [-14, -20, -25, -32, -40, -50, -60, -72, -85, -100, -110, -125, -135, -145, -160, -170, -195, -220, -240, -260, -290],
    marks: "2222222222222++1+++++",
  },
  ef: {
    steps: "main",
    first: 0,
    um: [-10, -14, -18, -23, -28, -35],
    marks: "222mmm",
  },
  f: {
    steps: "main",
    first: 0,
    um: [-6, -10, -13, -16, -20, -25, -30, -36, -43, -50, -56, -62, -68, -76, -80, -86, -98, -110, -120, -130, -145],
    marks: "22222222222221222222+",
  },
  fg: {
    steps: "main",
    first: 0,
    um: [-4, -6, -8, -10, -12, -15],
    marks: "222mmm",
  },
  g: {
    steps: "main",
    first: 0,
    um: [-2, -4, -5, -6, -7, -9, -10, -12, -14, -15, -17, -18, -20, -22, -24, -26, -28, -30, -32, -34, -38],
    marks: "2222222222222+2222221",
  },
  h: {
    steps: "main",
    first: 0,
    um: [0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0],
    marks: "222222222222222222222",
  },
};

/** Lower limit deviations ei of j, which has values in these grades only. */
export const SHAFTS_J: Readonly<Record<string, DeviationColumn>> = {
  j5: {
    steps: "main",
    first: 0,
    um: [-2, -2, -2, -3, -4, -5, -7, -9, -11, -13, -16, -18, -20],
    marks: "2222222212111",
  },
  j6: {
    steps: "main",
    first: 0,
    um: [-2, -2, -2, -3, -4, -5, -7, -9, -11, -13, -16, -18, -20],
    marks: "2222222212111",
  },
  j7: {
    steps: "main",
    first: 0,
    um: [-4, -4, -5, -6, -8, -10, -12, -15, -18, -21, -26, -28, -32],
    marks: "111111mmm1111",
  },
  j8: {
    steps: "main",
    first: 0,
    um: [-6],
    marks: "1",
  },
};
