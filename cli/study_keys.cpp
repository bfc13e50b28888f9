#include "gainsay/cli/study_keys.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <array>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr bool kNotYet = false;
constexpr std::string_view kNeeded = "needed";
constexpr std::string_view kOneUnit =
    "give all numbers in one set of units; `unit` keys are labels for now";
constexpr std::string_view kSeparateFiles =
    "write each hypothesis as a file of its own, with `base` for what they share";
constexpr std::string_view kNoGroups =
    "use per = \"experiment\", or one experiment for each value of the label";

constexpr std::array kSections = {
    SectionWords{Section::Study, "top", "study.toml"},
    SectionWords{Section::Inputs, "[inputs]", "study.toml"},
    SectionWords{Section::Input, "inputs.NAME", "study.toml"},
    SectionWords{Section::Knowns, "[knowns]", "all three kinds of file"},
    SectionWords{Section::Known, "knowns.NAME", "all three kinds of file"},
    SectionWords{Section::Unknowns, "[unknowns]", "study.toml and hypotheses"},
    SectionWords{Section::Unknown, "unknowns.NAME", "study.toml and hypotheses"},
    SectionWords{Section::Prior, "prior", "study.toml and hypotheses"},
    SectionWords{Section::Readouts, "[readouts]", "study.toml"},
    SectionWords{Section::Readout, "readouts.NAME", "study.toml"},
    SectionWords{Section::Noise, "noise", "study.toml"},
    SectionWords{Section::Search, "[search]", "study.toml"},
    SectionWords{Section::Accuracy, "[accuracy]", "study.toml"},
    SectionWords{Section::Hypothesis, "top", "a hypothesis"},
    SectionWords{Section::Compartments, "[compartments]", "a hypothesis"},
    SectionWords{Section::Compartment, "compartments.NAME", "a hypothesis"},
    SectionWords{Section::SpeciesNames, "[species]", "a hypothesis"},
    SectionWords{Section::Species, "species.NAME", "a hypothesis"},
    SectionWords{Section::Where, "[where]", "a hypothesis"},
    SectionWords{Section::Reactions, "[reactions]", "a hypothesis"},
    SectionWords{Section::Reaction, "reactions.NAME", "a hypothesis"},
    SectionWords{Section::Experiment, "top", "an experiment"},
    SectionWords{Section::Starts, "[start]", "an experiment"},
    SectionWords{Section::Start, "start.NAME", "an experiment"},
    SectionWords{Section::Courses, "[inputs]", "an experiment"},
    SectionWords{Section::Course, "inputs.NAME", "an experiment"},
    SectionWords{Section::Dose, "[[doses]]", "an experiment"},
    SectionWords{Section::DoseParts, "add and raise", "an experiment"},
};

