// Degree of accuracy expected of manufacturing processes, by ISO tolerance grade: the chart of the BS 4500 and
// ISO/R 286 family. One source (a drawing textbook's figure). A machine in good condition is meant.

/** The processes that one grade is expected of. */
export interface GradeLine {
  readonly grade: number;
  readonly rows: readonly string[];
}

/** The chart, coarsest grade first. */
export const ISO_PROCESS_GRADES: readonly GradeLine[] = [
  { grade: 16, rows: ["sand casting (approximately)", "flame cutting"] },
  { grade: 15, rows: ["stamping (approximately)"] },
  { grade: 14, rows: ["die casting or moulding", "rubber moulding"] },
  { grade: 13, rows: ["press work", "tube rolling"] },
  { grade: 12, rows: ["light press work", "tube drawing"] },
  { grade: 11, rows: ["drilling", "rough turning", "rough boring", "precision tube drawing"] },
  { grade: 10, rows: ["milling", "slotting", "planing", "metal rolling", "extrusion"] },
  { grade: 9, rows: ["worn capstan or automatic", "horizontal boring machine", "vertical boring machine"] },
  { grade: 8, rows: ["centre lathe turning", "centre lathe boring", "reaming", "capstan or automatic in good condition"] },
  { grade: 7, rows: ["high-quality turning", "broaching", "honing"] },
  { grade: 6, rows: ["grinding", "fine honing"] },
  { grade: 5, rows: ["machine lapping", "diamond boring", "fine boring", "fine grinding", "ball bearings"] },
  { grade: 4, rows: ["lapping (gauges, fits of extreme precision)"] },
  { grade: 3, rows: ["good quality gauges, gap gauges"] },
  { grade: 2, rows: ["high quality gauges, plug gauges"] },
  { grade: 1, rows: ["slip blocks, reference gauges"] },
];
