#pragma once

#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/readout.h"
#include "gainsay/estimation/unknown.h"
#include "gainsay/testing/mechanism.h"

#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// Writes an experiment down line by line.
class Bench {
 public:
  explicit Bench(std::string name) { experiment_.name = std::move(name); }

  Bench& begins(double time) {
    experiment_.begins = time;
    return *this;
  }
  Bench& known(const char* name, double value) {
    experiment_.knowns[name] = value;
    return *this;
  }
  Bench& start(const char* species, std::string_view value) {
    experiment_.starts.push_back({species, written(value), std::nullopt});
    return *this;
  }
  Bench& start(const char* species, estimation::Unknown unknown) {
    experiment_.starts.push_back({species, 0.0, std::move(unknown)});
    return *this;
  }
  Bench& input(const char* name, std::vector<std::pair<double, double>> steps) {
    experiment_.inputs.push_back({name, std::move(steps)});
    return *this;
  }
  Bench& add(double at, const char* species, std::string_view amount) {
    experiment_.doses.push_back({at, {{species, written(amount)}}, {}});
    return *this;
  }
  Bench& raise(double at, const char* species, std::string_view rise) {
    experiment_.doses.push_back({at, {}, {{species, written(rise)}}});
    return *this;
  }
  Bench& absent(const char* species) {
    experiment_.absent.push_back(species);
    return *this;
  }
  Bench& data(const char* readout, std::vector<std::pair<double, double>> readings) {
    estimation::Series series{readout, {}};
    for (const auto& [time, value] : readings) series.points.push_back({time, value});
    experiment_.series.push_back(std::move(series));
    return *this;
  }
  /// The reading written last, to be changed.
  estimation::Point& last_point() { return experiment_.series.back().points.back(); }

  operator const estimation::Experiment&() const { return experiment_; }  // NOLINT: it is one

 private:
  estimation::Experiment experiment_;
};

inline estimation::DeclaredUnknown between(const char* name, double low, double high) {
  estimation::DeclaredUnknown declared;
  declared.unknown.name = name;
  declared.unknown.low = low;
  declared.unknown.high = high;
  declared.own = true;
  return declared;
}

inline estimation::DeclaredUnknown per_experiment(estimation::DeclaredUnknown declared) {
  declared.per_experiment = true;
  return declared;
}

/// A readout of constant sd; its scale is 1 and its offset 0 until said otherwise.
inline estimation::Readout shows(const char* name, std::string_view what, double sd = 1.0) {
  estimation::Readout readout;
  readout.name = name;
  readout.shows = written(what);
  readout.noise.sd = sd;
  return readout;
}

}  // namespace gainsay::testing