constexpr std::array kStudyKeys = {
    // study.toml
    StudyKey{Section::Study, "title", kText, Section::None, "", "the folder's name",
             R"(title = "Why does the acid stop forming?")", "the question, as reports head it"},
    StudyKey{Section::Study, "significance", kNumber, Section::None, "", "0.05",
             "significance = 0.01",
             "the probability with which a true hypothesis may be rejected, between 0 and 1"},
    StudyKey{Section::Study, "decides", kText, Section::None, "", "as docs/verdict.md says",
             R"(decides = "full")",
             R"(which limit decides: "full" or "reduced"; "simulated" not yet)"},
    StudyKey{Section::Study, "ignore", kTexts, Section::None, "", "none",
             R"(ignore = ["operator", "remarks"])",
             "columns of data tables that mean nothing here"},
    StudyKey{Section::Study, "inputs", kTable, Section::Inputs, "", "none",
             "inputs.light = { otherwise = 0 }", "quantities that the experimenter sets over time"},
    StudyKey{Section::Study, "knowns", kTable, Section::Knowns, "", "none", "knowns.c_base = 500",
             "numbers that are given, for all hypotheses"},
    StudyKey{Section::Study, "unknowns", kTable, Section::Unknowns, "", "none",
             "unknowns.k1 = [0.01, 10]",
             "numbers to be fitted: all hypotheses share the range, each fits its own value"},
    StudyKey{Section::Study, "readouts", kTable, Section::Readouts, "", "none",
             R"(readouts.glow = { shows = "enzyme", noise = { sd = 0.05 } })",
             "what the instruments show"},
    StudyKey{Section::Study, "search", kTable, Section::Search, "", "see [search]",
             "search.seed = 7", "how the best fit is searched for"},
    StudyKey{Section::Study, "accuracy", kTable, Section::Accuracy, "", "see [accuracy]",
             "accuracy.relative = 1e-8", "how exactly the equations are integrated"},
    StudyKey{Section::Study, "units", kTable, Section::None, "", "", R"(units = { time = "min" })",
             "units of the study, into which all else is converted", kNotYet, kOneUnit},
    StudyKey{Section::Study, "labels", kTexts, Section::None, "", "", R"(labels = ["plate"])",
             "columns or keys that group data", kNotYet, kNoGroups},
    StudyKey{Section::Study, "measured_together", kTables, Section::None, "", "",
             R"(measured_together = [{ readouts = ["a", "b"] }])",
             "readouts of one sample that share noise", kNotYet,
             "leave out one of two readouts that depend on each other"},

    StudyKey{Section::Inputs, "*", kTable, Section::Input, "", "", "light = { otherwise = 0 }",
             "declares an input, so that a slip in its name is found"},
    StudyKey{Section::Input, "unit", kText, Section::None, "", "none", R"(unit = "L/min")",
             "a label for pages; nothing is converted"},
    StudyKey{Section::Input, "otherwise", kNumber, Section::None, "of the input", "none",
             "otherwise = 0", "the value where an experiment gives none"},

    StudyKey{Section::Knowns, "*", kNumber | kTable, Section::Known, "of the known", "",
             "c_base = 500", "a number, or a table"},
    StudyKey{Section::Known, "value", kNumber, Section::None, "of the known", kNeeded,
             "value = 500", "the number"},
    StudyKey{Section::Known, "unit", kText, Section::None, "", "none", R"(unit = "mmol/L")",
             "a label for pages; nothing is converted"},

    StudyKey{Section::Unknowns, "*", kNumbers | kTable, Section::Unknown, "of the unknown", "",
             "Km = [0.01, 10]",
             "the range in which it lies, searched in its logarithm; or a table"},
    StudyKey{Section::Unknown, "between", kNumbers, Section::None, "of the unknown", kNeeded,
             "between = [0.01, 10]", "the range: lower end, upper end"},
    StudyKey{Section::Unknown, "unit", kText, Section::None, "", "none", R"(unit = "1/min")",
             "a label for pages; nothing is converted"},
    StudyKey{Section::Unknown, "linear", kTruth, Section::None, "", "false", "linear = true",
             "searched on a linear scale; needed where the range holds 0 or less"},
    StudyKey{
        Section::Unknown, "per", kText, Section::None, "", "one for all", R"(per = "experiment")",
        R"(one unknown for each experiment that uses it, shown as kd[run-03]; labels not yet)"},
    StudyKey{Section::Unknown, "prior", kTable, Section::Prior, "", "none",
             "prior = { value = 2, sd = 0.3 }", "earlier knowledge, taken as one more measurement"},
    StudyKey{Section::Unknown, "first", kNumber | kNumbers, Section::None, "of the unknown", "none",
             "first = [0.1, 1]",
             "a first guess or a list of them, tried besides the random starts"},
    StudyKey{Section::Unknown, "hard", kTruth, Section::None, "", "false", "hard = true",
             "the range is never moved out"},
    StudyKey{Section::Prior, "value", kNumber, Section::None, "of the unknown", kNeeded,
             "value = 2", "the earlier estimate"},
    StudyKey{Section::Prior, "sd", kNumber, Section::None, "of the unknown",
             "needed, or geometric_sd", "sd = 0.3", "its standard deviation"},
    StudyKey{Section::Prior, "geometric_sd", kNumber, Section::None, "", "needed, or sd",
             "geometric_sd = 1.2", "its geometric standard deviation, above 1"},

    StudyKey{Section::Readouts, "*", kTable, Section::Readout, "", "",
             R"(glow = { shows = "enzyme", noise = { sd = 0.05 } })", "one readout"},
    StudyKey{Section::Readout, "shows", kExpression, Section::None, "", kNeeded,
             R"(shows = "2 * dimer + monomer")",
             "what it shows: an expression of everything that has a name, and of t"},
    StudyKey{Section::Readout, "title", kText, Section::None, "", "the name",
             R"(title = "Fluorescence")", "what pages call it"},
    StudyKey{Section::Readout, "unit", kText, Section::None, "", "none", R"(unit = "mmol/L")",
             "a label for axes; nothing is converted"},
    StudyKey{Section::Readout, "scale", kExpression, Section::None, "readout / shows", "1",
             R"(scale = "unknown")",
             R"(a number, "unknown", or "unknown per experiment"; labels not yet)"},
    StudyKey{Section::Readout, "offset", kExpression, Section::None, "of the readout", "0",
             R"(offset = "unknown per experiment")", "likewise; added after the scale"},
    StudyKey{Section::Readout, "signed", kTruth, Section::None, "", "false", "signed = true",
             "an unknown scale may be negative"},
    StudyKey{Section::Readout, "noise", kTable, Section::Noise, "", "needed, or sd columns",
             "noise = { sd = 0.05, relative = 0.03 }", "how it scatters"},
    StudyKey{Section::Readout, "sd_of", kText, Section::None, "", "needed with sd columns",
             R"(sd_of = "mean")",
             R"(what an sd in a table belongs to: "reading" where a row is one reading, "mean" )"
             "where a row is a mean and its sd that of the mean"},
    StudyKey{Section::Readout, "axis", kText, Section::None, "", "linear", R"(axis = "log")",
             R"("log" for a logarithmic axis)"},
    StudyKey{Section::Readout, "column", kText, Section::None, "", "", R"(column = "RT 3.45 area")",
             "its column in tables, if not its name", kNotYet,
             "head the column with the readout's name"},
    StudyKey{Section::Readout, "n", kWhole, Section::None, "", "", "n = 3",
             "how many readings an sd was estimated from", kNotYet,
             "give each reading as a row of its own"},
    StudyKey{Section::Readout, "against", kText, Section::None, "", "", R"(against = "S")",
             "what to plot against, if not time", kNotYet, "leave it out"},
    StudyKey{Section::Readout, "by", kText, Section::None, "", "", R"(by = "I")",
             "one curve for each value", kNotYet, "leave it out"},
    StudyKey{Section::Readout, "average", kNumber, Section::None, "time", "", "average = 5",
             "mean over so much time", kNotYet, "shorten the time over which a reading is taken"},
    StudyKey{Section::Readout, "relative_to", kTable, Section::None, "", "",
             R"(relative_to = { experiment = "vehicle", at = 0 })",
             "what its values were divided by", kNotYet,
             R"(give the values as read, with scale = "unknown")"},
    StudyKey{Section::Readout, "memory", kExpression, Section::None, "", "",
             R"(memory = "unknown")", "makes the noise of neighbours correlate", kNotYet,
             "leave it out"},

    StudyKey{Section::Noise, "sd", kExpression, Section::None, "of the readout", "0", "sd = 0.05",
             R"(standard deviation, the same for all values; or "unknown", fitted, and then )"
             R"(alone; or "same as glow", the unknown one of that readout; "from replicates" )"
             R"(not yet)"},
    StudyKey{Section::Noise, "relative", kExpression, Section::None, "", "0", "relative = 0.03",
             "part of the modelled value: variance = sd^2 + (relative * value)^2"},
    StudyKey{Section::Noise, "counting", kExpression, Section::None, "of the readout", "",
             "counting = 1", "variance in proportion to the modelled value", kNotYet,
             "use sd and relative"},
    StudyKey{Section::Noise, "geometric_sd", kExpression, Section::None, "", "",
             "geometric_sd = 1.2", "scatter of the logarithm", kNotYet, "use relative"},
    StudyKey{Section::Noise, "memory", kExpression, Section::None, "", "", R"(memory = "unknown")",
             "makes the noise of neighbours correlate", kNotYet, "leave it out"},

    StudyKey{
        Section::Search, "descents", kText | kWhole, Section::None, "", "until convincing",
        "descents = 40",
        R"(how many random starts, or "until convincing"; 0 fits from the first guesses alone)"},
    StudyKey{Section::Search, "budget", kWhole, Section::None, "integrations", "20000",
             "budget = 50000", "integrations for each experiment, for each hypothesis"},
    StudyKey{Section::Search, "seed", kWhole, Section::None, "", "1", "seed = 7",
             "of all random draws"},
    StudyKey{Section::Search, "may_miss", kNumber, Section::None, "", "", "may_miss = 0.05",
             "how often the search may miss a planted truth", kNotYet, "leave it out"},
    StudyKey{Section::Accuracy, "relative", kNumber, Section::None, "", "1e-6", "relative = 1e-8",
             "relative tolerance of the integration"},
    StudyKey{Section::Accuracy, "negligible", kNumber, Section::None, "", "1e-8",
             "negligible = 1e-9",
             "of a species: this times the largest start, addition or reading of its kind in the "
             "experiment (1 if none)"},

    // A hypothesis
    StudyKey{Section::Hypothesis, "title", kText, Section::None, "", "the file's stem",
             R"(title = "Whole cells, two enzymes")", "what pages call it; not inherited"},
    StudyKey{Section::Hypothesis, "base", kText, Section::None, "", "none",
             R"(base = "plain.toml")",
             "the hypothesis that this one amends, relative to this file"},
    StudyKey{Section::Hypothesis, "remove", kTexts, Section::None, "", "none",
             R"(remove = ["reactions.loss", "unknowns.kd"])",
             "what of the base is taken out before this file's keys are merged in"},
    StudyKey{Section::Hypothesis, "compartments", kTable, Section::Compartments, "",
             "one of volume 1", R"(compartments.tank = { volume = 0.8 })", "where species are"},
    StudyKey{Section::Hypothesis, "species", kTable, Section::SpeciesNames, "", "none",
             "species.nitrile = {}", "what is converted"},
    StudyKey{Section::Hypothesis, "where", kTable, Section::Where, "", "none",
             R"(where.brake = "1 + acid / Ki")", "names for expressions, in any order"},
    StudyKey{Section::Hypothesis, "reactions", kTable, Section::Reactions, "", "none",
             R"(reactions.loss = { equation = "enzyme ->", rate = "kd * enzyme" })",
             "what is turned into what"},
    StudyKey{Section::Hypothesis, "knowns", kTable, Section::Knowns, "", "none", "knowns.Ki = 3",
             "its own knowns; one of the name of a study's unknown fixes it"},
    StudyKey{Section::Hypothesis, "unknowns", kTable, Section::Unknowns, "", "none",
             "unknowns.Ki = [0.01, 100]", "its own unknowns; they replace the study's"},
    StudyKey{Section::Hypothesis, "choices", kTable, Section::None, "", "",
             "choices.inhibition.none = {}", "alternatives whose product is a family", kNotYet,
             kSeparateFiles},
    StudyKey{Section::Hypothesis, "never", kTexts | kTables, Section::None, "", "",
             R"(never = ["enzyme.lost"])", "members that a family leaves out", kNotYet,
             kSeparateFiles},

    StudyKey{Section::Compartments, "*", kTable, Section::Compartment, "", "",
             "tank = { volume = 0.8 }", "one compartment"},
    StudyKey{Section::Compartment, "volume", kExpression, Section::None, "volume", "1",
             R"(volume = "fill0")", "of knowns and unknowns"},
    StudyKey{Section::Compartment, "fills", kExpression, Section::None, "volume / time", "",
             R"(fills = "feed")", "adds liquid free of species", kNotYet,
             "use a volume that does not change"},
    StudyKey{Section::Compartment, "drains", kExpression, Section::None, "volume / time", "",
             R"(drains = "outflow")", "removes contents", kNotYet,
             "use a volume that does not change"},

    StudyKey{Section::SpeciesNames, "*", kTable, Section::Species, "", "", "nitrile = {}",
             "one species; in expressions its name is its concentration"},
    StudyKey{Section::Species, "in", kText, Section::None, "", "the only compartment",
             R"(in = "tank")", "its compartment"},
    StudyKey{Section::Species, "start", kExpression, Section::None, "concentration, or amount", "0",
             "start = 1",
             "its start value where the experiment gives none; of knowns, unknowns and inputs"},
    StudyKey{Section::Species, "amount", kTruth, Section::None, "", "false", "amount = true",
             "its name stands for its amount; it needs no compartment"},
    StudyKey{Section::Species, "held", kTruth, Section::None, "", "false", "held = true",
             "the experimenter holds it at its start"},
    StudyKey{Section::Species, "shown_as", kText, Section::None, "", "the name",
             R"(shown_as = "R*")", "what pages print"},
    StudyKey{Section::Species, "negligible", kNumber, Section::None, "concentration, or amount",
             "see [accuracy]", "negligible = 1e-16", "how little of it does not matter"},
    StudyKey{Section::Species, "arrives", kTable, Section::None, "", "",
             R"(arrives = { share = "F" })", "part and delay with which doses reach it", kNotYet,
             "let the dose enter a species of its own that a reaction empties"},

    StudyKey{Section::Where, "*", kExpression, Section::None, "", "", R"(brake = "1 + acid / Ki")",
             "a name for an expression"},

    StudyKey{Section::Reactions, "*", kTable, Section::Reaction, "", "",
             R"(loss = { equation = "enzyme ->", rate = "kd * enzyme" })", "one reaction"},
    StudyKey{Section::Reaction, "equation", kText, Section::None, "", kNeeded,
             R"(equation = "2 A + B -> C")",
             "`->` or `→`, `<->` or `⇌`; positive coefficients; an empty side is the outside"},
    StudyKey{Section::Reaction, "rate", kExpression, Section::None, "concentration / time",
             "needed, or flow", R"x(rate = "mass_action(k1)")x",
             "where all that stand in the equation share one compartment"},
    StudyKey{Section::Reaction, "flow", kExpression, Section::None, "amount / time",
             "needed, or rate", R"(flow = "Q * drug")",
             "where they do not share a compartment, or one of them is an amount"},
    StudyKey{Section::Reaction, "back", kExpression, Section::None, "as rate or flow", "none",
             R"x(back = "mass_action(k2)")x",
             "the way back of `<->`; without it rate or flow is the signed net"},

    // An experiment
    StudyKey{Section::Experiment, "title", kText, Section::None, "", "the file's stem",
             R"(title = "High load, 30 degrees")", "what pages call it"},
    StudyKey{Section::Experiment, "data", kText, Section::None, "", "the same stem, .csv",
             R"(data = "run-03.csv")", "its table, relative to this file"},
    StudyKey{Section::Experiment, "begins", kNumber, Section::None, "time", "0", "begins = -5",
             "the time at which it begins"},
    StudyKey{Section::Experiment, "knowns", kTable, Section::Knowns, "", "none",
             "knowns.fill0 = 0.8",
             "replace those of study and hypothesis; a name that only experiments give must be "
             "given by each"},
    StudyKey{Section::Experiment, "start", kTable, Section::Starts, "", "the hypothesis'",
             "start = { nitrile = 40 }", "start values of species"},
    StudyKey{Section::Experiment, "inputs", kTable, Section::Courses, "", "their `otherwise`",
             "inputs.light = 3", "what the inputs were"},
    StudyKey{Section::Experiment, "doses", kTables, Section::Dose, "", "none",
             "doses = [{ at = 60, add = { nitrile = 10 } }]", "additions; mostly as [[doses]]"},
    StudyKey{Section::Experiment, "absent", kTexts, Section::None, "", "none",
             R"(absent = ["depot"])", "species that a hypothesis may lack"},
    StudyKey{Section::Experiment, "ignore", kTexts, Section::None, "", "none",
             R"(ignore = ["remarks"])", "columns of its table that mean nothing here"},
    StudyKey{Section::Experiment, "labels", kTable, Section::None, "", "",
             R"(labels.batch = "B12")", "what groups experiments", kNotYet, kNoGroups},
    StudyKey{Section::Experiment, "settle", kTruth | kTable, Section::None, "", "", "settle = true",
             "begin at the steady state", kNotYet,
             "let the experiment begin earlier: begins = -1000"},
    StudyKey{Section::Experiment, "samples", kTables, Section::None, "", "",
             "samples = [{ every = 10, volume = 0.002 }]", "what sampling takes away", kNotYet,
             "leave it out where samples are small"},
    StudyKey{Section::Experiment, "held_out", kTruth, Section::None, "", "", "held_out = true",
             "not fitted, but predicted and tested", kNotYet,
             "take the file out of experiments/ for the time being"},
    StudyKey{Section::Experiment, "replaces", kText, Section::None, "", "",
             R"(replaces = "run-03")", "a correction of another experiment", kNotYet,
             "remove the file that is replaced"},

    StudyKey{Section::Starts, "*", kExpression | kTable, Section::Start, "concentration, or amount",
             "", R"(nitrile = "0.98 * weighed")",
             "a number, an expression of knowns, unknowns and inputs at the beginning, or a table"},
    StudyKey{Section::Start, "value", kNumber, Section::None, "concentration, or amount",
             "needed, or between", "value = 1.0",
             "as weighed in: fitted, with its sd as one more measurement"},
    StudyKey{Section::Start, "sd", kNumber, Section::None, "concentration, or amount",
             "needed with value", "sd = 0.05", "standard deviation of the weighing"},
    StudyKey{Section::Start, "between", kNumbers, Section::None, "concentration, or amount",
             "needed, or value; with value: 5 sd on either side, not below 0",
             "between = [0.1, 10]",
             "one unknown of this experiment, shown as start.enzyme[run-03]"},
    StudyKey{Section::Start, "unit", kText, Section::None, "", "none", R"(unit = "mmol/L")",
             "a label for pages; nothing is converted"},
    StudyKey{Section::Start, "linear", kTruth, Section::None, "", "false; always true with value",
             "linear = true", "as of an unknown"},
    StudyKey{Section::Start, "first", kNumber | kNumbers, Section::None, "concentration, or amount",
             "none; the value", "first = 1", "as of an unknown"},
    StudyKey{Section::Start, "hard", kTruth, Section::None, "", "false", "hard = true",
             "as of an unknown"},

    StudyKey{Section::Courses, "*", kNumber | kTable, Section::Course, "of the input", "",
             "light = 3", "a number for the whole time, or a table"},
    StudyKey{Section::Course, "steps", kPairs, Section::None, "time; of the input", kNeeded,
             "steps = [[0, 0], [30, 5e-4], [90, 0]]", "pairs of a time and the value from then on"},
    StudyKey{Section::Course, "lines", kPairs, Section::None, "", "", "lines = [[0, 0], [30, 1]]",
             "straight from pair to pair", kNotYet, "use steps, as many as needed"},
    StudyKey{Section::Course, "table", kText, Section::None, "", "", R"(table = "reactor-03.csv")",
             "its course in a table", kNotYet, "use steps, as many as needed"},
    StudyKey{Section::Course, "column", kText, Section::None, "", "", R"(column = "T_R")",
             "the column of that table", kNotYet, "use steps, as many as needed"},
    StudyKey{Section::Course, "smooth", kTruth, Section::None, "", "", "smooth = true",
             "a smooth course through the table", kNotYet, "use steps, as many as needed"},
    StudyKey{Section::Course, "period", kNumber, Section::None, "time", "", "period = 24",
             "repeats the course", kNotYet, "write the steps of each period"},

    StudyKey{Section::Dose, "at", kNumber, Section::None, "time", kNeeded, "at = 60",
             "when it is added; readings at this time are taken just before"},
    StudyKey{Section::Dose, "add", kTable, Section::DoseParts, "amount", "needed, or raise",
             "add = { nitrile = 10 }", "amounts added"},
    StudyKey{Section::Dose, "raise", kTable, Section::DoseParts, "concentration", "needed, or add",
             "raise = { nitrile = 12.5 }", "rises of concentration"},
    StudyKey{Section::Dose, "over", kNumber, Section::None, "time", "", "over = 5",
             "added evenly over so much time", kNotYet,
             "use an input with steps and a reaction `-> species` with a flow"},
    StudyKey{Section::Dose, "every", kNumber, Section::None, "time", "", "every = 24", "repeats it",
             kNotYet, "write one [[doses]] for each"},
    StudyKey{Section::Dose, "times", kWhole, Section::None, "", "", "times = 4",
             "how often it is repeated", kNotYet, "write one [[doses]] for each"},
    StudyKey{Section::Dose, "volume", kNumber, Section::None, "volume", "", "volume = 0.01",
             "liquid added with it", kNotYet, "leave it out where it is small"},
    StudyKey{Section::DoseParts, "*", kExpression, Section::None, "amount; concentration", "",
             "nitrile = 10", "a number or an expression of knowns; unknowns not yet"},
};

}  // namespace

