import { Acknowledgement } from "./acknowledgement";
import { Bed } from "./bed";
import { BedStay } from "./bed-stay";
import { ChartEntry } from "./chart-entry";
import { EpisodePause } from "./episode-pause";
import { Height } from "./height";
import { Hospital } from "./hospital";
import { MechanicsReading } from "./mechanics-reading";
import { Observation } from "./observation";
import { Patient } from "./patient";
import { Session } from "./session";
import { SettingChange } from "./setting-change";
import { SettingsCheck } from "./settings-check";
import { TargetOrder } from "./target-order";
import { Unit } from "./unit";
import { UnitMembership } from "./unit-membership";
import { UnitPolicy } from "./unit-policy";
import { User } from "./user";
import { VentilationEpisode } from "./ventilation-episode";

Hospital.hasMany(Unit, { as: "units", foreignKey: "hospitalId" });
Unit.belongsTo(Hospital, { as: "hospital", foreignKey: "hospitalId" });
Unit.hasMany(Bed, { as: "beds", foreignKey: "unitId" });
Unit.hasMany(UnitPolicy, { as: "policies", foreignKey: "unitId" });
Bed.belongsTo(Unit, { as: "unit", foreignKey: "unitId" });

User.hasMany(UnitMembership, { as: "memberships", foreignKey: "userId" });
UnitMembership.belongsTo(Unit, { as: "unit", foreignKey: "unitId" });
Session.belongsTo(User, { as: "user", foreignKey: "userId" });

Patient.hasMany(VentilationEpisode, { as: "episodes", foreignKey: "patientId" });
VentilationEpisode.belongsTo(Patient, { as: "patient", foreignKey: "patientId" });
VentilationEpisode.hasMany(EpisodePause, { as: "pauses", foreignKey: "episodeId" });
VentilationEpisode.hasMany(BedStay, { as: "bedStays", foreignKey: "episodeId" });
BedStay.belongsTo(Bed, { as: "bed", foreignKey: "bedId" });

ChartEntry.belongsTo(User, { as: "author", foreignKey: "authorId" });
ChartEntry.belongsTo(VentilationEpisode, { as: "episode", foreignKey: "episodeId" });
ChartEntry.hasOne(SettingChange, { as: "settings", foreignKey: "entryId" });
ChartEntry.hasOne(SettingsCheck, { as: "settingsCheck", foreignKey: "entryId" });
ChartEntry.hasOne(MechanicsReading, { as: "mechanics", foreignKey: "entryId" });
ChartEntry.hasOne(Observation, { as: "observation", foreignKey: "entryId" });
ChartEntry.hasOne(Height, { as: "height", foreignKey: "entryId" });
ChartEntry.hasOne(TargetOrder, { as: "targets", foreignKey: "entryId" });
ChartEntry.hasOne(Acknowledgement, { as: "acknowledgement", foreignKey: "entryId" });
