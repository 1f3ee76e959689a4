import { Op } from "sequelize";
import { Bed, BedStay, Session, Unit, UnitPolicy, VentilationEpisode } from "@/db/models";
import type { Me } from "@/lib/contracts";
import type { Ctx } from "./context";
import { SESSION_MS } from "./session";