std::span<const StudyKey> all_study_keys() { return kStudyKeys; }

std::span<const SectionWords> all_sections() { return kSections; }

const SectionWords& words_for(Section section) {
  const auto found = std::find_if(kSections.begin(), kSections.end(),
                                  [&](const SectionWords& row) { return row.section == section; });
  GAINSAY_REQUIRE(found != kSections.end(), "every section but None has its words");
  return *found;
}

const StudyKey* find_key(Section section, std::string_view name) {
  const auto is = [&](std::string_view wanted) {
    return std::find_if(kStudyKeys.begin(), kStudyKeys.end(), [&](const StudyKey& row) {
      return row.section == section && row.name == wanted;
    });
  };
  auto found = is(name);
  if (found == kStudyKeys.end()) found = is("*");
  return found == kStudyKeys.end() ? nullptr : &*found;
}

std::string words_for_takes(unsigned takes) {
  constexpr std::array<std::pair<unsigned, std::string_view>, 9> kWords = {{
      {kNumber, "a number"},
      {kWhole, "a whole number"},
      {kText, "a text"},
      {kTruth, "true or false"},
      {kNumbers, "a list of numbers"},
      {kTexts, "a list of texts"},
      {kPairs, "a list of pairs [time, value]"},
      {kTable, "a table"},
      {kTables, "a list of tables"},
  }};
  std::string words;
  for (const auto& [bit, word] : kWords) {
    if ((takes & bit) == 0) continue;
    takes &= ~bit;
    if (!words.empty()) words += takes == 0 ? " or " : ", ";
    words += word;
  }
  return words;
}

}  // namespace gainsay::cli
