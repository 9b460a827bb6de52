import { column, many, one, SheetModel } from "./sheet-model";

/** Invented workbooks in which nothing is the matter: inputs in their units, every limit holds, every value is fresh. */
export const cleanBooks: Readonly<Record<string, () => SheetModel>> = {
  "argon pre-clean": preClean,
  "ion extraction": extraction,
  "divertor tile": divertor,
  "hot cathode": cathode,
  "biased chuck": chuck,
};

const first = 6;

function preClean(): SheetModel {
  const last = 45;
  const book = new SheetModel().on("Chamber");
  book.type("A1", "Argon pre-clean").type("A2", "Ion").type("B2", "Ar+");
  "Run,Pressure,n bulk,T_e,λ_D,u_B,V_f,Ion flux,Flux ratio,Believe?,Measured V_f,Agrees?"
    .split(",")
    .forEach((heading, i) => book.type(`${"ABCDEFGHIJKL"[i]}4`, heading));
  ",Pa,m⁻³,eV,mm,m/s,V,m⁻² s⁻¹,,,V,".split(",").forEach((unit, i) => unit && book.type(`${"ABCDEFGHIJKL"[i]}5`, unit));
  for (let r = first; r <= last; r++) {
    const i = r - first;
    book.type(`A${r}`, i + 1).type(`B${r}`, 0.3 + 0.05 * (i % 8));
    book.type(`C${r}`, Number((2e16 * 1.06 ** i).toPrecision(3))).type(`D${r}`, Number((1.7 + 0.012 * i).toFixed(3)));
    book.formula(`E${r}`, `=SHEATH.DEBYELENGTH(C${r},D${r},,"mm")`, (at) =>
      one("DEBYELENGTH", at(`C${r}`), at(`D${r}`), null, "mm"),
    );
  }
  const range = (letter: string) => column(letter, first, last);
  book.formula(`F${first}`, `=SHEATH.BOHMSPEED(D${first}:D${last},$B$2)`, (at) =>
    many("BOHMSPEED", range("D").map(at), at("B2")),
  );
  book.formula(`G${first}`, `=SHEATH.FLOATINGPOTENTIAL(D${first}:D${last},B2)`, (at) =>
    many("FLOATINGPOTENTIAL", range("D").map(at), at("B2")),
  );
  for (let r = first; r <= last; r++) {
    book.formula(`H${r}`, `=SHEATH.WALLFLUX(C${r},D${r},B$2)`, (at) =>
      one("WALLFLUX", at(`C${r}`), at(`D${r}`), at("B2")),
    );
    book.formula(`I${r}`, `=H${r}/H$${first}`, (at) => ratio(at(`H${r}`), at(`H${first}`)));
  }
  book.formula(`J${first}`, `=SHEATH.LIMITCHECK("DEBYELENGTH",C${first}:C${last},D${first}:D${last})`, (at) =>
    many("LIMITCHECK", "DEBYELENGTH", range("C").map(at), range("D").map(at)),
  );
  for (let r = first; r <= last; r++) {
    book.type(`K${r}`, Number((-4.68 * (1.7 + 0.012 * (r - first))).toFixed(2)));
    book.formula(`L${r}`, `=SHEATH.WITHIN(K${r},G${r},5%,,"V_f in run "&A${r})`, (at) =>
      one("WITHIN", at(`K${r}`), at(`G${r}`), 0.05, null, `V_f in run ${String(at(`A${r}`))}`),
    );
  }
  return book.formula("L2", `=SHEATH.VERDICT(J${first}:J${last},L${first}:L${last})`, (at) =>
    one2("VERDICT", range("J").map(at), range("L").map(at)),
  );
}

function one2(name: string, ...ranges: unknown[][]): unknown {
  return many(name, ...ranges)[0][0];
}

function ratio(a: unknown, b: unknown): unknown {
  if (typeof a === "object" && a !== null) return a;
  if (typeof b === "object" && b !== null) return b;
  return Number(a) / Number(b);
}

