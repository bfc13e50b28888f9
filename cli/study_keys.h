#pragma once

#include <cstdint>
#include <span>
#include <string>
#include <string_view>

namespace gainsay::cli {

/// The tables of study files. Those whose keys are names chosen by the author hold one row, "*".
enum class Section : std::uint8_t {
  Study,
  Inputs,
  Input,
  Knowns,
  Known,
  Unknowns,
  Unknown,
  Prior,
  Readouts,
  Readout,
  Noise,
  Search,
  Accuracy,
  Hypothesis,
  Compartments,
  Compartment,
  SpeciesNames,
  Species,
  Where,
  Reactions,
  Reaction,
  Experiment,
  Starts,
  Start,
  Courses,
  Course,
  Dose,
  DoseParts,
  None
};

/// What a key takes; several may be joined.
enum Takes : unsigned {
  kText = 1U << 0U,
  kNumber = 1U << 1U,
  kWhole = 1U << 2U,    ///< a whole number, at least 0
  kTruth = 1U << 3U,    ///< true or false
  kTexts = 1U << 4U,    ///< list of texts
  kNumbers = 1U << 5U,  ///< list of numbers
  kPairs = 1U << 6U,    ///< list of lists of two numbers
  kTable = 1U << 7U,    ///< table
  kTables = 1U << 8U,   ///< list of tables: [[...]]
  kExpression = kText | kNumber
};

/// One key of the study files: the one source of what the readers accept and of
/// docs/study-files.md.
struct StudyKey {
  Section section;
  std::string_view name;
  unsigned takes = 0;             ///< of Takes
  Section holds = Section::None;  ///< section of the table or tables it takes
  std::string_view unit;          ///< in words; empty where none applies
  std::string_view otherwise;     ///< what holds without it; "needed" where there must be one
  std::string_view example;       ///< the key with a value, as it may stand in its table
  std::string_view meaning;
  bool accepted = true;           ///< else it gives a placed 'not yet'
  std::string_view instead = {};  ///< of a key not yet accepted: what to do for now
};

struct SectionWords {
  Section section;
  std::string_view header;  ///< as it stands in a file: "[readouts]", "NAME = { ... } below [...]"
  std::string_view file;    ///< "study.toml", "a hypothesis", ...
};

/// All keys, section by section, in the order in which the page shows them.
std::span<const StudyKey> all_study_keys();
std::span<const SectionWords> all_sections();
const SectionWords& words_for(Section section);

/// The row of a key, the "*" row of its section, or null.
const StudyKey* find_key(Section section, std::string_view name);

/// "a text or a number", for messages and the page.
std::string words_for_takes(unsigned takes);

}  // namespace gainsay::cli
