#pragma once

#include "gainsay/core/parse.h"
#include "gainsay/core/schedule.h"
#include "gainsay/core/system.h"

#include <Eigen/Core>

#include <cmath>
#include <functional>
#include <string>
#include <vector>

namespace gainsay::testing {

/// One state as a user would write it.
struct StateText {
  std::string name;
  std::string rate;
  std::string start;
};

struct SystemText {
  std::vector<StateText> states;
  std::vector<std::string> unknowns;
  std::vector<std::string> inputs;
  std::vector<std::pair<std::string, std::string>> jumps;  ///< (state, rise)
  std::vector<std::string> readouts;
};

/// The system of these texts; throws where one of them is not an expression.
inline core::System read_system(const SystemText& text) {
  const auto read = [](const std::string& expression) {
    return core::parse(expression)->expression;
  };
  core::System system;
  system.unknowns = text.unknowns;
  system.inputs = text.inputs;
  for (const StateText& state : text.states) {
    system.states.push_back(state.name);
    system.rates.push_back(read(state.rate));
    system.starts.push_back(read(state.start));
  }
  for (const auto& [state, rise] : text.jumps) {
    for (std::size_t i = 0; i < system.states.size(); ++i) {
      if (system.states[i] == state) system.jumps.push_back({.state = i, .rise = read(rise)});
    }
  }
  for (const std::string& readout : text.readouts) system.readouts.push_back(read(readout));
  return system;
}

/// A system with the states (n) and their derivatives by the unknowns (n x p) at any time.
struct ExactSystem {
  std::string title;
  core::System system;
  std::vector<double> unknowns;
  core::Schedule schedule;  ///< inputs and events; without outputs
  double last = 10.0;       ///< a time at which all of it has happened
  std::function<Eigen::VectorXd(double t)> states;
  std::function<Eigen::MatrixXd(double t)> derivatives;
};

/// A -> B -> C. Bateman (1910); derivatives by hand.
inline ExactSystem consecutive_reactions() {
  const double k1 = 0.5, k2 = 0.2, start = 10.0;
  const auto a = [=](double t) { return start * std::exp(-k1 * t); };
  const auto b = [=](double t) {
    return start * k1 / (k2 - k1) * (std::exp(-k1 * t) - std::exp(-k2 * t));
  };
  return {
      .title = "consecutive reactions",
      .system = read_system(
          {.states = {{"A", "-k1 * A", "A0"}, {"B", "k1 * A - k2 * B", "0"}, {"C", "k2 * B", "0"}},
           .unknowns = {"k1", "k2", "A0"},
           .readouts = {"A", "B", "C", "A + B + C"}}),
      .unknowns = {k1, k2, start},
      .schedule = {},
      .last = 20.0,
      .states = [=](double t) { return Eigen::Vector3d(a(t), b(t), start - a(t) - b(t)); },
      .derivatives =
          [=](double t) {
            const double e1 = std::exp(-k1 * t), e2 = std::exp(-k2 * t), gap = k2 - k1;
            const double b1 = start * (k2 / (gap * gap) * (e1 - e2) - k1 / gap * t * e1);
            const double b2 = start * k1 * (t * e2 / gap - (e1 - e2) / (gap * gap));
            Eigen::Matrix3d result;
            result << -t * a(t), 0.0, e1,  //
                b1, b2, b(t) / start,      //
                t * a(t) - b1, -b2, 1.0 - e1 - b(t) / start;
            return result;
          }};
}

/// Logistic growth. Verhulst (1838); derivatives by hand.
inline ExactSystem logistic_growth() {
  const double r = 0.6, K = 50.0, start = 2.0;
  const auto y = [=](double t) { return K / (1.0 + (K / start - 1.0) * std::exp(-r * t)); };
  return {.title = "logistic growth",
          .system = read_system({.states = {{"y", "r * y * (1 - y / K)", "y0"}},
                                 .unknowns = {"r", "K", "y0"},
                                 .readouts = {"y", "y^2"}}),
          .unknowns = {r, K, start},
          .schedule = {},
          .last = 20.0,
          .states = [=](double t) { return Eigen::VectorXd::Constant(1, y(t)); },
          .derivatives =
              [=](double t) {
                const double e = std::exp(-r * t), share = y(t) / K, left = K / start - 1.0;
                Eigen::MatrixXd result(1, 3);
                result << share * share * K * left * t * e, share - share * share * K / start * e,
                    share * share * K * K / (start * start) * e;
                return result;
              }};
}

/// A decay of unknown order: dA/dt = -k A^h. By separation of variables; derivatives by hand.
inline ExactSystem decay_of_order() {
  const double k = 0.3, h = 1.5, start = 4.0;
  const auto base = [=](double t) { return std::pow(start, 1.0 - h) - (1.0 - h) * k * t; };
  const auto a = [=](double t) { return std::pow(base(t), 1.0 / (1.0 - h)); };
  return {
      .title = "decay of unknown order",
      .system = read_system(
          {.states = {{"A", "-k * A^h", "A0"}}, .unknowns = {"k", "h", "A0"}, .readouts = {"A"}}),
      .unknowns = {k, h, start},
      .schedule = {},
      .last = 10.0,
      .states = [=](double t) { return Eigen::VectorXd::Constant(1, a(t)); },
      .derivatives =
          [=](double t) {
            const double g = 1.0 - h, slope = a(t) / (g * base(t));  // dA / dbase
            const double base_h = -std::log(start) * std::pow(start, g) + k * t;
            Eigen::MatrixXd result(1, 3);
            result << slope * -g * t, a(t) * std::log(base(t)) / (g * g) + slope * base_h,
                slope * g * std::pow(start, -h);
            return result;
          }};
}

/// One compartment: an infusion from 0 to 2, and unknown doses at 3 (twice at once) and 7. Sum of
/// exponentials (superposition); derivatives by hand.
inline ExactSystem doses_and_infusion() {
  const double ke = 0.25, V = 8.0, dose = 5.0, infusion = 3.0;
  // Sum over what was given of amount x shape(time since), for a shape and its derivative by ke.
  const auto from_doses = [=](double t, auto shape) {
    return (t > 3.0 ? 2.0 * shape(t - 3.0) : 0.0) + (t > 7.0 ? shape(t - 7.0) : 0.0);
  };
  const auto washout = [=](double s) { return std::exp(-ke * s); };
  const auto washout_ke = [=](double s) { return -s * std::exp(-ke * s); };
  const auto filling = [=](double s) { return s > 0.0 ? (1.0 - std::exp(-ke * s)) / ke : 0.0; };
  const auto filling_ke = [=](double s) {
    return s > 0.0 ? (s * std::exp(-ke * s) - (1.0 - std::exp(-ke * s)) / ke) / ke : 0.0;
  };
  const auto c = [=](double t) {
    return (dose * from_doses(t, washout) + infusion * (filling(t) - filling(t - 2.0))) / V;
  };
  return {.title = "doses and an infusion",
          .system = read_system({.states = {{"C", "infusion / V - ke * C", "0"}},
                                 .unknowns = {"ke", "V", "dose", "scale"},
                                 .inputs = {"infusion"},
                                 .jumps = {{"C", "dose / V"}, {"C", "infusion + dose / V"}},
                                 .readouts = {"scale * C"}}),
          .unknowns = {ke, V, dose, 2.0},
          .schedule = {.begins = 0.0,
                       .inputs = {infusion},
                       .events = {{.time = 2.0, .settings = {{0, 0.0}}, .jumps = {}},
                                  {.time = 3.0, .settings = {}, .jumps = {0, 1}},
                                  {.time = 7.0, .settings = {}, .jumps = {0}}},
                       .outputs = {}},
          .last = 12.0,
          .states = [=](double t) { return Eigen::VectorXd::Constant(1, c(t)); },
          .derivatives =
              [=](double t) {
                const double by_ke = dose * from_doses(t, washout_ke) +
                                     infusion * (filling_ke(t) - filling_ke(t - 2.0));
                Eigen::MatrixXd result(1, 4);
                result << by_ke / V, -c(t) / V, from_doses(t, washout) / V, 0.0;
                return result;
              }};
}

inline std::vector<ExactSystem> all_exact_systems() {
  return {consecutive_reactions(), logistic_growth(), decay_of_order(), doses_and_infusion()};
}

}  // namespace gainsay::testing