/** A table, defined names on a sheet of their own, and calls inside calls. */
function extraction(): SheetModel {
  const last = 35;
  const book = new SheetModel().on("Inputs");
  book.type("A1", "Ion").type("B1", "Xe+").type("A2", "Electron temperature, eV").type("B2", 4);
  book.type("A3", "Slit, m").type("B3", 0.002);
  Object.assign(book.names, { ion: "Inputs!$B$1", T_e: "Inputs!$B$2" });
  book.on("Runs");
  ["V", "n edge", "s", "J", "transit", "field"].forEach((heading, i) => book.type(`${"BCDEFG"[i]}3`, heading));
  for (let r = 4; r <= last; r++) {
    const i = r - 4;
    book.type(`B${r}`, 1500 + 50 * i).type(`C${r}`, Number((4e15 * (1 + 0.07 * i)).toPrecision(3)));
    book.formula(`D${r}`, '=SHEATH.SHEATHWIDTH(Grid[@V],Grid[@[n edge]],T_e,"child")', (at) =>
      one("SHEATHWIDTH", at(`B${r}`), at(`C${r}`), at("Inputs!B2"), "child"),
    );
    book.formula(`E${r}`, `=SHEATH.CHILDCURRENT(B${r},D${r},ion,,,"mA/cm^2")`, (at) =>
      one("CHILDCURRENT", at(`B${r}`), at(`D${r}`), at("Inputs!B1"), null, null, "mA/cm^2"),
    );
    book.formula(`F${r}`, `=1E6*SHEATH.IONTRANSITTIME(B${r},SHEATH.SHEATHWIDTH(B${r},C${r},T_e),Inputs!$B$1)`, (at) =>
      scaled(
        1e6,
        one(
          "IONTRANSITTIME",
          at(`B${r}`),
          one("SHEATHWIDTH", at(`B${r}`), at(`C${r}`), at("Inputs!B2")),
          at("Inputs!B1"),
        ),
      ),
    );
  }
  book.formula("G4", "=SHEATH.WALLFIELD(Grid[V],Grid[n edge],T_e)", (at) =>
    many("WALLFIELD", column("B", 4, last).map(at), column("C", 4, last).map(at), at("Inputs!B2")),
  );
  return book.table("Grid", `B3:F${last}`, ["V", "n edge", "s", "J", "transit"]);
}

function scaled(factor: number, value: unknown): unknown {
  return typeof value === "number" ? factor * value : value;
}

/** Deuterium at an angle, with units as text and a spill that another formula reads. */
function divertor(): SheetModel {
  const last = 33;
  const book = new SheetModel().on("Tile");
  ["Shot", "n", "T_e", "T_i", "angle", "heat flux", "drop", "share", "limit angle", "B", "gyroradius"].forEach(
    (heading, i) => book.type(`${"ABCDEFGHIJK"[i]}3`, heading),
  );
  for (let r = 4; r <= last; r++) {
    const i = r - 4;
    book
      .type(`A${r}`, 9000 + i)
      .type(`B${r}`, `${(1.2 + 0.04 * i).toFixed(2)}e13 cm^-3`)
      .type(`C${r}`, 18 + i)
      .type(`D${r}`, 20 + i);
    book.type(`E${r}`, 12 + (i % 6)).type(`J${r}`, Number((2 + 0.01 * i).toFixed(2)));
    book.formula(`K${r}`, `=SHEATH.GYRORADIUS(D${r},J${r},"D+","mm")`, (at) =>
      one("GYRORADIUS", at(`D${r}`), at(`J${r}`), "D+", "mm"),
    );
    book.formula(`G${r}`, `=SHEATH.MAGNETICPRESHEATHDROP(C${r},E${r})`, (at) =>
      one("MAGNETICPRESHEATHDROP", at(`C${r}`), at(`E${r}`)),
    );
  }
  const range = (letter: string) => column(letter, 4, last);
  book.formula("F4", `=SHEATH.WALLHEATFLUX(B4:B${last},C4:C${last},"D+",D4:D${last},,,,,E4:E${last},"MW/m^2")`, (at) =>
    many(
      "WALLHEATFLUX",
      range("B").map(at),
      range("C").map(at),
      "D+",
      range("D").map(at),
      null,
      null,
      null,
      null,
      range("E").map(at),
      "MW/m^2",
    ),
  );
  book.formula("H4", "=F4#/F4", (at) => range("F").map((each) => [ratio(at(each), at("F4"))]));
  for (let r = 4; r <= last; r++)
    book.formula(`I${r}`, `=SHEATH.GRAZINGLIMIT("D+",C${r},D${r})`, (at) =>
      one("GRAZINGLIMIT", "D+", at(`C${r}`), at(`D${r}`)),
    );
  return book;
}

