#include "gainsay/cli/experiment_files.h"

#include "gainsay/cli/csv_reader.h"
#include "gainsay/cli/toml_tree.h"

#include <algorithm>
#include <filesystem>
#include <map>
#include <set>
#include <utility>

namespace gainsay::cli {

namespace {

std::string stem_of(const std::string& file) { return std::filesystem::path(file).stem().string(); }

class ExperimentFiles {
 public:
  ExperimentFiles(StudyFiles& files, const StudyTop& top, const std::vector<std::string>& knowns,
                  Diagnostics& diagnostics)
      : files_(files), top_(top), knowns_(knowns), diagnostics_(diagnostics) {}

  ReadExperiments read() && {
    for (const std::string& file : files_.list("experiments", ".toml")) read_document(file);
    for (const std::string& file : files_.list("experiments", ".csv")) {
      if (tables_.find(file) == tables_.end()) read_lone_table(file);
    }
    std::stable_sort(
        read_.experiments.begin(), read_.experiments.end(),
        [](const auto& a, const auto& b) { return a.experiment.name < b.experiment.name; });
    return std::move(read_);
  }

 private:
  void read_document(const std::string& file) {
    std::string why;
    const auto source = files_.read(file, why);
    if (source == nullptr) return say_unreadable(file, why);
    const std::string own_table = StudyFiles::beside(file, stem_of(file) + ".csv");
    const auto document = read_toml(source, diagnostics_);
    if (!document) {
      tables_[own_table] = file;  // else it would be taken for an experiment of its own
      read_.all_read = false;
      return;
    }
    ExperimentReading reading =
        read_experiment(*document, stem_of(file), whole(source), top_, diagnostics_);
    const bool is_named = !reading.data.empty();
    const std::string table = is_named ? StudyFiles::beside(file, reading.data) : own_table;
    if (is_named || files_.exists(table)) take_table(table, reading);
    if (is_named && !files_.exists(table)) tables_[own_table] = file;  // said once
    read_.experiments.push_back(std::move(reading));
  }

  // A table that no document names is an experiment of its own.
  void read_lone_table(const std::string& file) {
    ExperimentReading reading;
    if (stem_of(file) == "runs") {
      std::string why;
      if (const auto source = files_.read(file, why)) {
        say_not_yet({source, 1, 1}, "runs.csv", "write one TOML file for each experiment",
                    diagnostics_);
      }
      return;
    }
    const TomlValue nothing;
    std::string why;
    const auto source = files_.read(file, why);
    if (source == nullptr) return say_unreadable(file, why);
    reading = read_experiment(nothing, stem_of(file), whole(source), top_, diagnostics_);
    const bool taken = std::any_of(read_.experiments.begin(), read_.experiments.end(),
                                   [&](const ExperimentReading& other) {
                                     return other.experiment.name == reading.experiment.name;
                                   });
    if (taken) {
      diagnostics_.error(whole(source),
                         {"the experiment '" + reading.experiment.name +
                              "' is there twice: as this table and as a TOML file with another "
                              "table",
                          "one experiment of each name", "rename the table, or remove it"});
      return;
    }
    take_table(file, reading);
    read_.experiments.push_back(std::move(reading));
  }

  void take_table(const std::string& file, ExperimentReading& reading) {
    const std::size_t errors = diagnostics_.errors();
    add_table(file, reading);
    reading.table_is_wrong = diagnostics_.errors() > errors;
  }

  void add_table(const std::string& file, ExperimentReading& reading) {
    const auto [other, is_new] = tables_.try_emplace(file, reading.file.file());
    if (!is_new) {
      diagnostics_.error(reading.data_place,
                         {"the table '" + file + "' is used by " + other->second + " already",
                          "one table for each experiment",
                          "give each experiment a table of its own: readings count once"});
      return;
    }
    std::string why;
    const auto source = files_.read(file, why);
    if (source == nullptr) {
      diagnostics_.error(reading.data_place, {"the table '" + file + "' cannot be used: " + why,
                                              "a CSV file, relative to this file",
                                              "correct the path, or put the table there"});
      return;
    }
    if (source->bytes.starts_with("#:")) {
      say_not_yet({source, 1, 1}, "#:", "put these lines into a TOML file of the same stem",
                  diagnostics_);
      return;
    }
    const auto table = read_csv(source, diagnostics_);
    if (table && top_.is_understood) {
      reading.series = read_table(*table, context(reading), diagnostics_);
    }
  }

  TableContext context(const ExperimentReading& reading) const {
    TableContext context;
    for (const ReadReadout& readout : top_.readouts)
      context.readouts.push_back(readout.readout.name);
    for (const DeclaredInput& input : top_.inputs) context.inputs.push_back(input.name);
    context.knowns = knowns_;
    for (const ReadKnown& known : reading.knowns) context.knowns.push_back(known.name);
    context.ignored = top_.ignored_columns;
    context.ignored.insert(context.ignored.end(), reading.ignored_columns.begin(),
                           reading.ignored_columns.end());
    context.begins = reading.experiment.begins;
    return context;
  }

  void say_unreadable(const std::string& file, const std::string& why) {
    const auto missing = std::make_shared<const SourceText>(SourceText{file, ""});
    diagnostics_.error(whole(missing), {"the file cannot be used: " + why, "a file to read",
                                        "remove it, or allow reading it"});
    read_.all_read = false;
  }

  StudyFiles& files_;
  const StudyTop& top_;
  const std::vector<std::string>& knowns_;
  Diagnostics& diagnostics_;
  ReadExperiments read_;
  std::map<std::string, std::string> tables_;  // used so far, and by which file
};

}  // namespace

ReadExperiments read_experiments(StudyFiles& files, const StudyTop& top,
                                 const std::vector<std::string>& knowns, Diagnostics& diagnostics) {
  return ExperimentFiles(files, top, knowns, diagnostics).read();
}

}  // namespace gainsay::cli