/** Readings against ground, where 0 V is a value, and an emitting wall. */
function cathode(): SheetModel {
  const last = 29;
  const book = new SheetModel().on("Cathode");
  book.type("A1", "Ion").type("B1", "He+").type("A2", "Work function, eV").type("B2", 4.5);
  ["Point", "V wall", "V plasma", "T_e", "T wall", "yield", "V_w", "J_th", "V_f", "energy"].forEach((heading, i) =>
    book.type(`${"ABCDEFGHIJ"[i]}4`, heading),
  );
  for (let r = 5; r <= last; r++) {
    const i = r - 5;
    book
      .type(`A${r}`, i + 1)
      .type(`B${r}`, -60 - i)
      .type(`C${r}`, 12 + 0.1 * i)
      .type(`D${r}`, Number((3 + 0.05 * i).toFixed(2)));
    book.type(`E${r}`, 2200 + 10 * i).type(`F${r}`, Number((0.1 + 0.004 * i).toFixed(3)));
    book.formula(`G${r}`, `=SHEATH.WALLTOEDGE(B${r},C${r},D${r})`, (at) =>
      one("WALLTOEDGE", at(`B${r}`), at(`C${r}`), at(`D${r}`)),
    );
    book.formula(`H${r}`, `=SHEATH.RICHARDSONCURRENT(E${r},B$2)`, (at) =>
      one("RICHARDSONCURRENT", at(`E${r}`), at("B2")),
    );
    book.formula(`I${r}`, `=SHEATH.FLOATINGPOTENTIAL(D${r},B$1,,F${r})`, (at) =>
      one("FLOATINGPOTENTIAL", at(`D${r}`), at("B1"), null, at(`F${r}`)),
    );
    book.formula(`J${r}`, `=SHEATH.IONIMPACTENERGY(D${r},B$1,,G${r})`, (at) =>
      one("IONIMPACTENERGY", at(`D${r}`), at("B1"), null, at(`G${r}`)),
    );
  }
  return book;
}

/** A driven wall: amplitudes as text, pressure in the instrument's unit, and a path from the pressure. */
function chuck(): SheetModel {
  const last = 31;
  const book = new SheetModel().on("Chuck");
  ["Step", "Pressure", "V_dc", "V_rf", "n edge", "T_e", "path", "width", "resistance", "collisions"].forEach(
    (heading, i) => book.type(`${"ABCDEFGHIJ"[i]}2`, heading),
  );
  ",mTorr,V,,m⁻³,eV,m,m,Ω m²,".split(",").forEach((unit, i) => unit && book.type(`${"ABCDEFGHIJ"[i]}3`, unit));
  for (let r = 4; r <= last; r++) {
    const i = r - 4;
    book
      .type(`A${r}`, i + 1)
      .type(`B${r}`, Number((0.5 + 0.02 * i).toFixed(2)))
      .type(`C${r}`, -(300 + 10 * i));
    book
      .type(`D${r}`, `${300 + 10 * i} V`)
      .type(`E${r}`, Number((8e15 * (1 + 0.05 * i)).toPrecision(3)))
      .type(`F${r}`, Number((2 + 0.01 * i).toFixed(2)));
    book.formula(`G${r}`, `=SHEATH.MEANFREEPATH(B${r}&" mTorr","Ar")`, (at) =>
      one("MEANFREEPATH", `${String(at(`B${r}`) ?? "")} mTorr`, "Ar"),
    );
    book.formula(`H${r}`, `=SHEATH.RFSHEATHWIDTH(ABS(C${r}),E${r},F${r})`, (at) =>
      one(
        "RFSHEATHWIDTH",
        typeof at(`C${r}`) === "number" ? Math.abs(at(`C${r}`) as number) : at(`C${r}`),
        at(`E${r}`),
        at(`F${r}`),
      ),
    );
    book.formula(`J${r}`, `=IF(G${r}>H${r},"few","many")`, (at) =>
      Number(at(`G${r}`)) > Number(at(`H${r}`)) ? "few" : "many",
    );
  }
  const range = (letter: string) => column(letter, 4, last);
  return book.formula("I4", `=SHEATH.SHEATHRESISTANCE(E4:E${last},F4:F${last},"Ar+")`, (at) =>
    many("SHEATHRESISTANCE", range("E").map(at), range("F").map(at), "Ar+"),
  );
}
